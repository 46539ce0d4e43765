"""Which units are known, how is each spelled, and what is one of each in SI?

A closed table: dimension -> spelling -> Unit. SI inside: m, N, N/m, N/m², N·m, N·m², N·m/rad. Factors are exact
fractions, so 5620 mm, 562 cm and 5.62 m are the same float.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass
from fractions import Fraction

# Standard acceleration of free fall: 3rd CGPM (1901); SI brochure, 9th edition, Appendix 1. Exact, m/s².
STANDARD_GRAVITY = Fraction("9.80665")
# International yard and pound agreement (1959); NIST SP 811 (2008), Appendix B.6 and B.8. Both exact: m, kg.
FOOT = Fraction("0.3048")
POUND = Fraction("0.45359237")
INCH = FOOT / 12
POUND_FORCE = POUND * STANDARD_GRAVITY
KILOGRAM_FORCE = STANDARD_GRAVITY


@dataclass(frozen=True, slots=True, kw_only=True)
class Unit:
    """symbol: as printed. factor: SI per one, exact. mass: a mass, taken as its weight under STANDARD_GRAVITY."""

    symbol: str
    factor: Fraction
    mass: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class Dimension:
    """name, example: for messages. cap: |SI value| must stay below it. negative: a value below zero has a meaning."""

    name: str
    example: str
    cap: Fraction
    negative: bool = False


def _dimension(name: str, example: str, cap: int, *, negative: bool = False) -> Dimension:
    return Dimension(name=name, example=example, cap=Fraction(cap), negative=negative)


# The caps are far above any beam: they refuse slips and nonsense, they judge nothing. No published source.
DIMENSIONS = {
    "length": _dimension("a length", "5.62 m or 18' 4 1/2\"", 1000),
    "small_length": _dimension("a length", '100 mm or 3 1/2"', 10, negative=True),
    "force": _dimension("a force or weight", "12 kN, 1200 kg or 2700 lb", 10**9, negative=True),
    "line_load": _dimension("a load per length", "4.8 kN/m or 250 plf", 10**8, negative=True),
    "area_load": _dimension("a load per area", "2.5 kN/m² or 50 psf", 10**7),
    "moment": _dimension("a moment", "30 kN·m or 22 kip·ft", 10**10, negative=True),
    "mass_per_length": _dimension("a weight per length", "46 kg/m or 31 lb/ft", 10**6),
    "bending_stiffness": _dimension("a bending stiffness EI", "20500 kN·m² or 7100000 kip·in²", 10**14),
    "spring": _dimension("a spring stiffness", "5000 kN/m or 28 kip/in", 10**13),
    "rotational_spring": _dimension("a rotational stiffness", "2000 kN·m/rad or 1500 kip·ft/rad", 10**14),
    "number": _dimension("a plain number", "1.35", 10**6),
}

_LENGTHS: dict[str, tuple[Fraction, tuple[str, ...]]] = {
    "m": (Fraction(1), ("m", "metre", "metres", "meter", "meters")),
    "cm": (Fraction(1, 100), ("cm",)),
    "mm": (Fraction(1, 1000), ("mm",)),
    "ft": (FOOT, ("ft", "foot", "feet", "'")),
    "in": (INCH, ("in", "inch", "inches", '"')),
}
_FORCES: dict[str, tuple[Fraction, tuple[str, ...]]] = {
    "N": (Fraction(1), ("N",)),
    "daN": (Fraction(10), ("daN",)),
    "kN": (Fraction(1000), ("kN",)),
    "MN": (Fraction(10**6), ("MN",)),
    "kip": (1000 * POUND_FORCE, ("kip", "kips")),
    "lb": (POUND_FORCE, ("lb", "lbs", "lbf", "pound", "pounds")),
    "kg": (KILOGRAM_FORCE, ("kg", "kgs", "kgf", "kilo", "kilos")),
    "t": (1000 * KILOGRAM_FORCE, ("t", "tonne", "tonnes", "te")),
}
_MASSES = frozenset(("lb", "kg", "t"))
_AREAS = {"m": ("m2", "sqm", "sq·m"), "ft": ("ft2", "sqft", "sq·ft", "sf")}
_POWERS = {1: "", 2: "²"}

Spelled = tuple[Unit, Iterable[str]]


def _force_names(force: str) -> tuple[str, ...]:
    # "k" alone is asked (kip or kN), joined to a foot or an inch it is only ever a kip
    return (*_FORCES[force][1], "k") if force == "kip" else _FORCES[force][1]


def _length(symbol: str) -> Spelled:
    factor, names = _LENGTHS[symbol]
    return Unit(symbol=symbol, factor=factor), names


def _force(symbol: str) -> Spelled:
    factor, names = _FORCES[symbol]
    return Unit(symbol=symbol, factor=factor, mass=symbol in _MASSES), names


def _per_length(force: str, length: str) -> Spelled:
    unit = Unit(symbol=f"{force}/{length}", factor=_FORCES[force][0] / _LENGTHS[length][0], mass=force in _MASSES)
    return unit, [f"{f}/{n}" for f in _force_names(force) for n in _LENGTHS[length][1]]


def _per_area(force: str, length: str) -> Spelled:
    factor = _FORCES[force][0] / _LENGTHS[length][0] ** 2
    unit = Unit(symbol=f"{force}/{length}²", factor=factor, mass=force in _MASSES)
    return unit, [f"{f}/{n}" for f in _force_names(force) for n in _AREAS[length]]


def _times(force: str, length: str, power: int = 1, *, per: str = "") -> Spelled:
    """Force times length: kN·m, kNm; the other way round only with a sign or in feet (m·kN, ft·lb, ftlb)."""
    factor = _FORCES[force][0] * _LENGTHS[length][0] ** power
    unit = Unit(symbol=f"{force}·{length}{_POWERS[power]}{per}", factor=factor, mass=force in _MASSES)
    digit = "" if power == 1 else str(power)
    spellings = [f"{f}{sign}{length}{digit}{per}" for f in _force_names(force) for sign in ("·", "")]
    if power == 1:
        signs = ("·", "") if length in ("ft", "in") else ("·",)
        spellings += [f"{length}{sign}{f}{per}" for f in _force_names(force) for sign in signs]
    return unit, spellings


def _named(symbol: str, factor: Fraction) -> Spelled:
    return Unit(symbol=symbol, factor=factor), (symbol,)


def _spellings(*rows: Spelled) -> dict[str, Unit]:
    return {spelling: unit for unit, names in rows for spelling in names}


_ALL_LENGTHS = _spellings(*map(_length, _LENGTHS))
_LINE_LOADS = _spellings(
    *(_per_length(force, "m") for force in ("N", "daN", "kN", "MN", "kg", "t")),
    _per_length("N", "mm"),
    _per_length("lb", "ft"),
    _per_length("kip", "ft"),
    _named("plf", POUND_FORCE / FOOT),
    _named("klf", 1000 * POUND_FORCE / FOOT),
)

UNITS: dict[str, dict[str, Unit]] = {
    "length": _ALL_LENGTHS,
    "small_length": _ALL_LENGTHS,
    "force": _spellings(*map(_force, _FORCES)),
    "line_load": _LINE_LOADS,
    "area_load": _spellings(
        *(_per_area(force, "m") for force in ("N", "daN", "kN", "kg", "t")),
        _per_area("lb", "ft"),
        _per_area("kip", "ft"),
        _named("Pa", Fraction(1)),
        _named("kPa", Fraction(1000)),
        _named("psf", POUND_FORCE / FOOT**2),
        _named("ksf", 1000 * POUND_FORCE / FOOT**2),
    ),
    "moment": _spellings(
        *(_times(force, "m") for force in ("N", "daN", "kN", "MN", "kg", "t")),
        _times("N", "mm"),
        _times("kN", "mm"),
        *(_times(force, length) for force in ("kip", "lb") for length in ("ft", "in")),
    ),
    "mass_per_length": _LINE_LOADS,
    "bending_stiffness": _spellings(
        *(_times(force, "m", 2) for force in ("N", "kN", "MN")),
        _times("N", "mm", 2),
        _times("kN", "mm", 2),
        *(_times(force, length, 2) for force in ("kip", "lb") for length in ("in", "ft")),
    ),
    "spring": _spellings(
        *(_per_length(force, "m") for force in ("N", "kN", "MN")),
        _per_length("N", "mm"),
        _per_length("kN", "mm"),
        *(_per_length(force, length) for force in ("kip", "lb") for length in ("in", "ft")),
    ),
    "rotational_spring": _spellings(
        *(_times(force, "m", per="/rad") for force in ("N", "kN", "MN")),
        *(_times(force, length, per="/rad") for force in ("kip", "lb") for length in ("ft", "in")),
    ),
    "number": {},
}

# A wrong capital does no harm, except where M (mega) could stand for m (milli): those are read as written only.
_FOLDED = {
    dimension: {spelling.casefold(): unit for spelling, unit in table.items() if not spelling.startswith("M")}
    for dimension, table in UNITS.items()
}


def find_unit(dimension: str, spelling: str) -> Unit | None:
    """The unit of this dimension that is spelled so (units.py has brought signs and powers to one form)."""
    return UNITS[dimension].get(spelling) or _FOLDED[dimension].get(spelling.casefold())
