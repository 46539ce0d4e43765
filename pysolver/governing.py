"""Where does each comparison govern, at best estimate and at worst?

Best estimates first; then loads by the sign of their influence and lengths and positions by search (bounds.py). Each
criterion becomes one Compared with places in words. Effects in SI, signs as in statics.py.
"""

import math
from collections.abc import Generator, Sequence
from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise
from pysolver.comparison import Along, Judged, compare, factor_ranges, ratio_of
from pysolver.envelope import Worst
from pysolver.facts import Gap
from pysolver.frame import Reading
from pysolver.model import Model
from pysolver.outcome import Compared
from pysolver.searching import loose, place_name, total_load, uncovered, worst_of_the_box
from pysolver.uplift import every_case, least_reactions

Floats = NDArray[np.float64]

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


def govern(model: Model, gaps: Sequence[Gap], *, full: bool) -> Generator[None, None, Governed]:
    """Compare everything; yields between slices. full: ranges too; otherwise best estimates only (high is None)."""
    point = model.best_point()
    best = {way: model.solved(point[None, :], way) for way in model.ways}
    plain = [_worst_way(model, one, best, best_only=True) for one in model.judged]
    if not full:
        compared = [_compared(model, one, b, None, gaps, searched=False) for one, b in zip(model.judged, plain, strict=True)]
        return Governed(compared=tuple(compared), least={}, uncovered=uncovered(model, best[model.ways[0]]), varied=(),
                        not_varied=(), best=best[model.ways[0]])
    search_ = yield from worst_of_the_box(model, best[model.ways[0]])
    worst = [_worst_way(model, one, {way: model.solved(p[None, :], loose(way)) for way in model.ways}, best_only=False)
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


def _worst_way(model: Model, one: Judged, solved: dict[Reading, Along], *, best_only: bool) -> _At:
    answers = [_At(along, compare(along, one, model.sources, best=best_only)) for along in solved.values()]
    return max(answers, key=lambda a: float(a.worst.ratio[0]))


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
