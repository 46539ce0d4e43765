"""What travels with a record, and do the numbers come out the same when it is opened elsewhere?

A carried document is {"record", "numbers", "outcome", "versions"}: the record with the SI value beside every written
number, the numbers worked out from it, and what worked them out. Opening it recomputes everything; numbers agree when
they differ by no more than 1e-9 of the largest number of their kind.
"""

import copy
from typing import Any

from pysolver.answer import answer, numbers, versions
from pysolver.check import Result, run_check
from pysolver.errors import InputError
from pysolver.readings import written
from pysolver.record import Record, validated

AGREEMENT = 1e-9
MAX_NUMBERS = 2000


def carried(document: Any) -> dict[str, Any]:
    """A record as it travels. Raises InputError when it is no record."""
    result = run_check(document)
    return {"record": with_values(result), "numbers": {k: float(f"{v:.9e}") for k, v in numbers(result).items()},
            "versions": versions(), "outcome": {"word": result.outcome.word, "title": result.outcome.title}}


def short(document: dict[str, Any]) -> dict[str, Any]:
    """A carried document for a link: without the values beside the written numbers, which are read again from the text."""
    light = copy.deepcopy(document)
    for _, quantity, _, _ in written(light["record"]):
        quantity.pop("value", None)
    return light


def with_values(result: Result) -> Record:
    """The record with the value that was read kept beside each written number."""
    record = copy.deepcopy(result.record)
    values = {**{p: m.best for p, m in result.readings.measured.items()}, **result.readings.issued}
    for path, quantity, _, _ in written(record):
        if path in values:
            quantity["value"] = values[path]
    return record


def opened(document: dict[str, Any], now: str | None = None) -> dict[str, Any]:
    """Recompute a carried document (or a bare record) and say whether its numbers come out the same."""
    bare = "record" not in document
    record = validated(document if bare else document["record"])
    result = run_check(record)
    told = {"record": record, "result": answer(result, now), "recorded": {"numbers": {}, "versions": {}, "outcome": None}}
    if bare:
        return {**told, "agreement": {"equal": None, "shown": "No numbers were recorded with it; these are worked out here.",
                                      "differs": []}}
    kept, made_by = _numbers(document.get("numbers")), _texts(document.get("versions"))
    outcome = _texts(document.get("outcome"))
    differs = differences(kept, numbers(result))
    if outcome.get("word") != result.outcome.word:
        differs.append({"name": "outcome", "recorded": outcome.get("word", ""), "now": result.outcome.word})
    return {**told, "recorded": {"numbers": kept, "versions": made_by, "outcome": outcome},
            "agreement": {"equal": not differs, "differs": differs, "shown": _agreement_text(differs, made_by)}}


def differences(kept: dict[str, float], now: dict[str, float]) -> list[dict[str, Any]]:
    """Every name whose numbers differ by more than AGREEMENT of the largest of their kind (the part before the colon)."""
    scale: dict[str, float] = {}
    for name, value in [*kept.items(), *now.items()]:
        kind = name.partition(":")[0]
        scale[kind] = max(scale.get(kind, 0.0), abs(value))
    found = []
    for name in sorted({*kept, *now}):
        a, b = kept.get(name), now.get(name)
        if a is None or b is None or abs(a - b) > AGREEMENT * scale[name.partition(":")[0]]:
            found.append({"name": name, "recorded": a, "now": b})
    return found


def _numbers(value: Any) -> dict[str, float]:
    """The recorded numbers, from a stranger: names are texts, values finite numbers, or it is refused."""
    good = isinstance(value, dict) and len(value) <= MAX_NUMBERS and all(
        isinstance(v, int | float) and not isinstance(v, bool) and abs(v) < 1e300 and len(k) <= 200
        for k, v in value.items())
    if not good:
        raise InputError(code="numbers", field="/numbers", message="The numbers recorded with this check are damaged. Ask for "
                         "the link or the file again.")
    return {str(k): float(v) for k, v in value.items()}


def _texts(value: Any) -> dict[str, str]:
    return {str(k)[:40]: str(v)[:200] for k, v in list(value.items())[:20]} if isinstance(value, dict) else {}


def _agreement_text(differs: list[dict[str, Any]], made_by: dict[str, str]) -> str:
    then = f"asfound {made_by.get('asfound', '?')}, Python {made_by.get('python', '?')}, numpy {made_by.get('numpy', '?')}"
    here = versions()
    now = f"asfound {here['asfound']}, Python {here['python']}, numpy {here['numpy']}"
    if not differs:
        return f"Recomputed here: the numbers equal the recorded ones. Recorded with {then}; recomputed with {now}."
    return (f"Recomputed here: {len(differs)} of the numbers differ from the recorded ones. Recorded with {then}; "
            f"recomputed with {now}.")
