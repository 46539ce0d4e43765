"""Where are the supports, their faces, and the things that were taped from them?

Worked out from the left end, in m. Effective span (J8): a span measured between faces ("clear") is widened at an end
support by min(bearing, depth)/2, or by half the bearing when the limit's rule is centre to centre (EN 1992-1-1, 5.3.2.2,
for the first). A support between two spans keeps its middle. A bearing found shorter than drawn never shortens a span:
the longer of both is used.
"""

from collections.abc import Callable
from dataclasses import dataclass
from typing import Any

from pysolver.beam import SHORTEST, Support
from pysolver.errors import InputError
from pysolver.readings import Readings
from pysolver.record import Record

STICKS_OUT = 0.03  # m, own rule: tape and edge of a load together

Pick = Callable[[str], float]  # the value chosen for the measured number at a path; KeyError when it is not answered


@dataclass(frozen=True, slots=True, kw_only=True)
class Reading:
    """How the beam is read: the span rule of the limit and where the reactions of an overhanging beam are taken.

    edge: which reactions are taken at the front edge of their bearing (J8: run too): "tip", those under an overhang, at
    the edge towards its tip; "inner", those of end supports without overhang, at the inner edge, which shortens the arm
    that holds the beam down; "" none.
    strict: a load off the beam is an error; otherwise (inside the search) it is moved onto it.
    """

    rule: str = "effective"
    edge: str = ""
    strict: bool = True


class Frame:
    """Where supports, faces and ends are, worked out from the left."""

    def __init__(self, record: Record, readings: Readings, pick: Pick, reading: Reading) -> None:
        self.record, self.pick, self.reading, self.readings = record, pick, reading, readings
        count = len(record["supports"])
        self.bearing = [self._bearing(j) for j in range(count)]
        self.left = self._overhang("left")
        self.right = self._overhang("right")
        middle = [self.left]
        for i, span in enumerate(record["spans"]):
            length = pick(f"/spans/{i}/length")
            clear = span["measure"] == "clear"
            middle.append(middle[-1] + length + (self._half(i) + self._half(i + 1) if clear else 0.0))
        self.x = middle
        self.length = middle[-1] + self.right
        self.faces = [(x - self._to_face(j, j - 1), x + self._to_face(j, j)) for j, x in enumerate(middle)]
        self.real = tuple(j for j, s in enumerate(record["supports"]) if s["kind"] != "free")
        self.x = [self._reacting(j) for j in range(count)]

    def _or_zero(self, path: str) -> float:
        try:
            return self.pick(path)
        except KeyError:
            return 0.0

    def _overhang(self, end: str) -> float:
        """What a range may take below nothing, or below what a tape can tell from nothing, is no overhang."""
        length = self._or_zero(f"/overhangs/{end}")
        return length if length >= SHORTEST else 0.0

    def _bearing(self, j: int) -> float:
        path = f"/supports/{j}/bearing"
        if path not in self.readings.measured:
            return 0.0
        return max(self.pick(path), self.readings.issued.get(f"{path}_drawn", 0.0))

    def _half(self, j: int) -> float:
        """From the reaction to the inner face. An end support under the effective rule reacts at most depth/2 inside."""
        half = self.bearing[j] / 2
        at_end = (j == 0 and not self.left) or (j == len(self.bearing) - 1 and not self.right)
        if at_end and self.reading.rule == "effective":
            half = min(half, (self._or_zero("/section/depth") or self.bearing[j]) / 2)
        return half

    def _to_face(self, j: int, span: int) -> float:
        """From the middle of a support to its face towards a span: as far as the clear span was widened by; otherwise
        half of the bearing that was found."""
        spans = self.record["spans"]
        if 0 <= span < len(spans) and spans[span]["measure"] == "clear":
            return self._half(j)
        return self._or_zero(f"/supports/{j}/bearing") / 2

    def _reacting(self, j: int) -> float:
        last = len(self.bearing) - 1
        if not self.reading.edge or j not in (0, last):
            return self.x[j]
        overhangs = bool(self.left if j == 0 else self.right)
        if overhangs != (self.reading.edge == "tip"):
            return self.x[j]
        outward = -1.0 if j == 0 else 1.0
        return self.x[j] + outward * self._half(j) * (1.0 if overhangs else -1.0)

    def beam_supports(self) -> tuple[Support, ...]:
        made = []
        for j in self.real:
            support = self.record["supports"][j]
            springs = {name: self.pick(f"/supports/{j}/{name}") for name in ("stiffness", "rotational")
                       if support[name] is not None and (name == "rotational" or support["kind"] == "spring")}
            try:
                made.append(Support(x=self.x[j], kind=support["kind"], settlement=self._or_zero(f"/supports/{j}/settlement"),
                                    **springs))
            except InputError as error:
                raise error.moved(f"/supports/{j}/{error.field}") from None
        return tuple(made)

    def place(self, position: dict[str, Any], path: str, width: float) -> tuple[float, float]:
        """(start, end) in m of a thing `width` long that stands at a position."""
        distance = self._distance(f"{path}/distance")
        origin, way = self._origin(position)
        near = origin + way * (distance if position["to"] != "middle" else distance - width / 2)
        far = near + way * width
        return min(near, far), max(near, far)

    def onto_beam(self, start: float, end: float, path: str) -> tuple[float, float]:
        """A load that sticks out by no more than a tape may be out (or, in the search, by any amount) is moved onto the
        beam whole: none of it is lost."""
        over = max(-start, end - self.length)
        if self.reading.strict and over > STICKS_OUT:
            where = f"from {start:.3f} m to {end:.3f} m" if end > start else f"at {start:.3f} m"
            raise InputError(code="off_the_beam", field=f"{path}/position",
                             message=f"The load lies {where}, but the beam runs from 0 to {self.length:.3f} m. "
                                     "Measure again from the point named, or correct the span.")
        width = min(end - start, self.length)
        start = min(max(start, 0.0), self.length - width)
        return start, start + width

    def _distance(self, path: str) -> float:
        issued = self.readings.issued
        return issued[path] if path in issued else self.pick(path)

    def _origin(self, position: dict[str, Any]) -> tuple[float, float]:
        if position["from"] == "left_end":
            return 0.0, 1.0
        if position["from"] == "right_end":
            return self.length, -1.0
        way = 1.0 if position["side"] == "right" else -1.0
        j = min(position["support"], len(self.x) - 1)
        if position["at"] == "face":
            return self.faces[j][1 if way > 0 else 0], way
        return 0.5 * sum(self.faces[j]), way
