"""Which values are written on a curve, and where, so that they can be read?

Written: the governing places, the rails, then the extremes of every span and overhang, largest first. A value that
finds no room is counted and the drawing says how many are left out; nothing is written over another text.
"""

import math
from collections.abc import Iterator, Sequence
from dataclasses import dataclass
from itertools import pairwise

import numpy as np

from pysolver import piecewise, svg
from pysolver.display import System, show
from pysolver.drawing_body import WIDTH, TrueScale
from pysolver.drawing_labels import Box, Place, Sheet, rows, width_of
from pysolver.drawing_symbols import name, name_half
from pysolver.found import Layout
from pysolver.piecewise import Floats

WORTH = 0.02  # of the largest value: less is not written
Piece = tuple[float, float, Floats]
Value = tuple[float, float, str]  # x, value, text
Limit = tuple[float, float, float, str]  # start, end, value with its sign, text
RING = 10.0  # half of the mark at a governing place
NAME_ROW = 23.0
LONGEST = 46  # characters that fit across the paper
MOST_COVERED = 2  # small boxes of a line: a value may touch the end of a stroke, and never lies along or across a curve


@dataclass(frozen=True, slots=True, kw_only=True)
class Figure:
    """The plot: scale across, ordinate of the base line, drawing units per SI unit (positive: down), and its frame."""

    across: TrueScale
    base: float
    scale: float
    top: float
    bottom: float
    unit: str
    dimension: str
    system: System

    def x(self, place: float) -> float:
        return self.across.x(place)

    def y(self, value: float) -> float:
        return self.base + self.scale * value

    def shown(self, value: float) -> str:
        """Three figures; the unit only where it is not the one in the heading."""
        return show(self.dimension, value, self.system).removesuffix(f" {self.unit}")


@dataclass(frozen=True, slots=True, kw_only=True)
class Labels:
    """markup; how many values found no room; which governing places and limits found none; the extremes in words."""

    markup: str
    left_out: int
    homeless: tuple[str, ...]
    words: str


def base_line(figure: Figure, layout: Layout, names: Sequence[str]) -> str:
    """The ruled line of the beam, its supports under it (a hatched face where the beam is fixed), names at the foot."""
    y = figure.base
    parts = [svg.line(figure.x(0.0) - 6, y, figure.x(layout.beam.length) + 6, y, "axis", stroke_width="1.2")]
    xs = [figure.x(layout.supports[j]) for j in layout.real]
    for j, x, support, row in zip(layout.real, xs, layout.beam.supports, name_rows(figure, layout, names), strict=True):
        foot = figure.bottom + 12 + NAME_ROW * row
        parts.append(svg.line(x, y, x, foot - 11, "dim", stroke_width="0.4", stroke_dasharray="1 3"))
        parts.append(_foot_mark(x, y, support.kind == "fixed", -8.0 if x < WIDTH / 2 else 0.0))
        half = name_half(svg.clean(names[j]))
        parts.append(name(min(max(x, half + 2), WIDTH - half - 2), foot, svg.clean(names[j])))
    return "".join(parts)


def name_rows(figure: Figure, layout: Layout, names: Sequence[str]) -> list[int]:
    """In which row each name stands so that they keep apart."""
    places = [(figure.x(layout.supports[j]), name_half(svg.clean(names[j])) + 1) for j in layout.real]
    middles = [(min(max(x, half + 1), WIDTH - half - 1), half) for x, half in places]
    return rows([(x - half, x + half) for x, half in middles])


def _foot_mark(x: float, y: float, fixed: bool, left: float) -> str:
    if fixed:
        return svg.hatched(x + left, y - 9, 8, 18, 4) + svg.line(x, y - 9, x, y + 9, "ground", stroke_width="1.6")
    return svg.polyline([(x, y), (x - 5, y + 8), (x + 5, y + 8)], "support", closed=True, stroke_width="1.2")


def label_values(figure: Figure, layout: Layout, pieces: Sequence[Piece], edges: Sequence[Sequence[Piece]],
                 rails: Sequence[Limit], governing: Sequence[Value], floor: float) -> Labels:
    """All texts in the plot. edges: curves of the worst case; floor: magnitudes up to it are rounding residues."""
    sheet = Sheet(frame=Box(x0=1, y0=figure.top - 6, x1=WIDTH - 1, y1=figure.bottom + 1))
    sheet.soft += [*_lines(figure, pieces), *(box for edge in edges for box in _lines(figure, edge)),
                   Box(x0=0, x1=WIDTH, y0=figure.base - 1, y1=figure.base + 9)]
    sheet.hard += [*_rail_boxes(figure, rails), *(Box(x0=x - RING, x1=x + RING, y0=y - RING, y1=y + RING)
                   for x, y in ((figure.x(place), figure.y(value)) for place, value, _ in governing))]
    must = [(text, sheet.write(text, list(_around(figure, x, value, text, RING)), "label gov"))
            for x, value, text in ((x, value, svg.clean(text, LONGEST)) for x, value, text in governing)]
    must += [(text, sheet.write(text, list(_beside(figure, start, end, value, text)), "rail-label", svg.SMALL))
             for start, end, value, text in ((a, b, value, svg.clean(text, LONGEST)) for a, b, value, text in rails)]
    values = extremes(layout, pieces, floor)
    may = [sheet.write(figure.shown(value), [*_around(figure, x, value, figure.shown(value)), *_afield(figure, x, value)],
                       most=MOST_COVERED if k else math.inf) for k, (x, value) in enumerate(values)]
    words = "; ".join(f"{show(figure.dimension, v, figure.system)} at {show('length', x, figure.system)}"
                      for x, v in values)
    return Labels(markup="".join(one for one in (*(m for _, m in must), *may) if one), left_out=may.count(None),
                  homeless=tuple(text for text, one in must if one is None), words=f"Extremes: {words or 'none'}.")


def extremes(layout: Layout, pieces: Sequence[Piece], floor: float) -> list[tuple[float, float]]:
    """(x, value) of the largest and smallest value of every span and overhang, largest magnitude first."""
    bounds = sorted({0.0, *(layout.supports[j] for j in layout.real), layout.beam.length})
    found: list[tuple[float, float]] = []
    of_piece = peaks(pieces)
    for a, b in pairwise(bounds):
        values = [one for piece, many in zip(pieces, of_piece, strict=True)
                  if a - 1e-9 <= 0.5 * (piece[0] + piece[1]) <= b + 1e-9 for one in many]
        if values:
            found += [max(values, key=lambda v: v[1]), min(values, key=lambda v: v[1])]
    most = max((abs(v) for _, v in found), default=0.0)
    kept: list[tuple[float, float]] = []
    for x, v in sorted(found, key=lambda one: -abs(one[1])):
        twice = any(abs(x - a) < 1e-6 and abs(v - b) < 1e-6 * most for a, b in kept)
        if abs(v) > max(WORTH * most, floor) and not twice:
            kept.append((x, v))
    return kept


def peaks(pieces: Sequence[Piece]) -> list[list[tuple[float, float]]]:
    """(x, value) at both ends and at the stationary points of each piece: all its extremes are among them."""
    if not pieces:
        return []
    lengths = np.array([end - start for start, end, _ in pieces])
    c = np.zeros((len(pieces), max(2, *(len(one) for _, _, one in pieces))))
    for row, (_, _, one) in zip(c, pieces, strict=True):
        row[:len(one)] = one
    inner = piecewise.stationary(c, lengths)
    s = np.concatenate([np.zeros((len(pieces), 1)), inner, lengths[:, None]], axis=1)
    values = piecewise.evaluate(c[:, None, :], np.where(np.isnan(s), 0.0, s))
    return [[(start + float(t), float(v)) for t, v in zip(row, across, strict=True) if not np.isnan(t)]
            for (start, _, _), row, across in zip(pieces, s, values, strict=True)]


def _around(figure: Figure, x: float, value: float, words: str, clear: float = 0.0) -> Iterator[Place]:
    """Places for a value: outside the curve, beside it, farther out on a leader, then inside, then written upwards."""
    px, py = figure.x(x), figure.y(value)
    out = 1.0 if py >= figure.base else -1.0
    half = width_of(words) / 2
    middle = min(max(px, half + 4), WIDTH - half - 4)
    shifts = (0.0, half + 5, -half - 5)
    sides = ((6.0 + clear, "start"), (-6.0 - clear, "end"))

    def level(step: float) -> float:
        return py + (14.0 + clear + step if out > 0 else -(4.0 + clear + step))

    yield from (Place(x=middle + shift, y=level(step)) for step in (0.0, 8.0) for shift in shifts)
    yield from (Place(x=px + shift, y=py + 4, anchor=anchor) for shift, anchor in sides)
    yield from (Place(x=middle + shift, y=level(step), to=(px, py + out * clear)) for step in (16.0, 26.0, 36.0)
                for shift in shifts)
    yield from (Place(x=px + shift, y=py + 4 - out * deep, anchor=anchor) for deep in (14.0, 28.0, 42.0)
                for shift, anchor in sides)
    for back in (0.0, 14.0, 28.0):
        yield Place(x=px + 5, y=py + out * (6 - back), anchor="end" if out > 0 else "start", turned=True)
        yield Place(x=px + 5, y=py - out * (6 + back), anchor="start" if out > 0 else "end", turned=True)


def _afield(figure: Figure, x: float, value: float) -> Iterator[Place]:
    """Places all round, farther and farther, each with a leader to the value."""
    to = figure.x(x), figure.y(value)
    for far in (22.0, 32.0, 44.0):
        for k in (2, 14, 6, 10, 3, 13, 5, 11, 1, 15, 7, 9):  # sixteenths of a turn, steep ones last
            turn = math.tau * k / 16
            yield Place(x=to[0] + 1.3 * far * math.cos(turn), y=to[1] - far * math.sin(turn) + 4, to=to)


def _beside(figure: Figure, start: float, end: float, value: float, words: str) -> Iterator[Place]:
    """Places for the text of a rail: outside it at its right end, its left end, its middle, then inside."""
    x0, x1, y = figure.x(start), figure.x(end), figure.y(value)
    out = 1.0 if y >= figure.base else -1.0
    half = width_of(words, svg.SMALL) / 2 + 3
    for level in (y + (17 if out > 0 else -10), y - out * 6 + (0 if out > 0 else 9)):
        for middle in (x1 - half, x0 + half, 0.5 * (x0 + x1)):
            yield Place(x=min(max(middle, half), WIDTH - half), y=level)


def _lines(figure: Figure, pieces: Sequence[Piece]) -> Iterator[Box]:
    """Small boxes along a curve, only to keep texts off it."""
    last: float | None = None
    for start, end, c in pieces:
        count = max(2, int((figure.x(end) - figure.x(start)) / 4))
        s = np.linspace(0.0, end - start, count + 1)
        ys = [figure.y(float(v)) for v in piecewise.evaluate(c, s)]
        xs = [figure.x(start + float(one)) for one in s]
        yield from _jump(xs[0], figure.base if last is None else last, ys[0])
        last = ys[-1]
        for (xa, ya), (xb, yb) in pairwise(zip(xs, ys, strict=True)):
            yield Box(x0=xa - 0.5, x1=xb + 0.5, y0=min(ya, yb) - 1, y1=max(ya, yb) + 1)
    if last is not None:
        yield from _jump(figure.x(pieces[-1][1]), last, figure.base)


def _jump(x: float, start: float, end: float) -> Iterator[Box]:
    """The vertical of a jump, in boxes of a few units so that crossing it counts by length."""
    top, bottom = min(start, end), max(start, end)
    for k in range(int((bottom - top) / 4)):
        yield Box(x0=x - 1, x1=x + 1, y0=top + 4 * k, y1=top + 4 * k + 4)


def _rail_boxes(figure: Figure, rails: Sequence[Limit]) -> Iterator[Box]:
    for start, end, value, _ in rails:
        y = figure.y(value)
        out = 5.0 if y >= figure.base else -5.0
        yield Box(x0=figure.x(start), x1=figure.x(end), y0=min(y, y + out) - 1, y1=max(y, y + out) + 1)
