"""Where does each comparison govern, at best estimate and at worst?

Best estimates first; then loads by the sign of their influence and lengths and positions by search (bounds.py). Each
criterion becomes one Compared with places in words. Effects in SI, signs as in statics.py.
"""

import math
from collections.abc import Iterator, Sequence
from dataclasses import dataclass, replace

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise
from pysolver.bounds import search
from pysolver.combinations import ranges
from pysolver.comparison import Along, Judged, chunks, compare, factor_ranges, ratio_of, solve_layouts, without_limit
from pysolver.display import show_place
from pysolver.envelope import Worst
from pysolver.facts import Gap
from pysolver.found import SELF_WEIGHT, Layout, span_name
from pysolver.frame import Reading
from pysolver.limits import STRENGTH
from pysolver.loads import LineLoad
from pysolver.model import Model
from pysolver.outcome import Compared
from pysolver.record import Record
from pysolver.stiffness import shape_of
from pysolver.uplift import every_case, least_reactions

Floats = NDArray[np.float64]

WIDE = 0.02
GATHERINGS = 25
INSET = 1e-7
NEGLIGIBLE = 1e-9  # of the load (times the length, for moments): rounding
LIFTS = 1e-9  # share of the load below which a negative reaction is rounding


@dataclass(frozen=True, slots=True, kw_only=True)
class Governed:
    """compared: one entry per criterion; uncovered: kinds of effect that no sheet limits where they occur, with the place
    of the largest (J22); least: least reaction of each support, worst case (share of the load, by index);
    varied, not_varied: paths of uncertain lengths and positions."""

    compared: tuple[Compared, ...]
    least: dict[int, float]
    uncovered: dict[str, str]
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
        return Governed(compared=tuple(compared), least={}, uncovered=_uncovered(model, best[model.ways[0]]), varied=(),
                        not_varied=(), best=best[model.ways[0]])
    search_ = _Search(model, best[model.ways[0]])
    worst = [_worst_way(model, one, {way: model.solved(p[None, :], _loose(way)) for way in model.ways}, best_only=False)
             for one, p in zip(model.judged, search_.points, strict=False)]
    compared = [_compared(model, one, b, w, gaps, searched=bool(search_.varied))
                for one, b, w in zip(model.judged, plain, worst, strict=True)]
    return Governed(compared=tuple(compared), least=search_.least, uncovered=search_.uncovered, varied=search_.varied,
                    not_varied=search_.not_varied, best=best[model.ways[0]])


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
        wide = wide_ranges(model, best, low, high)
        placed = np.array([is_place_of_load(v) for v in model.variables], bool)
        # where the end of its range is over a support, a load close beside the support makes the worse shear
        inset = np.where(placed, INSET * (high - low), 0.0)
        low, high = low + inset, high - inset
        found = search(self.evaluate, low, point, high, wide=wide, starts=self._gathered(low, high, wide))
        self.varied = tuple(model.variables[i] for i in found.together)
        self.not_varied = tuple(v for i, v in enumerate(model.variables) if i not in found.together)
        self.points = found.points[:len(model.judged)]
        lifts = found.worst[len(model.judged):len(model.judged) + len(self.supports)]
        self.least = {j: -float(v) for j, v in zip(self.supports, lifts, strict=True)}
        self.uncovered: dict[str, str] = {}
        for point in found.points[-len(STRENGTH):]:
            self.uncovered |= _uncovered(model, model.solved(point[None, :], _loose(model.ways[0])))

    def _gathered(self, low: Floats, high: Floats, wide: NDArray[np.bool_]) -> Floats:
        """(m, n) points at which all loads of uncertain place stand as near to one place as they can: loads moved one at a
        time would not find it. One such place for each of GATHERINGS along the beam."""
        model, loads = self.model, [i for i, v in enumerate(self.model.variables) if wide[i] and is_place_of_load(v)]
        if len(loads) < 2:
            return np.zeros((0, len(low)))
        ends = [model.layouts(end[None, :], _loose(model.ways[0]))[0] for end in (low, high)]
        points = np.tile(model.best_point(), (GATHERINGS, 1))
        for i in loads:
            a, b = (middle_of(lay, model.variables[i]) for lay in ends)
            if a != b:
                share = np.clip((np.linspace(0.0, ends[0].beam.length, GATHERINGS) - a) / (b - a), 0.0, 1.0)
                points[:, i] = low[i] + share * (high[i] - low[i])
        return points

    def evaluate(self, points: Floats) -> Floats:
        """(C, K + J + 3): the worst ratio of each criterion, the uplift at each support, and the effects without a limit, the
        latter two as shares of the load."""
        worst = np.full((len(points), len(self.model.judged) + len(self.supports) + len(STRENGTH)), -np.inf)
        for way in self.model.ways:
            layouts = self.model.layouts(points, _loose(way))
            for rows in _alike(layouts, self.step):
                worst[rows] = np.maximum(worst[rows], self._of_one_shape([layouts[i] for i in rows]))
        return worst

    def _of_one_shape(self, layouts: list[Layout]) -> Floats:
        along = solve_layouts(layouts)
        ratios = [compare(along, one, self.model.sources, best=False).ratio for one in self.model.judged]
        least = least_reactions(self.model, layouts, every_case(self.model), best=False)
        effects = [worst.ratio / self.size for worst in _without_limit(self.model, along).values()]
        return np.concatenate([np.array(ratios).reshape(len(ratios), len(layouts)).T, -least / self.size,
                               np.array(effects).T], axis=1)


def _without_limit(model: Model, along: Along) -> dict[str, Worst]:
    low, high = ranges(every_case(model), model.sources, best=False)
    return {kind: without_limit(along, kind, model.judged, low, high) for kind in STRENGTH}


def _uncovered(model: Model, along: Along) -> dict[str, str]:
    """The kinds of effect that occur where no sheet has a limit for them, with the place of the largest."""
    size, layout = total_load(along), along.layouts[0]
    return {kind: place_name(model.record, layout, float(along.batch.x[0, worst.piece[0]] + worst.s[0]))
            for kind, worst in _without_limit(model, along).items()
            if worst.ratio[0] > NEGLIGIBLE * size * (1.0 if kind == "shear" else layout.beam.length)}


def _alike(layouts: Sequence[Layout], most: int) -> Iterator[list[int]]:
    """Indices of layouts of one shape, at most `most` at a time: a range may move a hinge past a support."""
    shapes: dict[tuple[tuple[bool, int], ...], list[int]] = {}
    for i, layout in enumerate(layouts):
        shapes.setdefault(shape_of(layout.beam), []).append(i)
    for rows in shapes.values():
        yield from (rows[k:k + most] for k in range(0, len(rows), most))


def is_place_of_load(path: str) -> bool:
    return path.startswith("/loads/") and path.endswith("/position/distance")


def middle_of(layout: Layout, path: str) -> float:
    """x (m) of the middle of the load whose place a path measures. Loads follow the beam's own weight, if that is there."""
    index = int(path.split("/")[2]) + (1 if layout.loads and layout.loads[0].source == SELF_WEIGHT else 0)
    load = layout.loads[index]
    return 0.5 * (load.start + load.end) if isinstance(load, LineLoad) else load.x


def wide_ranges(model: Model, best: Along, low: Floats, high: Floats) -> NDArray[np.bool_]:
    """(n,) which ranges are wide: lengths that may be out by more than WIDE of the beam. A stiffness acts one way."""
    is_length = np.array([model.readings.measured[v].dimension in ("length", "small_length") for v in model.variables], bool)
    wide: NDArray[np.bool_] = is_length & (high - low > WIDE * best.layouts[0].beam.length)
    return wide


def total_load(along: Along) -> float:
    """The sum of all reactions' sizes, source by source: the scale for rounding."""
    return max(float(np.abs(along.batch.reactions).sum()), 1e-300)


def least_reaction(best: Along, model: Model, support: int, *, at_best: bool) -> float:
    """Least upward reaction (N) of a support (index in the record) at the best estimate of lengths and positions."""
    layout = best.layouts[0]
    return float(least_reactions(model, [layout], every_case(model), best=at_best)[0, layout.real.index(support)])


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
        high=max(ratio, float(worst.worst.ratio[0])) if has_ratio and worst else None,
        case=one.cases[int(best.worst.case[0])].name,
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
    system = record["settings"]["display"]
    for i, (start, end) in enumerate(layout.spans):
        if start <= x <= end:
            return f"{show_place(x - start, system)} from {record['supports'][i]['name']}, span {span_name(record, i)}"
    first, last = record["supports"][0]["name"], record["supports"][-1]["name"]
    if x < layout.supports[0]:
        return f"{show_place(layout.supports[0] - x, system)} left of {first}, overhang"
    return f"{show_place(x - layout.supports[-1], system)} right of {last}, overhang"


def infinite_hold_down(model: Model, best: Along, least_worst: dict[int, float]) -> list[Compared]:
    """J20: a support that can hold down, but for which no hold-down figure was given, has none: pulling on it is over."""
    given = {one.criterion.support for one in model.judged if one.criterion.kind == "hold_down"}
    made = []
    for j in best.layouts[0].real:
        support = model.record["supports"][j]
        if support["kind"] == "bearing" or j in given:
            continue
        size = total_load(best)
        at_best = least_reaction(best, model, j, at_best=True)
        at_worst = min(size * least_worst.get(j, 0.0), at_best)
        if at_worst < -LIFTS * size:
            made.append(Compared(
                kind="hold_down", sheet=0, support=support["name"], kind_of_limit=None, basis=None,
                place=f"at {support['name']}", x=best.layouts[0].supports[j], unfactored=max(-at_best, 0.0),
                bare=0.0, factored=max(-at_best, 0.0), worst=-at_worst, capacity=0.0,
                ratio=math.inf if at_best < -LIFTS * size else 0.0, low=0.0, high=math.inf, case="", searched=False,
                worst_place=f"at {support['name']}"))
    return made
