"""Between which values does a measured number lie?

Each written number of a record is read once (units.py) and widened by how it was measured (means.json, J13): exact only
from the design sheet or when marked so; without a stated means it counts as by eye. Values in SI.
"""

import json
from collections.abc import Mapping
from dataclasses import dataclass
from functools import cache
from importlib import resources
from typing import Any

from pysolver.errors import InputError
from pysolver.units import parse

GROUP = {"length": "length", "small_length": "length", "force": "load", "line_load": "load", "area_load": "load",
         "moment": "load", "mass_per_length": "load", "bending_stiffness": "stiffness", "spring": "stiffness",
         "rotational_spring": "stiffness", "settlement": "settlement"}


@dataclass(frozen=True, slots=True, kw_only=True)
class Measured:
    """A number as read: best estimate, the range it may lie in, its dimension and how it was known."""

    best: float
    low: float
    high: float
    dimension: str
    means: str

    @property
    def exact(self) -> bool:
        return self.low == self.high


@cache
def means_table() -> dict[tuple[str, str], dict[str, Any]]:
    """The rows of means.json by (id, group of dimensions)."""
    rows = json.loads(resources.files("pysolver").joinpath("means.json").read_text("utf-8"))
    return {(row["id"], group): row for row in rows for group in row["for"]}


def read_measured(quantity: Mapping[str, Any], dimension: str, field: str) -> Measured:
    """Read a written number. dimension: as in units.py, or "settlement" (a small length). Raises InputError at field."""
    unit_dimension = "small_length" if dimension == "settlement" else dimension
    best = _number(quantity["text"], quantity, unit_dimension, field)
    _refuse_other_value(quantity, best, field)
    means = quantity.get("means") or "by_eye"
    group = GROUP[dimension]
    row = means_table().get((means, group))
    if row is None:
        raise InputError(code="means", field=field, message=f"{means!r} is not a way to know a {group}. "
                         f"Choose one of: {', '.join(sorted(m for m, g in means_table() if g == group))}.")
    low, high = _stated(quantity, unit_dimension, field) if means == "stated" else _range(best, row)
    if not low <= best <= high:
        raise InputError(code="range", field=field, message=f"The best estimate {quantity['text']} is not between the low "
                         f"{quantity.get('low')} and the high {quantity.get('high')}. Correct one of the three.")
    return Measured(best=best, low=low, high=high, dimension=dimension, means=means)


def read_exact(quantity: Mapping[str, Any], dimension: str, field: str) -> float:
    """Read a written number that has no range, such as an issued limit (J14)."""
    best = _number(quantity["text"], quantity, dimension, field)
    _refuse_other_value(quantity, best, field)
    return best


def _number(text: str, quantity: Mapping[str, Any], dimension: str, field: str) -> float:
    try:
        return parse(dimension, text, quantity.get("unit") or "").value
    except InputError as error:
        raise error.at(field) from None


def _refuse_other_value(quantity: Mapping[str, Any], best: float, field: str) -> None:
    kept = quantity.get("value")
    if kept is not None and not (abs(kept) < 1e300 and abs(kept - best) <= 1e-9 * abs(best)):
        raise InputError(code="value_differs", field=field, message=f"The record says {quantity['text']!r} and beside it "
                         f"the value {kept!r}, which is not the same. Enter the number again.")


def _range(best: float, row: dict[str, Any]) -> tuple[float, float]:
    if "steps" in row:
        error = next(e for up_to, e in row["steps"] if abs(best) <= up_to)
        return best - error, best + error
    ends = best * (1.0 - row["minus"]), best * (1.0 + row["plus"])
    return min(ends), max(ends)


def _stated(quantity: Mapping[str, Any], dimension: str, field: str) -> tuple[float, float]:
    if not quantity.get("low") or not quantity.get("high"):
        raise InputError(code="range", field=field,
                         message="Low and high are said to be stated, but one of them is missing. Enter both.")
    return _number(quantity["low"], quantity, dimension, field), _number(quantity["high"], quantity, dimension, field)
