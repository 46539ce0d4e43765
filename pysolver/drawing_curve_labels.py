"""Which values are written on a curve, and where, so that they can be read?

Written: the governing places, the rails, then the extremes of every span and overhang, largest first. A value that finds
no room is counted and the drawing says how many are left out; nothing is written over another text.
"""

from collections.abc import Iterator, Sequence
from dataclasses import dataclass

import numpy as np

from pysolver import piecewise, svg
from pysolver.display import System, show
from pysolver.drawing_body import WIDTH, TrueScale
from pysolver.drawing_labels import Box, Place, Sheet, width_of
from pysolver.drawing_symbols import name
from pysolver.found import Layout
from pysolver.piecewise import Floats

WORTH = 0.02  # of the largest value: less is not written
Piece = tuple[float, float, Floats]
Value = tuple[float, float, str]  # x, value, text


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
    markup: str
    left_out: int
    words: str


def base_line(figure: Figure, layout: Layout, names: Sequence[str]) -> str:
    """The ruled line of the beam with its supports: a small triangle under it, a name at the foot."""
    parts = [svg.line(figure.x(0.0) - 6, figure.base, figure.x(layout.beam.length) + 6, figure.base, "axis", stroke_width="1.2")]
    last = -100.0
    for j in layout.real:
        x, y = figure.x(layout.supports[j]), figure.base
        parts.append(svg.polyline([(x, y), (x - 5, y + 8), (x + 5, y + 8)], "support", closed=True, stroke_width="1.2"))
        if x - last >= 22:
            parts.append(name(x, figure.bottom + 12, svg.clean(names[j])))
            last = x
    return "".join(parts)


def label_values(figure: Figure, layout: Layout, pieces: Sequence[Piece], edges: Sequence[Piece],
                 rails: Sequence[tuple[float, float, float, str]], governing: Sequence[Value]) -> Labels:
    """All texts in the plot. edges: pieces of the worst case; rails: (start, end, signed value, text)."""
    sheet = Sheet(frame=Box(x0=1, y0=figure.top - 6, x1=WIDTH - 1, y1=figure.bottom + 1))
    sheet.soft += [*_lines(figure, pieces), *_lines(figure, edges), *_rail_boxes(figure, rails),
                   Box(x0=0, x1=WIDTH, y0=figure.base - 1, y1=figure.base + 9)]
    written = [sheet.write(text, list(_around(figure, x, value, text)), "label gov") for x, value, text in governing]
    written += [sheet.write(text, list(_beside(figure, start, end, value, text)), "rail-label", svg.SMALL)
                for start, end, value, text in dict.fromkeys(rails)]
    values = extremes(layout, pieces)
    for x, value in values:
        written.append(sheet.write(figure.shown(value), list(_around(figure, x, value, figure.shown(value)))))
    words = "; ".join(f"{show(figure.dimension, v, figure.system)} at {show('length', x, figure.system)}" for x, v in values)
    return Labels(markup="".join(one for one in written if one), left_out=sum(one is None for one in written),
                  words=f"Extremes: {words or 'none'}.")


def extremes(layout: Layout, pieces: Sequence[Piece]) -> list[tuple[float, float]]:
    """(x, value) of the largest and smallest value of every span and overhang, largest magnitude first."""
    bounds = sorted({0.0, *(layout.supports[j] for j in layout.real), layout.beam.length})
    found: list[tuple[float, float]] = []
    for a, b in zip(bounds, bounds[1:], strict=False):
        here = [p for p in pieces if a - 1e-9 <= 0.5 * (p[0] + p[1]) <= b + 1e-9]
        values = [one for piece in here for one in _candidates(piece)]
        if values:
            found += [max(values, key=lambda v: v[1]), min(values, key=lambda v: v[1])]
    most = max((abs(v) for _, v in found), default=0.0)
    kept: list[tuple[float, float]] = []
    for x, v in sorted(found, key=lambda one: -abs(one[1])):
        twice = any(abs(x - a) < 1e-6 and abs(v - b) < 1e-6 * most for a, b in kept)
        if abs(v) > max(WORTH * most, 1e-9) and not twice:
            kept.append((x, v))
    return kept


def _candidates(piece: Piece) -> Iterator[tuple[float, float]]:
    start, end, c = piece
    inner = piecewise.stationary(c[None, :], np.array([end - start]))[0]
    for s in (0.0, *(float(s) for s in inner if not np.isnan(s)), end - start):
        yield start + s, float(piecewise.evaluate(c, np.asarray(s)))


def _around(figure: Figure, x: float, value: float, words: str) -> Iterator[Place]:
    """Places for a value: outside the curve first, then beside it, then farther out, then inside, then upwards."""
    px, py = figure.x(x), figure.y(value)
    out = 1.0 if py >= figure.base else -1.0
    half = width_of(words) / 2
    middle = min(max(px, half + 4), WIDTH - half - 4)

    def level(step: float) -> float:
        return py + (14.0 + step if out > 0 else -(4.0 + step))

    for step in (0.0, 8.0, 16.0):
        for shift in (0.0, half + 5, -half - 5):
            yield Place(x=middle + shift, y=level(step))
    for shift in (6.0, -6.0):
        yield Place(x=px + shift, y=py + 4, anchor="start" if shift > 0 else "end")
    for shift in (0.0, half + 5, -half - 5):
        yield Place(x=middle + shift, y=py - out * 8 + (0 if out > 0 else 10))
    for back in (0.0, 14.0, 28.0):
        yield Place(x=px + 5, y=py + out * (6 - back), anchor="end" if out > 0 else "start", turned=True)
        yield Place(x=px + 5, y=py - out * (6 + back), anchor="start" if out > 0 else "end", turned=True)


def _beside(figure: Figure, start: float, end: float, value: float, words: str) -> Iterator[Place]:
    """Places for the text of a rail: outside it at its right end, its left end, its middle, then inside."""
    x0, x1, y = figure.x(start), figure.x(end), figure.y(value)
    out = 1.0 if y >= figure.base else -1.0
    half = width_of(words, svg.SMALL) / 2 + 3
    for level in (y + (17 if out > 0 else -8), y - out * 6 + (0 if out > 0 else 9)):
        for middle in (x1 - half, x0 + half, 0.5 * (x0 + x1)):
            yield Place(x=min(max(middle, half), WIDTH - half), y=level)


def _lines(figure: Figure, pieces: Sequence[Piece]) -> Iterator[Box]:
    """Small boxes along a curve, only to keep texts off it."""
    for start, end, c in pieces:
        count = max(2, int((figure.x(end) - figure.x(start)) / 4))
        s = np.linspace(0.0, end - start, count + 1)
        ys = [figure.y(float(v)) for v in piecewise.evaluate(c, s)]
        xs = [figure.x(start + float(one)) for one in s]
        for (xa, ya), (xb, yb) in zip(zip(xs, ys, strict=True), list(zip(xs, ys, strict=True))[1:], strict=False):
            yield Box(x0=xa - 0.5, x1=xb + 0.5, y0=min(ya, yb) - 1, y1=max(ya, yb) + 1)


def _rail_boxes(figure: Figure, rails: Sequence[tuple[float, float, float, str]]) -> Iterator[Box]:
    for start, end, value, _ in rails:
        y = figure.y(value)
        out = 5.0 if y >= figure.base else -5.0
        yield Box(x0=figure.x(start), x1=figure.x(end), y0=min(y, y + out) - 1, y1=max(y, y + out) + 1)
