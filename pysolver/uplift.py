"""Would a support have to hold the beam down, and how much?

Uplift is the one check in which a source is split: the part of a load that lifts and the part that holds down are taken
with their own factors and ends of range (J14; EN 1990, table A1.2(A), note on a single source, from memory). So loads are
cut at the supports. Forces in N, reactions up.
"""

from collections.abc import Sequence
from dataclasses import replace
from itertools import pairwise

import numpy as np
from numpy.typing import NDArray

from pysolver.combinations import Case, ranges
from pysolver.found import Layout
from pysolver.loads import LineLoad, Load, PointLoad
from pysolver.model import Model
from pysolver.statics import solve_reactions

Floats = NDArray[np.float64]

PART = " / part "


def least_reactions(model: Model, layouts: Sequence[Layout], chosen: Sequence[Case], *, best: bool) -> Floats:
    """(C, J) the least upward reaction of each support over all cases, every load counted.

    layouts of one shape. best: loads at their best estimate, otherwise anywhere in their ranges.
    """
    held = solve_reactions([lay.beam for lay in layouts], [_in_parts(lay) for lay in layouts])
    names = [source.name for source in model.sources]
    base = [names.index(source.partition(PART)[0]) for source in held.sources]
    low, high = (ends[:, base] for ends in ranges(chosen, model.sources, best=best))
    sums = [np.minimum(held.reactions * lo, held.reactions * hi).sum(axis=2) for lo, hi in zip(low, high, strict=True)]
    smallest: Floats = np.min(sums, axis=0)
    return smallest


def _in_parts(layout: Layout) -> tuple[Load, ...]:
    """The loads cut at the supports; every load has as many parts as there are regions, so that layouts stay alike."""
    edges = [0.0, *(layout.supports[j] for j in layout.real), layout.beam.length]
    return tuple(_part(load, k, a, b) for load in layout.loads for k, (a, b) in enumerate(pairwise(edges)))


def _part(load: Load, k: int, start: float, end: float) -> Load:
    source = f"{load.source}{PART}{k}"
    if not isinstance(load, LineLoad):
        inside = start <= load.x < end or (load.x == end and k > 0)
        return replace(load, source=source) if inside else PointLoad(x=load.x, force=0.0, source=source)
    a, b = max(start, load.start), min(end, load.end)
    if b <= a:
        return PointLoad(x=min(max(load.start, start), end), force=0.0, source=source)
    growth = (load.end_intensity - load.start_intensity) / (load.end - load.start)
    return LineLoad(start=a, end=b, start_intensity=load.start_intensity + growth * (a - load.start),
                    end_intensity=load.start_intensity + growth * (b - load.start), source=source)


def every_case(model: Model) -> list[Case]:
    """All cases of all sets in use, and the loads as they are: a bearing must stay down in each of them."""
    ones = tuple(1.0 for _ in model.sources)
    as_they_are = Case(name="all loads as they are", favourable=ones, unfavourable=ones)
    every = [*(case for one in model.judged for case in one.cases), as_they_are]
    return list({(case.favourable, case.unfavourable): case for case in every}.values())
