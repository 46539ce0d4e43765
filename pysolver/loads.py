"""What acts on the beam? Point loads, line loads and applied moments, each of one named source.

SI units: N, N/m, N·m. Loads are positive down, applied moments positive clockwise, x from the left end.
All loads of one `source` are one unknown: they grow and shrink together (one block weight, one self weight).
"""

from dataclasses import dataclass

from pysolver.beam import Beam, finite, within
from pysolver.errors import InputError

MAX_LOADS = 2000
LARGEST = 1e12  # N, N/m or N·m: beyond any building


@dataclass(frozen=True, slots=True, kw_only=True)
class PointLoad:
    """A force (N, down) at x."""

    x: float
    force: float
    source: str = "load"

    def __post_init__(self) -> None:
        finite(self.x, "position", "The place of a load", 1e3)
        finite(self.force, "magnitude", "The load", LARGEST)


@dataclass(frozen=True, slots=True, kw_only=True)
class LineLoad:
    """A load (N/m, down) from start to end, its intensity running straight from start_intensity to end_intensity."""

    start: float
    end: float
    start_intensity: float
    end_intensity: float
    source: str = "load"

    def __post_init__(self) -> None:
        finite(self.start, "position", "The start of a line load", 1e3)
        finite(self.end, "length", "The end of a line load", 1e3)
        finite(self.start_intensity, "magnitude", "The load per length", LARGEST)
        finite(self.end_intensity, "magnitude_end", "The load per length", LARGEST)
        if self.end <= self.start:
            raise InputError(code="load_length", field="length",
                             message=f"The line load is {self.end - self.start:g} m long. Its length must be more than zero.")


@dataclass(frozen=True, slots=True, kw_only=True)
class AppliedMoment:
    """A moment (N·m, clockwise) put into the beam at x."""

    x: float
    moment: float
    source: str = "load"

    def __post_init__(self) -> None:
        finite(self.x, "position", "The place of an applied moment", 1e3)
        finite(self.moment, "magnitude", "The applied moment", LARGEST)


Load = PointLoad | LineLoad | AppliedMoment


def check_on_beam(beam: Beam, loads: tuple[Load, ...]) -> None:
    """Raise InputError, field loads/i/..., when a load lies off the beam or there are too many of them."""
    if len(loads) > MAX_LOADS:
        raise InputError(code="too_many", field="loads",
                         message=f"{len(loads)} loads are more than {MAX_LOADS}. Put like loads together.")
    for i, load in enumerate(loads):
        if isinstance(load, LineLoad):
            within(load.start, 0.0, beam.length, f"loads/{i}/position", "The start of the load")
            within(load.end, 0.0, beam.length + 1e-9, f"loads/{i}/length", "The far end of the load")
        else:
            within(load.x, 0.0, beam.length, f"loads/{i}/position", "The load")
        if isinstance(load, AppliedMoment) and any(abs(load.x - h) < 1e-9 for h in beam.hinges):
            raise InputError(code="moment_on_hinge", field=f"loads/{i}/position",
                             message=f"The applied moment is exactly on the hinge at {load.x:.3f} m. Say on which side of "
                                     "the hinge it acts by moving it a little.")
