"""Does every measured number keep its range, and do factors come on top of it? Rules of judgement J13 to J16 (J15, the
search for the worst of the box, is in test_bounds.py). Numbers are worked out by hand beside each test.
"""

import pytest
from records import (
    HOG,
    SAG,
    SHEAR,
    at,
    bare,
    beam,
    entry,
    everywhere,
    generous,
    load,
    one,
    outcome_of,
    point,
    q,
    sheet,
    simple,
    strip,
    two_spans,
)

from pysolver.answer import answer
from pysolver.check import run_check
from pysolver.record import blank

EXACT = 1e-9


def floor(magnitude: object, sagging: str = "100 kNm", span: object = "6.00 m", **more: object) -> dict:  # type: ignore[type-arg]
    """6 m under one permanent load and nothing else."""
    record = beam(["6.00 m"], loads=[everywhere("floor", magnitude)],
                  limits=[sheet(entry(SAG, sagging), entry(SHEAR, "900 kN"), **more)])
    record["spans"][0]["length"] = span if isinstance(span, dict) else q(str(span))
    return record


# --- J13 -----------------------------------------------------------------------------------------------------------


@pytest.mark.parametrize(("means", "low", "high"), [
    (None, 0.75, 2.0), ("by_eye", 0.75, 2.0), ("weighed", 0.98, 1.02), ("ticket", 0.95, 1.05), ("counted", 0.90, 1.10),
    ("volume", 0.85, 1.15), ("steel_table", 0.96, 1.04), ("design", 1.0, 1.0), ("exact", 1.0, 1.0),
])
def test_J13_a_load_is_never_taken_as_exact_unless_it_is_said_to_be(means: str | None, low: float, high: float) -> None:
    """2 kN/m on 6 m: 9 kN·m. By eye -25 / +100 % is the rule's; the others are common practice, no published source."""
    sagging = one(run_check(floor(q("2 kN/m", means))), SAG)
    assert sagging.ratio == pytest.approx(0.09, rel=EXACT)
    assert sagging.low == pytest.approx(0.09 * low, rel=EXACT)
    assert sagging.high == pytest.approx(0.09 * high, rel=EXACT)


@pytest.mark.parametrize(("means", "longest"), [("tape", 6.005), ("laser", 6.005), ("paced", 6.3), ("by_eye", 6.6), (None, 6.6)])
def test_J13_a_span_is_never_taken_as_exact_unless_it_is_said_to_be(means: str | None, longest: float) -> None:
    sagging = one(run_check(floor("2 kN/m", span=q("6.00 m", means))), SAG)
    assert sagging.high == pytest.approx(2 * longest**2 / 8 / 100, rel=EXACT)


def test_J13_a_record_without_any_range_is_never_within() -> None:
    record = simple()
    record["section"]["depth"] = q("300 mm")
    result = run_check(record)
    assert result.outcome.word == "close"
    assert result.outcome.title == "close: ranges not stated"


def test_J13_a_record_without_any_range_is_still_over() -> None:
    record = simple(limits=[sheet(entry(SAG, "40 kNm"), entry(SHEAR, "100 kN"))])
    record["section"]["depth"] = q("300 mm")
    assert outcome_of(record) == "over"


def test_J13_a_way_of_measuring_that_does_not_fit_is_never_guessed() -> None:
    result = run_check(floor(q("2 kN/m", "tape")))
    assert result.outcome.word == "cannot"
    assert [(e.field, e.code) for e in result.errors] == [("/loads/0/magnitude", "means")]


@pytest.mark.parametrize("given", [{"low": "1 kN/m"}, {"high": "3 kN/m"}, {"low": "2.1 kN/m", "high": "3 kN/m"},
                                   {"low": "3 kN/m", "high": "1 kN/m"}])
def test_J13_a_stated_range_that_is_no_range_is_never_used(given: dict) -> None:  # type: ignore[type-arg]
    result = run_check(floor({"text": "2 kN/m", "means": "stated", **given}))
    assert result.outcome.word == "cannot"
    assert [(e.field, e.code) for e in result.errors] == [("/loads/0/magnitude", "range")]


def test_J13_best_within_and_worst_over_is_never_within() -> None:
    """9 kN·m best, 18 kN·m at double: against 17.9 close, against 18.1 within."""
    assert outcome_of(floor(q("2 kN/m", None), "17.9 kNm")) == "close"
    assert outcome_of(floor(q("2 kN/m", None), "18.1 kNm")) == "within"


# --- J14 -----------------------------------------------------------------------------------------------------------


def factored(**more: object) -> dict:  # type: ignore[type-arg]
    return {"basis": "factored", "set": "en1990-6.10-str", **more}


@pytest.mark.parametrize(("means", "high"), [("exact", 1.35), ("weighed", 1.35 * 1.02), ("counted", 1.35 * 1.10),
                                             (None, 1.35 * 2)])
def test_J14_a_factor_is_never_reduced_because_something_was_weighed(means: str | None, high: float) -> None:
    sagging = one(run_check(floor(q("2 kN/m", means), **factored())), SAG)
    assert sagging.unfactored == pytest.approx(9e3, rel=EXACT)
    assert sagging.factored == pytest.approx(1.35 * 9e3, rel=EXACT)
    assert sagging.high == pytest.approx(high * 0.09, rel=EXACT)


def test_J14_unfactored_best_factored_best_and_factored_high_are_never_left_out() -> None:
    told = answer(run_check(floor(q("2 kN/m", "counted"), **factored())))["criteria"][0]
    # 9; 1.35 x 9 = 12.15; 1.35 x 1.1 x 9 = 13.365, all in kN·m, three figures
    assert told["unfactored"] == "9.00 kN·m"
    assert told["factored"] in ("12.1 kN·m", "12.2 kN·m")
    assert told["high"] == "13.4 kN·m"


def strips(one_source: bool) -> list:  # type: ignore[type-arg]
    name = "floor" if one_source else ""
    return [strip("a", "10 kN/m", "0 m", "5.00 m", "permanent", removable=False, source=name),
            strip("b", "10 kN/m", "5.00 m", "5.00 m", "permanent", removable=False, source=name)]


def test_J14_one_source_never_takes_two_factors() -> None:
    """Two spans of 5 m, 10 kN/m, EN 1990. One source: 1.35 x 9/128 w L^2. Two sources: 1.35 in one span, 1.00 in the other:
    R = (7/16 x 1.35 - 1/16) w L = 0.528125 w L, M = R^2 / (2 x 1.35 w) = 0.1033016 w L^2."""
    limits = [generous(**factored())]
    same, apart = (one(run_check(two_spans(loads=strips(s), limits=limits)), SAG).ratio for s in (True, False))
    assert same == pytest.approx(1.35 * 9 / 128 * 250 / 900, rel=EXACT)
    assert apart == pytest.approx(0.528125**2 / 2.7 * 250 / 900, rel=EXACT)


def test_J14_one_source_never_takes_two_values() -> None:
    """By eye, unfactored: 0.75 in one span and double in the other gives more sagging than double in both."""
    loads = strips(True)
    for each in loads:
        each["magnitude"] = q("10 kN/m", None)
    assert one(run_check(two_spans(loads=loads)), SAG).high == pytest.approx(2 * 9 / 128 * 250 / 900, rel=EXACT)
    for each in loads:
        each["source"] = ""
    # R = (7/16 x 2 - 1/16 x 0.75) w L, M = R^2 / (2 x 2 w)
    assert one(run_check(two_spans(loads=loads)), SAG).high == pytest.approx((14 / 16 - 0.75 / 16)**2 / 4 * 250 / 900, rel=EXACT)


def test_J14_one_source_of_two_categories_is_never_guessed() -> None:
    loads = strips(True)
    loads[1]["category"] = "stored"
    result = run_check(two_spans(loads=loads))
    assert result.outcome.word == "cannot"
    assert [e.code for e in result.errors] == ["source"]


def test_J14_an_issued_limit_never_gets_a_range() -> None:
    record = floor("2 kN/m")
    record["limits"][0]["entries"][0]["value"] = {"text": "100 kNm", "means": "by_eye"}
    sagging = one(run_check(record), SAG)
    assert sagging.ratio == sagging.high == pytest.approx(0.09, rel=EXACT)


def test_J14_uplift_is_never_judged_with_one_factor_for_the_load_that_lifts_and_the_load_that_holds_down() -> None:
    """4 m span, 3.9 m overhang, one permanent load w: w (4 - 3.9^2 / 4) / 2 = 0.099 w down at A. With 0.9 where it holds
    down and 1.1 where it lifts (EN 1990:2002, table A1.2(A), from memory) it is (0.9 x 8 - 1.1 x 7.605) / 4 = -0.29 w."""
    limits = [generous(**factored())]
    assert outcome_of(beam(["4.00 m"], right="2.00 m", limits=limits)) == "within"
    assert outcome_of(beam(["4.00 m"], right="3.90 m", limits=limits)) != "within"


# --- J15: see test_bounds.py; here what a search may say -----------------------------------------------------------------


def test_J15_a_searched_worst_within_two_percent_of_the_limit_is_never_within() -> None:
    """9 kN·m at 6.000 m; at 6.005 m (tape) 9.0150 kN·m: 98.5 % of 9.15, 97.5 % of 9.25. With an exact span nothing is
    searched, and 98.4 % is within."""
    taped = q("6.00 m", "tape")
    assert outcome_of(floor("2 kN/m", "9.15 kNm", taped)) == "close"
    assert outcome_of(floor("2 kN/m", "9.25 kNm", taped)) == "within"
    assert outcome_of(floor("2 kN/m", "9.15 kNm")) == "within"


def test_J15_a_searched_bound_is_never_shown_as_proven() -> None:
    told = answer(run_check(floor("2 kN/m", span=q("6.00 m", "tape"))))
    assert all("searched, not proven" in c["note"] for c in told["criteria"])
    assert any("not proven" in note for note in told["notes"])


# --- J16 -----------------------------------------------------------------------------------------------------------


def test_J16_nothing_is_preset() -> None:
    result = run_check(blank())
    assert result.outcome.word == "cannot"
    assert result.compared == ()
    asked = {gap.path for gap in result.outcome.gaps}
    assert {"/spans/0/length", "/supports/0/kind", "/supports/1/kind"} <= asked


def test_J16_a_bare_number_takes_the_unit_of_its_field_and_never_another() -> None:
    assert one(run_check(floor({"text": "2", "unit": "kN/m", "means": "exact"})), SAG).unfactored == pytest.approx(9e3)
    assert one(run_check(floor({"text": "2 kN/m", "unit": "kg/m", "means": "exact"})), SAG).unfactored == pytest.approx(9e3)
    result = run_check(floor({"text": "2", "means": "exact"}))
    assert result.outcome.word == "cannot"
    assert [(e.field, e.code) for e in result.errors] == [("/loads/0/magnitude", "unit_missing")]


@pytest.mark.parametrize("text", ["1,200 kg/m", "1.200 kN/m", "2 ton/m"])
def test_J16_a_number_with_two_readings_is_never_guessed(text: str) -> None:
    result = run_check(floor(q(text)))
    assert result.outcome.word == "cannot"
    assert [(e.field, e.code) for e in result.errors] == [("/loads/0/magnitude", "ambiguous")]


def test_J16_kilograms_become_force_with_standard_gravity() -> None:
    """200 kg/m = 1961.33 N/m (g = 9.80665 m/s2, 3rd CGPM 1901): 1961.33 x 36 / 8 = 8825.985 N·m."""
    assert one(run_check(floor(q("200 kg/m"))), SAG).unfactored == pytest.approx(8825.985, rel=EXACT)


@pytest.mark.parametrize("missing", ["to", "at"])
def test_J16_whether_a_distance_runs_to_the_middle_or_the_edge_of_a_load_is_never_guessed(missing: str) -> None:
    """A stack of 2 m taped 1.00 m from A lies from 0 to 2 m or from 1 to 3 m; from face or middle of a 600 mm bearing."""
    position = at("1.00 m", support=0)
    position[missing] = None
    record = simple(loads=[everywhere("floor", "4.5 kN/m"), load("stack", "line", "7 kN/m", position=position, length=q("2 m"))])
    for support in record["supports"]:
        support["bearing"] = q("600 mm")
    assert outcome_of(record) != "within"


def test_J16_a_load_measured_from_a_support_that_does_not_exist_is_never_moved_to_another() -> None:
    position = at("1.00 m", support=7, side="left")
    record = simple(loads=[everywhere("floor", "4.5 kN/m"), point("pallet", "7 kN", position)])
    try:
        result = run_check(record)
    except Exception as error:
        assert type(error).__name__ == "InputError"  # noqa: PT017
    else:
        assert result.outcome.word != "within"


@pytest.mark.parametrize("field", ["magnitude", "position", "form"])
def test_J16_a_load_that_is_not_entered_in_full_is_never_left_out(field: str) -> None:
    record = simple()
    record["loads"][1][field] = None
    result = run_check(record)
    assert result.outcome.word == "cannot"
    assert f"/loads/1/{field}" in [gap.path for gap in result.outcome.gaps]


def test_J16_an_overhang_of_nothing_is_never_an_error() -> None:
    """A person who writes 0 for "does it stick out?" gets the answer of the beam that does not."""
    record = simple(left=q("0 m", "tape"))
    assert outcome_of(record) == "within"


def test_J16_a_range_that_reaches_down_to_no_overhang_is_never_a_crash() -> None:
    record = simple(left=q("0.1 m", low="0 m", high="0.3 m"), limits=[generous()])
    assert outcome_of(record) in ("within", "close", "cannot")


def test_J16_a_hinge_taped_close_to_a_support_is_never_a_crash() -> None:
    """Gerber beam with its hinge somewhere from 0.2 m left of B to 0.2 m right of it."""
    record = beam(["4.00 m", "4.00 m"], kinds=["fixed", "bearing", "bearing"], limits=[generous()])
    record["hinges"] = [{"position": at(q("4.1 m", low="3.8 m", high="4.2 m"))}]
    assert outcome_of(record) in ("within", "close", "cannot")


def test_J16_a_source_called_like_the_own_weight_is_never_a_crash() -> None:
    record = simple(loads=[everywhere("floor", "4.5 kN/m", source="self weight")], self_weight=None)
    assert outcome_of(record) in ("within", "close", "cannot")


def test_J16_no_load_at_all_is_never_a_crash() -> None:
    record = simple(loads=[], self_weight=None)
    record["permanent"]["answer"] = "none"
    assert outcome_of(record) in ("within", "close", "cannot")
    assert HOG not in [c.kind for c in run_check(record).compared]


def test_J16_a_zone_of_a_limit_without_a_starting_point_is_never_over_the_whole_beam() -> None:
    half = {"position": at(bare("1 m"), edge=True), "length": bare("2 m")}
    half["position"]["from"] = None
    record = simple(limits=[sheet(entry(SAG, "100 kNm", zone=half), entry(SHEAR, "100 kN"))])
    assert outcome_of(record) == "cannot"
