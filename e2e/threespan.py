"""The three-span check of the flow, twice: as a person enters it by touch, and as the record that must come of it.

Invented: no such beam, sheet or pallet exists.
"""

from typing import Any

from steps import Person

from pysolver.record import Record, blank

SPANS = (("A–B", "3.80"), ("B–C", "4.60"), ("C–D", "3.80"))
BEARINGS = (("A", "100"), ("B", "200"), ("C", "200"), ("D", "100"))
LIMITS = (("sagging moment", "sagging", "26", "kN·m"), ("hogging moment", "hogging", "30", "kN·m"),
          ("shear", "shear", "45", "kN"))
EN = "EN 1990, expression 6.10, STR set B, EN 1990:2002+A1:2005, recommended values"
SEEN = "None of these seen"


def enter_three_spans(person: Person) -> None:
    """From the first question of a new check to its result, by touch alone."""
    place(person)
    for (support, bearing), (span, length) in zip(BEARINGS, (*SPANS, ("", "")), strict=True):
        person.on_to(f"Support {support}")
        person.choose(f"Support {support}, kind", "Bearing")
        person.enter(f"Support {support}, bearing length", bearing, "steel tape")
        if span:
            one_span(person, span, length)
    person.go_to("Member")
    member(person)
    person.on_to("Limits")
    limits(person)
    person.on_to("Permanent load")
    loads(person)
    person.go_to("Look")
    look(person)
    person.result()


def place(person: Person) -> None:
    person.write("Where, member mark", "B7")
    person.write("Where, left end", "grid C")
    person.write("Where, right end", "street")


def one_span(person: Person, span: str, length: str) -> None:
    person.on_to(f"Span {span}")
    person.choose(f"Span {span}, measured how", "Clear, face to face")
    person.enter(f"Span {span}, clear opening", length, "steel tape")
    following = {"A–B": "B–C", "B–C": "C–D"}.get(span)
    if following:
        person.go_to(f"Span {span}")
        person.press(f"Add a span to the right of {span}")
        person.arrive(f"Span {following}")
        person.go_to(f"Span {span}")


def member(person: Person) -> None:
    person.choose("Member, same as on the sheet", "Measured, same as sheet")
    person.choose("Member, self weight", "Mass per length")
    person.enter("Member, self weight per length", "31", "steel section table")
    person.choose("Member, held against moving sideways", "All along, or it cannot buckle")


def limits(person: Person) -> None:
    person.press("Add a design sheet")
    person.write("Limits 1, document", "S-12")
    person.choose("Limits 1, kind of figure", "Resistance")
    person.choose("Limits 1, basis", "Factored")
    person.choose("Limits 1, combination", EN)
    person.choose("Limits 1, what it covers", "All load")
    for name, _, figure, _ in LIMITS:
        person.press(f"Limits 1, add {name}")
        person.enter(f"Limits 1, {name}", figure)
    person.close_pad()
    person.choose("Limits 1, span counted as", "Centre to centre of bearings")
    person.choose("Limits 1, restraint it was issued for", "Held sideways all along, or cannot buckle")
    person.choose("Limits 1, moments at supports are taken at", "At the middle of the support")


def loads(person: Person) -> None:
    person.choose("Permanent load, answer", "Entered as loads")
    person.press("Add a permanent load")
    person.write("Load 1, what it is", "floor")
    person.choose("Load 1, how it acts", "Along a length")
    person.enter("Load 1, size per length", "6.2", "from the design sheet")
    person.choose("Load 1, along the whole beam", "Yes")
    person.choose("Load 1, could someone take it away", "No")
    person.press("Add another load")
    person.write("Load 2, what it is", "pallet of blocks")
    person.choose("Load 2, category", "Stored goods, materials")
    person.choose("Load 2, how it acts", "Along a length")
    person.enter("Load 2, size per length", "8", "counted, times a unit weight")
    person.choose("Load 2, along the whole beam", "No")
    person.choose("Load 2, measured from", "A support")
    person.choose("Load 2, from which support", "Support B")
    person.choose("Load 2, towards", "street")
    person.choose("Load 2, from its", "Face")
    person.choose("Load 2, to its", "Near edge")
    person.enter("Load 2, distance", "1.50", "steel tape")
    person.enter("Load 2, length along the beam", "1200", "steel tape", unit="mm")
    person.choose("Load 2, could someone take it away", "Yes")


def look(person: Person) -> None:
    for where in ("at the ends", "at mid-span", "along the underside"):
        person.choose(f"Look, {where}", SEEN)
    person.choose("Look, anything the sheet does not allow", "None of these")


def quantity(text: str, unit: str, means: str | None = None) -> dict[str, Any]:
    """A written number as the record keeps it."""
    return {"text": text, "unit": unit, **({"means": means} if means else {})}


def three_spans() -> Record:
    """The record that the touches above must make, built without the page."""
    record = blank()
    support = record["supports"][0]
    record["place"]["member"] = "B7"
    record["ends"] = {"left": "grid C", "right": "street"}
    record["spans"] = [{"measure": "clear", "length": quantity(length, "m", "tape"), "drawn": None} for _, length in SPANS]
    record["supports"] = [{**support, "name": name, "kind": "bearing", "bearing": quantity(bearing, "mm", "tape")}
                          for name, bearing in BEARINGS]
    record["section"]["identity"] = "same"
    record["self_weight"] = {"answer": "entered", "mass": quantity("31", "kg/m", "steel_table")}
    record["permanent"]["answer"] = "entered"
    record["restraint"] = {"answer": "full", "spacing": None}
    record["loads"] = [
        load("floor", "permanent", quantity("6.2", "kN/m", "design"), whole_beam=True, removable=False),
        load("pallet of blocks", "stored", quantity("8", "kN/m", "counted"), removable=True,
             length=quantity("1200 mm", "m", "tape"), position={
                 "from": "support", "support": 1, "side": "right", "at": "face", "to": "near_edge",
                 "distance": quantity("1.50", "m", "tape")})]
    record["limits"] = [{
        "document": "S-12", "revision": "", "issued_by": "", "kind": "resistance", "basis": "factored",
        "set": "en1990-6.10-str", "own": None, "covers": "all", "covers_loads": [], "span": None, "span_rule": "centres",
        "restraint": "full", "restraint_spacing": None, "moment_at": "centre", "entries": [
            {"criterion": kind, "value": quantity(figure, unit), "support": None, "zone": None, "width": None, "sag_under": None}
            for _, kind, figure, unit in LIMITS]}]
    record["condition"]["distress"] = {"ends": "none", "midspan": "none", "underside": "none"}
    record["condition"]["void"]["answer"] = "none"
    return record


def load(name: str, category: str, magnitude: dict[str, Any], **more: Any) -> dict[str, Any]:
    """A line load with everything else unanswered."""
    return {"name": name, "category": category, "form": "line", "magnitude": magnitude, "magnitude_end": None, "position": None,
            "length": None, "whole_beam": False, "source": "", "note": "", "photos": [], **more}


def without_names(record: Record) -> Record:
    """The record without what the page makes up itself: ids and times."""
    if isinstance(record, dict):
        skipped = {"id", "created", "changed", "found_at"}
        return {key: without_names(value) for key, value in record.items() if key not in skipped}
    return [without_names(one) for one in record] if isinstance(record, list) else record
