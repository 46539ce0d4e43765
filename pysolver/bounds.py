"""What is the worst when lengths and positions lie anywhere in their ranges?

Loads enter through the sign of their influence (envelope.py). Lengths and positions do not act linearly, so they are
searched: a grid of the box (its corners, and levels inside for wide ranges), the middles of its sides, and from the worst
point found for each criterion a climb through the inside of wide ranges, since a worst case may lie between the corners
(J15: a stack somewhere between 2 and 4 m of a 6 m span is worst at 3 m). Inside a range of a few millimetres a stationary
point gains only the square of that little. At most eight variables are varied together; each of the rest goes to the end
that alone makes a criterion worse. A search is no proof: the result says "searched".
"""

from collections.abc import Generator, Sequence
from dataclasses import dataclass
from itertools import product

import numpy as np
from numpy.typing import NDArray

Floats = NDArray[np.float64]

TOGETHER = 8  # uncertain lengths and positions varied together; more are named
GRID = 700  # points of the grid at most
LEVELS = (3, 5)  # of a wide range, as far as the grid allows
CLIMBS = 8
STEPS = np.array([-1.0, -0.4, -0.1, 0.1, 0.4, 1.0])
GAIN = 1e-5  # of the value: smaller gains end the climb

Asking = Generator[Floats, Floats, "Found"]  # yields points (C, n) and is sent their values (C, K)


@dataclass(frozen=True, slots=True, kw_only=True)
class Searched:
    """For each of K criteria the largest value found, and the point (n,) of the box where it was found; and which of the
    variables were varied together."""

    worst: Floats
    points: Floats
    together: tuple[int, ...]


def search(low: Floats, best: Floats, high: Floats, *, wide: NDArray[np.bool_],
           starts: Floats) -> Generator[Floats, Floats, Searched]:
    """Yields points (C, n) of the box [low, high] and must be sent their values (C, K); returns what it found. So whoever
    evaluates them may do so in slices, and stop. best is one of the points.

    wide (n,): whose range is wide. starts (m, n): further points to begin from.
    """
    ends = yield from _ends(low, best, high)
    together = _most_telling(ends)
    found = yield from _best_of(np.concatenate([_starts(low, best, high, together, wide), starts]), None)
    rest = np.array([i not in together for i in range(len(low))], bool)
    if rest.any():
        worse_end = np.where(ends[1] > ends[0], high[:, None], low[:, None]).T
        found = yield from _best_of(np.where(rest, worse_end, found[1]), found)
    worst, at = yield from _climb(found, low, high, wide)
    return Searched(worst=worst, points=at, together=tuple(together))


Found = tuple[Floats, Floats]  # for each criterion the largest value (K,) and its point (K, n)


def _best_of(points: Floats, before: Found | None) -> Asking:
    values = yield points
    top = values.argmax(axis=0)
    worst, at = values[top, np.arange(values.shape[1])], points[top]
    if before is None:
        return worst, at
    better = worst > before[0]
    return np.where(better, worst, before[0]), np.where(better[:, None], at, before[1])


def _ends(low: Floats, best: Floats, high: Floats) -> Generator[Floats, Floats, tuple[Floats, Floats, Floats]]:
    """(n, K) at the low end and at the high end of each variable alone, and (1, K) at best."""
    n = len(low)
    points = np.tile(best, (2 * n + 1, 1))
    points[np.arange(n), np.arange(n)] = low
    points[n + np.arange(n), np.arange(n)] = high
    values = yield points
    return values[:n], values[n:2 * n], values[2 * n:]


def _most_telling(ends: tuple[Floats, Floats, Floats]) -> list[int]:
    """The variables whose range, taken alone, changes a criterion most, in their own order."""
    at_low, at_high, at_best = ends
    telling = np.maximum(np.abs(at_low - at_best), np.abs(at_high - at_best)).max(axis=1, initial=0.0)
    return sorted(np.argsort(-telling, kind="stable")[:TOGETHER].tolist())


def _climb(found: Found, low: Floats, high: Floats, wide: NDArray[np.bool_]) -> Asking:
    """From each criterion's worst point along each wide range, in steps that shrink when nothing is gained."""
    climbing = np.full(len(found[0]), bool(wide.any()))
    reach = 0.5 * (high - low)
    for _ in range(CLIMBS):
        if not climbing.any():
            break
        before = found[0]
        found = yield from _best_of(_neighbours(np.unique(found[1][climbing], axis=0), low, high, reach, wide), found)
        climbing &= found[0] > before + GAIN * np.abs(before)
        reach = 0.5 * reach
    return found


def _starts(low: Floats, best: Floats, high: Floats, together: Sequence[int], wide: NDArray[np.bool_]) -> Floats:
    n = len(low)
    levels = _levels([i for i in together if wide[i]], together)
    grid = list(product(*([np.linspace(low[i], high[i], levels[i]).tolist() if i in levels else [best[i]] for i in range(n)])))
    middles = np.tile(best, (n, 1))
    middles[np.arange(n), np.arange(n)] = 0.5 * (low + high)
    return np.concatenate([best[None, :], np.array(grid).reshape(len(grid), n), middles])


def _levels(wide: Sequence[int], together: Sequence[int]) -> dict[int, int]:
    """How many values of each variable the grid has: its ends, and more inside wide ranges as far as it may grow."""
    levels = dict.fromkeys(together, 2)
    for count in LEVELS:
        for i in wide:
            if np.prod(list(levels.values())) / levels[i] * count <= GRID:
                levels[i] = count
    return levels


def _neighbours(at: Floats, low: Floats, high: Floats, reach: Floats, wide: NDArray[np.bool_]) -> Floats:
    """For each of the K points a step of each size along each wide range, kept in the box."""
    moved = []
    for i in np.nonzero(wide)[0]:
        near = np.repeat(at, len(STEPS), axis=0)
        near[:, i] = np.clip((at[:, i, None] + STEPS * reach[i]).ravel(), low[i], high[i])
        moved.append(near)
    return np.unique(np.concatenate(moved), axis=0)
