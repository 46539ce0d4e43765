"""Which limit holds where along the beam, and what keeps a limit from being used?

A sheet is one document of the designer with one basis, one coverage and one set of conditions; its entries become
criteria: (kind, sheet, capacity along the beam). A capacity is constant, or given in zones at distances on the member
that a tape can find; where zones overlap the lower holds, where none is given there is a gap (J7). SI units.
"""

from dataclasses import dataclass
from typing import Any

from pysolver.errors import InputError
from pysolver.found import Layout, zone_complete
from pysolver.readings import Readings
from pysolver.record import Record, from_no_support

STRENGTH = ("sagging", "hogging", "shear")
SAG_RATIO_RANGE = (50.0, 5000.0)


@dataclass(frozen=True, slots=True, kw_only=True)
class Stretch:
    """A capacity (N, N·m, m) that holds from start to end (m); None: over the whole beam."""

    capacity: float
    zone: str | None  # path of the zone in the record


@dataclass(frozen=True, slots=True, kw_only=True)
class Criterion:
    """One comparison: what is compared with which limit.

    kind: sagging, hogging, shear, reaction, hold_down or sag. support: index in the record for reactions. span_ratio: n
    of a sag limit L/n. derived: the limit was derived from a load and a span (J5). under: total or added (sag).
    """

    kind: str
    sheet: int
    stretches: tuple[Stretch, ...]
    support: int = -1
    span_ratio: float | None = None
    derived: str = ""
    under: str = "total"


def criteria(record: Record, readings: Readings) -> tuple[list[Criterion], list[InputError]]:
    """Every comparison that the record's limits ask for, and what is wrong with entries that give none."""
    found: list[Criterion] = []
    errors: list[InputError] = []
    known = {load["id"] for load in record["loads"]}
    for i, sheet in enumerate(record["limits"]):
        if not set(sheet["covers_loads"]) <= known:
            errors.append(InputError(code="no_load", field=f"/limits/{i}/covers_loads",
                                     message=f"{name_of_sheet(record, i)} covers a load that is not on the record. Pick its "
                                             "loads again."))
        grouped: dict[tuple[Any, ...], list[Stretch]] = {}
        for j, entry in enumerate(sheet["entries"]):
            path = f"/limits/{i}/entries/{j}"
            try:
                found += _special(record, readings, i, entry, path, grouped)
            except InputError as error:
                errors.append(error)
        for (kind, support, under), stretches in grouped.items():
            found.append(Criterion(kind=kind, sheet=i, support=support, stretches=tuple(stretches), under=under))
    return found, errors


def _special(record: Record, readings: Readings, sheet: int, entry: dict[str, Any], path: str,
             grouped: dict[tuple[Any, ...], list[Stretch]]) -> list[Criterion]:
    """Criteria that stand alone (L/n, derived from a load); plain values are put into `grouped` instead."""
    _refuse_incomplete(record, readings, entry, path)
    kind, under = entry["criterion"], entry["sag_under"] or "total"
    if kind == "sag" and f"{path}/value" not in readings.issued:
        if any(error.field == f"{path}/value" for error in readings.errors):
            return []
        return [Criterion(kind="sag", sheet=sheet, stretches=(), span_ratio=sag_ratio(entry["value"]["text"], f"{path}/value"),
                          under=under)]
    if f"{path}/value" not in readings.issued:
        return []
    value = readings.issued[f"{path}/value"]
    if value <= 0.0:
        raise InputError(code="limit", field=f"{path}/value",
                         message=f"The limit {entry['value']['text']} must be more than zero. Enter it without a sign: "
                                 "its kind says the direction.")
    if kind in ("line_load", "area_load"):
        return _derived(readings, sheet, kind, value, path)
    supports = [entry["support"]]
    if kind in ("reaction", "hold_down") and entry["support"] is None:
        supports = list(range(len(record["supports"])))
    for support in supports:
        zone = f"{path}/zone" if entry["zone"] is not None else None
        key = (kind, support if kind in ("reaction", "hold_down") else -1, under if kind == "sag" else "total")
        grouped.setdefault(key, []).append(Stretch(capacity=value, zone=zone))
    return []


def _refuse_incomplete(record: Record, readings: Readings, entry: dict[str, Any], path: str) -> None:
    """A line on the sheet that is not complete is never passed over: the outcome waits for it."""
    if entry["value"] is None:
        raise InputError(code="limit", field=f"{path}/value",
                         message="This limit has no figure yet. Enter it, or take its line off the sheet.")
    if entry["support"] is not None and entry["support"] >= len(record["supports"]):
        raise InputError(code="limit", field=f"{path}/support",
                         message="This limit is for a support that the beam does not have. Pick the support again.")
    if entry["zone"] is not None and from_no_support(entry["zone"]["position"], record):
        raise InputError(code="zone", field=f"{path}/zone",
                         message="Where this limit holds was measured from a support that the beam does not have. Pick it again.")
    if entry["zone"] is not None and not zone_complete(entry["zone"], f"{path}/zone", readings):
        raise InputError(code="zone", field=f"{path}/zone", message="Where this limit holds is not entered in full: give the "
                         "point it is measured from, the distance and the length, or let it hold over the whole beam.")


def sag_ratio(text: str, field: str) -> float:
    """n of "L/360" or "/360"."""
    try:
        n = float(text.upper().replace(" ", "").removeprefix("L").removeprefix("/"))
    except ValueError:
        n = float("nan")
    if not SAG_RATIO_RANGE[0] <= n <= SAG_RATIO_RANGE[1]:
        raise InputError(code="sag_limit", field=field,
                         message=f"{text!r} is not a sag limit. Write a length (20 mm) or a part of the span (L/360).")
    return n


def _derived(readings: Readings, sheet: int, kind: str, value: float, path: str) -> list[Criterion]:
    """M = w L^2/8 and V = w L/2 of the simple span that the load was issued for (J5)."""
    span = readings.issued.get(f"/limits/{sheet}/span")
    if span is None:
        raise InputError(code="limit_span", field=f"/limits/{sheet}/span",
                         message="A load as limit says nothing without the span that it was issued for. Enter that span.")
    width = readings.issued.get(f"{path}/width") if kind == "area_load" else 1.0
    if width is None:
        raise InputError(code="limit_width", field=f"{path}/width",
                         message="A load per area needs the width of floor that this beam carries. Enter that width.")
    w = value * width
    text = f"derived from {w / 1000:.3g} kN/m on a simple span of {span:.3f} m"
    whole = (("sagging", w * span**2 / 8), ("shear", w * span / 2))
    return [Criterion(kind=k, sheet=sheet, stretches=(Stretch(capacity=c, zone=None),), derived=text) for k, c in whole]


def is_simple_span(record: Record) -> bool:
    """One span on two supports that let it turn, no overhang, no hinge: the only system that a derived limit fits."""
    kinds = {s["kind"] for s in record["supports"]}
    overhangs = any(record["overhangs"][end] is not None for end in ("left", "right"))
    turning = any(s["rotational"] is not None for s in record["supports"])
    return (len(record["spans"]) == 1 and kinds <= {"bearing", "pinned"} and not overhangs and not record["hinges"]
            and not turning)


def capacity_at(criterion: Criterion, x: float, layout: Layout) -> float | None:
    """The capacity at x (m), the lower where two overlap; None in a gap."""
    if criterion.span_ratio is not None:
        return _sag_span(x, layout) / criterion.span_ratio
    here = [s.capacity for s in criterion.stretches
            if s.zone is None or layout.zones[s.zone][0] - 1e-9 <= x <= layout.zones[s.zone][1] + 1e-9]
    return min(here) if here else None


def _sag_span(x: float, layout: Layout) -> float:
    """The lesser of drawn and found span at x; of an overhang, or a cantilever, twice its length (J7)."""
    for i, (start, end) in enumerate(layout.spans):
        if start <= x <= end:
            span = min(end - start, layout.drawn.get(i, end - start))
            free = i not in layout.real or i + 1 not in layout.real
            return 2.0 * span if free else span
    first, last = layout.supports[0], layout.supports[-1]
    return 2.0 * (first if x < first else layout.beam.length - last)


def set_of(sheet: dict[str, Any]) -> str | None:
    """The id of the combination set with which a sheet is compared."""
    if sheet["basis"] == "unfactored" and sheet["set"] is None:
        return "unfactored"
    return sheet["set"]  # type: ignore[no-any-return]


def name_of_sheet(record: Record, index: int) -> str:
    sheet = record["limits"][index]
    name = sheet["document"].strip() or f"limit sheet {index + 1}"
    return f"{name} rev {sheet['revision'].strip()}" if sheet["revision"].strip() else name
