"""The worked demonstration: an invented roof-garden terrace, an invented drawing, nobody real.

Beam T4 was drawn with 5.40 + 4.20 m clear spans. On site two packs of paving were set down in the longer span and the
soil tray is already laid. The check comes out close: worth weighing a pack.
"""

from typing import Any

from pysolver.record import Record, blank


def quantity(text: str, means: str | None = None, **more: str) -> dict[str, Any]:
    """A written number as the page stores it."""
    return {"text": text, **({"means": means} if means else {}), **more}


def from_support(index: int, distance: str, means: str, *, to: str = "middle", at: str = "face") -> dict[str, Any]:
    """A position taped from the right-hand side of a support."""
    return {"from": "support", "support": index, "side": "right", "at": at, "to": to, "distance": quantity(distance, means)}


def load(id_: str, name: str, category: str, form: str, magnitude: dict[str, Any], **more: Any) -> Record:
    """A load with everything else unanswered."""
    return {"id": id_, "name": name, "category": category, "form": form, "magnitude": magnitude, "magnitude_end": None,
            "position": None, "length": None, "whole_beam": False, "source": "", "removable": None, "note": "", "photos": [],
            **more}


def entry(id_: str, criterion: str, value: str, **more: Any) -> Record:
    """One limit of a sheet, over the whole beam."""
    return {"id": id_, "criterion": criterion, "value": quantity(value), "support": None, "zone": None, "width": None,
            "sag_under": None, **more}


def demo() -> Record:
    """The demonstration record; the page gives it a new id and times."""
    record = blank()
    record.update(id="demo")
    record["place"] = {"site": "Terrace over the boat hall (invented)", "member": "T4", "drawing": "TG-17", "revision": "B",
                       "stage": "deck laid, planting not yet"}
    record["ends"] = {"left": "hall wall", "right": "quay side"}
    record["found_by"] = {"name": "", "role": "site engineer", "phone": ""}
    record["spans"] = [{"measure": "clear", "length": quantity("5.40 m", "tape"), "drawn": quantity("5.40 m")},
                       {"measure": "clear", "length": quantity("4.20 m", "tape"), "drawn": quantity("4.20 m")}]
    for index, bearing in enumerate(("200 mm", "240 mm", "200 mm")):
        if index == 2:
            record["supports"].append({**record["supports"][1], "name": "C"})
        record["supports"][index].update(kind="bearing", bearing=quantity(bearing, "tape"), bearing_drawn=quantity(bearing))
    record["section"].update(identity="same", depth=quantity("300 mm", "tape"), stiffness=quantity("17500 kNm2", "steel_table"))
    record["self_weight"] = {"answer": "entered", "mass": quantity("42.2 kg/m", "steel_table")}
    record["permanent"] = {"answer": "entered"}
    record["restraint"] = {"answer": "full", "spacing": None}
    record["loads"] = [
        load("deck", "terrace deck and soil tray", "permanent", "line", quantity("7.4 kN/m", "volume"), whole_beam=True),
        load("pack1", "pack of paving", "stored", "line", quantity("16 kN/m", "counted"), length=quantity("1.00 m", "tape"),
             position=from_support(0, "1.90 m", "tape", to="near_edge"), source="paving", removable=True),
        load("pack2", "second pack of paving", "stored", "line", quantity("16 kN/m", "counted"),
             length=quantity("1.00 m", "tape"), position=from_support(0, "3.10 m", "tape", to="near_edge"), source="paving",
             removable=True)]
    record["limits"] = [{
        "id": "s1", "document": "TG-17", "revision": "B", "issued_by": "the terrace's designer", "kind": "resistance",
        "basis": "factored", "set": "en1990-6.10-str", "own": None, "covers": "all", "covers_loads": [],
        "span": quantity("5.62 m"), "span_rule": "centres", "restraint": "full", "restraint_spacing": None,
        "moment_at": "centre", "entries": [
            entry("e1", "sagging", "70 kNm"), entry("e2", "hogging", "80 kNm"), entry("e3", "shear", "120 kN"),
            entry("e4", "reaction", "210 kN"), entry("e5", "sag", "L/250", sag_under="total")]}]
    record["condition"]["distress"] = {"ends": "none", "midspan": "none", "underside": "none"}
    record["condition"]["void"]["answer"] = "none"
    return record
