"""Where does each comparison govern, at best estimate and at worst?

Best estimates first; then loads by the sign of their influence and lengths and positions by search (bounds.py). Each
criterion becomes one Compared with places in words. Effects in SI, signs as in statics.py.
"""

import math
from collections.abc import Sequence
from dataclasses import dataclass, replace

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise
from pysolver.bounds import most_telling, search
from pysolver.combinations import Case
from pysolver.comparison import Along, Judged, chunks, compare, factor_ranges, ratio_of, smallest_reactions
from pysolver.envelope import Worst
from pysolver.facts import Gap
from pysolver.found import Layout, span_name
from pysolver.frame import Reading
from pysolver.model import Model
from pysolver.outcome import Compared
from pysolver.record import Record

Floats = NDArray[np.float64]

LIFTS = 1e-9  # share of the load below which a negative reaction is rounding


@dataclass(frozen=True, slots=True, kw_only=True)
class Governed:
    """compared: one entry per criterion; least: least reaction of each support, worst case (share of the load, by index);
    varied, not_varied: paths of uncertain lengths and positions."""

    compared: tuple[Compared, ...]
    least: dict[int, float]
    varied: tuple[str, ...]
    not_varied: tuple[str, ...]
    best: Along


def govern(model: Model, gaps: Sequence[Gap], *, full: bool) -> Governed:
    """Compare everything. full: ranges too; otherwise best estimates only (high is None)."""
    point = model.best_point()
    best = {way: model.solved(point[None, :], way) for way in model.ways}
    plain = [_worst_way(model, one, best, best_only=True) for one in model.judged]
    if not full:
        compared = [_compared(model, one, b, None, gaps, searched=False) for one, b in zip(model.judged, plain, strict=True)]
        return Governed(compared=tuple(compared), least={}, varied=(), not_varied=(), best=best[model.ways[0]])
    search_ = _Search(model, best[model.ways[0]])
    worst = [_worst_way(model, one, {way: model.solved(p[None, :], _loose(way)) for way in model.ways}, best_only=False)
             for one, p in zip(model.judged, search_.points, strict=False)]
    compared = [_compared(model, one, b, w, gaps, searched=bool(search_.varied))
                for one, b, w in zip(model.judged, plain, worst, strict=True)]
    return Governed(compared=tuple(compared), least=search_.least, varied=search_.varied, not_varied=search_.not_varied,
                    best=best[model.ways[0]])


@dataclass(frozen=True, slots=True)
class _At:
    """A worst ratio together with the solved layout that it belongs to."""

    along: Along
    worst: Worst


def _loose(way: Reading) -> Reading:
    return replace(way, strict=False)


def _worst_way(model: Model, one: Judged, solved: dict[Reading, Along], *, best_only: bool) -> _At:
    answers = [_At(along, compare(along, one, model.sources, best=best_only)) for along in solved.values()]
    return max(answers, key=lambda a: float(a.worst.ratio[0]))


class _Search:
    """The search over the box: worst ratios of all criteria, and least reactions of all supports, together."""

    def __init__(self, model: Model, best: Along) -> None:
        self.model, self.size = model, total_load(best)
        self.step = chunks(10**6, best)
        self.supports = best.layouts[0].real
        low, high = (np.array([getattr(model.readings.measured[v], end) for v in model.variables]) for end in ("low", "high"))
        point = model.best_point()
        used = most_telling(self.evaluate, low, point, high)
        low, high = (np.where(np.isin(np.arange(len(point)), used), end, point) for end in (low, high))
        found = self._search(low, point, high, used)
        self.varied = tuple(model.variables[i] for i in used)
        self.not_varied = tuple(v for i, v in enumerate(model.variables) if i not in used)
        self.points = found[1][:len(model.judged)]
        lifts = found[0][len(model.judged):]
        self.least = {j: -float(v) for j, v in zip(self.supports, lifts, strict=True)}

    def _search(self, low: Floats, point: Floats, high: Floats, used: list[int]) -> tuple[Floats, Floats]:
        def widened(p: Floats) -> Floats:
            whole = np.tile(point, (len(p), 1))
            whole[:, used] = p
            return whole

        found = search(lambda p: self.evaluate(widened(p)), low[used], point[used], high[used])
        return found.worst, widened(found.points)

    def evaluate(self, points: Floats) -> Floats:
        """(C, K + J): the worst ratio of each criterion, then the uplift at each support as a share of the load."""
        rows = [self._chunk(points[i:i + self.step]) for i in range(0, len(points), self.step)]
        return np.concatenate(rows)

    def _chunk(self, points: Floats) -> Floats:
        ways = []
        for way in self.model.ways:
            along = self.model.solved(points, _loose(way))
            columns = [compare(along, one, self.model.sources, best=False).ratio for one in self.model.judged]
            lifts = [-least_reaction(along, self.model, j, best=False) / self.size for j in self.supports]
            ways.append(np.stack([*columns, *lifts], axis=1) if columns or lifts else np.zeros((len(points), 0)))
        worst: Floats = np.max(ways, axis=0)
        return worst


def total_load(along: Along) -> float:
    """The sum of all reactions' sizes, source by source: the scale for rounding."""
    return max(float(np.abs(along.batch.reactions).sum()), 1e-300)


def every_case(model: Model) -> list[Case]:
    """All cases of all sets in use: a bearing must stay down in each of them."""
    return [case for one in model.judged for case in one.cases] or [_as_they_are(model)]


def _as_they_are(model: Model) -> Case:
    ones = tuple(1.0 for _ in model.sources)
    return Case(name="all loads as they are", favourable=ones, unfavourable=ones)


def least_reaction(along: Along, model: Model, support: int, *, best: bool) -> Floats:
    """(C,) least upward reaction (N) of a support (index in the record), over all cases, all loads counted."""
    j = along.layouts[0].real.index(support)
    least: Floats = smallest_reactions(along, [*every_case(model), _as_they_are(model)], model.sources, best=best)[:, j]
    return least


def _compared(model: Model, one: Judged, best: _At, worst: _At | None, gaps: Sequence[Gap], *, searched: bool) -> Compared:
    criterion = one.criterion
    sheet = model.record["limits"][criterion.sheet]
    held = tuple(g for g in gaps if g.withholds(criterion.sheet, criterion.kind))
    has_ratio = criterion.kind == "sag" or (sheet["basis"] in ("factored", "unfactored") and sheet["covers"] is not None
                                            and not (sheet["covers"] == "added" and not sheet["covers_loads"])
                                            and (sheet["basis"] == "unfactored" or sheet["set"] is not None))
    x, ratio = _x(best), float(best.worst.ratio[0])
    unfactored, low = _at_place(model, one, best)
    covered = np.array([one.covered], dtype=float)
    top = worst or best
    return Compared(
        kind=criterion.kind, sheet=criterion.sheet, kind_of_limit=sheet["kind"], basis=sheet["basis"],
        support=model.record["supports"][criterion.support]["name"] if criterion.support >= 0 else None,
        place=place_name(model.record, best.along.layouts[0], x, criterion.support), x=x, unfactored=unfactored,
        bare=float(ratio_of(best.along, one, covered, covered).ratio[0]), factored=float(best.worst.effect[0]),
        worst=float(top.worst.effect[0]),
        capacity=_capacity(best, ratio, one), ratio=ratio if has_ratio else None, low=low if has_ratio else None,
        high=float(worst.worst.ratio[0]) if has_ratio and worst else None, case=one.cases[int(best.worst.case[0])].name,
        searched=searched, worst_place=place_name(model.record, top.along.layouts[0], _x(top), criterion.support),
        derived=criterion.derived, under=criterion.under, withheld=held, ranged=model.ranged)


def _x(at: _At) -> float:
    return float(at.along.batch.x[0, at.worst.piece[0]] + at.worst.s[0])


def _capacity(at: _At, ratio: float, one: Judged) -> float:
    effect = abs(float(at.worst.effect[0]))
    if ratio > 0.0 and effect > 0.0:
        return effect / ratio
    return min((s.capacity for s in one.criterion.stretches), default=0.0)


def _at_place(model: Model, one: Judged, at: _At) -> tuple[float, float]:
    """At the governing place: the unfactored best estimate of what is covered (in the quantity's own sign), and the
    ratio with every source at the end of its range that relieves."""
    piece, s, kind = int(at.worst.piece[0]), np.asarray(float(at.worst.s[0])), one.criterion.kind
    if kind in ("reaction", "hold_down"):
        j = at.along.layouts[0].real.index(one.criterion.support)
        values = at.along.batch.reactions[0, j]
    else:
        name = kind if kind in ("sag", "shear") else "moment"
        values = piecewise.evaluate(at.along.influence(name).coefficients[0, piece], s)
    covered = np.array(one.covered, dtype=float)
    sign = -1.0 if kind in ("hogging", "hold_down") or (kind == "shear" and at.worst.effect[0] < 0) else 1.0
    low, high = (r[int(at.worst.case[0])] for r in factor_ranges(one, model.sources, best=False))
    least = float(np.minimum(sign * values * low, sign * values * high).sum())
    effect, ratio = abs(float(at.worst.effect[0])), float(at.worst.ratio[0])
    unfactored = float((values * covered).sum()) * (1.0 if kind == "shear" else sign)
    return unfactored, max(least, 0.0) * (ratio / effect if effect else 0.0)


def place_name(record: Record, layout: Layout, x: float, support: int = -1) -> str:
    """Where x is, in words that can be taped: "at B", "2.19 m from A, span A–B", "0.40 m from the tip"."""
    if support >= 0:
        return f"at {record['supports'][support]['name']}"
    for j in layout.real:
        if abs(x - layout.supports[j]) < 1e-6:
            return f"at {record['supports'][j]['name']}"
    for i, (start, end) in enumerate(layout.spans):
        if start <= x <= end:
            return f"{x - start:.2f} m from {record['supports'][i]['name']}, span {span_name(record, i)}"
    first, last = record["supports"][0]["name"], record["supports"][-1]["name"]
    if x < layout.supports[0]:
        return f"{layout.supports[0] - x:.2f} m left of {first}, overhang"
    return f"{x - layout.supports[-1]:.2f} m right of {last}, overhang"


def infinite_hold_down(model: Model, best: Along, least_worst: dict[int, float]) -> list[Compared]:
    """J20: a support that can hold down, but for which no hold-down figure was given, has none: pulling on it is over."""
    given = {one.criterion.support for one in model.judged if one.criterion.kind == "hold_down"}
    made = []
    for j in best.layouts[0].real:
        support = model.record["supports"][j]
        if support["kind"] == "bearing" or j in given:
            continue
        size = total_load(best)
        at_best = float(least_reaction(best, model, j, best=True)[0])
        at_worst = min(size * least_worst.get(j, 0.0), at_best)
        if at_worst < -LIFTS * size:
            made.append(Compared(
                kind="hold_down", sheet=0, support=support["name"], kind_of_limit=None, basis=None,
                place=f"at {support['name']}", x=best.layouts[0].supports[j], unfactored=max(-at_best, 0.0),
                bare=0.0, factored=max(-at_best, 0.0), worst=-at_worst, capacity=0.0,
                ratio=math.inf if at_best < -LIFTS * size else 0.0, low=0.0, high=math.inf, case="", searched=False,
                worst_place=f"at {support['name']}"))
    return made
