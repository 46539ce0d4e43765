"""How does the beam look while it is being entered? A schematic for a phone, every part large enough to touch.

Spans keep a rough proportion between 96 and 260 units (one unit is one CSS pixel), so the drawing of a long beam is
wider than a phone. What is not answered yet is drawn with a question mark; a blank record gives a drawing too. Places
in m from the left end, as in found.py; without a Layout they are taken from the readings as far as these go.
"""

from collections.abc import Sequence
from dataclasses import dataclass
from itertools import pairwise

import numpy as np

from pysolver import drawing_symbols as symbols
from pysolver import svg
from pysolver.display import System, show
from pysolver.drawing_loads import DrawnLoad, draw_loads, height_of
from pysolver.drawing_places import Stations, stations
from pysolver.drawing_symbols import BEAM
from pysolver.found import Layout, span_name
from pysolver.readings import FORM_DIMENSION, Readings
from pysolver.record import Record

NARROWEST, WIDEST = 96.0, 260.0
LEAST_WIDTH = 340.0
MARGIN = 34.0
OVERHANG = (58.0, 96.0)
NOMINAL = 150.0  # what a span of mean length is drawn
NAMES, DIMENSIONS, FOOT = 40.0, 66.0, 84.0  # below the underside of the beam
UNREAD_STRIP = 50.0


@dataclass(frozen=True, slots=True, kw_only=True)
class Pick:
    """A thing that a touch can select: path in the record, plain label (not escaped), place in the viewBox."""

    path: str
    label: str
    x: float
    y: float


@dataclass(frozen=True, slots=True, kw_only=True)
class Working:
    """The working drawing: markup, what can be picked, and the size of its viewBox."""

    svg: str
    picks: tuple[Pick, ...]
    width: float
    height: float


@dataclass(frozen=True, slots=True, kw_only=True)
class _Frame:
    """Where things stand across the paper: each support, the tips of the beam; width of the paper."""

    stations: Stations
    supports: tuple[float, ...]
    left: float
    right: float
    width: float

    def x(self, place: float) -> float:
        """Across the paper for a place in m, straight between supports."""
        at = self.stations
        return float(np.interp(place, [0.0, *at.supports, at.length], [self.left, *self.supports, self.right]))


def working(record: Record, layout: Layout | None, readings: Readings) -> Working:
    """The schematic of a valid record. layout: at best estimates, or None while there is none (then what can be placed
    from the readings alone is placed, the rest stands in the order of entry, marked as unread)."""
    system: System = record["settings"]["display"]
    frame = _frame(record, stations(record, layout, readings))
    loads = _loads(record, frame, readings, system)
    y = 8.0 + max(height_of(loads, frame.width), 22.0) + BEAM / 2
    above = draw_loads(loads, y - BEAM / 2, frame.width)
    hinges = _hinges(frame)
    section = _section_place(frame, [x for x, _ in hinges])
    parts = [above.markup, _supports(record, frame, y + BEAM / 2),
             symbols.beam(frame.left, frame.right, y, [x for x, _ in hinges]),
             *(symbols.hinge(x, y, unread=unread) for x, unread in hinges),
             symbols.cross_section(section, y + BEAM / 2 + 7),
             _dimensions(record, frame, readings, y + BEAM / 2, system), _ends(record, frame, y + BEAM / 2)]
    height = y + BEAM / 2 + FOOT + (14.0 if any(record["ends"].values()) else 0.0)
    picks = _picks(record, frame, above.centres, [x for x, _ in hinges], section, y)
    title = f"Working drawing of {svg.clean(record['place']['member'], 60) or 'the beam'}"
    markup = svg.document(frame.width, height, parts, name="working", title=title, description=_words(picks))
    return Working(svg=markup, picks=picks, width=frame.width, height=height)


def _frame(record: Record, at: Stations) -> _Frame:
    lengths = np.diff(at.supports)
    drawn = np.clip(lengths / lengths.mean() * NOMINAL, NARROWEST, WIDEST)
    overhangs = [_overhang(record["overhangs"]["left"], at.supports[0], float(lengths.mean())),
                 _overhang(record["overhangs"]["right"], at.length - at.supports[-1], float(lengths.mean()))]
    free = LEAST_WIDTH - 2 * MARGIN - sum(overhangs)
    if drawn.sum() < free:
        drawn = np.clip(drawn * (free / drawn.sum()), NARROWEST, WIDEST)
    width = max(LEAST_WIDTH, 2 * MARGIN + sum(overhangs) + float(drawn.sum()))
    left = 0.5 * (width - sum(overhangs) - float(drawn.sum()))
    supports = left + overhangs[0] + np.concatenate([[0.0], np.cumsum(drawn)])
    return _Frame(stations=at, supports=tuple(float(x) for x in supports), left=left, width=width,
                  right=float(supports[-1]) + overhangs[1])


def _overhang(written: object, length: float, mean: float) -> float:
    if written is None:
        return 0.0
    return float(np.clip(length / mean * NOMINAL, *OVERHANG))


def _loads(record: Record, frame: _Frame, readings: Readings, system: System) -> list[DrawnLoad]:
    places = frame.stations.loads
    lost = [i for i, place in enumerate(places) if place is None]
    step = (frame.right - frame.left) / (len(lost) + 1)
    drawn = []
    for i, (load, place) in enumerate(zip(record["loads"], places, strict=True)):
        if place is None:
            middle = frame.left + step * (lost.index(i) + 1)
            half = min(UNREAD_STRIP, step) / 2 if load["form"] == "line" else 0.0
            x0, x1 = middle - half, middle + half
        else:
            x0, x1 = frame.x(place[0]), frame.x(place[1])
        start, end = _magnitudes(record, i, readings)
        words = magnitude_words(load["form"], start, end, system) + " ?" * (place is None and start is not None)
        drawn.append(DrawnLoad(form=load["form"], x0=x0, x1=x1, start=start, end=end, label=words,
                               unread=place is None or start is None, permanent=load["category"] == "permanent"))
    return drawn


def _magnitudes(record: Record, i: int, readings: Readings) -> tuple[float | None, float | None]:
    measured = readings.measured
    start, end = (measured.get(f"/loads/{i}/{name}") for name in ("magnitude", "magnitude_end"))
    first = start.best if start else None
    return first, end.best if end and record["loads"][i]["form"] == "line" else first


def magnitude_words(form: str | None, start: float | None, end: float | None, system: System) -> str:
    """"12.5 kN", "4.00 kN/m to 12.0 kN/m", or "?"."""
    dimension = FORM_DIMENSION.get(form or "")
    if dimension is None or start is None:
        return "?"
    first, last = show(dimension, start, system), show(dimension, start if end is None else end, system)
    if first == last:
        return first
    figure, _, unit = first.rpartition(" ")
    return f"{figure} to {last}" if last.endswith(f" {unit}") else f"{first} to {last}"


def _supports(record: Record, frame: _Frame, y: float) -> str:
    last = len(frame.supports) - 1
    parts = []
    for j, (one, x) in enumerate(zip(record["supports"], frame.supports, strict=True)):
        side = -1 if j == 0 and x - frame.left < 1 else 1 if j == last and frame.right - x < 1 else 0
        parts.append(symbols.support(one["kind"], x, y, side=side, rotational=one["rotational"] is not None))
        if one["kind"] == "free":
            parts.append(svg.text(x, y + 20, "free end", "label-small", size=svg.SMALL))
        parts.append(symbols.name(x, y + NAMES, svg.clean(one["name"])))
    parts += [symbols.free_end(x, y, side) for end, x, side in (("left", frame.left, -1), ("right", frame.right, 1))
              if record["overhangs"][end] is not None]
    return "".join(parts)


def _dimensions(record: Record, frame: _Frame, readings: Readings, y: float, system: System) -> str:
    parts = [_measure(readings, f"/spans/{i}/length", across, y + DIMENSIONS, system, span["measure"] or "")
             for i, (span, across) in enumerate(zip(record["spans"], pairwise(frame.supports), strict=True))]
    for end, x0, x1 in (("left", frame.left, frame.supports[0]), ("right", frame.supports[-1], frame.right)):
        if record["overhangs"][end] is not None:
            parts.append(_measure(readings, f"/overhangs/{end}", (x0, x1), y + DIMENSIONS, system, ""))
            parts.append(_tick(x0 if end == "left" else x1, y + 14, y))
    return "".join(parts) + "".join(_tick(x, y + NAMES + 12, y) for x in frame.supports)


def _tick(x: float, start: float, y: float) -> str:
    """The thin line from a thing down to its dimension line."""
    return svg.line(x, start, x, y + DIMENSIONS + 5, "dim", stroke_width="0.6")


def _measure(readings: Readings, path: str, across: tuple[float, float], y: float, system: System, below: str) -> str:
    read = readings.measured.get(path)
    words = show("length", read.best, system) if read else "?"
    return symbols.dimension(*across, y, words, below=below, known=read is not None)


def _ends(record: Record, frame: _Frame, y: float) -> str:
    """What people on site call the two ends."""
    longest = int(frame.width / 2 / 8)
    left, right = (svg.clean(record["ends"][end], longest) for end in ("left", "right"))
    places = ((6.0, left, "start"), (frame.width - 6, right, "end"))
    return "".join(svg.text(x, y + FOOT + 8, words, "label-small", anchor=anchor, size=svg.SMALL)
                   for x, words, anchor in places if words)


def _hinges(frame: _Frame) -> list[tuple[float, bool]]:
    """(across, not read) of each hinge; those without a place in order along the beam."""
    places = frame.stations.hinges
    step = (frame.right - frame.left) / (places.count(None) + 1)
    lost = [i for i, place in enumerate(places) if place is None]
    return [(frame.x(place[0]), False) if place else (frame.left + step * (lost.index(i) + 1), True)
            for i, place in enumerate(places)]


def _section_place(frame: _Frame, hinges: Sequence[float]) -> float:
    """The middle of the span that is farthest from any hinge, so that a finger can tell the two apart."""
    middles = [0.5 * (a + b) for a, b in pairwise(frame.supports)]
    return max(middles, key=lambda x: min([abs(x - h) for h in hinges], default=0.0))


def _picks(record: Record, frame: _Frame, loads: Sequence[svg.Point], hinges: Sequence[float], section: float,
           y: float) -> tuple[Pick, ...]:
    under = y + BEAM / 2
    found: list[Pick] = []
    for j, (one, x) in enumerate(zip(record["supports"], frame.supports, strict=True)):
        found.append(Pick(path=f"/supports/{j}", label=f"Support {svg.clean(one['name'])}", x=x, y=under + 20))
        if j < len(record["spans"]):
            found.append(Pick(path=f"/spans/{j}", label=f"Span {svg.clean(span_name(record, j))}",
                              x=0.5 * (x + frame.supports[j + 1]), y=under + DIMENSIONS - 6))
    for i, (load, (x, up)) in enumerate(zip(record["loads"], loads, strict=True)):
        name = svg.clean(load["name"], 60)
        found.append(Pick(path=f"/loads/{i}", label=f"Load: {name}" if name else f"Load {i + 1}", x=x, y=up))
    found += [Pick(path=f"/hinges/{i}", label=f"Hinge {i + 1}", x=x, y=y) for i, x in enumerate(hinges)]
    for end, a, b in (("left", frame.left, frame.supports[0]), ("right", frame.supports[-1], frame.right)):
        if record["overhangs"][end] is not None:
            found.append(Pick(path=f"/overhangs/{end}", label=f"Overhang at the {end}", x=0.5 * (a + b),
                              y=under + DIMENSIONS - 6))
    found.append(Pick(path="/section", label="Member section", x=section, y=under + 16))
    return _apart(found)


def _apart(picks: Sequence[Pick]) -> tuple[Pick, ...]:
    """No two picks at one point: a later one is moved down a little until it stands alone."""
    taken: set[tuple[int, int]] = set()
    moved = []
    for pick in picks:
        y = pick.y
        while (round(pick.x), round(y)) in taken:
            y += 4.0
        taken.add((round(pick.x), round(y)))
        moved.append(Pick(path=pick.path, label=pick.label, x=round(pick.x, 2), y=round(y, 2)))
    return tuple(moved)


def _words(picks: Sequence[Pick]) -> str:
    return "Schematic, not to scale. From left to right: " + ", ".join(p.label for p in picks) + "."
