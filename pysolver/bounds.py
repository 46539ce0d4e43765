"""What is the worst when lengths and positions lie anywhere in their ranges?

Loads enter through the sign of their influence (envelope.py). Lengths and positions do not act linearly, so they are
searched: the corners of the box, the middles of its sides, and from the worst point found for each criterion a climb
along every variable through the inside of its range, since a worst case may lie between the corners (J15: a stack
somewhere between 2 and 4 m of a 6 m span is worst at 3 m). A search is no proof: what comes out is marked "searched".
"""

from collections.abc import Callable
from dataclasses import dataclass
from itertools import product

import numpy as np
from numpy.typing import NDArray

Floats = NDArray[np.float64]

MOST_VARIED = 8  # more uncertain lengths and positions than these are named as not varied
FULL_GRID = 4  # up to so many variables also get their middle values: 3^4 points
CLIMBS = 5
STEPS = np.array([-1.0, -0.4, -0.1, 0.1, 0.4, 1.0])
GAIN = 1e-6  # of a ratio: smaller gains end the climb
WORTH_CLIMBING = 0.5  # a criterion below half of its limit at every corner, side and middle is left there

Evaluate = Callable[[Floats], Floats]


@dataclass(frozen=True, slots=True, kw_only=True)
class Searched:
    """For each of K criteria the largest value found, and the point (n,) of the box where it was found."""

    worst: Floats
    points: Floats


def search(evaluate: Evaluate, low: Floats, best: Floats, high: Floats) -> Searched:
    """evaluate(points (C, n)) -> values (C, K), called with points of the box [low, high]; best is one of them."""
    points = _starts(low, best, high)
    values = evaluate(points)
    top = values.argmax(axis=0)
    worst, at = values[top, np.arange(values.shape[1])], points[top]
    climbing = worst >= WORTH_CLIMBING if len(low) else np.zeros(len(worst), bool)
    reach = 0.5 * (high - low)
    for _ in range(CLIMBS):
        if not climbing.any():
            break
        tried = np.unique(_neighbours(np.unique(at[climbing], axis=0), low, high, reach), axis=0)
        values = evaluate(tried)
        top = values.argmax(axis=0)
        found = values[top, np.arange(values.shape[1])]
        better = found > worst
        climbing &= found > worst + GAIN
        worst, at = np.where(better, found, worst), np.where(better[:, None], tried[top], at)
        reach = 0.45 * reach
    return Searched(worst=worst, points=at)


def _starts(low: Floats, best: Floats, high: Floats) -> Floats:
    n = len(low)
    levels = [[a, 0.5 * (a + b), b] if n <= FULL_GRID else [a, b] for a, b in zip(low, high, strict=True)]
    chosen = list(product(*levels))
    corners = np.array(chosen).reshape(len(chosen), n)
    middles = np.tile(best, (n, 1))
    middles[np.arange(n), np.arange(n)] = 0.5 * (low + high)
    return np.concatenate([best[None, :], corners, middles])


def _neighbours(at: Floats, low: Floats, high: Floats, reach: Floats) -> Floats:
    """For each of the K points, a step of each size along each variable, kept in the box."""
    k, n = at.shape
    moved = np.repeat(at, n * len(STEPS), axis=0).reshape(k, n, len(STEPS), n)
    for i in range(n):
        moved[:, i, :, i] += STEPS * reach[i]
    result: Floats = np.clip(moved.reshape(-1, n), low, high)
    return result


def most_telling(evaluate: Evaluate, low: Floats, best: Floats, high: Floats, most: int = MOST_VARIED) -> list[int]:
    """The variables whose range, taken alone, changes the criteria most: at most `most` of them, in their own order."""
    n = len(low)
    if n <= most:
        return list(range(n))
    points = np.tile(best, (2 * n, 1))
    points[np.arange(n), np.arange(n)] = low
    points[n + np.arange(n), np.arange(n)] = high
    change = np.abs(evaluate(points) - evaluate(best[None, :])).max(axis=1)
    telling = np.maximum(change[:n], change[n:])
    return sorted(np.argsort(-telling, kind="stable")[:most].tolist())
