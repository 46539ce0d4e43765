"""How fast is the solver? Ratios from one run, printed.

    .venv/bin/python bench/solver.py

One solve of a three-span beam by pysolver against the same by scikit-fem (the reference of the tests, a general-purpose
finite element library); a batch of 256 beams against 256 solves; a full check against its best-estimate stage. Times are
the least of several repeats, alternating; the machine is whatever it is, so read the ratios.
"""

import sys
import time
from collections.abc import Callable
from pathlib import Path

sys.path[:0] = [str(Path(__file__).resolve().parent.parent), str(Path(__file__).resolve().parent.parent / "tests")]

from reference_fe import reference_solution

from pysolver.beam import Beam, Stretch, Support
from pysolver.check import run_check
from pysolver.demo import demo
from pysolver.loads import LineLoad, PointLoad
from pysolver.statics import solve, solve_batch

REPEATS = 15


def least(*runs: Callable[[], object]) -> list[float]:
    """The least time (s) of each run, taken in turns."""
    times = [[] for _ in runs]
    for _ in range(REPEATS):
        for i, run in enumerate(runs):
            began = time.perf_counter()
            run()
            times[i].append(time.perf_counter() - began)
    return [min(t) for t in times]


def main() -> None:
    beam = Beam(length=15.0, supports=tuple(Support(x=x, kind="pinned") for x in (0.0, 4.0, 10.0, 15.0)),
                stretches=(Stretch(start=0.0, end=15.0, bending_stiffness=2e7),))
    loads = (LineLoad(start=0.0, end=15.0, start_intensity=8e3, end_intensity=8e3), PointLoad(x=6.5, force=2.4e4),
             LineLoad(start=11.0, end=14.0, start_intensity=0.0, end_intensity=1.2e4))
    ours, theirs = least(lambda: solve(beam, loads), lambda: reference_solution(beam, loads))
    print(f"one solve: ours {1e3 * ours:.2f} ms, scikit-fem {1e3 * theirs:.2f} ms: {ours / theirs:.2f} of its time")
    batch, single = least(lambda: solve_batch([beam] * 256, [loads] * 256), lambda: [solve(beam, loads) for _ in range(256)])
    print(f"256 beams: in one batch {1e3 * batch:.1f} ms, one by one {1e3 * single:.1f} ms: {batch / single:.3f} of the time")
    record = demo()
    best, full = least(lambda: run_check(record, full=False), lambda: run_check(record))
    print(f"demonstration check: best estimate {1e3 * best:.0f} ms, with ranges {1e3 * full:.0f} ms: {full / best:.1f} times")


if __name__ == "__main__":
    main()
