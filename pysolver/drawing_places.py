"""Where does a thing of the record stand along the beam, as far as that is known while the record is being entered?

With a Layout the places are those that are solved. Without one they come from the readings alone: spans that are not
read get a nominal length, and a thing counts as placed only when every span between it and the point it was measured
from is read. For drawing only: bearings are left out here, so nothing is ever computed from these places. m from the
left end of the beam.
"""

from dataclasses import dataclass, replace
from itertools import pairwise
from statistics import fmean
from typing import Any

from pysolver.found import Layout
from pysolver.loads import LineLoad
from pysolver.readings import Readings
from pysolver.record import Record

NOMINAL_SPAN = 4.0  # m, of a span when none is read
Extent = tuple[float, float]


@dataclass(frozen=True, slots=True, kw_only=True)
class Stations:
    """Supports and length of the beam, read[i]: whether part i is known (overhang, spans, overhang), and the places of
    loads and hinges where they are known."""

    supports: tuple[float, ...]
    length: float
    read: tuple[bool, ...]
    loads: tuple[Extent | None, ...]
    hinges: tuple[Extent | None, ...]


def stations(record: Record, layout: Layout | None, readings: Readings) -> Stations:
    """The places for drawing: solved ones when there is a layout, else as far as the readings tell."""
    return _from_layout(record, layout) if layout is not None else _from_readings(record, readings)


def load_of(record: Record, layout: Layout) -> int:
    """How many loads of a layout come before the first load of its record (the beam's own weight)."""
    return len(layout.loads) - len(record["loads"])


def _from_layout(record: Record, layout: Layout) -> Stations:
    loads = [(load.start, load.end) if isinstance(load, LineLoad) else (load.x, load.x)
             for load in layout.loads[load_of(record, layout):]]
    return Stations(supports=layout.supports, length=layout.beam.length, read=(True,) * (len(layout.supports) + 1),
                    loads=tuple(loads), hinges=tuple((x, x) for x in layout.beam.hinges))


def _from_readings(record: Record, readings: Readings) -> Stations:
    lengths = [_best(readings, f"/spans/{i}/length") for i in range(len(record["spans"]))]
    nominal = fmean([one for one in lengths if one] or [NOMINAL_SPAN])
    overhangs = [_best(readings, f"/overhangs/{end}") if record["overhangs"][end] is not None else 0.0
                 for end in ("left", "right")]
    parts = [overhangs[0], *(one or None for one in lengths), overhangs[1]]
    sizes = [part if part is not None and part >= 0.0 else nominal / 3 if i in (0, len(parts) - 1) else nominal
             for i, part in enumerate(parts)]
    edges = [sum(sizes[:i + 1]) for i in range(len(sizes))]
    bare = Stations(supports=tuple(edges[:-1]), length=edges[-1], read=tuple(part is not None for part in parts),
                    loads=(), hinges=())
    loads = [_load_place(load, f"/loads/{i}", bare, readings) for i, load in enumerate(record["loads"])]
    hinges = [_place(hinge["position"], f"/hinges/{i}/position", bare, readings, 0.0)
              for i, hinge in enumerate(record["hinges"])]
    return replace(bare, loads=tuple(loads), hinges=tuple(hinges))


def _best(readings: Readings, path: str) -> float | None:
    read = readings.measured.get(path)
    return read.best if read is not None else None


def _load_place(load: dict[str, Any], path: str, at: Stations, readings: Readings) -> Extent | None:
    if load["form"] == "line" and load["whole_beam"]:
        return 0.0, at.length
    width = _best(readings, f"{path}/length") if load["form"] == "line" else 0.0
    return _place(load["position"], f"{path}/position", at, readings, width)


def _place(position: dict[str, Any] | None, path: str, at: Stations, readings: Readings,
           width: float | None) -> Extent | None:
    distance = _best(readings, f"{path}/distance")
    if position is None or distance is None or width is None:
        return None
    origin, way = _origin(position, at)
    if origin is None:
        return None
    near = origin + way * (distance if position["to"] == "near_edge" else distance - width / 2)
    start, end = sorted((near, near + way * width))
    if start < -1e-6 or end > at.length + 1e-6 or not _known_between(min(origin, start), max(origin, end), at):
        return None
    return start, end


def _origin(position: dict[str, Any], at: Stations) -> tuple[float | None, float]:
    start = position["from"]
    way = -1.0 if start == "right_end" or (start == "support" and position["side"] == "left") else 1.0
    if start == "left_end":
        return 0.0, way
    if start == "right_end":
        return at.length, way
    j = position["support"]
    if start is None or j is None or position["side"] is None or j >= len(at.supports):
        return None, way
    return at.supports[j], way


def _known_between(start: float, end: float, at: Stations) -> bool:
    """Whether every part of the beam between two places is read."""
    edges = [0.0, *at.supports, at.length]
    return all(read for read, (a, b) in zip(at.read, pairwise(edges), strict=True)
               if a < end - 1e-9 and start < b - 1e-9)
