"""What is the beam? Its length, what it rests on, its hinges and its stiffness.

SI units: m, N/m, N·m/rad, N·m². x runs from the left end. Settlement is positive down. A beam is valid once built:
what cannot be built raises InputError with the field and what to do.
"""

import math
from dataclasses import dataclass
from itertools import pairwise
from typing import Literal, get_args

from pysolver.errors import InputError

SupportKind = Literal["bearing", "pinned", "fixed", "spring"]

MAX_SPANS = 200
SHORTEST = 1e-3  # m; nearer than a millimetre, two things on a beam are in one place: a tape cannot part them
LONGEST = 1e3  # m
ROUNDED = 1.0 - 1e-6  # a millimetre between two places far from the left end is a millimetre


def finite(value: float, field: str, what: str, largest: float = 1e15) -> float:
    """value itself, or InputError when it is not a number that a measurement can give (NaN, infinite, absurd)."""
    if not math.isfinite(value) or abs(value) > largest:
        raise InputError(code="not_a_number", field=field,
                         message=f"{what} is {value!r}. Enter a measured number up to {largest:g}.")
    return value


def within(value: float, low: float, high: float, field: str, what: str) -> float:
    """value itself, or InputError when it lies outside [low, high] (both in m)."""
    finite(value, field, what, LONGEST)
    if not low <= value <= high:
        raise InputError(code="off_the_beam", field=field,
                         message=f"{what} is at {value:.3f} m, but the beam runs from {low:.3f} m to {high:.3f} m. "
                                 "Measure again from the point named.")
    return value


@dataclass(frozen=True, slots=True, kw_only=True)
class Support:
    """A place where the beam is held up.

    bearing: carried, not held down (the caller must refuse tension); pinned: held both ways; fixed: also held against
    turning; spring: on a vertical spring of `stiffness` N/m. `rotational` N·m/rad resists turning at any kind.
    """

    x: float
    kind: SupportKind
    stiffness: float | None = None
    rotational: float | None = None
    settlement: float = 0.0

    def __post_init__(self) -> None:
        if self.kind not in get_args(SupportKind):
            raise InputError(code="unknown_support", field="kind", message=f"Support kind {self.kind!r} is not known. "
                             f"Choose one of: {', '.join(get_args(SupportKind))}.")
        finite(self.x, "x", "The place of a support", LONGEST)
        finite(self.settlement, "settlement", "The settlement", 10.0)
        if (self.kind == "spring") != (self.stiffness is not None):
            raise InputError(code="spring_stiffness", field="stiffness",
                             message="A spring support needs its stiffness; no other kind takes one.")
        for name, value in (("stiffness", self.stiffness), ("rotational", self.rotational)):
            if value is not None and finite(value, name, "The spring stiffness") <= 0.0:
                raise InputError(code="spring_stiffness", field=name,
                                 message=f"The spring stiffness is {value:g}. It must be more than zero.")


@dataclass(frozen=True, slots=True, kw_only=True)
class Stretch:
    """A length of the beam with one bending stiffness EI (N·m²)."""

    start: float
    end: float
    bending_stiffness: float

    def __post_init__(self) -> None:
        finite(self.start, "start", "The start of a stretch", LONGEST)
        finite(self.end, "end", "The end of a stretch", LONGEST)
        if self.end - self.start < SHORTEST * ROUNDED:
            raise InputError(code="short_stretch", field="length",
                             message=f"A stretch of {self.end - self.start:.4f} m is too short. Give at least 1 mm.")
        if finite(self.bending_stiffness, "stiffness", "The stiffness EI") <= 0.0:
            raise InputError(code="stiffness", field="stiffness",
                             message=f"The stiffness EI is {self.bending_stiffness:g}. It must be more than zero.")


@dataclass(frozen=True, slots=True, kw_only=True)
class Beam:
    """A straight beam of `length` m on `supports`, with `hinges` (x of each) and stretches that cover it end to end."""

    length: float
    supports: tuple[Support, ...]
    stretches: tuple[Stretch, ...]
    hinges: tuple[float, ...] = ()

    def __post_init__(self) -> None:
        if finite(self.length, "length", "The length of the beam", LONGEST) < SHORTEST:
            raise InputError(code="span", field="length",
                             message=f"The beam is {self.length:g} m long. A span must be more than zero.")
        self._check_supports()
        self._check_hinges()
        self._check_stretches()

    def _check_supports(self) -> None:
        if not self.supports:
            raise InputError(code="mechanism", field="supports", message="The beam rests on nothing. Enter its supports.")
        if len(self.supports) > MAX_SPANS + 1:
            raise InputError(code="too_many", field="supports",
                             message=f"{len(self.supports)} supports are more than {MAX_SPANS + 1}. Split the beam.")
        for i, support in enumerate(self.supports):
            within(support.x, 0.0, self.length, f"supports/{i}", "A support")
        for i, (a, b) in enumerate(pairwise(self.supports)):
            if b.x - a.x < SHORTEST * ROUNDED:
                raise InputError(code="span", field=f"spans/{i}",
                                 message=f"The span between two supports is {b.x - a.x:g} m. It must be more than zero, "
                                         "with the supports in order from the left.")

    def _check_hinges(self) -> None:
        for i, x in enumerate(self.hinges):
            field = f"hinges/{i}"
            within(x, 0.0, self.length, field, "A hinge")
            if min(x, self.length - x) < SHORTEST:
                raise InputError(code="hinge_at_end", field=field,
                                 message=f"The hinge at {x:.3f} m is at the end of the beam, which is free to turn "
                                         "unless its support holds it. Remove the hinge.")
            if any(abs(x - y) < SHORTEST for y in self.hinges[:i]):
                raise InputError(code="hinge_twice", field=field,
                                 message=f"Two hinges at {x:.3f} m are one hinge. Remove one.")
            for support in self.supports:
                turning = support.kind == "fixed" or support.rotational is not None
                if turning and abs(support.x - x) < SHORTEST:
                    raise InputError(code="hinge_on_fixed", field=field,
                                     message=f"The hinge at {x:.3f} m is on a support that holds the beam against "
                                             "turning. Move the hinge to the side where it is, or change the support.")

    def _check_stretches(self) -> None:
        edges = [s.start for s in self.stretches[:1]] + [s.end for s in self.stretches]
        gaps = any(abs(b.start - a.end) > 1e-9 for a, b in pairwise(self.stretches))
        if not edges or gaps or abs(edges[0]) > 1e-9 or abs(edges[-1] - self.length) > 1e-9:
            raise InputError(code="stretches", field="stiffness",
                             message="The stiffness EI must be given once for every part of the beam, without gap or overlap.")
