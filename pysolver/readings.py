"""What do all the written numbers of a record say? Each is read once; what cannot be read is listed, not dropped.

A reading is keyed by the place of the number in the record (JSON pointer, e.g. /spans/0/length).
"""

from collections.abc import Iterator
from dataclasses import dataclass
from typing import Any

from pysolver.errors import InputError
from pysolver.measured import Measured, read_exact, read_measured
from pysolver.record import Record

FORM_DIMENSION = {"point": "force", "line": "line_load", "moment": "moment"}
ENTRY_DIMENSION = {"sagging": "moment", "hogging": "moment", "shear": "force", "reaction": "force", "hold_down": "force",
                   "line_load": "line_load", "area_load": "area_load", "sag": "small_length"}


@dataclass(frozen=True, slots=True, kw_only=True)
class Readings:
    """measured: numbers with a range; issued: numbers without one (limits, zones, drawn sizes); errors: what failed."""

    measured: dict[str, Measured]
    issued: dict[str, float]
    errors: tuple[InputError, ...]


def read_all(record: Record) -> Readings:
    """Read every written number of a valid record."""
    measured: dict[str, Measured] = {}
    issued: dict[str, float] = {}
    errors: list[InputError] = []
    for path, quantity, dimension, has_range in written(record):
        try:
            if not has_range:
                issued[path] = read_exact(quantity, dimension, path)
            else:
                measured[path] = _positive(read_measured(quantity, dimension, path), path, quantity["text"])
        except InputError as error:
            errors.append(error)
    return Readings(measured=measured, issued=issued, errors=tuple(errors))


def _positive(number: Measured, path: str, text: str) -> Measured:
    """A bearing or a depth is more than nothing at every end of its range; only a settlement may be an uplift."""
    if path.endswith(("/bearing", "/depth")) and number.low <= 0.0:
        raise InputError(code="negative", field=path, message=f"{text!r} cannot be a size: it, and all of its range, must be "
                         "more than zero. Measure again, or leave it unanswered.")
    return number


def written(record: Record) -> Iterator[tuple[str, dict[str, Any], str, bool]]:
    """(path, written number, dimension, has a range) of everything that is answered."""
    for path, quantity, dimension, has_range in _everything(record):
        if quantity is not None:
            yield path, quantity, dimension, has_range


def _everything(record: Record) -> Iterator[tuple[str, Any, str, bool]]:
    for i, span in enumerate(record["spans"]):
        yield f"/spans/{i}/length", span["length"], "length", True
        yield f"/spans/{i}/drawn", span["drawn"], "length", False
    for end in ("left", "right"):
        yield f"/overhangs/{end}", record["overhangs"][end], "length", True
    for i, support in enumerate(record["supports"]):
        for name, dimension in (("bearing", "small_length"), ("stiffness", "spring"), ("rotational", "rotational_spring"),
                                ("settlement", "settlement")):
            yield f"/supports/{i}/{name}", support[name], dimension, True
        yield f"/supports/{i}/bearing_drawn", support["bearing_drawn"], "small_length", False
    for i, hinge in enumerate(record["hinges"]):
        yield from _position(f"/hinges/{i}/position", hinge["position"], True)
    yield from _section(record)
    for i, load in enumerate(record["loads"]):
        dimension = FORM_DIMENSION.get(load["form"] or "", "")
        if dimension:
            yield f"/loads/{i}/magnitude", load["magnitude"], dimension, True
            yield f"/loads/{i}/magnitude_end", load["magnitude_end"], dimension, True
        yield f"/loads/{i}/length", load["length"], "length", True
        yield from _position(f"/loads/{i}/position", load["position"], True)
    for i, sheet in enumerate(record["limits"]):
        yield from _sheet(f"/limits/{i}", sheet)


def is_part_of_span(text: str) -> bool:
    """Whether a sag limit is written as a part of the span: "L/360", "/360"."""
    return text.replace(" ", "").upper().startswith(("L/", "/"))


def _section(record: Record) -> Iterator[tuple[str, Any, str, bool]]:
    section = record["section"]
    yield "/section/depth", section["depth"], "small_length", True
    yield "/section/stiffness", section["stiffness"], "bending_stiffness", True
    for i, zone in enumerate(section["zones"]):
        yield f"/section/zones/{i}/length", zone["length"], "length", False
        yield f"/section/zones/{i}/stiffness", zone["stiffness"], "bending_stiffness", True
        yield from _position(f"/section/zones/{i}/position", zone["position"], False)
    yield "/self_weight/mass", record["self_weight"]["mass"], "mass_per_length", True
    yield "/restraint/spacing", record["restraint"]["spacing"], "length", True


def _position(path: str, position: Any, has_range: bool) -> Iterator[tuple[str, Any, str, bool]]:
    if position is not None:
        yield f"{path}/distance", position["distance"], "length", has_range


def _sheet(path: str, sheet: Any) -> Iterator[tuple[str, Any, str, bool]]:
    yield f"{path}/span", sheet["span"], "length", False
    yield f"{path}/restraint_spacing", sheet["restraint_spacing"], "length", False
    for j, entry in enumerate(sheet["entries"]):
        at = f"{path}/entries/{j}"
        if not (entry["criterion"] == "sag" and entry["value"] and is_part_of_span(entry["value"]["text"])):
            yield f"{at}/value", entry["value"], ENTRY_DIMENSION[entry["criterion"]], False
        yield f"{at}/width", entry["width"], "length", False
        if entry["zone"] is not None:
            yield f"{at}/zone/length", entry["zone"]["length"], "length", False
            yield from _position(f"{at}/zone/position", entry["zone"]["position"], False)
