"""What is the worst of the whole box of what was measured, over all criteria at once?

The points come from bounds.py; here they become beams, solved many at a time, and the values of every criterion. Searching
yields between slices of work, so that whoever runs it may answer others meanwhile, or stop (build: a phone has one worker).
Forces in N, signs as in statics.py.
"""

from collections.abc import Generator, Iterator, Sequence
from dataclasses import dataclass, replace

import numpy as np
from numpy.typing import NDArray

from pysolver.bounds import search
from pysolver.combinations import ranges
from pysolver.comparison import Along, chunks, compare, solve_layouts, without_limit
from pysolver.display import show_place
from pysolver.envelope import Worst
from pysolver.found import SELF_WEIGHT, Layout, span_name
from pysolver.frame import Reading
from pysolver.limits import STRENGTH
from pysolver.loads import LineLoad
from pysolver.model import Model
from pysolver.record import Record
from pysolver.stiffness import shape_of
from pysolver.uplift import every_case, least_reactions

Floats = NDArray[np.float64]

WIDE = 0.02
GATHERINGS = 25
INSET = 1e-7
NEGLIGIBLE = 1e-9  # of the load (times the length, for moments): rounding
IN_A_SLICE = 48  # beams solved before others are let in; more make a phone wait, fewer cost time

Slices = Generator[None, None, Floats]


@dataclass(frozen=True, slots=True, kw_only=True)
class Worsts:
    """points (K, n): where each criterion is worst; least: the least reaction of each support (share of the load, by index
    in the record); uncovered: kinds of effect that no sheet limits where they occur, with the place; varied together and
    only each by itself: paths."""

    points: Floats
    least: dict[int, float]
    uncovered: dict[str, str]
    varied: tuple[str, ...]
    not_varied: tuple[str, ...]


def worst_of_the_box(model: Model, best: Along) -> Generator[None, None, Worsts]:
    """The search over the box; yields between slices. best: solved at the best estimates."""
    low, high = (np.array([getattr(model.readings.measured[v], end) for v in model.variables]) for end in ("low", "high"))
    wide = wide_ranges(model, best, low, high)
    # where the end of its range is over a support, a load close beside the support makes the worse shear
    inset = np.where([is_place_of_load(v) for v in model.variables], INSET * (high - low), 0.0)
    low, high = low + inset, high - inset
    asking = search(low, model.best_point(), high, wide=wide, starts=_gathered(model, low, high, wide))
    points = next(asking)
    while True:
        values = yield from _evaluated(model, best, points)
        try:
            points = asking.send(values)
        except StopIteration as end:
            return _worsts(model, best, end.value.worst, end.value.points, end.value.together)


def _worsts(model: Model, best: Along, worst: Floats, points: Floats, together: tuple[int, ...]) -> Worsts:
    supports, criteria = best.layouts[0].real, len(model.judged)
    open_: dict[str, str] = {}
    for point in points[-len(STRENGTH):]:
        open_ |= uncovered(model, model.solved(point[None, :], loose(model.ways[0])))
    return Worsts(points=points[:criteria], uncovered=open_, varied=tuple(model.variables[i] for i in together),
                  least={j: -float(v) for j, v in zip(supports, worst[criteria:criteria + len(supports)], strict=True)},
                  not_varied=tuple(v for i, v in enumerate(model.variables) if i not in together))


def _gathered(model: Model, low: Floats, high: Floats, wide: NDArray[np.bool_]) -> Floats:
    """(m, n) points at which all loads of uncertain place stand as near to one place as they can: loads moved one at a
    time would not find it. One such place for each of GATHERINGS along the beam."""
    loads = [i for i, v in enumerate(model.variables) if wide[i] and is_place_of_load(v)]
    if len(loads) < 2:
        return np.zeros((0, len(low)))
    ends = [model.layouts(end[None, :], loose(model.ways[0]))[0] for end in (low, high)]
    points = np.tile(model.best_point(), (GATHERINGS, 1))
    for i in loads:
        a, b = (middle_of(lay, model.variables[i]) for lay in ends)
        if a != b:
            share = np.clip((np.linspace(0.0, ends[0].beam.length, GATHERINGS) - a) / (b - a), 0.0, 1.0)
            points[:, i] = low[i] + share * (high[i] - low[i])
    return points


def _evaluated(model: Model, best: Along, points: Floats) -> Slices:
    """(C, K + J + 3): the worst ratio of each criterion, the uplift at each support, and the effects without a limit, the
    latter two as shares of the load."""
    worst = np.full((len(points), len(model.judged) + len(best.layouts[0].real) + len(STRENGTH)), -np.inf)
    most = min(chunks(10**6, best), IN_A_SLICE)
    for way in model.ways:
        layouts = model.layouts(points, loose(way))
        for rows in _alike(layouts, most):
            worst[rows] = np.maximum(worst[rows], _of_one_shape(model, [layouts[i] for i in rows], total_load(best)))
            yield
    return worst


def _of_one_shape(model: Model, layouts: list[Layout], size: float) -> Floats:
    along = solve_layouts(layouts)
    ratios = [compare(along, one, model.sources, best=False).ratio for one in model.judged]
    least = least_reactions(model, layouts, every_case(model), best=False)
    effects = [worst.ratio / size for worst in _without_limit(model, along).values()]
    return np.concatenate([np.array(ratios).reshape(len(ratios), len(layouts)).T, -least / size, np.array(effects).T], axis=1)


def _without_limit(model: Model, along: Along) -> dict[str, Worst]:
    low, high = ranges(every_case(model), model.sources, best=False)
    return {kind: without_limit(along, kind, model.judged, low, high) for kind in STRENGTH}


def uncovered(model: Model, along: Along) -> dict[str, str]:
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


def loose(way: Reading) -> Reading:
    """As inside the search: a load that a range puts off the beam is moved onto it."""
    return replace(way, strict=False)


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
