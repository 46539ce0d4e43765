"""How do the tests of laws compare two answers, and how do they mirror, rescale and add up what acts on a beam?"""

from dataclasses import replace

import numpy as np
from numpy.polynomial import polynomial
from strategies import GRID

from pysolver.beam import Beam, Stretch, Support
from pysolver.loads import AppliedMoment, LineLoad, PointLoad
from pysolver.statics import Response, extremes, value

QUANTITIES = ("shear", "moment", "slope", "sag")
EXACT = 1e-12  # of the largest value: no linear system lies between the two sides
SOLVED = 1e-8  # of the largest value: the two sides come from systems with a condition number up to about 1e6


def scales(*responses: Response) -> dict[str, float]:
    """The largest size of each quantity, so that "near" means near beside the beam's own values."""
    found = {}
    for quantity in QUANTITIES:
        found[quantity] = max([abs(e.value) for r in responses for e in extremes(r, quantity)])
    lengths = max(float(r.x[-1] - r.x[0]) for r in responses)
    push = max(float(np.abs(r.reactions).max()) for r in responses)
    found["shear"] = max(found["shear"], push, found["moment"] / lengths)
    found["moment"] = max(found["moment"], found["shear"] * 1e-3 * lengths)
    # N, N·m, rad and m below which a beam is as good as untouched: a load straight over a wall leaves rounding only
    return {quantity: max(found[quantity], least) for quantity, least in zip(QUANTITIES, (1.0, 1.0, 1e-6, 1e-6), strict=True)}


def everywhere(response: Response, quantity: str, places: np.ndarray) -> np.ndarray:
    """(2, n) values just left and just right of each place."""
    return np.array([[value(response, quantity, float(x), side) for x in places] for side in ("left", "right")])


def spread(beam: Beam, count: int = 41) -> np.ndarray:
    """Places that no breakpoint can coincide with: the grid is 200 mm, these lie off it by an irrational part."""
    return (np.arange(count) + 0.5 / np.sqrt(2.0)) * beam.length / (count + 1.0)


def assert_near(found, expected, scale: float, tolerance: float) -> None:
    assert np.abs(np.asarray(found) - np.asarray(expected)).max() <= tolerance * scale


def same_answer(found: Response, expected: Response, places: np.ndarray, tolerance: float = SOLVED) -> None:
    size = scales(expected)
    for quantity in QUANTITIES:
        assert_near(everywhere(found, quantity, places), everywhere(expected, quantity, places), size[quantity], tolerance)
    assert_near(found.reactions, expected.reactions, size["shear"], tolerance)
    assert_near(found.fixing_moments, expected.fixing_moments, size["moment"], tolerance)


def ends(response: Response, quantity: str) -> tuple[np.ndarray, np.ndarray]:
    """Values just right of every breakpoint but the last, and just left of every one but the first."""
    coefficients = getattr(response, quantity)
    lengths = np.diff(response.x)
    return coefficients[:, 0], np.array([polynomial.polyval(h, c) for h, c in zip(lengths, coefficients, strict=True)])


def down_and_turn(loads) -> tuple[float, float]:
    """Sum of the loads, and of their clockwise moments about the left end."""
    down = turn = 0.0
    for load in loads:
        if isinstance(load, AppliedMoment):
            turn += load.moment
        elif isinstance(load, PointLoad):
            down, turn = down + load.force, turn + load.force * load.x
        else:
            run, first, last = load.end - load.start, load.start_intensity, load.end_intensity
            down += run * (first + last) / 2
            turn += run * (first + last) / 2 * load.start + run**2 * (first + 2 * last) / 6
    return down, turn


def intensity(loads, x: float) -> float:
    return sum(w.start_intensity + (x - w.start) / (w.end - w.start) * (w.end_intensity - w.start_intensity)
               for w in loads if isinstance(w, LineLoad) and w.start < x < w.end)


def unsettled(beam: Beam) -> Beam:
    return replace(beam, supports=tuple(replace(s, settlement=0.0) for s in beam.supports))


def mirrored(beam: Beam, loads) -> tuple[Beam, tuple]:
    def over(x: float) -> float:
        return (round(beam.length * GRID) - round(x * GRID)) / GRID

    turned = []
    for load in loads:
        if isinstance(load, LineLoad):
            turned.append(replace(load, start=over(load.end), end=over(load.start),
                                  start_intensity=load.end_intensity, end_intensity=load.start_intensity))
        elif isinstance(load, AppliedMoment):
            turned.append(replace(load, x=over(load.x), moment=-load.moment))
        else:
            turned.append(replace(load, x=over(load.x)))
    return replace(beam, supports=tuple(replace(s, x=over(s.x)) for s in reversed(beam.supports)),
                   stretches=tuple(replace(s, start=over(s.end), end=over(s.start)) for s in reversed(beam.stretches)),
                   hinges=tuple(over(x) for x in beam.hinges)), tuple(turned)


def rescaled(beam: Beam, loads, length: float, force: float) -> tuple[Beam, tuple]:
    """The same beam written in other units: every number times its powers of the two factors."""
    def support(s: Support) -> Support:
        return replace(s, x=s.x * length, settlement=s.settlement * length,
                       stiffness=None if s.stiffness is None else s.stiffness * force / length,
                       rotational=None if s.rotational is None else s.rotational * force * length)

    other = []
    for load in loads:
        if isinstance(load, LineLoad):
            other.append(replace(load, start=load.start * length, end=load.end * length,
                                 start_intensity=load.start_intensity * force / length,
                                 end_intensity=load.end_intensity * force / length))
        elif isinstance(load, AppliedMoment):
            other.append(replace(load, x=load.x * length, moment=load.moment * force * length))
        else:
            other.append(replace(load, x=load.x * length, force=load.force * force))
    stretches = tuple(Stretch(start=s.start * length, end=s.end * length,
                              bending_stiffness=s.bending_stiffness * force * length**2) for s in beam.stretches)
    return Beam(length=beam.length * length, supports=tuple(map(support, beam.supports)), stretches=stretches,
                hinges=tuple(x * length for x in beam.hinges)), tuple(other)
