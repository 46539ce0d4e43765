"""Can the beam move without bending? If so, which part of it, and what would hold it?

Kinematic method: cut at its hinges the beam falls into rigid parts, each with a deflection and a rotation. Supports,
springs and hinges are linear constraints on these. If their rank is less than the number of motions, the null space is
the way in which the beam would move. The matrix is small and scaled by the beam's length, so its rank is clear; the
stiffness matrix, whose condition depends on EI and spans, is not asked.
"""

import numpy as np
from numpy.typing import NDArray

from pysolver.beam import Beam
from pysolver.errors import InputError

Floats = NDArray[np.float64]

RANK_TOLERANCE = 1e-9


def motions(beam: Beam) -> Floats:
    """(k, parts, 2) the k independent ways to move: deflection at the left end and slope times length, of each part."""
    parts = len(beam.hinges) + 1
    rows = _constraints(beam, sorted(beam.hinges))
    if not rows:
        return np.eye(2 * parts).reshape(-1, parts, 2)
    _, size, ways = np.linalg.svd(np.array(rows), full_matrices=True)
    rank = int((size > RANK_TOLERANCE).sum())
    return ways[rank:].reshape(-1, parts, 2)


def _constraints(beam: Beam, hinges: list[float]) -> list[Floats]:
    def row(part: int, x: float) -> Floats:  # the deflection of a part at x
        out = np.zeros((len(hinges) + 1, 2))
        out[part] = 1.0, x / beam.length
        return out

    rows = [row(i, x) - row(i + 1, x) for i, x in enumerate(hinges)]
    for support in beam.supports:
        part = sum(h < support.x - 1e-9 for h in hinges)
        rows.append(row(part, support.x))
        if support.kind == "fixed" or support.rotational is not None:
            turn = np.zeros((len(hinges) + 1, 2))
            turn[part, 1] = 1.0
            rows.append(turn)
    return [r.ravel() for r in rows]


def refuse_mechanism(beam: Beam) -> None:
    """Raise InputError in words when the beam is a mechanism."""
    ways = motions(beam)
    if len(ways) == 0:
        return
    edges = [0.0, *sorted(beam.hinges), beam.length]
    loose = np.abs(ways[0]).max(axis=1) > 1e-6
    parts = [f"from {edges[i]:.2f} m to {edges[i + 1]:.2f} m" for i in np.nonzero(loose)[0]]
    if len(beam.hinges) == 0:
        reason = "nothing keeps the beam from turning about its only support"
    else:
        reason = f"the part {' and the part '.join(parts)} can swing without bending"
    raise InputError(code="mechanism", field="supports", message=f"The beam would fall as entered: {reason}. "
                     "Look again for a support, for what holds its end, or for a hinge that is not one.")
