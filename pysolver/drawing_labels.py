"""Where on a drawing can a label stand without covering another? Boxes in viewBox units, y down.

Text is measured by count of characters (WIDE of the font size each, a little more than the mean of sans-serif figures),
since no font is at hand where the drawings are made.
"""

import math
from collections.abc import Iterable, Sequence
from dataclasses import dataclass, field

import numpy as np

from pysolver import svg

WIDE = 0.58
GAP = 2.0


@dataclass(frozen=True, slots=True, kw_only=True)
class Box:
    x0: float
    y0: float
    x1: float
    y1: float

    def meets(self, other: "Box") -> bool:
        return self.x0 < other.x1 and other.x0 < self.x1 and self.y0 < other.y1 and other.y0 < self.y1


@dataclass(frozen=True, slots=True, kw_only=True)
class Place:
    """A place for a label: baseline point, anchor, whether it is written upwards; to: what a thin leader leads to."""

    x: float
    y: float
    anchor: str = "middle"
    turned: bool = False
    to: svg.Point | None = None


def width_of(words: str, size: float = svg.PLAIN) -> float:
    return WIDE * size * len(svg.clean(words))


def box_of(words: str, place: Place, size: float = svg.PLAIN) -> Box:
    """The paper that a label takes, with a little air round it."""
    long = width_of(words, size)
    before = {"start": 0.0, "middle": long / 2, "end": long}[place.anchor]
    if place.turned:
        return Box(x0=place.x - 0.8 * size - 1, x1=place.x + 0.2 * size + 1, y0=place.y - long + before - GAP,
                   y1=place.y + before + GAP)
    return Box(x0=place.x - before - GAP, x1=place.x - before + long + GAP, y0=place.y - 0.8 * size - 1,
               y1=place.y + 0.25 * size + 1)


@dataclass(slots=True)
class Sheet:
    """What is taken already. hard: texts, never to be covered; soft: lines, covered only when nothing else is left."""

    frame: Box
    hard: list[Box] = field(default_factory=list)
    soft: list[Box] = field(default_factory=list)

    def room(self, words: str, places: Iterable[Place], size: float = svg.PLAIN,
             most: float = math.inf) -> Place | None:
        """The first place that covers nothing, else the first that covers fewest lines (up to `most`), else None."""
        best: tuple[int, Place] | None = None
        soft = np.array([(b.x0, b.y0, b.x1, b.y1) for b in self.soft]).reshape(-1, 4)
        for place in places:
            box = box_of(words, place, size)
            if not self._inside(box) or any(box.meets(other) for other in self.hard) or self._leads_across(box, place.to):
                continue
            covered = int(((box.x0 < soft[:, 2]) & (soft[:, 0] < box.x1) & (box.y0 < soft[:, 3])
                           & (soft[:, 1] < box.y1)).sum())
            if covered == 0:
                return place
            if covered <= most and (best is None or covered < best[0]):
                best = covered, place
        return best[1] if best else None

    def write(self, words: str, places: Sequence[Place], classes: str = "label", size: float = svg.PLAIN,
              most: float = math.inf) -> str | None:
        """The label written at the best of the places, which is then taken; None when there is no room."""
        place = self.room(words, places, size, most)
        if place is None:
            return None
        box = box_of(words, place, size)
        self.hard.append(box)
        written = svg.text(place.x, place.y, words, classes, anchor=place.anchor, size=size, turned=place.turned)
        return written if place.to is None else _leader(box, place.to) + written

    def _leads_across(self, box: Box, to: svg.Point | None) -> bool:
        """Whether the leader would run through another text, a rail or a mark."""
        if to is None:
            return False
        start = _leader_start(box, to)
        steps = [k / 12 for k in range(1, 12)]
        spots = [(start[0] + t * (to[0] - start[0]), start[1] + t * (to[1] - start[1])) for t in steps]
        return any(one.x0 <= x <= one.x1 and one.y0 <= y <= one.y1 for one in self.hard for x, y in spots)

    def _inside(self, box: Box) -> bool:
        return (box.x0 >= self.frame.x0 and box.x1 <= self.frame.x1 and box.y0 >= self.frame.y0
                and box.y1 <= self.frame.y1)


def _leader_start(box: Box, to: svg.Point) -> svg.Point:
    """Of the label's edge the point that is nearest to what it tells."""
    if box.x0 - GAP <= to[0] <= box.x1 + GAP:
        return 0.5 * (box.x0 + box.x1), box.y0 if abs(to[1] - box.y0) < abs(to[1] - box.y1) else box.y1
    return box.x0 if to[0] < box.x0 else box.x1, min(max(to[1], box.y0), box.y1)


def _leader(box: Box, to: svg.Point) -> str:
    return svg.line(*_leader_start(box, to), *to, "leader", stroke_width="0.6")


def rows(extents: Sequence[tuple[float, float]]) -> list[int]:
    """For each (from, to) in turn the lowest row in which it overlaps nothing placed before it."""
    taken: list[list[tuple[float, float]]] = []
    chosen = []
    for start, end in extents:
        row = next((k for k, others in enumerate(taken) if all(end <= a or b <= start for a, b in others)), len(taken))
        if row == len(taken):
            taken.append([])
        taken[row].append((start, end))
        chosen.append(row)
    return chosen
