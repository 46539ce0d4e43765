"""What did the person write, and how is a number shown? Text to SI floats here, SI floats to text in display.py.

Nothing is guessed: a figure with two readings, a "ton", a bare number without a printed unit are asked (InputError).
The sign convention of each value is its field's; this module only refuses a minus where none has a meaning.
SI inside: m, N, N/m, N/m², N·m, N·m², N·m/rad. Spellings and factors: unit_table.py. Figures: number_text.py.
"""

from __future__ import annotations

import re
from dataclasses import dataclass
from decimal import Decimal
from fractions import Fraction

from pysolver.display import System, also, field_units, show, show_beside, show_range, show_ratio, show_room
from pysolver.errors import InputError, InternalError
from pysolver.number_text import inch_fraction, mixed, plain, readings
from pysolver.unit_table import DIMENSIONS, FOOT, INCH, KILOGRAM_FORCE, POUND_FORCE, UNITS, Unit, find_unit

__all__ = [
    "DIMENSIONS",
    "Parsed",
    "System",
    "also",
    "field_units",
    "parse",
    "show",
    "show_beside",
    "show_range",
    "show_ratio",
    "show_room",
]

MAX_CHARACTERS = 40
# Anything nearer to nothing than this is a slip, and would only upset a division later. No published source.
SMALLEST = Fraction(1, 10**9)

_FRACTIONS = {"½": "1/2", "¼": "1/4", "¾": "3/4", "⅛": "1/8", "⅜": "3/8", "⅝": "5/8", "⅞": "7/8"}
_ALIKE = str.maketrans(
    {
        **dict.fromkeys("’‘′´`ʹ", "'"),
        **dict.fromkeys("″”“ʺ", '"'),
        **dict.fromkeys("−–—‐‑‒﹣-", "-"),
        **dict.fromkeys("·⋅•∙×*∗", "·"),
        **dict.fromkeys("⁄∕", "/"),
        "²": "2",
        "^": "",
    }
)
_PARTS = re.compile(
    r"(?P<sign>[+-]?) ?(?P<figure>[0-9.,][0-9., /-]*?(?:[eE][+-]?[0-9]+)?) ?(?P<unit>[^0-9., /-].*)?",
    re.DOTALL,
)
_FEET_INCHES = re.compile(
    r"(?P<sign>[+-]?) ?(?P<feet>[0-9]{1,4}) ?(?:'|ft|feet|foot)\.? ?-? ?(?P<inches>[0-9][0-9., /-]*?) ?-?"
    r"(?: ?(?:\"|in|inch|inches)\.?)?",
    re.IGNORECASE,
)
_LENGTHS = ("length", "small_length")
# tonne: 1000 kg; US short ton: 2000 lb, long ton: 2240 lb (NIST SP 811 (2008), Appendix B.8)
_TONS = {"a tonne": 1000 * KILOGRAM_FORCE, "a US ton": 2000 * POUND_FORCE, "a long ton": 2240 * POUND_FORCE}


@dataclass(frozen=True, slots=True, kw_only=True)
class Parsed:
    """value: SI. unit: symbol used. text: what was read, in one form that reads back as the same value.

    converted: a mass (kg, t, lb) was taken as its weight with g = 9.80665 m/s²; the value is then shown beside it.
    """

    value: float
    unit: str
    text: str
    converted: bool


def parse(dimension: str, text: str, unit: str = "") -> Parsed:
    """Read what somebody wrote into a field of this dimension; unit is the one printed in the field, for a bare number.

    Raises InputError (codes: empty, too_long, not_a_number, ambiguous, unit_missing, unit_unknown, wrong_dimension,
    negative, too_large, too_small, inches) and InternalError for a dimension that does not exist.
    """
    if dimension not in DIMENSIONS:
        raise InternalError(code="dimension", message=f"There is no dimension {dimension!r}.")
    written = _one_form(dimension, text)
    feet = _FEET_INCHES.fullmatch(written) if dimension in _LENGTHS else None
    parsed = _feet_and_inches(feet, text) if feet else _figure_and_unit(dimension, written, text, unit)
    return _bounded(dimension, *parsed, text)


# --- reading -------------------------------------------------------------------------------------------------------


def _one_form(dimension: str, text: str) -> str:
    if len(text) > MAX_CHARACTERS:
        raise _error("too_long", f"{_quoted(text)} is longer than {MAX_CHARACTERS} characters. {_write(dimension)}")
    for sign, spelled in _FRACTIONS.items():
        text = text.replace(sign, f" {spelled}")
    text = " ".join(text.translate(_ALIKE).replace("''", '"').split())
    if not text:
        raise _error("empty", f"Nothing is written here. {_write(dimension)}")
    return text


Read = tuple[Fraction, Unit, str]  # exact SI value, unit used, text in one form


def _feet_and_inches(found: re.Match[str], text: str) -> Read:
    fraction = inch_fraction(found["inches"])
    # 1.200 inches has one reading here: 1200 inches would not follow feet
    figures: tuple[Fraction | Decimal, ...] = (fraction,) if fraction is not None else readings(found["inches"])
    if not figures:
        raise _error("not_a_number", f"The inches of {_quoted(text)} cannot be read. {_write('length')}")
    if figures[0] >= 12:
        raise _error("inches", f"{_quoted(text)} has 12 inches or more after the feet. Write the feet, then the "
                     "rest in inches.")
    inches = Fraction(figures[0])
    shown = plain(figures[0]) if isinstance(figures[0], Decimal) else mixed(inches)
    sign = -1 if found["sign"] == "-" else 1
    return (
        sign * (int(found["feet"]) * FOOT + inches * INCH),
        UNITS["length"]["ft"],
        f"{'-' * (sign < 0)}{int(found['feet'])}' {shown}\"",
    )


def _figure_and_unit(dimension: str, written: str, text: str, printed: str) -> Read:
    found = _PARTS.fullmatch(written)
    if not found:
        raise _unreadable(dimension, text)
    figure, spelled = found["figure"].strip(), (found["unit"] or "").strip()
    used = _unit(dimension, spelled, text, figure) if spelled else _printed_unit(dimension, printed, text, figure)
    minus = "-" if found["sign"] == "-" else ""
    fraction = inch_fraction(figure) if used.symbol in ("in", "ft") else None
    if fraction is not None:
        value, shown = fraction, mixed(fraction)
    else:
        metres = used.symbol == "m" and bool(spelled)
        decimal = _one_reading(dimension, readings(figure), text, used, metres=metres)
        value = Fraction(decimal)
        _below_cap(dimension, value * used.factor, text)  # before a figure like 1e300 is written out
        shown = plain(decimal, three_places_clear=metres)
    return (-value if minus else value) * used.factor, used, f"{minus}{shown} {used.symbol}".strip()


def _one_reading(dimension: str, found: tuple[Decimal, ...], text: str, unit: Unit, *, metres: bool) -> Decimal:
    """The only reading, or an error that asks.

    metres: the unit m was written with the figure. Then 5.623 m is what a tape reads to the millimetre, and its other
    reading, 5623 m, is kilometres, past the cap of every length: it is not asked. A bare 5.623 is.
    """
    if not found:
        raise _unreadable(dimension, text)
    if len(found) == 1 or metres:
        return found[0]
    small, large = (plain(value, three_places_clear=True) for value in found)
    ways = f"write {large} or {plain(found[0])}"
    if dimension in _LENGTHS and unit.symbol == "m":
        ways = f"write {small} m with its unit, or {large} mm"
    raise _error("ambiguous", f"{_quoted(text)} can mean {large} or {small}. To be clear, {ways}.")


def _printed_unit(dimension: str, printed: str, text: str, figure: str) -> Unit:
    if dimension == "number":
        return Unit(symbol="", factor=Fraction(1))
    if not printed.strip():
        raise _error("unit_missing", f"{_quoted(text)} has no unit. {_write(dimension)}")
    return _unit(dimension, " ".join(printed[:MAX_CHARACTERS].translate(_ALIKE).split()), printed, figure)


def _unit(dimension: str, spelled: str, text: str, figure: str) -> Unit:
    key = _spelling(spelled)
    _ask_ton_or_k(dimension, key, text, figure)
    unit = find_unit(dimension, key)
    if unit:
        return unit
    others = [name for name in DIMENSIONS if find_unit(name, key)]
    if others:
        raise _error("wrong_dimension", f"{_quoted(text)} is {DIMENSIONS[others[0]].name}; this field takes "
                     f"{DIMENSIONS[dimension].name}. {_write(dimension)}")
    of = f" of {_quoted(text)}" if spelled != text else ""
    raise _error("unit_unknown", f"The unit {_quoted(spelled)}{of} is not known here. {_write(dimension)}")


def _spelling(spelled: str) -> str:
    """One form for "kN m", "kN-m", "kN.m" and "kN·m"; "kN per m" and "kN / m"; "ft." and "ft"."""
    slashed = re.sub(r" ?/ ?", "/", re.sub(r"\bper\b", "/", spelled))
    return re.sub(r"[ .·-]+", "·", slashed.rstrip(" ."))


def _ask_ton_or_k(dimension: str, key: str, text: str, figure: str) -> None:
    numerator = key.partition("/")[0]
    if re.search(r"(?<![A-Za-z])(?:[Tt][Oo][Nn][SsFf]?|T)(?![A-Za-z])", numerator):
        found = readings(figure)
        count = found[0] if len(found) == 1 and abs(found[0]) < 10**6 else Decimal(1)
        weights = {name: show("force", float(Fraction(count) * factor)) for name, factor in _TONS.items()}
        ways = ", ".join(f"{weight} as {name}" for name, weight in weights.items())
        raise _error("ambiguous", f"{_quoted(text)} names a ton, and there are three: "
                     f"{plain(count, three_places_clear=True)} is {ways}. Write it in t (1000 kg), lb or kN.")
    if dimension == "force" and key in ("k", "K"):
        raise _error("ambiguous", f"{_quoted(text)} can mean kip or kN. Write kip (1000 lb) or kN.")


def _bounded(dimension: str, value: Fraction, unit: Unit, shown: str, text: str) -> Parsed:
    _below_cap(dimension, value, text)
    if value < 0 and not DIMENSIONS[dimension].negative:
        raise _error("negative", f"{_quoted(text)} is below zero, which has no meaning for "
                     f"{DIMENSIONS[dimension].name} here. Write it without the minus.")
    if value and abs(value) < SMALLEST:
        raise _error("too_small", f"{_quoted(text)} is as good as nothing. Check its unit, or write 0.")
    if not value:
        shown = shown.removeprefix("-")
    return Parsed(value=float(value), unit=unit.symbol, text=shown, converted=unit.mass)


def _below_cap(dimension: str, value: Fraction, text: str) -> None:
    cap = DIMENSIONS[dimension].cap
    if abs(value) >= cap:
        raise _error("too_large", f"{_quoted(text)} is more than any beam has: what is read here is below "
                     f"{show(dimension, float(cap)).replace('.00 ', ' ')}. Check the figure and its unit.")


# --- words ---------------------------------------------------------------------------------------------------------


def _write(dimension: str) -> str:
    return f"Write {DIMENSIONS[dimension].name}, for example {DIMENSIONS[dimension].example}."


def _unreadable(dimension: str, text: str) -> InputError:
    what = f"{_quoted(text)} cannot be read as {DIMENSIONS[dimension].name}."
    return _error("not_a_number", f"{what} {_write(dimension)}")


def _quoted(text: str) -> str:
    """What was read, shown without signs that a screen would act on (controls, changes of writing direction)."""
    cut = text[:MAX_CHARACTERS] + "…" * (len(text) > MAX_CHARACTERS)
    return f"“{''.join(c if c.isprintable() else '?' for c in cut)}”"


def _error(code: str, message: str) -> InputError:
    return InputError(code=code, message=message)
