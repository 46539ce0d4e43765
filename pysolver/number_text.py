"""Which numbers can a written figure mean?

One figure can have one reading (5.62), none (five) or two (1,200 is 1200 to one reader and 1.2 to the next).
This module only lists the readings; units.py decides what is asked. Exact: Decimal and Fraction, no floats.

The forms, and why each is clear or not:
  5.62  5,62  1,2000   one separator, not followed by exactly three digits: no convention groups digits so: decimal
  0.125  .125          nothing but zeros before it: groups never start with a zero: decimal
  1234,567             four digits before it: they would have been grouped as well: decimal
  1,200  1.200         one to three digits, one separator, three digits: two readings
  1,200,000  1.200,5   a repeated separator, or two kinds: the first kind groups, the last is the decimal sign
  1 200                grouped by a space as in the SI brochure, 9th edition, 5.4.4: a space is never a decimal sign
"""

from __future__ import annotations

import re
from decimal import Decimal
from fractions import Fraction

_MANTISSA = re.compile(r"([0-9., ]*[0-9])(?:[eE]([+-]?[0-9]{1,3}))?")
_DECIMAL = re.compile(r"([0-9]*)(?:[.,]([0-9]+))?")
_GROUPED = re.compile(r"([1-9][0-9]{0,2}(?:([ .,])[0-9]{3})(?:\2[0-9]{3})*)(?:([.,])([0-9]+))?")
_MIXED = re.compile(r"(?:([0-9]+)(?: ?- ?| ))?([0-9]+)/([0-9]+)")

# The divisions of an inch on a tape or rule. Common practice, no published source.
_INCH_DIVISIONS = frozenset((2, 4, 8, 16, 32, 64))


def readings(text: str) -> tuple[Decimal, ...]:
    """Every number that an unsigned figure can mean: none, one, or two with the decimal reading first."""
    found = _MANTISSA.fullmatch(text)
    if not found:
        return ()
    exponent = int(found[2] or 0)
    candidates = (_as_decimal(found[1]), _as_grouped(found[1]))
    return tuple(value.scaleb(exponent) for value in candidates if value is not None)


def _as_decimal(mantissa: str) -> Decimal | None:
    found = _DECIMAL.fullmatch(mantissa)
    return Decimal(f"{found[1] or 0}.{found[2] or 0}") if found else None


def _as_grouped(mantissa: str) -> Decimal | None:
    found = _GROUPED.fullmatch(mantissa)
    if not found or found[3] == found[2]:
        return None
    return Decimal(f"{re.sub('[ .,]', '', found[1])}.{found[4] or 0}")


def inch_fraction(text: str) -> Fraction | None:
    """4 1/2, 4-1/2 or 1/2 as people write inches; None if it is not a proper fraction of a rule's divisions."""
    found = _MIXED.fullmatch(text)
    if not found or int(found[3]) not in _INCH_DIVISIONS or int(found[2]) >= int(found[3]):
        return None
    return int(found[1] or 0) + Fraction(int(found[2]), int(found[3]))


def plain(value: Decimal, *, three_places_clear: bool = False) -> str:
    """The shortest figure with one reading: 1.2, 1200, 12.3450 (12.345 alone would have two)."""
    text = format(value, "f")
    if "." in text:
        text = text.rstrip("0").rstrip(".")
    return text if three_places_clear or len(readings(text)) == 1 else text + "0"


def mixed(value: Fraction) -> str:
    """4 1/2, 1/2 or 4, for a value that is a whole number of a rule's divisions."""
    whole, rest = divmod(value, 1)
    if not rest:
        return str(whole)
    return f"{whole} {rest}" if whole else str(rest)
