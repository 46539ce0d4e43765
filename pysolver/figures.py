"""Which drawings does a result have? The working drawing always; free body, shear, moment and sag once there is a beam.

The curve is the unfactored best estimate; dashed is the worst case, with the factors and the coverage of the limit that
the rails stand for, at the best estimate of lengths and positions. SI units, signs as in statics.py.
"""

from collections.abc import Sequence

import numpy as np

from pysolver import piecewise
from pysolver.check import Result
from pysolver.comparison import Judged, capacities, factor_ranges
from pysolver.display import System, show, show_ratio
from pysolver.drawing import Mark, Pick, Piece, Quantity, Rail, curve, free_body, working
from pysolver.envelope import worst_polynomials
from pysolver.found import Layout
from pysolver.governing import Governed
from pysolver.model import Model
from pysolver.outcome import Compared

KINDS: dict[Quantity, tuple[str, ...]] = {"shear": ("shear",), "moment": ("sagging", "hogging"), "sag": ("sag",)}
DIMENSION = {"shear": "force", "sagging": "moment", "hogging": "moment", "sag": "small_length"}


def drawings(result: Result, system: System) -> tuple[dict[str, str | None], tuple[Pick, ...]]:
    """SVG markup by name (None where there is nothing to draw), and what can be picked in the working drawing."""
    layout = result.governed.best.layouts[0] if result.governed else None
    scheme = working(result.record, layout, result.readings)
    drawn: dict[str, str | None] = dict.fromkeys(("free_body", "shear", "moment", "sag"))
    drawn["working"] = scheme.svg
    if result.model is not None and result.governed is not None and result.response is not None and layout is not None:
        drawn["free_body"] = free_body(result.record, layout, result.response, system)
        for quantity in ("shear", "moment", "sag"):
            if quantity != "sag" or "/section/stiffness" in result.readings.measured:
                drawn[quantity] = _curve(quantity, result, result.model, result.governed, layout, system)
    return drawn, scheme.picks


def _curve(quantity: Quantity, result: Result, ready: Model, governed: Governed, layout: Layout, system: System) -> str:
    assert result.response is not None
    high: list[Piece] = []
    low: list[Piece] = []
    rails: list[Rail] = []
    marks: list[Mark] = []
    for one, compared in zip(ready.judged, governed.compared, strict=True):
        kind = one.criterion.kind
        if kind not in KINDS[quantity]:
            continue
        rails += _rails(one, governed, kind, system)
        signs = {"shear": (1.0, -1.0), "hogging": (-1.0,)}.get(kind, (1.0,))
        for sign in signs if result.full else ():
            (high if sign > 0 else low).extend(_worst(one, compared, ready, governed, quantity, sign))
        if compared.ratio is not None:
            marks.append(_mark(kind, compared))
    first_high, first_low = (_first_cover(pieces) for pieces in (high, low))
    return curve(quantity, result.response, layout, high=first_high or None, low=first_low or None, rails=rails,
                 governing=marks, system=system, names=[s["name"] for s in result.record["supports"]])


def _first_cover(pieces: Sequence[Piece]) -> list[Piece]:
    """The pieces of the first sheet only, when several sheets limit the same quantity: they run from left to right once."""
    kept: list[Piece] = []
    for piece in pieces:
        if kept and piece[0] < kept[-1][1] - 1e-12:
            break
        kept.append(piece)
    return kept


def _mark(kind: str, compared: Compared) -> Mark:
    sign = -1.0 if kind == "hogging" else 1.0
    value = compared.factored if kind == "shear" else sign * compared.factored
    return Mark(x=compared.x, value=value, label=f"{show_ratio(compared.ratio or 0.0)} of the limit")


def _rails(one: Judged, governed: Governed, kind: str, system: System) -> list[Rail]:
    """The limit where it holds: neighbouring pieces of one capacity are one rail; shear has one on each side."""
    capacity, x = capacities(governed.best, one)[0], governed.best.batch.x[0]
    made: list[tuple[float, float, float]] = []
    for start, end, value in zip(x[:-1], x[1:], capacity, strict=True):
        if not np.isfinite(value) or end <= start:
            continue
        if made and made[-1][2] == value and made[-1][1] == start:
            made[-1] = (made[-1][0], float(end), float(value))
        else:
            made.append((float(start), float(end), float(value)))
    signs = {"shear": (1, -1), "hogging": (-1,)}.get(kind, (1,))
    return [Rail(start=a, end=b, value=v, sign=sign, label=f"limit {show(DIMENSION[kind], v, system)}")
            for a, b, v in made for sign in signs]


def _worst(one: Judged, compared: Compared, ready: Model, governed: Governed, quantity: Quantity,
           sign: float) -> list[Piece]:
    """The worst effect along the beam in the case that governs the criterion, one polynomial per sub-piece."""
    influence = governed.best.influence(quantity)
    low, high = factor_ranges(one, ready.sources, best=False)
    case = [c.name for c in one.cases].index(compared.case)
    polynomials = worst_polynomials(influence, sign, low[case], high[case])[0]
    told: list[Piece] = []
    for p, x in enumerate(governed.best.batch.x[0][:-1]):
        for q in range(polynomials.shape[1]):
            s0, s1 = float(influence.ends[0, p, q]), float(influence.ends[0, p, q + 1])
            if s1 > s0:
                told.append((float(x) + s0, float(x) + s1, piecewise.shifted(polynomials[p, q], np.asarray(s0))))
    return told
