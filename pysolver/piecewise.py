"""Where are the extremes and the zeros of a polynomial on a piece of the beam?

Coefficients ascend in the local coordinate s: p(s) = c0 + c1 s + c2 s^2 ...; the last axis of an array of coefficients
is the degree, all axes before it are free (cases, pieces, sources), so that many beams are answered at once.

Method: the zeros of the derivative cut a piece into monotone brackets; a bracket with a change of sign holds exactly
one zero, which bisection closes in on and Newton's step, kept inside the bracket, finishes. Degree 1 is direct.
Nothing is sampled, and nothing here can return NaN except as the mark for "no zero in this place".
"""

import numpy as np
from numpy.typing import NDArray

Floats = NDArray[np.float64]

BISECTIONS = 20  # to a millionth of the bracket
NEWTON_STEPS = 3  # from there: the error is squared each time


def evaluate(coefficients: Floats, s: Floats) -> Floats:
    """p(s) by Horner's rule. Shapes: coefficients (..., d+1), s broadcasts with (...)."""
    value: Floats = coefficients[..., -1] + 0.0 * s
    for k in range(coefficients.shape[-1] - 2, -1, -1):
        value = value * s + coefficients[..., k]
    return value


def derivative(coefficients: Floats) -> Floats:
    """Coefficients of dp/ds; shape (..., d+1) -> (..., max(d, 1))."""
    degree = coefficients.shape[-1] - 1
    slope: Floats = coefficients[..., 1:] * np.arange(1.0, degree + 1)
    return slope if degree else np.zeros_like(coefficients)


def zeros(coefficients: Floats, length: Floats) -> Floats:
    """The places in [0, length] where p changes sign, ascending; shape (..., d), NaN where there are fewer than d.

    length has the shape (...). A zero that p only touches is not a change of sign and is not listed.
    """
    scaled = coefficients * length[..., None] ** np.arange(coefficients.shape[-1])
    places: Floats = _zeros_in_unit(scaled) * length[..., None]
    return places


def _zeros_in_unit(p: Floats) -> Floats:
    if p.shape[-1] <= 2:
        return _zero_of_line(p)
    inner = _zeros_in_unit(derivative(p))
    shape = (*p.shape[:-1], 1)
    ends = np.concatenate([np.zeros(shape), np.where(np.isnan(inner), 1.0, inner), np.ones(shape)], axis=-1)
    ends = np.sort(ends, axis=-1)
    found: Floats = np.sort(_bisect(p, ends[..., :-1], ends[..., 1:]), axis=-1)  # NaN sorts to the end
    return found


def _zero_of_line(p: Floats) -> Floats:
    if p.shape[-1] == 1:
        return np.zeros((*p.shape[:-1], 0))
    c0, c1 = p[..., 0], p[..., 1]
    inside = (c0 * (c0 + c1) < 0.0) | ((c0 == 0.0) & (c1 != 0.0)) | ((c0 + c1 == 0.0) & (c1 != 0.0))
    place = np.full(c0.shape, np.nan)
    place[inside] = -c0[inside] / c1[inside]
    inside_unit: Floats = np.clip(place, 0.0, 1.0)[..., None]
    return inside_unit


def _bisect(p: Floats, low: Floats, high: Floats) -> Floats:
    """One zero in each bracket (..., n) of the monotone pieces of p (..., d+1); NaN where the sign does not change."""
    at_low, at_high = evaluate(p[..., None, :], low), evaluate(p[..., None, :], high)
    crosses = (at_low * at_high < 0.0) | ((at_low == 0.0) != (at_high == 0.0))
    found = np.full(low.shape, np.nan)
    if not crosses.any():
        return found
    where = np.nonzero(crosses)
    q = p[where[:-1]]
    a, b, rising = low[where], high[where], at_high[where] > at_low[where]
    for _ in range(BISECTIONS):
        middle = 0.5 * (a + b)
        left = (evaluate(q, middle) > 0.0) != rising
        a, b = np.where(left, middle, a), np.where(left, b, middle)
    found[where] = _newton(q, 0.5 * (a + b), a, b)
    return found


def _newton(p: Floats, place: Floats, low: Floats, high: Floats) -> Floats:
    slope = derivative(p)
    for _ in range(NEWTON_STEPS):
        steep = evaluate(slope, place)
        step = np.where(steep != 0.0, evaluate(p, place) / np.where(steep != 0.0, steep, 1.0), 0.0)
        place = np.clip(place - step, low, high)
    return place


def stationary(coefficients: Floats, length: Floats) -> Floats:
    """The places in [0, length] where dp/ds changes sign; shape (..., d-1), NaN where there are fewer."""
    return zeros(derivative(coefficients), length)


def shifted(coefficients: Floats, s: Floats) -> Floats:
    """Coefficients of p in the coordinate that starts at s (Taylor shift); shape as given."""
    moved = coefficients.copy()
    degree = coefficients.shape[-1] - 1
    for k in range(degree):
        for j in range(degree - 1, k - 1, -1):
            moved[..., j] += s * moved[..., j + 1]
    return moved
