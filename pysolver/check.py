"""READ THIS FIRST. One check, from a record to its outcome.

    record --validated--> read_all --> model (beam, loads, criteria, factors)
           --> govern (best estimates, then the worst of the box) --> gaps and distress --> decide --> Result

Everything a person can have written wrongly ends as an InputError in `errors`, with its field; the numbers that can be
worked out all the same are worked out (J23). SI units and signs as in statics.py.
"""

from collections.abc import Generator
from dataclasses import dataclass
from typing import Any

from pysolver.combinations import sets
from pysolver.errors import InputError
from pysolver.facts import Gap, distressed, gaps
from pysolver.found import missing
from pysolver.governing import LIFTS, Governed, govern, infinite_hold_down, least_reaction
from pysolver.limits import set_of
from pysolver.model import Model, model, stiffness_known, stiffness_needed
from pysolver.outcome import Compared, Outcome, decide
from pysolver.readings import Readings, read_all
from pysolver.record import Record, contradictions, validated
from pysolver.searching import total_load
from pysolver.statics import Response, solve


@dataclass(frozen=True, slots=True, kw_only=True)
class Result:
    """What came out. model, governed and response are None while the beam is not complete."""

    record: Record
    readings: Readings
    errors: tuple[InputError, ...]
    outcome: Outcome
    compared: tuple[Compared, ...] = ()
    model: Model | None = None
    governed: Governed | None = None
    response: Response | None = None
    full: bool = True


def run_check(document: Any, *, full: bool = True) -> Result:
    """The whole check of a record. full: with ranges; otherwise best estimates only, while the ranges are worked out.

    Raises InputError only when the document is no record at all.
    """
    steps = check_in_slices(document, full=full)
    while True:
        try:
            next(steps)
        except StopIteration as end:
            result: Result = end.value
            return result


def check_in_slices(document: Any, *, full: bool = True) -> Generator[None, None, Result]:
    """run_check that yields between slices of work, so that a phone can answer others meanwhile, or give it up."""
    record = validated(document)
    readings = read_all(record)
    unfinished = [*contradictions(record), *blocking(readings), *missing(record, readings), *stiffness_asked(record, readings)]
    if unfinished:
        return _unfinished(record, readings, unfinished)
    try:
        ready = model(record, readings)
        layout = ready.layouts(ready.best_point()[None, :], ready.ways[0])[0]
        response = solve(layout.beam, layout.loads)
        facts = gaps(record, readings, layout, (*readings.errors, *ready.errors))
        governed = yield from govern(ready, facts, full=full)
    except InputError as error:
        return _unfinished(record, readings, [error])
    compared = (*governed.compared, *infinite_hold_down(ready, governed.best, governed.least))
    outcome = decide(compared, facts, distressed=distressed(record), uncovered=uncovered(ready, governed),
                     lifting=lifting(ready, governed), lifts_now=lifts_now(ready, governed, response),
                     from_memory=_from_memory(record))
    return Result(record=record, readings=readings, errors=(*readings.errors, *ready.errors), outcome=outcome,
                  compared=compared, model=ready, governed=governed, response=response, full=full)


def blocking(readings: Readings) -> list[InputError]:
    """Numbers of the beam and its loads that could not be read: a load that is not understood is not left out."""
    return [e for e in readings.errors if not e.field.startswith("/limits") and not e.field.startswith("/restraint")]


def stiffness_asked(record: Record, readings: Readings) -> list[InputError]:
    """J12: with springs, settlement or changes of EI the moments depend on EI, so it must be known."""
    if not stiffness_needed(record) or stiffness_known(record, readings):
        return []
    return [InputError(code="missing", field="/section/stiffness", message="With a spring, a settlement or a change of "
                       "stiffness the moments depend on the stiffness EI. Enter EI with its range.")]


def _unfinished(record: Record, readings: Readings, wrong: list[InputError]) -> Result:
    found = [Gap(text=error.message.rstrip("."), who="you, from where you stand", path=error.field) for error in wrong]
    outcome = decide([], found, distressed=distressed(record), uncovered=[], lifting=[], lifts_now=False, from_memory=False)
    known = {(e.field, e.message) for e in readings.errors}
    errors = (*readings.errors, *(e for e in wrong if (e.field, e.message) not in known and e.code != "missing"))
    return Result(record=record, readings=readings, errors=errors, outcome=outcome)


def _from_memory(record: Record) -> bool:
    used = {set_of(sheet) for sheet in record["limits"] if sheet["basis"] in ("factored", "unfactored")}
    return any(s in sets() and sets()[s].from_memory for s in used if s)


def lifting(ready: Model, governed: Governed) -> list[Gap]:
    """J20, until contact is solved: a bearing with a negative reaction in any case or corner is not judged."""
    found = []
    size = total_load(governed.best)
    for j in governed.best.layouts[0].real:
        support = ready.record["supports"][j]
        if support["kind"] != "bearing":
            continue
        share = min(governed.least.get(j, 0.0), least_reaction(governed.best, ready, j, at_best=True) / size)
        if share < -LIFTS:
            found.append(Gap(text=f"the end at {support['name']} would lift" if j in (0, len(ready.record["supports"]) - 1)
                             else f"the beam would lift off {support['name']}",
                             who="the office: a bearing that opens is not judged here", path=f"/supports/{j}/kind"))
    return found


def lifts_now(ready: Model, governed: Governed, response: Response) -> bool:
    """Whether a bearing opens under the load as it is, unfactored: over, by J20."""
    kinds = [ready.record["supports"][j]["kind"] for j in governed.best.layouts[0].real]
    size = total_load(governed.best)
    return any(kind == "bearing" and r < -LIFTS * size for kind, r in zip(kinds, response.reactions, strict=True))


def uncovered(ready: Model, governed: Governed) -> list[Gap]:
    """J22: sagging, hogging and shear must each have a limit wherever their effect is not zero, in any case and corner."""
    words = {"sagging": "sagging moment", "hogging": "hogging moment", "shear": "shear"}
    found = []
    for kind, place in governed.uncovered.items():
        has_any = any(one.criterion.kind == kind for one in ready.judged)
        found.append(Gap(text=f"no limit given for {words[kind]}" + (f" {place}" if has_any else ""),
                         who="the office that issued the limits", path="/limits"))
    return found
