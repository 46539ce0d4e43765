"""How is an SI number shown? Three significant figures with its unit, in metric or US units.

Ratios round up, room rounds down, and rounding never moves a number to the other side of a limit. Whatever is shown
reads back with units.parse. Zero and what rounds to zero are shown as a plain 0.
- Lengths are shown as a tape reads: m to the millimetre (5.62 m, 5.623 m), feet and inches to 1/16.
- Small lengths (bearings, depths, sag): mm, never coarser than 1 mm; decimal inches.
- US forces, line loads and area loads below one kip are in lb, plf and psf.
"""

from __future__ import annotations

import math
from decimal import ROUND_CEILING, ROUND_FLOOR, ROUND_HALF_UP, Context, Decimal
from fractions import Fraction
from typing import Literal, NotRequired, TypedDict

from pysolver.errors import InternalError
from pysolver.number_text import mixed, readings
from pysolver.unit_table import FOOT, INCH, find_unit

System = Literal["metric", "us"]


class FieldUnits(TypedDict):
    """unit: printed in the field when nothing else is picked. keys: units offered on the pad, in order."""

    unit: str
    keys: list[str]


class _Rule(TypedDict):
    unit: str  # spelling in unit_table
    symbol: str
    below_one: NotRequired[tuple[str, str]]  # unit and symbol for magnitudes under one of the first
    places: NotRequired[int]  # no more decimals than this
    coarsest: NotRequired[int]  # exponent of ten of the coarsest step

# Solver sums leave residues near 1e-16 of the terms: beyond 12 figures a float says nothing about rounding up or down.
_NOISE_FREE = Context(prec=12)
_PLACES = 3
_SIXTEENTH = INCH / 16

_RULES: dict[str, dict[str, _Rule]] = {
    "metric": {
        "small_length": {"unit": "mm", "symbol": "mm", "places": 2, "coarsest": 0},
        "force": {"unit": "kN", "symbol": "kN"},
        "line_load": {"unit": "kN/m", "symbol": "kN/m"},
        "area_load": {"unit": "kPa", "symbol": "kN/m²"},
        "moment": {"unit": "kNm", "symbol": "kN·m"},
        "mass_per_length": {"unit": "kN/m", "symbol": "kN/m"},
        "bending_stiffness": {"unit": "kNm2", "symbol": "kN·m²"},
        "spring": {"unit": "kN/m", "symbol": "kN/m"},
        "rotational_spring": {"unit": "kNm/rad", "symbol": "kN·m/rad"},
    },
    "us": {
        "small_length": {"unit": "in", "symbol": "in"},
        "force": {"unit": "kip", "symbol": "kip", "below_one": ("lb", "lb")},
        "line_load": {"unit": "klf", "symbol": "klf", "below_one": ("plf", "plf")},
        "area_load": {"unit": "psf", "symbol": "psf"},
        "moment": {"unit": "kip·ft", "symbol": "kip·ft"},
        "mass_per_length": {"unit": "klf", "symbol": "klf", "below_one": ("plf", "plf")},
        "bending_stiffness": {"unit": "kip·ft2", "symbol": "kip·ft²"},
        "spring": {"unit": "kip/in", "symbol": "kip/in"},
        "rotational_spring": {"unit": "kip·ft/rad", "symbol": "kip·ft/rad"},
    },
}

_FIELDS: dict[str, dict[str, tuple[str, ...]]] = {
    "metric": {
        "length": ("m", "mm", "cm"),
        "small_length": ("mm", "cm", "m"),
        "force": ("kN", "kg", "t"),
        "line_load": ("kN/m", "kg/m"),
        "area_load": ("kN/m²", "kg/m²"),
        "moment": ("kN·m",),
        "mass_per_length": ("kg/m", "kN/m"),
        "bending_stiffness": ("kN·m²", "MN·m²"),
        "spring": ("kN/m", "kN/mm"),
        "rotational_spring": ("kN·m/rad",),
        "number": (),
    },
    "us": {
        "length": ("ft", "in"),
        "small_length": ("in",),
        "force": ("lb", "kip"),
        "line_load": ("plf", "klf"),
        "area_load": ("psf", "ksf"),
        "moment": ("kip·ft", "lb·ft", "kip·in"),
        "mass_per_length": ("lb/ft",),
        "bending_stiffness": ("kip·in²", "kip·ft²"),
        "spring": ("kip/in", "kip/ft"),
        "rotational_spring": ("kip·ft/rad",),
        "number": (),
    },
}


def field_units(system: System) -> dict[str, FieldUnits]:
    """For each dimension the unit printed in an empty field and the units offered as keys ("" and none for number)."""
    return {name: {"unit": keys[0] if keys else "", "keys": list(keys)} for name, keys in _FIELDS[system].items()}


def show(dimension: str, value: float, system: System = "metric") -> str:
    """An SI value with its unit, rounded to the nearest. Raises InternalError if it is not finite."""
    return _shown(dimension, value, system, ROUND_HALF_UP)


def show_place(value: float, system: System = "metric") -> str:
    """A place along the beam as one would tape it: to the centimetre, feet and inches to 1/16."""
    if system == "us":
        return show("length", value, system)
    return f"{_clean(_exact(value)).quantize(Decimal('0.01'), ROUND_HALF_UP)} m"


def also(dimension: str, value: float, system: System = "metric") -> str:
    """The same value in the other system of units."""
    return show(dimension, value, "us" if system == "metric" else "metric")


def show_room(dimension: str, value: float, system: System = "metric") -> str:
    """What is left before a limit, rounded down: the number shown fits, the value itself may be a little more."""
    return _shown(dimension, value, system, ROUND_FLOOR)


def show_range(dimension: str, low: float, high: float, system: System = "metric") -> str:
    """"5.615 to 5.625 m": low rounded down and high rounded up, so that the range shown holds the range meant."""
    first = _shown(dimension, low, system, ROUND_FLOOR, beside=high)
    last = _shown(dimension, high, system, ROUND_CEILING)
    if first == last:
        return first
    figure, _, symbol = first.rpartition(" ")
    one_symbol = not first.endswith('"') and symbol and last.endswith(f" {symbol}")
    return f"{figure if one_symbol else first} to {last}"


def show_beside(dimension: str, value: float, limit: float, system: System = "metric") -> tuple[str, str]:
    """An effect and its limit with as many figures as it takes to see which is larger (30.04 beside 30.00 kN·m)."""
    figures = 3
    shown = _beside(dimension, value, limit, system, figures)
    while (shown[0] == shown[1] and value != limit and figures < 9) or _would_be_asked(shown):
        figures += 1
        shown = _beside(dimension, value, limit, system, figures)
    return shown


def show_ratio(value: float) -> str:
    """A ratio of effect to limit, rounded up to two decimals, never to the other side of 1.

    Up to 0.99 and from 1.01: two decimals (0.851 is 0.86). Between them more decimals, as rounding 0.998 up would
    read 1.00: 0.998, 0.9992; from 0.9999 "just under 1". Above 1 three decimals: 1.0004 is 1.001, so over the limit
    never reads 1.00. Exactly 1 is 1.00. A limit of zero gives an infinite ratio: "limit is zero".
    """
    if value == math.inf:
        return "limit is zero"
    exact = _exact(value)
    clean = _clean(Fraction(exact))
    if exact == 1:
        return "1.00"
    if exact > 1:
        fine = max(clean.quantize(Decimal("0.001"), ROUND_CEILING), Decimal("1.001"))
        return f"{fine}" if fine < Decimal("1.01") else f"{clean.quantize(Decimal('0.01'), ROUND_CEILING)}"
    for step in ("0.01", "0.001", "0.0001"):
        shown = clean.quantize(Decimal(step), ROUND_CEILING)
        if shown < 1:
            return f"{shown if shown else abs(shown)}"
    return "just under 1"


# --- rounding ------------------------------------------------------------------------------------------------------


def _exact(value: float) -> Fraction:
    if not math.isfinite(value):
        raise InternalError(code="not_finite", message=f"A number to be shown is {value}.")
    return Fraction(value)


def _clean(value: Fraction) -> Decimal:
    return _NOISE_FREE.divide(Decimal(value.numerator), Decimal(value.denominator))


def _shown(dimension: str, value: float, system: System, rounding: str, *, beside: float | None = None) -> str:
    """beside: the value whose magnitude chooses the unit, if not this one."""
    exact = _exact(value)
    if dimension == "length":
        return _feet(exact, rounding) if system == "us" else _metres(exact, rounding)
    if dimension == "number":
        return _figures(exact, rounding)
    rule = _RULES[system][dimension]
    factor, symbol = _scale(dimension, rule, exact if beside is None else _exact(beside))
    figures = _figures(exact / factor, rounding, places=rule.get("places", _PLACES), coarsest=_coarsest(rule))
    return f"{figures} {symbol}"


def _beside(dimension: str, value: float, limit: float, system: System, figures: int) -> tuple[str, str]:
    if dimension not in _RULES[system]:
        return show(dimension, value, system), show(dimension, limit, system)
    rule = _RULES[system][dimension]
    factor, symbol = _scale(dimension, rule, _exact(limit))
    places = rule.get("places", _PLACES) + figures - 3
    first, second = (
        f"{_figures(_exact(number) / factor, ROUND_HALF_UP, figures, places, _coarsest(rule))} {symbol}"
        for number in (value, limit)
    )
    return first, second


def _would_be_asked(shown: tuple[str, str]) -> bool:
    """628.406 would be asked when typed in again (number_text): one figure more is not."""
    return any(len(readings(text.partition(" ")[0].removeprefix("-"))) == 2 for text in shown)


def _coarsest(rule: _Rule) -> int:
    return rule.get("coarsest", 99)


def _scale(dimension: str, rule: _Rule, value: Fraction) -> tuple[Fraction, str]:
    """The SI factor and symbol in which this magnitude is shown."""
    unit = _factor(dimension, rule["unit"])
    if "below_one" in rule and abs(value) < unit:
        spelling, symbol = rule["below_one"]
        return _factor(dimension, spelling), symbol
    return unit, rule["symbol"]


def _factor(dimension: str, spelling: str) -> Fraction:
    unit = find_unit(dimension, spelling)
    if unit is None:
        raise InternalError(code="unit", message=f"The table of units lacks {spelling} for {dimension}.")
    return unit.factor


def _figures(value: Fraction, rounding: str, figures: int = 3, places: int = _PLACES, coarsest: int = 99) -> str:
    clean = _clean(value)
    if not clean:
        return "0"
    shown = clean
    for _ in range(2):  # a second time, because 99.96 rounds up to 100.0 and then has a figure too many
        step = min(max(shown.adjusted() - figures + 1, -places), coarsest)
        shown = clean.quantize(Decimal((0, (1,), step)), rounding)
        if not shown:
            return "0"
    return format(shown, "f")


def _metres(value: Fraction, rounding: str) -> str:
    shown = _clean(value).quantize(Decimal("0.001"), rounding)
    return f"{str(shown).removesuffix('0')} m" if shown else "0 m"


def _feet(value: Fraction, rounding: str) -> str:
    sixteenths = int(_clean(value / _SIXTEENTH).quantize(Decimal(1), rounding))
    feet, rest = divmod(abs(sixteenths) * _SIXTEENTH, FOOT)
    sign = "-" if sixteenths < 0 else ""
    inches = f'{mixed(rest / INCH)}"'
    return f"{sign}{feet}' {inches}" if feet else f"{sign}{inches}"
