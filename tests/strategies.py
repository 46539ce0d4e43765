"""Which beams and loads do the tests of laws and the random comparison try?

One generator on a `random.Random` serves both: seeded for the comparison with the finite element library, driven by
hypothesis for the laws. All places are whole multiples of 1/grid metres, so that loads often fall on supports, hinges,
changes of stiffness and each other. Only stable beams come out (rank of the rigid-body constraints, worked out here anew).
"""

import random
from dataclasses import replace
from itertools import pairwise

import numpy as np
from hypothesis import strategies as st

from pysolver.beam import Beam, Stretch, Support
from pysolver.loads import AppliedMoment, LineLoad, Load, PointLoad

GRID = 5  # places per metre for the laws: not whole in binary, so that sums of them differ in the last figure
LEAST_RIGIDITY = 1e-3  # smallest singular value of the rigid-body constraints that still counts as stable

Situation = tuple[Beam, tuple[Load, ...]]


def random_situation(rng: random.Random, most_spans: int, grid: int) -> Situation:
    """A stable beam of 1 to most_spans spans and at least one load on it."""
    beam = random_beam(rng, most_spans, grid)
    return beam, random_loads(rng, beam, rng.randint(1, 2 + 2 * most_spans), grid)


def random_beam(rng: random.Random, most_spans: int, grid: int) -> Beam:
    spans = [rng.randint(grid // 2, 12 * grid) for _ in range(rng.randint(1, most_spans))]
    left, right = (rng.choice([0, 0, rng.randint(1, 3 * grid)]) for _ in range(2))
    at = [left + sum(spans[:i]) for i in range(len(spans) + 1)]
    whole = at[-1] + right
    supports = tuple(random_support(rng, k / grid, end=k in (0, whole)) for k in at)
    if len(spans) == 1 and rng.random() < 0.2:  # a cantilever
        supports = (Support(x=supports[0].x, kind="fixed", settlement=supports[0].settlement),)
    beam = Beam(length=whole / grid, supports=supports, stretches=random_stretches(rng, whole, grid))
    return with_hinges(rng, beam, whole, grid)


def random_support(rng: random.Random, x: float, end: bool) -> Support:
    kind = rng.choice(["bearing", "bearing", "pinned", "spring", "fixed" if end or rng.random() < 0.2 else "pinned"])
    settlement = rng.choice([0.0, 0.0, rng.randint(-20, 40) / 1000])
    stiffness = 10.0 ** rng.randint(5, 8) * rng.randint(1, 9) if kind == "spring" else None
    rotational = 10.0 ** rng.randint(5, 8) if kind != "fixed" and rng.random() < 0.15 else None
    return Support(x=x, kind=kind, stiffness=stiffness, rotational=rotational, settlement=settlement)


def random_stretches(rng: random.Random, whole: int, grid: int) -> tuple[Stretch, ...]:
    cuts = sorted({rng.randint(1, whole - 1) for _ in range(rng.choice([0, 0, 1, 2, 4]))})
    edges = [0, *cuts, whole]
    return tuple(Stretch(start=a / grid, end=b / grid, bending_stiffness=1e6 * rng.randint(2, 100))
                 for a, b in pairwise(edges))


def with_hinges(rng: random.Random, beam: Beam, whole: int, grid: int) -> Beam:
    """Try up to four hinges, keeping each that leaves the beam well held and off supports that resist turning."""
    for _ in range(rng.choice([0, 0, 1, 2, 4])):
        x = rng.randint(1, whole - 1) / grid
        turning = [s.x for s in beam.supports if s.kind == "fixed" or s.rotational is not None]
        if x not in turning and x not in beam.hinges and rigidity(beam, (*beam.hinges, x)) > LEAST_RIGIDITY:
            beam = replace(beam, hinges=(*beam.hinges, x))
    return beam


def rigidity(beam: Beam, hinges: tuple[float, ...]) -> float:
    """The smallest singular value of the constraints on the rigid parts between hinges; zero for a mechanism."""
    hinges = tuple(sorted(hinges))
    parts = len(hinges) + 1
    rows = []
    for i, x in enumerate(hinges):
        row = np.zeros(2 * parts)
        row[2 * i:2 * i + 4] = 1.0, x / beam.length, -1.0, -x / beam.length
        rows.append(row)
    for support in beam.supports:
        part = int(np.searchsorted(hinges, support.x))
        row = np.zeros(2 * parts)
        row[2 * part:2 * part + 2] = 1.0, support.x / beam.length
        rows.append(row)
        if support.kind == "fixed" or support.rotational is not None:
            turn = np.zeros(2 * parts)
            turn[2 * part + 1] = 1.0
            rows.append(turn)
    sizes = np.linalg.svd(np.array(rows), compute_uv=False)
    return float(sizes[-1]) if len(sizes) == 2 * parts else 0.0


def random_loads(rng: random.Random, beam: Beam, count: int, grid: int) -> tuple[Load, ...]:
    return tuple(random_load(rng, beam, f"source {i % 3}", grid) for i in range(count))


def random_load(rng: random.Random, beam: Beam, source: str, grid: int) -> Load:
    whole = round(beam.length * grid)
    kind = rng.choice(["point", "line", "line", "moment"])
    if kind == "line":
        start = rng.randint(0, whole - 1)
        end = rng.randint(start + 1, whole)
        first, last = rng.randint(-3, 30) * 1000.0, rng.randint(-3, 30) * 1000.0
        return LineLoad(start=start / grid, end=end / grid, start_intensity=first, end_intensity=last, source=source)
    x = rng.randint(0, whole) / grid
    if kind == "moment" and x not in beam.hinges:
        return AppliedMoment(x=x, moment=(rng.randint(1, 40) - 20.5) * 1000.0, source=source)
    return PointLoad(x=x, force=(rng.randint(1, 60) - 10.5) * 1000.0, source=source)


randoms = st.randoms(use_true_random=False)
beams = randoms.map(lambda rng: random_beam(rng, 4, GRID))
situations = randoms.map(lambda rng: random_situation(rng, 4, GRID))
