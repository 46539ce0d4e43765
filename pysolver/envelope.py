"""What is the worst effect along the beam when every source may take any value of its range?

With the geometry fixed the effect at a place is the sum over sources of (factor x response to the source). Each factor
lies in a range, so the worst sum takes, source by source, the end of the range that the sign of the response there asks
for (the sign of the influence). Along a piece these signs change only at zeros of a single source's polynomial; between
them the worst effect is one polynomial. A maximum cannot lie at such a zero (the worst effect has a convex kink there),
so ends of pieces and stationary points of those polynomials are all the candidates there are: the answer is exact.
"""

from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise

Floats = NDArray[np.float64]
Ints = NDArray[np.intp]


@dataclass(frozen=True, slots=True, kw_only=True)
class Worst:
    """For each of C beams: the largest ratio of effect to capacity, its effect, place and case (row of factors)."""

    ratio: Floats
    effect: Floats
    piece: Ints
    s: Floats
    case: Ints


@dataclass(frozen=True, slots=True, kw_only=True)
class Influence:
    """The response of a quantity to each source along C beams, and where it changes sign.

    coefficients (C, P, S, d+1); lengths (C, P); ends (C, P, Q+1) of the sub-pieces on which no source changes sign;
    inside (C, P, Q, S) the response in the middle of each sub-piece.
    """

    coefficients: Floats
    lengths: Floats
    ends: Floats
    inside: Floats


def influence(coefficients: Floats, lengths: Floats) -> Influence:
    """coefficients (C, P, S, d+1) in s from the start of each piece of `lengths` (C, P)."""
    crossings = piecewise.zeros(coefficients, np.broadcast_to(lengths[:, :, None], coefficients.shape[:-1]))
    flat = np.sort(crossings.reshape(*lengths.shape, -1), axis=-1)
    used = int((~np.isnan(flat)).sum(axis=-1).max(initial=0))
    inner = np.where(np.isnan(flat[..., :used]), lengths[..., None], flat[..., :used])
    ends = np.concatenate([np.zeros((*lengths.shape, 1)), inner, lengths[..., None]], axis=-1)
    middle = 0.5 * (ends[..., :-1] + ends[..., 1:])
    inside = piecewise.evaluate(coefficients[:, :, None, :, :], middle[..., None])
    return Influence(coefficients=coefficients, lengths=lengths, ends=ends, inside=inside)


def worst(of: Influence, sign: float, low: Floats, high: Floats, capacity: Floats) -> Worst:
    """The largest ratio to capacity of the positive (sign 1) or negative (sign -1) effect.

    low, high (K, S) ends of the factors' ranges in each case; capacity (C, P) > 0, infinite where nothing limits.
    """
    places = _candidates(of, sign, low, high)
    at_places = sign * piecewise.evaluate(np.swapaxes(of.coefficients, 1, 2)[:, :, :, None, :], places[:, None])
    count = len(of.lengths)
    best = Worst(ratio=np.full(count, -1.0), effect=np.zeros(count), piece=np.zeros(count, np.intp), s=np.zeros(count),
                 case=np.zeros(count, np.intp))
    for k in range(len(low)):
        best = _larger(best, _one_case(at_places, places, low[k], high[k], capacity, k))
    return best


def _sum_by_sign(values: Floats, low: Floats, high: Floats) -> Floats:
    """values (C, S, P, n) -> (C, P, n): each source at the end of its range that makes the sum largest."""
    total: Floats = np.maximum(values * low[:, None, None], values * high[:, None, None]).sum(axis=1)
    return total


def worst_polynomials(of: Influence, sign: float, low: Floats, high: Floats) -> Floats:
    """(C, P, Q, d+1) the worst effect of one case on each sub-piece, in s from the start of the piece; low, high (S,)."""
    factor = np.where(sign * of.inside > 0.0, high, low)
    summed: Floats = np.einsum("cpqs,cpsd->cpqd", factor, of.coefficients)
    return summed


def _candidates(of: Influence, sign: float, low: Floats, high: Floats) -> Floats:
    """(C, P, n) every place where the worst effect of some case can have its maximum."""
    ends = [np.zeros((*of.lengths.shape, 1)), of.lengths[..., None]]
    if of.coefficients.shape[-1] > 1:
        for k in range(len(low)):
            summed = worst_polynomials(of, sign, low[k], high[k])
            flat = piecewise.stationary(summed, np.broadcast_to(of.lengths[..., None], summed.shape[:-1]))
            ends.append(flat.reshape(*of.lengths.shape, -1))
    places = np.concatenate(ends, axis=-1)
    return np.where(np.isnan(places), 0.0, places)


def _one_case(values: Floats, places: Floats, low: Floats, high: Floats, capacity: Floats, case: int) -> Worst:
    effect = _sum_by_sign(values, low, high)
    ratio = np.maximum(effect, 0.0) / capacity[..., None]
    cases, _, n = ratio.shape
    top = ratio.reshape(cases, -1).argmax(axis=1)
    rows = np.arange(cases)
    return Worst(ratio=ratio.reshape(cases, -1)[rows, top], effect=effect.reshape(cases, -1)[rows, top], piece=top // n,
                 s=places.reshape(cases, -1)[rows, top], case=np.full(cases, case, np.intp))


def _larger(a: Worst, b: Worst) -> Worst:
    more = b.ratio > a.ratio
    names = ("ratio", "effect", "piece", "s", "case")
    return Worst(**{name: np.where(more, getattr(b, name), getattr(a, name)) for name in names})
