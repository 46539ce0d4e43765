"""Do the factors of each standard come out as its printed expressions say? Every case is worked by hand from the expression.

Sources: EN 1990:2002+A1:2005, 6.4.3.2, expression 6.10, with table A1.2(B) (1.35 / 1.00 / 1.50), read in secondary copies,
and psi0 of table A1.1 from memory; ASCE/SEI 7-16, 2.3.1 (strength) and 2.4.1 (allowable stress), from memory, the same
forms being printed in a city code that adopts them.
"""

import pytest
from records import SAG, SHEAR, bare, beam, entry, everywhere, generous, one, outcome_of, overhanging, point, sheet

from pysolver.check import run_check
from pysolver.combinations import Source, cases, own_set, sets

EXACT = 1e-9
Q = dict[str, float]


def mid_span(loads: dict[str, float], chosen: str, permanent: float = 0.0, basis: str = "factored", **more: object) -> float:
    """The factored moment (kN·m) at mid-span of 4 m, where a point load P gives P x 4 / 4 = P. loads: kN by category."""
    placed = [point(name, f"{kn} kN", "2.00 m", name) for name, kn in loads.items()]
    placed += [point("dead", f"{permanent} kN", "2.00 m", "permanent")] if permanent else [everywhere("dead", "0 kN/m")]
    limits = [sheet(entry(SAG, "1000 kNm"), entry(SHEAR, "1000 kN"), basis=basis, set=chosen, **more)]
    found = one(run_check(beam(["4.00 m"], loads=placed, limits=limits)), SAG)
    return found.factored / 1e3


@pytest.mark.parametrize(("permanent", "loads", "expected"), [
    # 1.35 G + 1.5 Q,1 + 1.5 psi0 Q,2 with each variable action leading in turn; the larger governs
    (10, {"imposed": 20.0, "snow": 8.0}, 1.35 * 10 + 1.5 * 20 + 1.5 * 0.7 * 8),
    (10, {"imposed": 8.0, "snow": 20.0}, 1.35 * 10 + 1.5 * 20 + 1.5 * 0.7 * 8),
    (10, {"imposed": 20.0, "stored": 8.0}, 1.35 * 10 + 1.5 * 20 + 1.5 * 1.0 * 8),
    (10, {"imposed": 20.0, "roof": 2.0}, 1.35 * 10 + 1.5 * 20 + 0.0),  # psi0 of roofs is 0
    (10, {"imposed": 2.0, "roof": 8.0}, 1.35 * 10 + 1.5 * 8 + 1.5 * 0.7 * 2),
    (10, {"imposed": 20.0, "snow": 8.0, "stored": 4.0}, 1.35 * 10 + 1.5 * 20 + 1.5 * 0.7 * 8 + 1.5 * 4),
    (10, {}, 1.35 * 10),
    (0, {"imposed": 20.0}, 1.5 * 20),
])
def test_en_1990_expression_6_10(permanent: float, loads: Q, expected: float) -> None:
    assert mid_span(loads, "en1990-6.10-str", permanent) == pytest.approx(expected, rel=EXACT)


@pytest.mark.parametrize(("permanent", "loads", "expected"), [
    (10, {}, 1.4 * 10),  # 1
    (10, {"imposed": 20.0}, 1.2 * 10 + 1.6 * 20),  # 2
    (10, {"imposed": 20.0, "roof": 6.0}, 1.2 * 10 + 1.6 * 20 + 0.5 * 6),  # 2
    (10, {"imposed": 20.0, "snow": 6.0}, 1.2 * 10 + 1.6 * 20 + 0.5 * 6),  # 2
    (10, {"imposed": 6.0, "snow": 20.0}, 1.2 * 10 + 1.6 * 20 + 1.0 * 6),  # 3
    (10, {"imposed": 6.0, "roof": 20.0}, 1.2 * 10 + 1.6 * 20 + 1.0 * 6),  # 3
    (10, {"roof": 9.0, "snow": 20.0}, 1.2 * 10 + 1.6 * 20),  # 3: Lr or S, not both
    (100, {"imposed": 2.0}, 1.4 * 100),  # 1 above 2 (1.2 x 100 + 1.6 x 2)
])
def test_asce_7_16_strength(permanent: float, loads: Q, expected: float) -> None:
    assert mid_span(loads, "asce7-16-lrfd", permanent) == pytest.approx(expected, rel=EXACT)


@pytest.mark.parametrize(("permanent", "loads", "expected"), [
    (10, {}, 10),  # 1
    (10, {"imposed": 20.0}, 10 + 20),  # 2
    (10, {"snow": 20.0}, 10 + 20),  # 3
    (10, {"imposed": 20.0, "snow": 16.0}, 10 + 0.75 * 20 + 0.75 * 16),  # 4
    (10, {"imposed": 20.0, "snow": 2.0}, 10 + 20),  # 2 above 4 (10 + 16.5)
    (10, {"stored": 8.0, "roof": 8.0}, 10 + 0.75 * 16),  # 4
])
def test_asce_7_16_allowable_stress(permanent: float, loads: Q, expected: float) -> None:
    assert mid_span(loads, "asce7-16-asd", permanent, basis="unfactored") == pytest.approx(expected, rel=EXACT)


def test_own_factors_are_the_ones_entered() -> None:
    """1.2 G + 1.4 Q,1 + 0.9 Q,2 as an office might give them: 12 + 28 + 7.2."""
    own = {"permanent": "1.2", "permanent_favourable": "0.95", "leading": "1.4", "accompanying": "0.9"}
    found = mid_span({"imposed": 20.0, "snow": 8.0}, "own", 10, own=own)
    assert found == pytest.approx(1.2 * 10 + 1.4 * 20 + 0.9 * 8, rel=EXACT)


@pytest.mark.parametrize("bad", ["", "abc", "-1", "9", "1.3O", "1,350"])
def test_own_factors_that_are_no_factors_are_refused_at_their_field(bad: str) -> None:
    own = {"permanent": bad, "permanent_favourable": "1", "leading": "1.5", "accompanying": "1.5"}
    limits = [generous(basis="factored", set="own", own=own)]
    result = run_check(beam(["4.00 m"], limits=limits))
    assert result.outcome.word == "cannot"
    assert [e.field for e in result.errors] == ["/limits/0/own/permanent"]


@pytest.mark.parametrize("name", ["permanent", "leading"])
def test_an_own_factor_below_one_never_makes_a_factored_effect_smaller_than_the_load(name: str) -> None:
    """A slip of the finger (0 for 1.5) would otherwise be within any limit. No published set has an unfavourable factor of
    the permanent or the leading load below 1.0 with a factored limit."""
    own = {"permanent": "1.2", "permanent_favourable": "0.95", "leading": "1.4", "accompanying": "0.9", name: "0"}
    assert outcome_of(beam(["4.00 m"], limits=[generous(basis="factored", set="own", own=own)])) != "within"


def test_own_factors_not_entered_are_never_taken_as_one() -> None:
    result = run_check(beam(["4.00 m"], limits=[generous(basis="factored", set="own")]))
    assert result.outcome.word == "cannot"


# --- favourable loads: 4 m span under 10 kN/m, an overhang of 2 m with a load P at its tip that relieves the span -----------


def relieved(category: str, chosen: str, basis: str, **more: object) -> float:
    """Span moment (kN·m): R = 20 a - P b x 2 / 4, M = R^2 / (2 x 10 a), with a and b the factors of floor and tip load."""
    loads = [*overhanging()["loads"], point("tip", "4 kN", "6.00 m", category, **more)]
    limits = [generous(basis=basis, set=chosen)]
    return one(run_check(overhanging(loads=loads, limits=limits)), SAG).factored / 1e3


@pytest.mark.parametrize(("category", "chosen", "basis", "a", "b"), [
    ("permanent", "en1990-6.10-str", "factored", 1.35, 1.0), ("stored", "en1990-6.10-str", "factored", 1.35, 0.0),
    ("permanent", "asce7-16-lrfd", "factored", 1.4, 0.9), ("stored", "asce7-16-lrfd", "factored", 1.4, 0.0),
    ("permanent", "asce7-16-asd", "unfactored", 1.0, 0.6), ("stored", "asce7-16-asd", "unfactored", 1.0, 0.0),
    ("permanent", "unfactored", "unfactored", 1.0, 1.0), ("stored", "unfactored", "unfactored", 1.0, 0.0),
])
def test_a_load_that_relieves_takes_its_favourable_factor(category: str, chosen: str, basis: str, a: float, b: float) -> None:
    expected = (20 * a - 4 * b * 0.5) ** 2 / (20 * a)
    assert relieved(category, chosen, basis) == pytest.approx(expected, rel=EXACT)


def test_a_load_that_relieves_and_cannot_be_removed_stays_in_the_unfactored_set() -> None:
    assert relieved("stored", "unfactored", "unfactored", removable=False) == pytest.approx(18**2 / 20, rel=EXACT)
    assert relieved("stored", "unfactored", "unfactored", removable=None) == pytest.approx(20.0, rel=EXACT)


def test_a_favourable_variable_action_is_never_counted_in_a_factored_set_even_if_it_cannot_be_removed() -> None:
    """EN 1990:2002 table A1.2(B): 0 where favourable."""
    assert relieved("stored", "en1990-6.10-str", "factored", removable=False) == pytest.approx((20 * 1.35) ** 2 / 27, rel=EXACT)


# --- the data -----------------------------------------------------------------------------------------------------


def test_every_set_names_its_edition_and_where_its_factors_were_read() -> None:
    for chosen in sets().values():
        assert chosen.edition
        assert chosen.data["source"]
        assert chosen.basis in ("factored", "unfactored")


@pytest.mark.parametrize("name", sorted(sets()))
def test_no_factored_case_takes_less_than_the_load_where_it_adds_and_leads(name: str) -> None:
    """In some case of every set each category alone takes at least its whole value; factored sets take more."""
    chosen = own_set(permanent=1.35, permanent_favourable=1.0, leading=1.5, accompanying=1.05) if name == "own" else sets()[name]
    for category in ("permanent", "imposed", "stored", "roof", "snow", "water", "construction", None):
        largest = max(case.unfavourable[0] for case in cases(chosen, [Source(name="s", category=category)]))
        assert largest >= (1.2 if chosen.basis == "factored" else 1.0)


def test_the_shown_name_of_the_governing_combination_is_the_one_with_these_factors() -> None:
    loads = [everywhere("dead", "0 kN/m"), point("imposed", "6 kN", "2.00 m", "imposed"),
             point("snow", "20 kN", "2.00 m", "snow")]
    limits = [sheet(entry(SAG, "1000 kNm"), entry(SHEAR, "1000 kN"), basis="factored", set="asce7-16-lrfd", span=bare("4 m"))]
    record = beam(["4.00 m"], loads=loads, limits=limits)
    assert one(run_check(record), SAG).case == "1.2D + 1.6S + L"
    assert outcome_of(record) == "within"
