"""Does the solver agree with a general-purpose finite element library (scikit-fem) on beams nobody picked by hand?

200 beams from an explicit list of seeds: 1 to 12 spans, overhangs, cantilevers, hinges, springs, settlements, stepped
EI, every kind of load. Differences are relative to the largest value on that beam. Where the two disagree, both the
handbook cases and the laws have to say who is right.
"""

import random
import sys

import numpy as np
import pytest
from strategies import random_situation
from test_statics_cases import CASES, agrees, build_beam, build_load, si

from pysolver.statics import solve, value

if sys.platform == "emscripten":
    pytest.skip("scipy and scikit-fem are not there in Pyodide", allow_module_level=True)

from reference_fe import reference_solution

pytestmark = pytest.mark.cpython_only

SEEDS = range(20260100, 20260300)
GRID = 4  # places per metre: the library's error grows as (length / shortest element)^4, to 7e-7 with 50 mm (seen)
SMALLEST_BY_CHANCE = {"hinged": 30, "sprung": 60, "settled": 60, "stepped": 60, "overhanging": 60, "fixed": 40, "long": 60}

# of the largest value on the beam; both methods solve systems with a condition number up to about 1e8 in 64 bits
ALLOWED = {"reactions": 1e-8, "fixing_moments": 1e-8, "shear": 1e-8, "moment": 1e-8, "sag": 1e-7, "slope": 1e-7}


def situation(seed: int):
    return random_situation(random.Random(seed), 12, GRID)


def differences(beam, loads) -> dict[str, float]:
    ours, theirs = solve(beam, loads), reference_solution(beam, loads)
    found = {}
    for quantity in ("shear", "moment", "slope", "sag"):
        mine = np.array([[value(ours, quantity, float(x), side) for x, side in zip(ends, ("right", "left"), strict=True)]
                         for ends in theirs.x])
        found[quantity] = relative(mine, getattr(theirs, quantity))
    for quantity in ("reactions", "fixing_moments"):
        # a fixing moment is small or large beside the bending moments, not beside itself
        scale = np.abs(theirs.moment).max() if quantity == "fixing_moments" else 0.0
        found[quantity] = relative(getattr(ours, quantity), getattr(theirs, quantity), scale)
    return found


def relative(mine, theirs, scale: float = 0.0) -> float:
    return float(np.abs(mine - theirs).max() / max(np.abs(theirs).max(), scale))


@pytest.mark.parametrize("seed", SEEDS)
def test_solver_agrees_with_the_finite_element_library_on_a_random_beam(seed):
    found = differences(*situation(seed))
    assert {name: error for name, error in found.items() if not error <= ALLOWED[name]} == {}


def test_the_random_beams_are_of_every_kind():
    beams = [situation(seed)[0] for seed in SEEDS]
    counted = {
        "hinged": sum(bool(b.hinges) for b in beams),
        "sprung": sum(any(s.kind == "spring" for s in b.supports) for b in beams),
        "settled": sum(any(s.settlement for s in b.supports) for b in beams),
        "stepped": sum(len(b.stretches) > 1 for b in beams),
        "overhanging": sum(b.supports[0].x > 0.0 or b.supports[-1].x < b.length for b in beams),
        "fixed": sum(any(s.kind == "fixed" for s in b.supports) for b in beams),
        "long": sum(len(b.supports) > 7 for b in beams),
    }
    assert {kind: count for kind, count in counted.items() if count < SMALLEST_BY_CHANCE[kind]} == {}


def published_against_reference(case) -> list[tuple[str, float, float]]:
    """(what, from the library, expected) of the case's support values and of its values at places that are nodes."""
    theirs = reference_solution(build_beam(case), [build_load(case, row) for row in case["loads"]])
    found = []
    for row in case["expected"]:
        if "support" in row:
            of_supports = theirs.reactions if row["of"] == "reaction" else theirs.fixing_moments
            found.append((row["of"], of_supports[int(row["support"])], si(case, row["of"], row["value"])))
        elif row["of"] in ("shear", "moment", "slope", "sag"):
            here = np.abs(theirs.x - si(case, "x", row["x"])) < 1e-9
            if "side" in row:
                here[:, 0 if row["side"] == "left" else 1] = False  # an element starts on the right side of its left end
            found += [(row["of"], at, si(case, row["of"], row["value"])) for at in getattr(theirs, row["of"])[here]]
    return found


@pytest.mark.parametrize("case", CASES, ids=[case["name"] for case in CASES])
def test_the_reference_itself_gives_the_published_or_hand_worked_value(case):
    found = published_against_reference(case)
    assert found
    assert [row for row in found if not agrees(row[1], row[2], 1e-8)] == []
