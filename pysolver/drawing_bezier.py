"""How does a polynomial of the beam become a curve of the drawing? One cubic Bézier for each piece, exactly.

A cubic Bézier whose control points stand at thirds of the piece is the graph of a cubic polynomial; its ordinates are
the polynomial's Bernstein coefficients b_i = sum over k <= i of C(i,k)/C(3,k) a_k h^k (Farin, Curves and Surfaces for
CAGD, on the Bernstein form; from memory). So shear (degree 2) and moment (degree 3) are drawn without any error.

A quintic (sag) is no cubic. It is cut into n equal parts, each replaced by the cubic that has its values and slopes at
both ends (Hermite). The error of that cubic is at most h^4/384 max |p''''| (Stoer and Bulirsch, Introduction to
Numerical Analysis, on Hermite interpolation; from memory). p'''' = 24 a4 + 120 a5 s runs straight, so its maximum
stands at an end of the piece, and n = ceil(h (max |p''''| / (384 tolerance))^(1/4)) parts keep the error below the
tolerance.
"""

import math
from collections.abc import Callable, Sequence

import numpy as np

from pysolver import piecewise
from pysolver.piecewise import Floats
from pysolver.svg import num

TOLERANCE = 0.045  # drawing units; with coordinates rounded to 0.001 the sag stays within 0.05

MOST_PARTS = 400  # of one piece: more parts than the paper is wide show nothing more

Curve = tuple[float, float, tuple[float, float, float, float]]  # start, end, ordinates of the four control points
Scale = Callable[[float], float]


def exact_cubic(coefficients: Floats, length: float) -> tuple[float, float, float, float]:
    """Bernstein ordinates over [0, length] of a polynomial of degree 3 or less, coefficients ascending."""
    a = [float(c) * length**k for k, c in enumerate(coefficients)] + [0.0] * 4
    return a[0], a[0] + a[1] / 3, a[0] + 2 * a[1] / 3 + a[2] / 3, a[0] + a[1] + a[2] + a[3]


def curves(start: float, end: float, coefficients: Floats, tolerance: float) -> list[Curve]:
    """The Béziers of one piece. tolerance: largest error for degrees 4 and 5, in the unit of the ordinates."""
    length = end - start
    degree = len(np.trim_zeros(np.asarray(coefficients, dtype=float), "b")) - 1
    if degree <= 3:
        return [(start, end, exact_cubic(coefficients, length))]
    n = parts(coefficients, length, tolerance)
    edges = np.linspace(0.0, length, n + 1)
    values = piecewise.evaluate(coefficients, edges)
    third = piecewise.evaluate(piecewise.derivative(coefficients), edges) * (length / n / 3)
    return [(start + float(edges[i]), start + float(edges[i + 1]),
             (float(values[i]), float(values[i] + third[i]), float(values[i + 1] - third[i + 1]), float(values[i + 1])))
            for i in range(n)]


def parts(coefficients: Floats, length: float, tolerance: float) -> int:
    """In how many equal parts a quartic or quintic is cut so that each cubic is nearer than the tolerance."""
    if tolerance <= 0.0:
        return 1
    fourth = piecewise.derivative(coefficients)
    for _ in range(3):
        fourth = piecewise.derivative(fourth)
    largest = float(np.abs(piecewise.evaluate(fourth, np.array([0.0, length]))).max())
    return min(max(1, math.ceil(length * math.sqrt(math.sqrt(largest / (384 * tolerance))))), MOST_PARTS)


def path_data(pieces: Sequence[Curve], x: Scale, y: Scale, *, base: float | None = None) -> str:
    """SVG path data through all pieces in order: jumps become verticals; a gap starts anew.

    base: also closed to this ordinate (drawing units) at both ends, for a wash or a line that starts at the base line.
    """
    d: list[str] = []
    last: float | None = None
    for start, end, b in pieces:
        if last is None or start - last > 1e-9:
            d += [] if last is None or base is None else [f"L{num(x(last))} {num(base)}"]
            d.append(f"M{num(x(start))} {num(y(b[0]) if base is None else base)}")
        d.append(f"L{num(x(start))} {num(y(b[0]))}")
        thirds = [start + (end - start) * k / 3 for k in (1, 2)]
        d.append(f"C{num(x(thirds[0]))} {num(y(b[1]))} {num(x(thirds[1]))} {num(y(b[2]))} {num(x(end))} {num(y(b[3]))}")
        last = end
    if base is not None and last is not None:
        d.append(f"L{num(x(last))} {num(base)}")
    return "".join(d)
