"""Which facts are missing, and which make the limits void, before any number is compared?

A fact is asked, never assumed (J1 to J9). Each Gap names what is missing, who can give it without going under the beam,
the field, and what it withholds: everything, one limit sheet, or only the moment limits of a sheet. A gap with `void`
says that the limits do not belong to this beam as found: even a ratio above one then reads "cannot be judged; the
numbers alone are over" (J23).
"""

from collections.abc import Iterator, Sequence
from dataclasses import dataclass
from typing import Any

from pysolver.beam import SHORTEST
from pysolver.combinations import sets
from pysolver.display import System, show
from pysolver.errors import InputError
from pysolver.found import Layout
from pysolver.limits import is_simple_span, name_of_sheet, set_of
from pysolver.readings import Readings
from pysolver.record import Record
from pysolver.vocabulary import label

OFFICE = "the office that issued the limit"
YOU = "you, from where you stand"

TAPE = 0.010  # m, own rule: as far as a tape may be out, a span that was issued is not said to be longer

ALLOWED = {"unfactored": {"unfactored"}, "factored": {"factored"}}  # basis of the limit: basis of the set (J4)


@dataclass(frozen=True, slots=True, kw_only=True)
class Gap:
    """A missing fact. sheet None: it withholds every comparison; moments: only moment limits; void: see above."""

    text: str
    who: str
    path: str
    sheet: int | None = None
    moments: bool = False
    void: bool = False

    def withholds(self, sheet: int, kind: str) -> bool:
        """Whether the outcome of a criterion of this kind and sheet must wait for this fact."""
        return self.sheet in (None, sheet) and (not self.moments or kind in ("sagging", "hogging"))


def gaps(record: Record, readings: Readings, layout: Layout, wrong: Sequence[InputError]) -> list[Gap]:
    """All missing and voiding facts, those first that a person on site can answer at once. wrong: what of the limits
    could not be used; a limit that is on the sheet is never passed over."""
    found = [*_condition(record), *_member(record), *_permanent(record)]
    found += [Gap(text=error.message.rstrip("."), who=YOU, path=error.field, sheet=_sheet_index(error.field)) for error in wrong]
    for i, sheet in enumerate(record["limits"]):
        found += [*_sheet(record, i, sheet), *_span_and_restraint(record, readings, layout, i, sheet)]
    if any(load["category"] == "water" for load in record["loads"]):
        found.append(Gap(text="standing water deepens as the beam sags, and that is not worked out here: unload, keep off",
                         who=OFFICE, path="/loads"))
    if record["found_at"] is None:
        found.append(Gap(text="when the beam was found like this", who=YOU, path="/condition/distress/ends"))
    if not record["limits"]:
        found.append(Gap(text="no limit is entered", who=OFFICE, path="/limits"))
    return found


def _sheet_index(field: str) -> int | None:
    parts = field.split("/")
    return int(parts[2]) if parts[1] == "limits" and len(parts) > 2 else None


def distressed(record: Record) -> bool:
    """Whether any sign of distress was seen: it overrides every number (J25)."""
    return "something" in record["condition"]["distress"].values()


def _condition(record: Record) -> Iterator[Gap]:
    places = {"ends": "the ends", "midspan": "mid-span", "underside": "the underside"}
    for place, words in places.items():
        answer = record["condition"]["distress"][place]
        if answer is None:
            yield Gap(text=f"{words}: say whether you see distress", who=YOU, path=f"/condition/distress/{place}")
        if answer == "not_seen":
            yield Gap(text=f"{words} could not be seen", who="someone who can see it without going under the beam",
                      path=f"/condition/distress/{place}")
    void = record["condition"]["void"]
    if void["answer"] == "some" or void["which"]:
        which = ", ".join(label("void_reasons", w) for w in void["which"]) or "a reason that is not named"
        yield Gap(text=f"the limits may not hold for this beam: {which}", who=OFFICE, path="/condition/void", void=True)
    elif void["answer"] != "none":
        yield Gap(text="say whether anything on the list makes the limits void", who=YOU, path="/condition/void")


def _member(record: Record) -> Iterator[Gap]:
    identity = record["section"]["identity"]
    if identity == "different":
        yield Gap(text="the section found is not the one on the sheet, so its limits are not this beam's",
                  who=OFFICE, path="/section/identity", void=True)
    elif identity != "same":
        yield Gap(text="whether depth, width, thickness and way up are as on the sheet", who="whoever can measure the section",
                  path="/section/identity")


def _permanent(record: Record) -> Iterator[Gap]:
    covers = {sheet["covers"] for sheet in record["limits"]}
    answer = record["permanent"]["answer"]
    entered = any(load["category"] == "permanent" for load in record["loads"])
    if answer is None:
        yield Gap(text="say what rests on the beam permanently: entered, none or not known", who=YOU, path="/permanent/answer")
    elif answer == "not_known":
        yield Gap(text="what rests on the beam permanently", who="the drawings or the office", path="/permanent/answer")
    elif answer == "entered" and not entered:
        yield Gap(text="the permanent load is said to be entered, but no load is permanent", who=YOU, path="/loads")
    own = record["self_weight"]["answer"]
    if own == "in_permanent" and answer == "none":
        yield Gap(text="the beam's own weight is said to be in the permanent load, but that is said to be none", who=YOU,
                  path="/self_weight/answer")
    if covers & {"all", None} and (own in (None, "not_known") or (own == "entered" and record["self_weight"]["mass"] is None)):
        yield Gap(text="the beam's own weight", who="the drawings or a section table", path="/self_weight/answer")


def _sheet(record: Record, i: int, sheet: dict[str, Any]) -> Iterator[Gap]:
    name, path = name_of_sheet(record, i), f"/limits/{i}"
    if sheet["kind"] is None:
        yield Gap(text=f"{name}: whether the limits are resistances or the effect of the designer's loads", who=OFFICE,
                  path=f"{path}/kind", sheet=i)
    if sheet["basis"] in (None, "not_known"):
        yield Gap(text=f"{name}: whether the limits are factored or unfactored", who=OFFICE, path=f"{path}/basis", sheet=i)
    elif set_of(sheet) is None:
        yield Gap(text=f"{name}: which combination of loads the factored limits belong to", who=OFFICE, path=f"{path}/set",
                  sheet=i)
    if sheet["covers"] is None:
        yield Gap(text=f"{name}: which loads the limits cover", who=OFFICE, path=f"{path}/covers", sheet=i)
    if sheet["covers"] == "added" and not sheet["covers_loads"]:
        yield Gap(text=f"{name}: which of the loads were added later", who=OFFICE, path=f"{path}/covers_loads", sheet=i)
    if any(e["criterion"] in ("line_load", "area_load") for e in sheet["entries"]) and not is_simple_span(record):
        yield Gap(text=f"{name}: a load as limit fits a simple span only, and this beam is none", who=OFFICE,
                  path=f"{path}/entries", sheet=i, void=True)


def _span_and_restraint(record: Record, readings: Readings, layout: Layout, i: int, sheet: dict[str, Any]) -> Iterator[Gap]:
    """J6: a moment limit that is not fully restrained holds only up to the span and restraint spacing it was issued for."""
    if not any(e["criterion"] in ("sagging", "hogging", "line_load", "area_load") for e in sheet["entries"]):
        return
    name, path = name_of_sheet(record, i), f"/limits/{i}"
    found, answer = record["restraint"], record["restraint"]["answer"]
    if sheet["restraint"] in (None, "not_stated"):
        yield Gap(text=f"{name}: for what sideways restraint the moment limit was issued", who=OFFICE,
                  path=f"{path}/restraint", sheet=i, moments=True)
        return
    if answer in (None, "not_seen"):
        yield Gap(text="how the beam is held sideways", who="whoever can see its top and its sides", path="/restraint/answer",
                  sheet=i, moments=True)
    if sheet["restraint"] == "full":
        if answer == "spacing":
            yield Gap(text=f"{name} counts on full sideways restraint, which was not found", who=OFFICE,
                      path="/restraint/answer", sheet=i, moments=True, void=True)
        return
    system = record["settings"]["display"]
    yield from _issued_span(readings, layout, i, name, system)
    yield from _issued_spacing(readings, i, name, found, system)


def _issued_span(readings: Readings, layout: Layout, i: int, name: str, system: System) -> Iterator[Gap]:
    issued = readings.issued.get(f"/limits/{i}/span")
    if issued is None:
        yield Gap(text=f"{name}: for what span the moment limit was issued", who=OFFICE, path=f"/limits/{i}/span", sheet=i,
                  moments=True)
        return
    for_span = show("length", issued, system)
    for what, path, found in _lengths(layout):
        measured = readings.measured[path]
        if found > issued + TAPE:
            yield Gap(text=f"the {what} found, {show('length', found, system)}, is longer than the {for_span} that {name} was "
                           "issued for",
                      who=OFFICE, path=path, sheet=i, moments=True, void=True)
            return
        if found + measured.high - measured.best > issued + 2 * TAPE:
            yield Gap(text=f"whether the {what} is longer than the {for_span} that {name} was issued for: it may be",
                      who="whoever can tape it", path=path, sheet=i, moments=True)


def _lengths(layout: Layout) -> Iterator[tuple[str, str, float]]:
    """(what, path, m) of every span, and of every overhang: an overhang that is longer than the issued span has a longer
    compression flange too."""
    for k, (start, end) in enumerate(layout.spans):
        yield "span", f"/spans/{k}/length", end - start
    if layout.supports[0] > SHORTEST:
        yield "overhang", "/overhangs/left", layout.supports[0]
    if layout.beam.length - layout.supports[-1] > SHORTEST:
        yield "overhang", "/overhangs/right", layout.beam.length - layout.supports[-1]


def _issued_spacing(readings: Readings, i: int, name: str, found: dict[str, Any], system: System) -> Iterator[Gap]:
    issued = readings.issued.get(f"/limits/{i}/restraint_spacing")
    if issued is None:
        yield Gap(text=f"{name}: for what restraint spacing the moment limit was issued", who=OFFICE,
                  path=f"/limits/{i}/restraint_spacing", sheet=i, moments=True)
        return
    if found["answer"] != "spacing":
        return
    spacing = readings.measured.get("/restraint/spacing")
    if spacing is None:
        yield Gap(text="the distance between the places where the beam is held sideways", who="whoever can see its top",
                  path="/restraint/spacing", sheet=i, moments=True)
    elif spacing.best <= issued + TAPE < spacing.high - TAPE:
        yield Gap(text=f"whether the restraint spacing is wider than the {show('length', issued, system)} of {name}: it may be",
                  who="whoever can tape it", path="/restraint/spacing", sheet=i, moments=True)
    elif spacing.best > issued + TAPE:
        yield Gap(text=f"the restraint spacing found, {show('length', spacing.best, system)}, is wider than the "
                       f"{show('length', issued, system)} of {name}",
                  who=OFFICE, path="/restraint/spacing", sheet=i, moments=True, void=True)


def wrong_pairs(record: Record) -> list[InputError]:
    """Limits whose basis and combination set do not belong together (J4), and sets that are not known."""
    errors = []
    for i, sheet in enumerate(record["limits"]):
        chosen, basis = set_of(sheet), sheet["basis"]
        if chosen is None or basis in (None, "not_known"):
            continue
        if chosen not in sets():
            errors.append(InputError(code="set", field=f"/limits/{i}/set",
                                     message=f"The combination set {chosen!r} is not known to this version of the app."))
        elif sets()[chosen].basis not in ALLOWED[basis]:
            errors.append(InputError(code="basis", field=f"/limits/{i}/set", message=f"A limit that is {basis} cannot be "
                                     f"compared with \"{sets()[chosen].label}\". Unfactored limits go with unfactored or ASD "
                                     "effects, factored limits with EN 1990, LRFD or own factors."))
    return errors
