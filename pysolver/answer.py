"""How is a Result told? One JSON object with the strings to show, for page, terminal and link.

Numbers on screen have three figures, ratios round up, and rounding never crosses a limit (J27); `numbers` holds full
precision for comparing two runs of the same record.
"""

import math
import platform
from collections.abc import Sequence
from dataclasses import asdict, replace
from typing import Any

import numpy as np

import pysolver
from pysolver.check import Result
from pysolver.display import System, show, show_beside, show_range, show_ratio
from pysolver.facts import distressed
from pysolver.figures import drawings
from pysolver.governing import least_reaction
from pysolver.limits import name_of_sheet
from pysolver.model import span_rule
from pysolver.outcome import CLEAR, CLOSE, WITHIN, Compared, lapsed, ruled_out, state, valid_until, what_now
from pysolver.record import VERSION, Record, moment
from pysolver.statics import extremes, solve
from pysolver.vocabulary import words

DIMENSION = {"sagging": "moment", "hogging": "moment", "shear": "force", "reaction": "force", "hold_down": "force",
             "sag": "small_length"}


def versions() -> dict[str, str]:
    """What computed an answer: it travels with every record, link and report."""
    return {"asfound": f"{pysolver.__version__} {pysolver.BUILD[:8]}", "python": platform.python_version(),
            "numpy": np.__version__, "record": str(VERSION)}


def answer(result: Result, now: str | None = None) -> dict[str, Any]:
    """The whole result for showing. now: ISO time with zone, for validity (J26)."""
    system: System = result.record["settings"]["display"]
    drawn, picks = drawings(result, system)
    return {
        "drawings": drawn, "picks": [asdict(pick) for pick in picks],
        "readings": readings(result, system), "errors": [_error(e) for e in result.errors],
        "outcome": outcome(result, system, now), "criteria": [criterion(result, c, system) for c in by_weight(result.compared)],
        "reactions": reactions(result, system), "compared": _compared_names(result), "not_compared": not_compared(result),
        "notes": notes(result, system), "cautions": words()["cautions"], "decisions": decisions(result, now),
        "clear_area": clear_area(result), "equilibrium": equilibrium(result), "numbers": numbers(result),
        "versions": versions()}


def _error(error: Any) -> dict[str, str]:
    return {"field": error.field, "code": error.code, "message": error.message}


def readings(result: Result, system: System) -> dict[str, dict[str, Any]]:
    """Every number that was read: its SI value, as shown, and its range."""
    told: dict[str, dict[str, Any]] = {}
    for path, m in result.readings.measured.items():
        dimension = "small_length" if m.dimension == "settlement" else m.dimension
        told[path] = {"value": m.best, "shown": show(dimension, m.best, system),
                      "range": "exact" if m.exact else show_range(dimension, m.low, m.high, system)}
    for path, value in result.readings.issued.items():
        told[path] = {"value": value, "shown": "", "range": "as issued"}
    return told


def outcome(result: Result, system: System, now: str | None) -> dict[str, Any]:
    """Word, title and the three lines of the bar."""
    decided = result.outcome
    record = result.record
    old = lapsed(record["found_at"], record["valid_until"], now)
    end = valid_until(record["found_at"], record["valid_until"])
    until = end.strftime("%H:%M") if end else "the end of this shift"
    first = f"as found earlier, look again. It was: {decided.title}" if old else decided.title
    memory = "; factors from memory" if decided.from_memory else ""
    chosen = record["decision"]["choice"] if record["decision"] else None
    contrary = [f"The decision written down, {_decision_label(chosen)}, is one that this outcome rules out."] \
        if chosen in ruled_out(decided, old=old) else []
    return {"word": decided.word, "title": decided.title, "reasons": [*decided.reasons, *contrary],
            "lines": [first, bar_numbers(decided.leading) + memory, what_now(decided, until, old=old)],
            "rules_out": ", ".join(_decision_label(d) for d in ruled_out(decided, old=old)) or "nothing",
            "missing": [{"text": g.text, "who": g.who, "path": g.path} for g in decided.gaps],
            "treated_as_over": decided.treated_as_over, "lapsed": old,
            "as_found": as_found(record["found_at"]),
            "until": until if decided.word in (WITHIN, CLOSE) else ""}


def as_found(found_at: str | None) -> str:
    """When the beam was found so, in the time of the place where it was found."""
    at = moment(found_at) if found_at else None
    if at is None:
        return "the time it was found is not stated"
    zone = at.strftime("%z")
    return f"as found at {at.day} {at:%B %Y, %H:%M} (UTC{zone[:3]}:{zone[3:5]})"


def _decision_label(choice: str) -> str:
    return next(str(d["label"]).lower() for d in words()["decisions"] if d["id"] == choice)


def bar_numbers(leading: Compared | None) -> str:
    """Second line of the bar, as short as it can be read: what governs, where, its ratio, and that of the worst case."""
    if leading is None or leading.ratio is None:
        return "No ratio can be given yet."
    title = leading.title.removeprefix("Bending, ")
    place, spanned, span = leading.place.partition(", span ")
    text = f"{title[:1].upper()}{title[1:]}, {place}{f' ({span})' * bool(spanned)}: {show_ratio(leading.ratio)}"
    return text if leading.high is None else f"{text}, worst {show_ratio(leading.high)}"


def by_weight(compared: Sequence[Compared]) -> list[Compared]:
    """Strength before sag, the nearest to its limit first."""
    return sorted(compared, key=lambda c: (c.kind == "sag", -max(c.high or 0.0, c.ratio or 0.0)))


def criterion(result: Result, one: Compared, system: System) -> dict[str, Any]:
    """One line of the governing list."""
    dimension = DIMENSION[one.kind]
    factored, limit = show_beside(dimension, abs(one.factored), one.capacity, system)
    high = show_beside(dimension, abs(one.worst), one.capacity, system)[0] if result.full else "working"
    return {"criterion": one.kind, "title": one.title, "state": state(one), "place": one.place,
            "worst_place": one.worst_place, "unfactored": show(dimension, abs(one.unfactored), system),
            "factored": factored, "high": high, "limit": limit,
            "ratio": show_ratio(one.ratio) if one.ratio is not None else "no ratio",
            "ratio_high": show_ratio(one.high) if one.high is not None else "",
            "note": criterion_note(one), "combination": one.case, "document": name_of_sheet(result.record, one.sheet)
            if result.record["limits"] else ""}


def criterion_note(one: Compared) -> str:
    parts = []
    if one.derived:
        parts.append(one.derived)
    if one.kind == "sag":
        parts.append("under all load, unfactored" if one.under == "total" else "under load added later, unfactored")
    if one.kind_of_limit == "design_effect":
        parts.append("compared with the effect of the designer's loads, not with a resistance")
    if one.searched and one.high is not None:
        parts.append("lengths and positions searched, not proven")
    if one.capacity == 0.0:
        parts.append("no hold-down figure was given, so none is counted on")
    parts += [f"waits for: {gap.text}" for gap in one.withheld[:1]]
    return "; ".join(parts)


def reactions(result: Result, system: System) -> list[dict[str, str]]:
    """Reactions: unfactored best estimate, and over all cases and ranges the least and the largest with factors."""
    if result.model is None or result.governed is None or result.response is None:
        return []
    best = result.governed.best
    told = []
    for i, j in enumerate(best.layouts[0].real):
        low = least_reaction(best, result.model, j, at_best=False)
        high = max((abs(c.worst) for c in result.compared if c.kind == "reaction"
                    and c.support == result.record["supports"][j]["name"]), default=None)
        told.append({"support": result.record["supports"][j]["name"],
                     "unfactored": show("force", float(result.response.reactions[i]), system),
                     "fixing": show("moment", float(result.response.fixing_moments[i]), system)
                     if result.response.fixing_moments[i] else "",
                     "low": show("force", low, system), "high": show("force", high, system) if high is not None else "no limit"})
    return told


def _compared_names(result: Result) -> list[str]:
    return [f"{c.title} with {name_of_sheet(result.record, c.sheet)}" for c in by_weight(result.compared)
            if c.ratio is not None and result.record["limits"]]


def not_compared(result: Result) -> list[str]:
    """What no number here speaks of (J22, J34)."""
    kinds = {c.kind for c in result.compared}
    own = [name for kind, name in (("sag", "sag"), ("reaction", "reactions")) if kind not in kinds]
    return own + list(words()["not_compared"])


def notes(result: Result, system: System) -> list[str]:
    """What an engineer would want to know of how the answer was reached."""
    if result.model is None or result.governed is None:
        return []
    record = result.record
    rule = "clear plus half the bearing, at most half the depth" if span_rule(record) == "effective" else \
        "centre to centre of bearings"
    told = [f"Effective span: {rule}."]
    if any(span["measure"] == "clear" for span in record["spans"]):
        told += _span_choice(result)
    if result.governed.varied:
        told.append(f"{len(result.governed.varied)} uncertain lengths, positions or stiffnesses were varied together; the "
                    "worst case of them was searched, not proven.")
    if result.governed.not_varied:
        names = ", ".join(path_name(record, path) for path in result.governed.not_varied)
        told.append(f"Not varied together with these, only each by itself, because others matter more: {names}.")
    if len(result.model.ways) > 1:
        told.append("Also run with the reactions at the front edges of the bearings, since the beam overhangs.")
    if "/section/stiffness" not in result.readings.measured:
        told.append("EI is not known: sag is not compared; M, V and reactions do not depend on it.")
    if any(e["value"] and e["criterion"] == "sag" for s in record["limits"] for e in s["entries"]) \
            and not any(c.kind == "sag" for c in result.compared):
        told.append("Sag has a limit but could not be compared.")
    return told


def _span_choice(result: Result) -> list[str]:
    """J8: what the other rule for the effective span would change."""
    assert result.model is not None and result.response is not None
    way = result.model.ways[0]
    other = replace(way, rule="centres" if way.rule == "effective" else "effective")
    layout = result.model.layouts(result.model.best_point()[None, :], other)[0]
    here, there = (max(abs(e.value) for e in extremes(r, "moment"))
                   for r in (result.response, solve(layout.beam, layout.loads)))
    if here == 0.0 or abs(there / here - 1.0) < 5e-4:
        return ["The other rule for the effective span would change the largest moment by less than 0.1 %."]
    return [f"The other rule for the effective span would change the largest moment by {100 * (there / here - 1):+.1f} %."]


def path_name(record: Record, path: str) -> str:
    """A field in words: the length of span A–B, the bearing at C, the place of "pack of paving"."""
    parts = path.strip("/").split("/")
    if parts[0] == "spans":
        i = int(parts[1])
        return f"length of span {record['supports'][i]['name']}–{record['supports'][i + 1]['name']}"
    if parts[0] == "supports":
        return f"{parts[2]} at {record['supports'][int(parts[1])]['name']}"
    if parts[0] == "loads":
        name = record["loads"][int(parts[1])]["name"].strip() or f"load {int(parts[1]) + 1}"
        return f"{'place' if parts[2] == 'position' else parts[2]} of {name}"
    return " ".join(p for p in parts if not p.isdigit())


def decisions(result: Result, now: str | None) -> list[dict[str, Any]]:
    """The decisions a person may pick, with those that the outcome rules out; nothing is preselected (J24)."""
    old = lapsed(result.record["found_at"], result.record["valid_until"], now)
    out = ruled_out(result.outcome, old=old)
    why = f"ruled out: {'as found earlier, look again' if old else result.outcome.title}"
    return [{"id": d["id"], "label": d["label"], "help": d["help"], "ruled_out": d["id"] in out,
             "why": why if d["id"] in out else ""} for d in words()["decisions"]]


def clear_area(result: Result) -> dict[str, list[str]] | None:
    """The full screen of three lines (J25)."""
    if result.outcome.word != CLEAR:
        return None
    why = "Distress was seen." if distressed(result.record) else "The load there now is above the factored resistance."
    return {"lines": ["Clear the area.", f"{why} Everyone away from on and under it.",
                      "Phone the person in charge. Nobody goes back to look."]}


def equilibrium(result: Result) -> str:
    if result.response is None:
        return ""
    return f"Loads and reactions balance to {max(result.response.residual, 1e-17):.0e} of the load."


def numbers(result: Result) -> dict[str, float]:
    """Full precision, by name; the part before the colon names quantities of one scale."""
    if result.response is None or result.governed is None:
        return {}
    told: dict[str, float] = {}
    for i, j in enumerate(result.governed.best.layouts[0].real):
        told[f"reaction N:{j + 1}{result.record['supports'][j]['name']}"] = float(result.response.reactions[i])
    for quantity, unit in (("shear", "N"), ("moment", "N·m"), *((("sag", "m"),) if _sag_known(result) else ())):
        top, bottom = extremes(result.response, quantity)
        told[f"{quantity} {unit}:largest"] = top.value
        if quantity != "sag":
            told[f"{quantity} {unit}:smallest"] = bottom.value
    for i, one in enumerate(result.compared):
        best = None if one.kind in ("reaction", "hold_down") else one.ratio  # a link is short: the worst is enough there
        for name, value in (("ratio", best), ("ratio_high", one.high)):
            if value is not None and math.isfinite(value):
                told[f"{name}:{i + 1} {one.title}"] = value
    return told


def _sag_known(result: Result) -> bool:
    return "/section/stiffness" in result.readings.measured
