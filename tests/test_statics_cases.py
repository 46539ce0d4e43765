"""Does the solver give what handbooks, closed forms and hand sheets give?

The cases are data (cases/*.json) with their source beside them. Every expected value is also shifted by 1 % to show
that the comparison would notice.
"""

import json
from fractions import Fraction
from pathlib import Path

import pytest

from pysolver.beam import Beam, Stretch, Support
from pysolver.loads import AppliedMoment, LineLoad, PointLoad
from pysolver.statics import extremes, solve, value

# NIST SP 811 (2008), appendix B.8: the foot is 0.3048 m exactly, the pound-force 4.448 221 615 260 5 N exactly
METRES = {"m": Fraction(1), "ft": Fraction(3048, 10000)}
NEWTONS = {"kN": Fraction(1000), "kip": Fraction("4448.2216152605")}

# powers of length and of force in each quantity
DIMENSIONS = {"x": (1, 0), "reaction": (0, 1), "shear": (0, 1), "moment": (1, 1), "fixing moment": (1, 1),
              "sag": (1, 0), "slope": (0, 0), "intensity": (-1, 1), "bending stiffness": (2, 1),
              "stiffness": (-1, 1), "rotational": (1, 1)}

HALF_A_PER_CENT = 0.005  # no tolerance may come near the 1 % by which the values are shifted


def read(file: str) -> list[dict]:
    text = json.loads((Path(__file__).parent / "cases" / file).read_text(encoding="utf-8"))
    return [{"tolerance": text["tolerance"], **case} for case in text["cases"]]


CASES = read("handbook.json") + read("hand_sheets.json")
every_case = pytest.mark.parametrize("case", CASES, ids=[case["name"] for case in CASES])


def si(case: dict, quantity: str, text: str) -> float:
    length, force = DIMENSIONS[quantity]
    units = case["units"]
    return float(Fraction(text) * METRES[units["length"]] ** length * NEWTONS[units["force"]] ** force)


def build_beam(case: dict) -> Beam:
    supports = tuple(
        Support(x=si(case, "x", row["x"]), kind=row["kind"], settlement=si(case, "x", row.get("settlement", "0")),
                **{name: si(case, name, row[name]) for name in ("stiffness", "rotational") if name in row})
        for row in case["supports"])
    stretches = tuple(
        Stretch(start=si(case, "x", row["start"]), end=si(case, "x", row["end"]),
                bending_stiffness=si(case, "bending stiffness", row["bending_stiffness"]))
        for row in case["stretches"])
    return Beam(length=si(case, "x", case["length"]), supports=supports, stretches=stretches,
                hinges=tuple(si(case, "x", x) for x in case["hinges"]))


def build_load(case: dict, row: dict) -> PointLoad | LineLoad | AppliedMoment:
    if row["kind"] == "point":
        return PointLoad(x=si(case, "x", row["x"]), force=si(case, "reaction", row["force"]), source="a")
    if row["kind"] == "moment":
        return AppliedMoment(x=si(case, "x", row["x"]), moment=si(case, "moment", row["moment"]), source="a")
    return LineLoad(start=si(case, "x", row["start"]), end=si(case, "x", row["end"]), source="a",
                    start_intensity=si(case, "intensity", row["start_intensity"]),
                    end_intensity=si(case, "intensity", row["end_intensity"]))


def comparisons(case: dict) -> list[tuple[str, float, float]]:
    """(what, found, expected) of every expected value of the case, in SI units."""
    response = solve(build_beam(case), tuple(build_load(case, row) for row in case["loads"]))
    found = []
    for row in case["expected"]:
        of = row["of"]
        quantity = of.removeprefix("largest ").removeprefix("smallest ")
        expected = si(case, quantity, row["value"])
        if quantity != of:
            extreme = extremes(response, quantity)[of.startswith("smallest")]
            found.append((of, extreme.value, expected))
            if "x" in row:
                found.append((f"place of the {of}", extreme.x, si(case, "x", row["x"])))
        elif "support" in row:
            of_supports = response.reactions if of == "reaction" else response.fixing_moments
            found.append((f"{of} {row['support']}", of_supports[int(row["support"])], expected))
        else:
            x, sides = si(case, "x", row["x"]), [row["side"]] if "side" in row else _inner_sides(case, row)
            found += [(f"{of} at {row['x']} {side}", value(response, quantity, x, side), expected) for side in sides]
    return found


def _inner_sides(case: dict, row: dict) -> list[str]:
    """Both sides of a place where the case names none; at an end of the beam only the side inside it."""
    return {"0": ["right"], case["length"]: ["left"]}.get(row["x"], ["left", "right"])


def agrees(found: float, expected: float, tolerance: float) -> bool:
    return abs(found - expected) <= tolerance * abs(expected)


@every_case
def test_solver_gives_the_published_or_hand_worked_value(case):
    tolerance = float(case["tolerance"]["relative"])
    off = [f"{what}: {found!r}, expected {expected!r}" for what, found, expected in comparisons(case)
           if not agrees(found, expected, tolerance)]
    assert not off, f"{case['source']}: {off}"


@every_case
@pytest.mark.parametrize("shift", [0.99, 1.01])
def test_every_expected_value_is_missed_when_shifted_by_one_per_cent(case, shift):
    tolerance = float(case["tolerance"]["relative"])
    unnoticed = [what for what, found, expected in comparisons(case) if agrees(found, expected * shift, tolerance)]
    assert not unnoticed


@every_case
def test_every_case_names_its_source_its_working_and_why_its_tolerance(case):
    assert case["source"]
    assert case["working"]
    assert case["tolerance"]["why"]
    assert 0.0 < float(case["tolerance"]["relative"]) < HALF_A_PER_CENT
    assert len(case["expected"]) >= 2


def test_no_expected_value_is_zero_for_a_shift_would_not_move_it():
    assert all(Fraction(row[key]) != 0 for case in CASES for row in case["expected"] for key in ("value", "x")
               if key in row and not (key == "x" and row["of"] in DIMENSIONS))
