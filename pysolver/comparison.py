"""How does each effect compare with each limit, for one or many choices of what was measured?

A Comparison holds what stays the same while lengths and positions vary: the criteria, the sources with their ranges and
the factors of each criterion's combination set. compare() then answers for many layouts at once. Only the loads that a
limit covers enter its ratio (J2); its basis chooses the factors (J4). SI units, signs as in statics.py.
"""

from collections.abc import Sequence
from dataclasses import dataclass, field, replace

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise
from pysolver.combinations import Case, CombinationSet, Source, cases, ranges
from pysolver.envelope import Influence, Worst, influence, worst
from pysolver.found import Layout
from pysolver.limits import Criterion, capacity_at
from pysolver.statics import Batch, solve_batch

Floats = NDArray[np.float64]

QUANTITY = {"sagging": ("moment", 1.0), "hogging": ("moment", -1.0), "sag": ("sag", 1.0)}
CELLS_AT_ONCE = 400_000  # numbers held at once for one quantity of a batch: keeps a phone's memory calm


@dataclass(frozen=True, slots=True, kw_only=True)
class Judged:
    """A criterion with the set that it is compared with, and which sources its limit covers."""

    criterion: Criterion
    chosen: CombinationSet
    cases: tuple[Case, ...]
    covered: tuple[bool, ...]
    at_face: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class Along:
    """Layouts of one shape, solved together."""

    batch: Batch
    layouts: Sequence[Layout]
    known: dict[str, Influence] = field(default_factory=dict)

    def influence(self, name: str) -> Influence:
        """The response to each source of shear, moment or sag (from the chord), worked out at most once."""
        if name not in self.known:
            coefficients = from_chord(self) if name == "sag" else getattr(self.batch, name)
            self.known[name] = influence(coefficients, np.diff(self.batch.x, axis=1))
        return self.known[name]


def solve_layouts(layouts: Sequence[Layout]) -> Along:
    """Solve layouts of one shape, with breakpoints where zones end, at supports and at their faces."""
    cuts = [tuple(x for ends in (*lay.zones.values(), *lay.faces) for x in ends) for lay in layouts]
    batch = solve_batch([lay.beam for lay in layouts], [lay.loads for lay in layouts], cuts)
    return Along(batch=batch, layouts=layouts)


def judged(criterion: Criterion, chosen: CombinationSet, sources: Sequence[Source], covered: Sequence[bool],
           at_face: bool) -> Judged:
    """A criterion made ready. sources in the order of the batch."""
    return Judged(criterion=criterion, chosen=chosen, cases=cases(chosen, sources), covered=tuple(covered), at_face=at_face)


def factor_ranges(one: Judged, sources: Sequence[Source], *, best: bool) -> tuple[Floats, Floats]:
    """(K, S) ends of the factors' ranges, zero for what the limit does not cover."""
    low, high = ranges(one.cases, sources, best=best)
    mask = np.array(one.covered, dtype=float)
    return low * mask, high * mask


def compare(along: Along, one: Judged, sources: Sequence[Source], *, best: bool) -> Worst:
    """The worst ratio of one criterion in each layout: with sources at best, or anywhere in their ranges."""
    return ratio_of(along, one, *factor_ranges(one, sources, best=best))


def ratio_of(along: Along, one: Judged, low: Floats, high: Floats) -> Worst:
    """The worst ratio of one criterion with factors (K, S) between low and high."""
    kind = one.criterion.kind
    if kind in ("reaction", "hold_down"):
        return _compare_reaction(along, one, low, high)
    return _of_kind(along, kind, low, high, capacities(along, one))


def _of_either_sign(influence: Influence, low: Floats, high: Floats, capacity: Floats) -> Worst:
    up, down = (worst(influence, sign, low, high, capacity) for sign in (1.0, -1.0))
    more = down.ratio > up.ratio
    return Worst(ratio=np.where(more, down.ratio, up.ratio), effect=np.where(more, -down.effect, up.effect),
                 piece=np.where(more, down.piece, up.piece), s=np.where(more, down.s, up.s),
                 case=np.where(more, down.case, up.case))


def _compare_reaction(along: Along, one: Judged, low: Floats, high: Floats) -> Worst:
    j = along.layouts[0].real.index(one.criterion.support)
    sign = 1.0 if one.criterion.kind == "reaction" else -1.0
    values = sign * along.batch.reactions[:, j][:, None, :, None]
    capacity = np.full((len(along.layouts), 1), min(s.capacity for s in one.criterion.stretches))
    return worst(influence(values, np.zeros((len(along.layouts), 1))), 1.0, low, high, capacity)


def capacities(along: Along, one: Judged) -> Floats:
    """(C, P) the capacity on each piece; infinite in a gap, and inside a support when the limit is for its face."""
    x = along.batch.x
    middle = 0.5 * (x[:, :-1] + x[:, 1:])
    flat = one.criterion.stretches
    if one.criterion.span_ratio is None and all(s.zone is None for s in flat):
        capacity = np.full(middle.shape, min(s.capacity for s in flat))
    else:
        rows = [[capacity_at(one.criterion, m, lay) for m in row]
                for row, lay in zip(middle, along.layouts, strict=True)]
        capacity = np.array([[np.inf if c is None else c for c in row] for row in rows])
    if one.at_face and one.criterion.kind in ("sagging", "hogging"):
        for c, layout in enumerate(along.layouts):
            for left, right in layout.faces:
                capacity[c, (middle[c] > left) & (middle[c] < right)] = np.inf
    return capacity


def without_limit(along: Along, kind: str, all_judged: Sequence[Judged], low: Floats, high: Floats) -> Worst:
    """The largest effect (its ratio is to one N or N·m) of a kind on those pieces for which no sheet has a limit."""
    limits = [capacities(along, replace(one, at_face=False)) for one in all_judged if one.criterion.kind == kind]
    covered: NDArray[np.bool_] = np.zeros(np.diff(along.batch.x, axis=1).shape, bool)
    for capacity in limits:
        covered |= np.isfinite(capacity)
    open_pieces = np.where(covered, np.inf, 1.0)
    if covered.all():
        nothing, first = np.zeros(len(covered)), np.zeros(len(covered), np.intp)
        return Worst(ratio=nothing, effect=nothing, piece=first, s=nothing, case=first)
    return _of_kind(along, kind, low, high, open_pieces)


def _of_kind(along: Along, kind: str, low: Floats, high: Floats, capacity: Floats) -> Worst:
    """Pieces without length stand between things in one place, as a load and the support under it: nothing is there."""
    capacity = np.where(np.diff(along.batch.x, axis=1) > 0.0, capacity, np.inf)
    if kind == "shear":
        return _of_either_sign(along.influence("shear"), low, high, capacity)
    name, sign = QUANTITY[kind]
    return worst(along.influence(name), sign, low, high, capacity)


def from_chord(along: Along) -> Floats:
    """(C, P, S, 6) sag measured from the chord between displaced supports (J33): an overhang from the chord of its
    neighbour produced, a cantilever from the level of its support."""
    x, real = along.batch.x, along.layouts[0].real
    places = np.array([[lay.supports[j] for j in real] for lay in along.layouts])
    levels = _sag_at(along.batch, places)
    middle = 0.5 * (x[:, :-1] + x[:, 1:])
    if len(real) == 1:
        start, slope = levels[:, :1], np.zeros_like(levels[:, :1])
    else:
        slopes = np.diff(levels, axis=1) / np.diff(places, axis=1)[..., None]
        span = np.clip((places[:, None, :] < middle[..., None]).sum(axis=2) - 1, 0, len(real) - 2)
        rows = np.arange(len(x))[:, None]
        slope = slopes[rows, span]
        start = levels[rows, span] + slope * (x[:, :-1] - places[rows, span])[..., None]
    coefficients = along.batch.sag.copy()
    coefficients[..., 0] -= start
    coefficients[..., 1] -= slope
    return coefficients


def _sag_at(batch: Batch, places: Floats) -> Floats:
    """(C, J, S) the sag at places (C, J) by source."""
    piece = np.clip((batch.x[:, None, :] <= places[..., None]).sum(axis=2) - 1, 0, batch.sag.shape[1] - 1)
    rows = np.arange(len(places))[:, None]
    value: Floats = piecewise.evaluate(batch.sag[rows, piece], (places - batch.x[rows, piece])[..., None])
    return value


def chunks(total: int, along_one: Along) -> int:
    """How many layouts to solve at once so that the arrays of one quantity stay small."""
    _, pieces, sources, _ = along_one.batch.sag.shape
    return max(1, min(total, CELLS_AT_ONCE // max(1, int(pieces * pieces * sources))))
