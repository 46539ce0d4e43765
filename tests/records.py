"""Which records do the tests of judgement start from? Builders over pysolver.record.blank(), every question answered.

The base record is within: a simple span of 6.00 m (exact), 0.5 kN/m of its own, a floor of 4.5 kN/m, a pallet of 14 kN at
mid-span, and unfactored resistances far above. By hand: M = 5 x 6^2 / 8 + 14 x 6 / 4 = 22.5 + 21 = 43.5 kN·m,
V = 5 x 6 / 2 + 14 / 2 = 22 kN. All numbers are exact except the depth (tape), which changes nothing: the record has a
range, so J13 does not hold it at "close", and the numbers are those of the hand calculation.
"""

from typing import Any

from pysolver.check import Result, run_check
from pysolver.outcome import Compared
from pysolver.record import Record, blank, blank_support

SAG, HOG, SHEAR = "sagging", "hogging", "shear"


def q(text: str, means: str | None = "exact", low: str | None = None, high: str | None = None) -> dict[str, Any]:
    """A written number; with low and high its range is stated."""
    if low is not None and high is not None:
        return {"text": text, "means": "stated", "low": low, "high": high}
    return {"text": text} if means is None else {"text": text, "means": means}


def bare(text: str) -> dict[str, Any]:
    """A written number as a sheet issues it: no range, no means."""
    return {"text": text}


def at(distance: Any, start: str = "left_end", *, support: int | None = None, side: str | None = "right",
       face: bool = False, edge: bool = False) -> dict[str, Any]:
    """A position; from a support when one is given."""
    return {"from": start if support is None else "support", "support": support, "side": side if support is not None else None,
            "at": "face" if face else "centre", "to": "near_edge" if edge else "middle",
            "distance": distance if isinstance(distance, dict) else q(distance)}


def load(id_: str, form: str, magnitude: Any, category: str | None = "stored", **more: Any) -> Record:
    made: Record = {"id": id_, "name": id_, "category": category, "form": form,
                    "magnitude": magnitude if isinstance(magnitude, dict) else q(magnitude), "magnitude_end": None,
                    "position": None, "length": None, "whole_beam": False, "source": "", "removable": True, "note": "",
                    "photos": []}
    return {**made, **more}


def point(id_: str, magnitude: Any, position: Any, category: str | None = "stored", **more: Any) -> Record:
    return load(id_, "point", magnitude, category, position=position if isinstance(position, dict) and "from" in position
                else at(position), **more)


def strip(id_: str, magnitude: Any, start: str, length: Any, category: str | None = "stored", **more: Any) -> Record:
    """A line load whose near edge is `start` from the left end."""
    return load(id_, "line", magnitude, category, position=at(start, edge=True),
                length=length if isinstance(length, dict) else q(length), **more)


def everywhere(id_: str, magnitude: Any, category: str | None = "permanent", **more: Any) -> Record:
    return load(id_, "line", magnitude, category, whole_beam=True, **{"removable": False, **more})


def zone(start: str, length: str, **more: Any) -> dict[str, Any]:
    """A stretch of the member in which a limit holds, from the left end unless said otherwise."""
    return {"position": at(bare(start), edge=True, **more), "length": bare(length)}


def entry(criterion: str, value: str, **more: Any) -> Record:
    return {"id": "".join(c if c.isalnum() and c.isascii() else "-" for c in f"{criterion}-{value}"),
            "criterion": criterion, "value": bare(value),
            "support": None, "zone": None, "width": None, "sag_under": None, **more}


def sheet(*entries: Record, **more: Any) -> Record:
    """One document: unfactored resistances, all load, fully restrained, unless said otherwise."""
    made: Record = {"id": "s1", "document": "TW-3", "revision": "A", "issued_by": "the office", "kind": "resistance",
                    "basis": "unfactored", "set": None, "own": None, "covers": "all", "covers_loads": [], "span": None,
                    "span_rule": "centres", "restraint": "full", "restraint_spacing": None, "moment_at": "centre",
                    "entries": list(entries)}
    return {**made, **more}


def generous(**more: Any) -> Record:
    """Limits that nothing here comes near, for moments and shear."""
    return sheet(entry(SAG, "900 kNm"), entry(HOG, "900 kNm"), entry(SHEAR, "900 kN"), **more)


def beam(spans: list[str], *, kinds: list[str] | None = None, left: Any = None, right: Any = None,
         loads: list[Record] | None = None, limits: list[Record] | None = None, self_weight: str | None = None) -> Record:
    """A beam of spans (centre to centre, exact) with every question answered and no distress seen."""
    record = blank()
    record.update(id="test", found_at="2031-05-04T09:00:00Z")
    record["spans"] = [{"measure": "centres", "length": q(s), "drawn": None} for s in spans]
    record["supports"] = [blank_support(i) for i in range(len(spans) + 1)]
    for support, kind in zip(record["supports"], kinds or ["bearing"] * (len(spans) + 1), strict=True):
        support["kind"] = kind
    record["overhangs"] = {"left": q(left) if isinstance(left, str) else left,
                           "right": q(right) if isinstance(right, str) else right}
    record["section"].update(identity="same", depth=q("300 mm", "tape"))
    record["self_weight"] = ({"answer": "entered", "mass": q(self_weight, "design")} if self_weight
                             else {"answer": "in_permanent", "mass": None})
    record["permanent"] = {"answer": "entered"}
    record["restraint"] = {"answer": "full", "spacing": None}
    record["loads"] = loads if loads is not None else [everywhere("floor", "5 kN/m")]
    record["limits"] = limits if limits is not None else [generous()]
    record["condition"]["distress"] = {"ends": "none", "midspan": "none", "underside": "none"}
    record["condition"]["void"]["answer"] = "none"
    return record


def simple(**more: Any) -> Record:
    """The base record (see the module)."""
    given = {"loads": [everywhere("floor", "4.5 kN/m"), point("pallet", "14 kN", "3.00 m")], "self_weight": "0.5 kN/m",
             "limits": [sheet(entry(SAG, "100 kNm"), entry(SHEAR, "100 kN"))], **more}
    return beam(["6.00 m"], **given)


def two_spans(**more: Any) -> Record:
    """Two spans of 5 m under 10 kN/m all over, everything in the permanent load."""
    return beam(["5.00 m", "5.00 m"], **{"loads": [everywhere("floor", "10 kN/m")], **more})


def overhanging(**more: Any) -> Record:
    """4 m between A (held down) and B (bearing), 2 m beyond B; 10 kN/m lies on the span only: 20 kN down at A."""
    given = {"kinds": ["pinned", "bearing"], "right": "2.00 m",
             "loads": [strip("floor", "10 kN/m", "0 m", "4.00 m", "permanent", removable=False)], **more}
    return beam(["4.00 m"], **given)


def clear_span(clear: str, bearing: Any, depth: Any, *, drawn: str | None = None, rule: str = "effective",
               loads: list[Record] | None = None) -> Record:
    """A simple span measured between the faces of two equal bearings under 8 kN/m."""
    record = beam(["1 m"], loads=loads if loads is not None else [everywhere("floor", "8 kN/m")],
                  limits=[generous(span_rule=rule)])
    record["spans"] = [{"measure": "clear", "length": q(clear), "drawn": None}]
    for support in record["supports"]:
        support["bearing"] = bearing if isinstance(bearing, dict) else q(bearing)
        support["bearing_drawn"] = bare(drawn) if drawn else None
    record["section"]["depth"] = depth if isinstance(depth, dict) else q(depth, "tape")
    return record


def outcome_of(record: Record) -> str:
    return run_check(record).outcome.word


def one(result: Result, kind: str, support: str | None = None, sheet: int = 0) -> Compared:
    """The single comparison of a kind (and support) with a sheet."""
    found = [c for c in result.compared if c.kind == kind and c.support == support and c.sheet == sheet]
    assert len(found) == 1, f"{len(found)} comparisons of {kind} at {support}"
    return found[0]


def texts(value: Any) -> list[str]:
    """Every text anywhere in an answer."""
    if isinstance(value, str):
        return [value]
    if isinstance(value, dict):
        return [t for v in value.values() for t in texts(v)]
    if isinstance(value, list | tuple):
        return [t for v in value for t in texts(v)]
    return []
