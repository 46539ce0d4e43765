"""What is the outcome, why, and what does it rule out?

The outcome is the most severe of numbers, condition and missing facts (J23). Pure functions from compared numbers and
gaps to words; no arithmetic of loads happens here. The words are those of the rules: within, close, over, cannot be
judged, clear the area. Nothing here permits anything: decisions are a person's (J24).
"""

from collections.abc import Sequence
from dataclasses import dataclass
from datetime import datetime, timedelta

from pysolver.facts import Gap
from pysolver.record import moment

WITHIN, CLOSE, OVER, CANNOT, CLEAR, WORKING = "within", "close", "over", "cannot", "clear", "working"
SEARCH_MARGIN = 0.98  # J15: a searched worst within 2 % of the limit is close
VALID_HOURS = 12  # own rule, no published source: an outcome without a stated validity lapses after a shift

TITLE = {"sagging": "Bending, sagging", "hogging": "Bending, hogging", "shear": "Shear", "reaction": "Reaction",
         "hold_down": "Hold-down", "sag": "Sag"}


@dataclass(frozen=True, slots=True, kw_only=True)
class Compared:
    """One criterion with its numbers. x in m, effects in SI.

    unfactored, factored: effects at best estimate at the governing place; worst: of the whole box; bare: the ratio of the
    unfactored best estimate where that is largest; ratio, low, high: of best estimate, at the relieving ends of the loads,
    of the box (None: basis or coverage allow none, or not worked out yet).
    """

    kind: str
    sheet: int
    support: str | None
    kind_of_limit: str | None
    basis: str | None
    place: str
    x: float
    unfactored: float
    bare: float
    factored: float
    worst: float
    capacity: float
    ratio: float | None
    low: float | None
    high: float | None
    case: str
    searched: bool
    worst_place: str
    derived: str = ""
    under: str = "total"
    withheld: tuple[Gap, ...] = ()
    ranged: bool = True

    @property
    def title(self) -> str:
        name = TITLE[self.kind]
        return f"{name} at {self.support}" if self.support else name

    @property
    def over_either_way(self) -> bool:
        """J4: without a basis there is no ratio, but the unfactored effect alone may exceed the figure."""
        return self.ratio is None and self.bare > 1.0


def state(one: Compared) -> str:
    """within, close, over or cannot for one criterion by itself; working while its range is not worked out yet."""
    if numbers_over(one):
        voided = any(gap.void for gap in one.withheld)
        return CANNOT if voided else OVER
    if one.ratio is None or one.withheld:
        return CANNOT
    if one.high is None:
        return WORKING
    if one.high > 1.0 or (one.searched and one.high > SEARCH_MARGIN) or not one.ranged:
        return CLOSE
    return WITHIN


def numbers_over(one: Compared) -> bool:
    """Whether the numbers alone are above the limit, whatever withholds the outcome."""
    return one.over_either_way or (one.ratio is not None and one.ratio > 1.0)


def beyond_resistance(one: Compared) -> bool:
    """J23: the unfactored best estimate above a factored resistance."""
    return (one.kind_of_limit == "resistance" and one.basis == "factored" and one.kind != "sag"
            and one.bare > 1.0)


@dataclass(frozen=True, slots=True, kw_only=True)
class Outcome:
    """The word, its title, the reasons, the gaps in order, what it rules out, and whether it counts as over."""

    word: str
    title: str
    reasons: tuple[str, ...]
    gaps: tuple[Gap, ...]
    treated_as_over: bool
    leading: Compared | None
    from_memory: bool


def decide(compared: Sequence[Compared], gaps: Sequence[Gap], *, distressed: bool, uncovered: Sequence[Gap],
           lifting: Sequence[Gap], lifts_now: bool, from_memory: bool) -> Outcome:
    """The outcome of a check. uncovered: kinds of effect without a limit (J22); lifting: bearings that would open (J20);
    lifts_now: one of them under the load as it is, which counts as over."""
    strength = [c for c in compared if c.kind != "sag"]
    every_gap = (*gaps, *lifting, *uncovered)
    over = [c for c in strength if numbers_over(c)]
    leading = _leading(strength)
    memory = ("The factors of this set are from memory: check them against the standard.",) if from_memory else ()

    def made(word: str, title: str, reasons: Sequence[str], treated: bool = False) -> Outcome:
        title = title if word == CLEAR else title + sag_words(compared)
        return Outcome(word=word, title=title, reasons=(*reasons, *memory), gaps=every_gap, treated_as_over=treated,
                       leading=leading, from_memory=from_memory)

    if distressed:
        return made(CLEAR, "clear the area: distress was seen", ["Distress overrides the numbers."], True)
    crushed = [c for c in strength if beyond_resistance(c)]
    if crushed:
        return made(CLEAR, f"clear the area: {named(crushed)} without any factor is above the factored resistance",
                    ["The load that is there now, unfactored and as estimated, is above the factored resistance."], True)
    plainly = [c for c in over if state(c) == OVER]
    if plainly:
        return made(OVER, over_title(plainly), [over_reason(c) for c in plainly], True)
    if over:
        return made(CANNOT, "cannot be judged; the numbers alone are over", [g.text for g in every_gap], True)
    if every_gap or not strength or any(state(c) == CANNOT for c in strength):
        first = every_gap[0].text if every_gap else "no limit can be compared"
        return made(CANNOT, f"cannot be judged: {first}", [g.text for g in every_gap], lifts_now)
    if any(state(c) == WORKING for c in strength):
        return made(WORKING, "best estimate within; the ranges follow", [])
    near = [c for c in strength if state(c) == CLOSE]
    if near:
        unranged = all(not c.ranged for c in near)
        title = "close: ranges not stated" if unranged else f"close to the entered limits: {named(near)}"
        return made(CLOSE, title, [close_reason(c) for c in near])
    return made(WITHIN, f"within the entered limits: {named(strength)}", [])


def sag_words(compared: Sequence[Compared]) -> str:
    """What is said of sag, apart from strength: "" when it is within or not compared."""
    states = {state(c) for c in compared if c.kind == "sag"}
    return "; sag over" if OVER in states else "; sag close" if CLOSE in states else ""


def named(compared: Sequence[Compared]) -> str:
    """bending, shear, reaction: what was compared, in few words."""
    words = {"sagging": "bending", "hogging": "bending", "shear": "shear", "reaction": "reaction", "hold_down": "hold-down",
             "sag": "sag"}
    return ", ".join(dict.fromkeys(words[c.kind] for c in compared))


def over_title(over: Sequence[Compared]) -> str:
    if any(c.over_either_way for c in over):
        return f"over on either reading: {named(over)}"
    if all(c.kind_of_limit == "design_effect" for c in over):
        return f"over the designer's figure: {named(over)}"
    return f"over the entered limit: {named(over)}"


def over_reason(one: Compared) -> str:
    if one.over_either_way:
        return f"{one.title}: the unfactored effect alone exceeds the figure, whichever basis it has."
    figure = "the designer's figure" if one.kind_of_limit == "design_effect" else "the limit"
    return f"{one.title}: the best estimate is above {figure} {one.place}."


def close_reason(one: Compared) -> str:
    if not one.ranged:
        return f"{one.title}: no number has a range, so how far it may be out is not known."
    if one.high is not None and one.high > 1.0:
        return f"{one.title}: the best estimate is within, the worst case is over."
    return f"{one.title}: the worst case that was found is within 2 % of the limit, searched and not proven."


def _leading(strength: Sequence[Compared]) -> Compared | None:
    """The criterion that governs: the largest worst ratio, else the largest best ratio."""
    with_ratio = [c for c in strength if c.ratio is not None]
    if not with_ratio:
        return None
    return max(with_ratio, key=lambda c: (max(c.high or 0.0, c.ratio or 0.0)))


RULED_OUT = {WITHIN: (), WORKING: (), CLOSE: ("carry_on",), CANNOT: ("carry_on",), OVER: ("carry_on", "hold"),
             CLEAR: ("carry_on", "hold", "unload")}


def ruled_out(outcome: Outcome, *, old: bool = False) -> tuple[str, ...]:
    """The decisions that the outcome rules out (J24); what is treated as over rules out as much as over. old: lapsed, so
    nobody carries on by it (J26)."""
    if outcome.word != CLEAR and outcome.treated_as_over:
        return RULED_OUT[OVER]
    return RULED_OUT[outcome.word] or (("carry_on",) if old else ())


def what_now(outcome: Outcome, until: str, *, old: bool = False) -> str:
    """The third line of the bar: what the outcome rules out, and what to do meanwhile."""
    if outcome.word == CLEAR:
        return "Everyone away from on and under it, now. Then phone."
    if outcome.treated_as_over:
        return "Rules out holding: take load off, nobody on or under it, tell the person in charge."
    if outcome.word in (CLOSE, CANNOT) or old:
        return "Rules out carrying on: add nothing, measure again or phone."
    if outcome.word == WITHIN:
        return f"Nothing here stops the work; nothing moved or added until {until} or any change."
    return "Working on the ranges. Add nothing meanwhile."


def valid_until(found_at: str | None, stated: str | None) -> datetime | None:
    """When the outcome lapses (J26): as stated, else VALID_HOURS after it was found; None when neither is given."""
    if stated:
        return moment(stated)
    found = moment(found_at) if found_at else None
    return found + timedelta(hours=VALID_HOURS) if found else None


def lapsed(found_at: str | None, stated: str | None, now: str | None) -> bool:
    """Whether the outcome is now "as found earlier, look again": too old, or found in the future by a wrong clock."""
    end, at = valid_until(found_at, stated), moment(now) if now else None
    found = moment(found_at) if found_at else None
    if at is None:
        return False
    return (end is not None and at > end) or (found is not None and found > at + timedelta(hours=1))
