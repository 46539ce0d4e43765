"""How are the loads of a beam set out above it so that no label covers another? Rows of symbols, the widest lowest.

Lengths in viewBox units, y down; magnitudes in SI only set the height of strips and the way of arrows.
"""

from collections.abc import Sequence
from dataclasses import dataclass

from pysolver.drawing_labels import Box, Place, box_of, rows, width_of
from pysolver.drawing_symbols import arrow, curved_arrow
from pysolver.svg import Point, group, hatched, line, num, path, polyline, text

LABEL = 16.0  # height of a row's line of labels
POINT = 27.0  # length of an arrow
MOMENT = 22.0
STRIP = 19.0  # the tallest strip
GAP = 3.0


@dataclass(frozen=True, slots=True, kw_only=True)
class DrawnLoad:
    """A load at its place on the drawing, from x0 to x1 (the same for a point load or a moment).

    start, end: intensities of a line load, or the magnitude; None when it was not read. unread: its place is not known.
    """

    form: str | None
    x0: float
    x1: float
    start: float | None
    end: float | None
    label: str
    permanent: bool = False
    unread: bool = False

    @property
    def classes(self) -> str:
        kind = "moment-load" if self.form == "moment" else "load"
        return kind + " load-permanent" * self.permanent + " unread" * self.unread


@dataclass(frozen=True, slots=True, kw_only=True)
class LoadDrawing:
    """markup; centres of the symbols in the order of the loads; height above the beam."""

    markup: str
    centres: tuple[Point, ...]
    height: float


def height_of(loads: Sequence[DrawnLoad], width: float) -> float:
    """How much paper the loads take above the top of the beam."""
    return _Rows(loads, width).total


def draw_loads(loads: Sequence[DrawnLoad], top: float, width: float) -> LoadDrawing:
    """All loads above a beam whose upper side is at `top`, on paper `width` wide."""
    laid = _Rows(loads, width)
    most = max((abs(v) for one in loads if one.form == "line" for v in (one.start, one.end) if v), default=1.0)
    labels = [Place(x=laid.label_x[i], y=top - laid.foot[laid.row[i]] - _rise_of(one, most) - 5)
              for i, one in enumerate(loads)]
    boxes = [box_of(one.label, place) for one, place in zip(loads, labels, strict=True)]
    parts, centres = [], []
    for i, one in enumerate(loads):
        foot = top - laid.foot[laid.row[i]]
        parts.append(_drops(one, foot, top, boxes) if laid.row[i] else "")
        parts.append(group([_symbol(one, foot, most)], one.classes, **_dashes(one)))
        parts.append(text(labels[i].x, labels[i].y, one.label, "label unread" if one.unread else "label"))
        centres.append((0.5 * (one.x0 + one.x1), foot - 0.5 * laid.size[laid.row[i]]))
    return LoadDrawing(markup="".join(parts), centres=tuple(centres), height=laid.total)


def _dashes(one: DrawnLoad) -> dict[str, str]:
    return {"stroke_dasharray": "2 3"} if one.unread else {}


class _Rows:
    """Which row each load stands in, and how far above the beam each row begins."""

    def __init__(self, loads: Sequence[DrawnLoad], width: float) -> None:
        halves = [width_of(one.label) / 2 + 5 for one in loads]
        self.label_x = [min(max(0.5 * (one.x0 + one.x1), half), max(width - half, half))
                        for one, half in zip(loads, halves, strict=True)]
        order = sorted(range(len(loads)), key=lambda i: (loads[i].x0 - loads[i].x1, loads[i].x0))
        chosen = rows([_extent(loads[i], self.label_x[i], halves[i]) for i in order])
        self.row = [0] * len(loads)
        for i, row in zip(order, chosen, strict=True):
            self.row[i] = row
        count = max(chosen, default=-1) + 1
        self.size = [max(_size(one) for one, row in zip(loads, self.row, strict=True) if row == k)
                     for k in range(count)]
        self.foot = [GAP + sum(size + LABEL + GAP for size in self.size[:k]) for k in range(count)]
        self.total = GAP + sum(size + LABEL + GAP for size in self.size)


def _rise_of(one: DrawnLoad, most: float) -> float:
    """How high the symbol itself is."""
    return max(_rise(one.start, most), _rise(one.end, most)) if one.form == "line" else _size(one)


def _extent(one: DrawnLoad, label_x: float, half: float) -> tuple[float, float]:
    reach = 14.0 if one.form == "moment" else 6.0
    return min(one.x0 - reach, label_x - half), max(one.x1 + reach, label_x + half)


def _size(one: DrawnLoad) -> float:
    return {"line": STRIP, "moment": MOMENT}.get(one.form or "", POINT)


def _drops(one: DrawnLoad, foot: float, top: float, boxes: Sequence[Box]) -> str:
    """Thin lines from a load in a higher row down to the beam, broken where a label stands in the way."""
    drawn = []
    for x in sorted({one.x0, one.x1}):
        at = foot
        for box in sorted((b for b in boxes if b.x0 < x < b.x1 and foot < b.y1 and b.y0 < top), key=lambda b: b.y0):
            drawn.append((x, at, box.y0))
            at = max(at, box.y1)
        drawn.append((x, at, top))
    return "".join(line(x, a, x, b, "ordinate", stroke_width="0.6") for x, a, b in drawn if b - a > 2)


def _symbol(one: DrawnLoad, foot: float, most: float) -> str:
    if one.form == "line":
        return _strip(one, foot, most)
    if one.form == "moment":
        x, y = one.x0, foot - 9
        turn = curved_arrow(x, y, 11, clockwise=one.start is None or one.start >= 0.0)
        return path(turn, "", fill="none", stroke_width="1.6") + line(x, y - 2, x, y + 2, "")
    up = one.start is not None and one.start < 0.0
    shaft = arrow(one.x0, foot, foot - POINT, 8) if up else arrow(one.x0, foot - POINT, foot, 8)
    foot_hatch = hatched(one.x0 - 7, foot - POINT - 1, 14, 7, 4) if one.permanent else ""
    return path(shaft, "", fill="none", stroke_width="1.8") + foot_hatch


def _strip(one: DrawnLoad, foot: float, most: float) -> str:
    """A ruled strip of arrows as high as its intensity; a permanent one is hatched instead."""
    left, right = (_rise(value, most) for value in (one.start, one.end))
    outline = polyline([(one.x0, foot), (one.x0, foot - left), (one.x1, foot - right), (one.x1, foot)], "",
                       closed=True, fill="none", stroke_width="1.2")
    if one.permanent:
        return outline + _hatch_under(one.x0, one.x1, foot, left, right)
    count = max(2, round((one.x1 - one.x0) / 14))
    up = (one.start or 0.0) + (one.end or 0.0) < 0.0
    arrows = []
    for k in range(count + 1):
        x, rise = one.x0 + (one.x1 - one.x0) * k / count, left + (right - left) * k / count
        if rise > 5:
            arrows.append(arrow(x, foot, foot - rise, 4.5) if up else arrow(x, foot - rise, foot, 4.5))
    return outline + path("".join(arrows), "", fill="none", stroke_width="0.9")


def _rise(value: float | None, most: float) -> float:
    if value is None:
        return 12.0
    return (6.0 + (STRIP - 6.0) * abs(value) / most) if value else 0.0


def _hatch_under(x0: float, x1: float, foot: float, left: float, right: float) -> str:
    """Strokes at 45 degrees that rise to the right, from the foot to the sloping top of a strip."""
    slope = (right - left) / max(x1 - x0, 1e-6)
    strokes, x = [], x0 - max(left, right)
    while x < x1:
        # on the stroke: u = x + t, height t; inside while 0 <= t <= left + slope (u - x0) and x0 <= u <= x1
        t0 = max(0.0, x0 - x)
        reach = (left + slope * (x - x0)) / (1.0 - slope) if slope < 0.99 else STRIP
        t1 = min(reach, x1 - x, STRIP)
        if t1 - t0 > 0.5 and left + slope * (x + t0 - x0) >= t0:
            strokes.append(f"M{num(x + t0)} {num(foot - t0)}L{num(x + t1)} {num(foot - t1)}")
        x += 5.0
    return path("".join(strokes), "hatch", stroke_width="0.8") if strokes else ""
