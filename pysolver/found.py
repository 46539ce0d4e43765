"""What beam stands there, and what rests on it, for one choice of every measured number?

lay_out() turns a record and its readings into a Layout: the beam, the loads, and where supports and faces are. It is
called with the best estimates first and then with every point of the box of uncertain lengths and positions.
"""

from collections.abc import Callable
from dataclasses import dataclass
from itertools import pairwise
from typing import Any

from pysolver.beam import SHORTEST, Beam, Stretch
from pysolver.errors import InputError
from pysolver.frame import Frame, Pick, Reading
from pysolver.loads import AppliedMoment, LineLoad, Load, PointLoad
from pysolver.readings import Readings
from pysolver.record import Record

SELF_WEIGHT = "self weight"
ANY_STIFFNESS = 1e7  # N·m²; M, V and R of a beam of one EI without springs or settlement do not depend on it (J12)

@dataclass(frozen=True, slots=True, kw_only=True)
class Layout:
    """One choice of everything measured. x in m from the left end of the beam.

    supports: x of every support of the record (a free end: its tip); real: the index in the record of each support that
    the beam has; faces: (left face, right face) of each; spans: (start, end) of each span; zones: (start, end) of each zone
    of a limit by its path; drawn: the drawn length of a span by its index.
    """

    beam: Beam
    loads: tuple[Load, ...]
    supports: tuple[float, ...]
    real: tuple[int, ...]
    faces: tuple[tuple[float, float], ...]
    spans: tuple[tuple[float, float], ...]
    zones: dict[str, tuple[float, float]]
    drawn: dict[int, float]


def missing(record: Record, readings: Readings) -> list[InputError]:
    """What must still be answered before there is a beam to solve, each with its field."""
    wanted = [*_support_gaps(record), *_span_gaps(record)]
    for i, load in enumerate(record["loads"]):
        wanted += [(f"/loads/{i}/{f}", text) for f, text in _load_gaps(load)]
        wanted += [] if load["whole_beam"] else _face_gaps(record, load["position"], f"{load_name(load)} was")
    for i, hinge in enumerate(record["hinges"]):
        if _position_gap(hinge["position"]):
            wanted.append((f"/hinges/{i}/position", "The place of the hinge"))
        wanted += _face_gaps(record, hinge["position"], "a hinge was")
    unread = {error.field for error in readings.errors}
    return [InputError(code="missing", field=field, message=f"{text} is not entered yet.")
            for field, text in dict(wanted).items() if field not in unread]


def _support_gaps(record: Record) -> list[tuple[str, str]]:
    wanted: list[tuple[str, str]] = []
    for i, support in enumerate(record["supports"]):
        if support["kind"] is None:
            wanted.append((f"/supports/{i}/kind", f"The kind of support {support['name']}"))
        if support["kind"] == "spring" and support["stiffness"] is None:
            wanted.append((f"/supports/{i}/stiffness", f"The spring stiffness of support {support['name']}"))
    return wanted


def _span_gaps(record: Record) -> list[tuple[str, str]]:
    wanted: list[tuple[str, str]] = []
    for i, span in enumerate(record["spans"]):
        name = span_name(record, i)
        if span["length"] is None:
            wanted.append((f"/spans/{i}/length", f"The length of span {name}"))
        elif span["measure"] is None:
            wanted.append((f"/spans/{i}/measure", f"Whether span {name} was measured clear or centre to centre"))
        for j in (i, i + 1):
            if span["measure"] == "clear" and record["supports"][j]["bearing"] is None \
                    and record["supports"][j]["kind"] != "free":
                wanted.append((f"/supports/{j}/bearing", f"The bearing length of support {record['supports'][j]['name']}"))
    return wanted


def span_name(record: Record, i: int) -> str:
    """A–B: the span between two supports by their names."""
    return f"{record['supports'][i]['name']}–{record['supports'][i + 1]['name']}"


def load_name(load: dict[str, Any]) -> str:
    return str(load["name"]).strip() or "the load"


def _load_gaps(load: dict[str, Any]) -> list[tuple[str, str]]:
    name = load_name(load)
    gaps = []
    if load["form"] is None:
        gaps.append(("form", f"Whether {name} is a point load, a line load or a moment"))
    if load["magnitude"] is None:
        gaps.append(("magnitude", f"How much {name} is"))
    if load["form"] == "line" and load["whole_beam"]:
        return gaps
    if load["form"] == "line" and load["length"] is None:
        gaps.append(("length", f"Over what length {name} lies"))
    if _position_gap(load["position"]) or (load["form"] == "line" and load["position"]["to"] is None):
        gaps.append(("position", f"Where {name} is"))
    return gaps


def _face_gaps(record: Record, position: dict[str, Any] | None, what: str) -> list[tuple[str, str]]:
    """A distance taped from the face of a support needs its bearing length, and one from a support says from where."""
    if position is None or position["from"] != "support" or position["support"] is None:
        return []
    j = min(position["support"], len(record["supports"]) - 1)
    support = record["supports"][j]
    if position["at"] == "face" and support["bearing"] is None and support["kind"] != "free":
        return [(f"/supports/{j}/bearing", f"The bearing length of support {support['name']}, from whose face {what} taped,")]
    return []


def _position_gap(position: dict[str, Any] | None) -> bool:
    if position is None or position["from"] is None or position["distance"] is None:
        return True
    return position["from"] == "support" and None in (position["support"], position["side"], position["at"])


def lay_out(record: Record, readings: Readings, pick: Pick, reading: Reading) -> Layout:
    """The beam and its loads. Raises InputError with the field of the record when they cannot stand as entered."""
    frame = Frame(record, readings, pick, reading)
    beam = _in_record(record, lambda: Beam(length=frame.length, supports=frame.beam_supports(),
                                           stretches=_stretches(record, readings, pick, frame),
                                           hinges=tuple(_hinge(frame, h["position"], f"/hinges/{i}/position")
                                                        for i, h in enumerate(record["hinges"]))))
    loads = tuple(_loads(record, readings, pick, frame))
    return Layout(beam=beam, loads=loads, supports=tuple(frame.x), real=frame.real, faces=tuple(frame.faces),
                  spans=tuple(pairwise(frame.x)), zones=_zones(record, readings, frame),
                  drawn={i: readings.issued[f"/spans/{i}/drawn"] for i in range(len(record["spans"]))
                         if f"/spans/{i}/drawn" in readings.issued})


def _hinge(frame: Frame, position: dict[str, Any], path: str) -> float:
    """x of a hinge; one that a tape cannot part from a support is on it."""
    x = frame.place(position, path, 0.0)[0]
    return next((frame.x[j] for j in frame.real if abs(frame.x[j] - x) < SHORTEST), x)


def _zones(record: Record, readings: Readings, frame: Frame) -> dict[str, tuple[float, float]]:
    """Where the zones of limits lie on this layout: distances on the member, never stretched with the span (J7)."""
    made = {}
    for i, sheet in enumerate(record["limits"]):
        for j, entry in enumerate(sheet["entries"]):
            path = f"/limits/{i}/entries/{j}/zone"
            if zone_complete(entry["zone"], path, readings):
                made[path] = frame.place(entry["zone"]["position"], f"{path}/position", readings.issued[f"{path}/length"])
    return made


def zone_complete(zone: dict[str, Any] | None, path: str, readings: Readings) -> bool:
    """Whether a zone of a limit says from where and how far it runs."""
    if zone is None or _position_gap(zone["position"]):
        return False
    return f"{path}/length" in readings.issued and f"{path}/position/distance" in readings.issued


def _in_record(record: Record, make: Callable[[], Any]) -> Any:
    try:
        return make()
    except InputError as error:
        raise error.moved(_in_words_of_the_record(error.field)) from None


def _in_words_of_the_record(field: str) -> str:
    """The field of the record behind a field of the beam."""
    part, _, index = field.lstrip("/").partition("/")
    known = {"spans": f"/spans/{index}/length", "length": "/spans/0/length", "hinges": f"/hinges/{index}/position",
             "stiffness": "/section/stiffness", "supports": f"/supports/{index}" if index else "/supports"}
    return known.get(part, field if field.startswith("/") else f"/{field}")


def _stretches(record: Record, readings: Readings, pick: Pick, frame: Frame) -> tuple[Stretch, ...]:
    """The base stiffness, cut by the zones that have another."""
    base = pick("/section/stiffness") if record["section"]["stiffness"] is not None else ANY_STIFFNESS
    zones = []
    for i, zone in enumerate(record["section"]["zones"]):
        path = f"/section/zones/{i}"
        if zone["length"] is None or zone["stiffness"] is None or _position_gap(zone["position"]):
            raise InputError(code="missing", field=path, message="This stretch of other stiffness is not entered in full.")
        start, end = frame.place(zone["position"], f"{path}/position", readings.issued[f"{path}/length"])
        zones.append((max(start, 0.0), min(end, frame.length), pick(f"{path}/stiffness"), path))
    made, at = [], 0.0
    for start, end, stiffness, path in sorted(zones):
        if start < at - 1e-9 or end <= start:
            raise InputError(code="stretches", field=path, message="This stretch overlaps another or lies off the beam.")
        if start > at + 1e-3:
            made.append(Stretch(start=at, end=start, bending_stiffness=base))
        made.append(Stretch(start=made[-1].end if made else 0.0, end=end, bending_stiffness=stiffness))
        at = end
    if at < frame.length - 1e-3 or not made:
        made.append(Stretch(start=at, end=frame.length, bending_stiffness=base))
    last = made[-1]
    made[-1] = Stretch(start=last.start, end=frame.length, bending_stiffness=last.bending_stiffness)
    return tuple(made)


def _loads(record: Record, readings: Readings, pick: Pick, frame: Frame) -> list[Load]:
    """Loads at their best estimate; how far each source may be out is applied as a factor on the response."""
    best = {path: m.best for path, m in readings.measured.items()}
    made: list[Load] = []
    if record["self_weight"]["answer"] == "entered" and "/self_weight/mass" in best:
        w = best["/self_weight/mass"]
        made.append(LineLoad(start=0.0, end=frame.length, start_intensity=w, end_intensity=w, source=SELF_WEIGHT))
    for i, load in enumerate(record["loads"]):
        path = f"/loads/{i}"
        try:
            made.append(_one_load(load, path, best, pick, frame))
        except InputError as error:
            raise error.moved(f"{path}/{error.field}" if not error.field.startswith("/") else error.field) from None
    return made


def source_of(load: dict[str, Any]) -> str:
    """The unknown that a load belongs to: what the person named as its source, or itself."""
    named = str(load["source"]).strip()
    return f"source {named}" if named else f"load {load['id']}"  # no person's word can be taken for SELF_WEIGHT


def _one_load(load: dict[str, Any], path: str, best: dict[str, float], pick: Pick, frame: Frame) -> Load:
    amount, source = best[f"{path}/magnitude"], source_of(load)
    if load["form"] == "line":
        far = best.get(f"{path}/magnitude_end", amount)
        if load["whole_beam"]:
            start, end = 0.0, frame.length
        else:
            start, end = frame.place(load["position"], f"{path}/position", pick(f"{path}/length"))
            start, end = frame.onto_beam(start, end, path)
        return LineLoad(start=start, end=end, start_intensity=amount, end_intensity=far, source=source)
    x = frame.place(load["position"], f"{path}/position", 0.0)[0]
    x = frame.onto_beam(x, x, path)[0]
    if load["form"] == "moment":
        return AppliedMoment(x=x, moment=amount, source=source)
    return PointLoad(x=x, force=amount, source=source)
