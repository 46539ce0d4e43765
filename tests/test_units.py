"""Is what people write on site read, asked where it must not be guessed, and shown on the right side of limits?"""

import math
from fractions import Fraction

import pytest
from hypothesis import event, example, given
from hypothesis import strategies as st

from pysolver import units
from pysolver.errors import InputError, InternalError
from pysolver.unit_table import UNITS

DIMENSIONS = sorted(units.DIMENSIONS)


def value(dimension: str, text: str, unit: str = "") -> float:
    return units.parse(dimension, text, unit).value


def refused(dimension: str, text: str, unit: str = "") -> InputError:
    with pytest.raises(InputError) as caught:
        units.parse(dimension, text, unit)
    return caught.value


# --- factors against sources outside the project -------------------------------------------------------------------

# NIST SP 811 (2008), Appendix B.8, seven figures as printed (typed from memory, each one confirmed by scipy.constants
# in the test below it): text, dimension, SI value.
NIST = [
    ("1 ft", "length", 3.048e-01),
    ("1 in", "length", 2.54e-02),
    ("1 kg", "force", 9.80665),
    ("1 lb", "force", 4.448222),
    ("1 kip", "force", 4.448222e03),
    ("1 t", "force", 1000 * 9.80665),
    ("1 plf", "line_load", 1.459390e01),
    ("1 lb/ft", "line_load", 1.459390e01),
    ("1 klf", "line_load", 1.459390e04),
    ("1 kg/m", "mass_per_length", 9.80665),
    ("1 lb/ft", "mass_per_length", 1.488164 * 9.80665),  # pound per foot 1.488164 kg/m, times standard gravity
    ("1 psf", "area_load", 4.788026e01),
    ("1 ksf", "area_load", 4.788026e04),
    ("1 lb·ft", "moment", 1.355818),
    ("1 lb·in", "moment", 1.129848e-01),
    ("1 kip·ft", "moment", 1.355818e03),
    ("1 lb/in", "spring", 1.751268e02),
    ("1 kip/in", "spring", 1.751268e05),
    ("1 kip·ft/rad", "rotational_spring", 1.355818e03),
    ("1 kip·ft²", "bending_stiffness", 1.355818e03 * 0.3048),
    ("1 kip·in²", "bending_stiffness", 1.129848e02 * 0.0254),
]


@pytest.mark.parametrize(("text", "dimension", "expected"), NIST)
def test_factors_are_those_of_nist_sp_811(text: str, dimension: str, expected: float) -> None:
    assert value(dimension, text) == pytest.approx(expected, rel=5e-7)  # half of the seventh printed figure


@pytest.mark.cpython_only
def test_factors_are_those_of_scipy_constants() -> None:
    constants = pytest.importorskip("scipy.constants")
    foot, inch, pound = constants.foot, constants.inch, constants.lbf
    for text, dimension, expected in [
        ("1 ft", "length", foot),
        ("1 in", "length", inch),
        ("1 lb", "force", pound),
        ("1 kg", "force", constants.kgf),
        ("1 t", "force", constants.metric_ton * constants.g),
        ("1 plf", "line_load", pound / foot),
        ("1 psf", "area_load", pound / foot**2),
        ("1 lb·ft", "moment", pound * foot),
        ("1 lb·in", "moment", pound * inch),
        ("1 lb/in", "spring", pound / inch),
        ("1 kip·in²", "bending_stiffness", 1000 * pound * inch**2),
    ]:
        assert value(dimension, text) == pytest.approx(expected, rel=1e-14), text


@pytest.mark.parametrize("dimension", DIMENSIONS)
def test_every_symbol_of_the_table_reads_back_as_its_own_unit(dimension: str) -> None:
    for unit in UNITS[dimension].values():
        parsed = units.parse(dimension, f"0.5 {unit.symbol}")
        assert (parsed.unit, parsed.value) == (unit.symbol, float(unit.factor / 2))


@pytest.mark.parametrize("dimension", DIMENSIONS)
def test_spellings_of_one_symbol_have_one_factor(dimension: str) -> None:
    factors: dict[str, set[Fraction]] = {}
    for unit in UNITS[dimension].values():
        factors.setdefault(unit.symbol, set()).add(unit.factor)
    assert all(len(found) == 1 for found in factors.values())


# --- what people write ---------------------------------------------------------------------------------------------

FEET = 18 * 0.3048 + 4.5 * 0.0254  # 18' 4 1/2"


@pytest.mark.parametrize(
    ("dimension", "text", "expected"),
    [
        *(("length", text, 5.62) for text in ("5.62 m", "5.62m", "5620 mm", "562 cm", "5,62 m", "+5.62 M", "5620 MM")),
        *(
            ("length", text, FEET)
            for text in (
                "18' 4 1/2\"",
                "18'-4 1/2\"",
                "18'-4-1/2\"",
                "18 ft 4.5 in",
                "18ft 4,5in.",
                "18 feet 4 1/2 inches",
                "18′ 4½″",
                "18’ 4½”",
                "18' 4 1/2''",
                "18' 4½",
                "220.5 in",
            )
        ),
        *(("length", text, 4.5 * 0.0254) for text in ("4 1/2 in", "4½\"", "4-1/2\"", "4.5 in", "4 1⁄2 in")),
        ("length", "1/2 in", 0.0127),
        ("length", "18'", 18 * 0.3048),
        ("small_length", "-5 mm", -0.005),
        ("small_length", "−5 mm", -0.005),
        ("force", "1.2 t", 11767.98),  # 1200 kg x 9.80665 m/s²
        ("force", "1 200 kg", 11767.98),
        ("force", "1\u00a0200 kg", 11767.98),
        ("force", "1\u202f200 kg", 11767.98),
        ("force", "12 KN", 12e3),
        ("force", "-12 kn", -12e3),
        ("force", "2.5e3 N", 2500),
        ("force", "5 MN", 5e6),
        ("force", "1,200,000 N", 1.2e6),
        ("force", "1,200.5 N", 1200.5),
        ("force", "1.200,5 N", 1200.5),
        *(("line_load", text, 12e3) for text in ("12 kN/m", "12kN/m", "12 Kn/m", "12 kN per m", "12 kN / m")),
        ("line_load", "12 N/mm", 12e3),
        *(("area_load", text, 4800) for text in ("4.8 kPa", "4.8 kN/m2", "4.8 kN/m²", "4.8kN/m^2", "4.8 KPA")),
        *(("moment", text, 30e3) for text in ("30 kNm", "30 kN·m", "30 kN m", "30 kN-m", "30 kN.m", "30 kN×m")),
        ("moment", "30 m·kN", 30e3),
        *(
            ("moment", text, 22 * 1355.8179483314)  # lbf x ft from the exact definitions, times 1000
            for text in ("22 kip-ft", "22 kip·ft", "22 k-ft", "22 K-FT", "22 ft-kips", "22 kip ft", "22kft")
        ),
        *(("bending_stiffness", text, 2.05e7) for text in ("20500 kN·m²", "20500 kNm2", "20.5 MN·m²", "2.05e7 N·m^2")),
        *(("spring", text, 5e6) for text in ("5 kN/mm", "5000 kN/m", "5000 N/mm")),
        *(("rotational_spring", text, 2e6) for text in ("2000 kN·m/rad", "2000 kNm/rad", "2000 kNm / rad")),
        ("number", "1.35", 1.35),
        ("number", "1,35", 1.35),
        ("number", ".7", 0.7),
    ],
)
def test_what_people_write_on_site_is_read(dimension: str, text: str, expected: float) -> None:
    assert value(dimension, text) == pytest.approx(expected, rel=1e-12)


def test_the_same_length_in_other_units_is_the_same_float() -> None:
    assert value("length", "5.62 m") == value("length", "5620 mm") == value("length", "562 cm") == 5.62


def test_a_bare_number_takes_the_unit_printed_in_its_field() -> None:
    assert value("length", "5.62", "m") == 5.62
    assert value("length", "5620", "mm") == 5.62
    assert value("length", "4 1/2", "in") == pytest.approx(0.1143)
    assert value("length", "5620 mm", "m") == 5.62, "a written unit wins"


def test_a_bare_number_without_a_printed_unit_is_asked() -> None:
    assert refused("length", "5.62").code == "unit_missing"


@pytest.mark.parametrize("text", ["1.2 t", "40 kg", "90 lb"])
def test_a_mass_is_converted_and_says_so(text: str) -> None:
    assert units.parse("force", text).converted
    assert not units.parse("force", "1.2 kN").converted


@pytest.mark.parametrize("unit", ["kN", "mm", "lb"])
@pytest.mark.parametrize("text", ["1,200", "1.200", "12,345", "999.999"])
def test_three_digits_after_a_lone_separator_are_asked(text: str, unit: str) -> None:
    dimension = "length" if unit == "mm" else "force"
    for written in ((text, unit), (f"{text} {unit}", "")):
        error = refused(dimension, *written)
        assert error.code == "ambiguous"
        assert text.replace(",", "").replace(".", "") in error.message
        assert text.replace(",", ".").rstrip("0") in error.message


def test_a_bare_figure_in_a_metre_field_is_asked_and_one_with_its_m_is_read() -> None:
    assert refused("length", "1.200", "m").code == refused("length", "1,200", "m").code == "ambiguous"
    assert value("length", "5.623 m") == 5.623
    assert value("length", "1,200 m") == 1.2


@pytest.mark.parametrize(
    ("text", "expected"),
    [("0.125", 0.125), ("0,125", 0.125), (".125", 0.125), ("1234.567", 1234.567), ("1.2000", 1.2), ("1.20", 1.2)],
)
def test_a_separator_that_cannot_group_is_decimal(text: str, expected: float) -> None:
    assert value("force", text, "N") == expected


@pytest.mark.parametrize("text", ["1.2 ton", "1.2 tons", "1.2 TON", "1.2 T", "1.2 short ton", "3 ton"])
def test_a_ton_is_asked_with_all_three_weights(text: str) -> None:
    error = refused("force", text)
    assert error.code == "ambiguous"
    if text.startswith("3"):
        # 3 x 1000 kg, 907.1847 kg and 1016.047 kg (NIST SP 811, B.8) x 9.80665 m/s²
        assert all(weight in error.message for weight in ("29.4 kN", "26.7 kN", "29.9 kN"))


def test_k_alone_is_asked() -> None:
    assert refused("force", "14 k").code == "ambiguous"


@pytest.mark.parametrize(
    ("dimension", "text", "code"),
    [
        ("length", "", "empty"),
        ("length", "   ", "empty"),
        ("length", "5" * 41, "too_long"),
        ("length", "five", "not_a_number"),
        ("length", "nan m", "not_a_number"),
        ("length", "inf", "not_a_number"),
        ("length", "5. m", "not_a_number"),
        ("length", "5-6 m", "not_a_number"),
        ("length", "18 4 m", "not_a_number"),
        ("length", "4 1/20 in", "not_a_number"),
        ("length", "٥ m", "not_a_number"),
        ("length", "18' 14\"", "inches"),
        ("length", "5 kN", "wrong_dimension"),
        ("length", "5 xyz", "unit_unknown"),
        ("length", "5.62 m2", "unit_unknown"),
        ("length", "18.5' 4\"", "unit_unknown"),
        ("length", "-5 m", "negative"),
        ("length", "1000 m", "too_large"),
        ("length", "1e300 m", "too_large"),
        ("length", "1e-30 m", "too_small"),
        ("force", "5 mN", "unit_unknown"),
        ("force", "5 mn", "unit_unknown"),
        ("moment", "5 mNm", "unit_unknown"),
        ("moment", "5 N m m", "unit_unknown"),
        ("force", "12 kN/m", "wrong_dimension"),
        ("line_load", "12 kN", "wrong_dimension"),
        ("area_load", "12 kN/m", "wrong_dimension"),
        ("rotational_spring", "12 kNm", "wrong_dimension"),
        ("number", "5 m", "wrong_dimension"),
        ("area_load", "-1 kPa", "negative"),
        ("spring", "-1 kN/m", "negative"),
    ],
)
def test_what_cannot_be_read_is_refused_naming_what_was_read(dimension: str, text: str, code: str) -> None:
    error = refused(dimension, text, "" if dimension == "number" else "m")
    assert (error.code, error.field) == (code, "")
    assert text.strip()[:40] in error.message
    assert str(error) == error.message


def test_a_message_never_carries_signs_that_turn_the_writing_round() -> None:
    assert "\u202e" not in refused("length", "\u202e5 m").message


def test_every_cap_refuses_and_the_float_below_it_is_read() -> None:
    for name, dimension in units.DIMENSIONS.items():
        si = next((unit.symbol for unit in UNITS[name].values() if unit.factor == 1), "")
        assert refused(name, f"{int(dimension.cap)} {si}").code == "too_large"
        assert value(name, f"{int(dimension.cap) - 1} {si}") == float(dimension.cap) - 1


def test_an_unknown_dimension_is_our_mistake() -> None:
    with pytest.raises(InternalError):
        units.parse("temperature", "5 K")


SITE = st.text(alphabet="0123456789.,'\"/- +eEkKNMmft inlbsgTt·²½×²\u202e′″", max_size=45)


PRINTED = st.one_of(st.just(""), st.just("m"), st.text(max_size=8))


@given(st.sampled_from(DIMENSIONS), st.one_of(st.text(max_size=45), SITE), PRINTED)
@example("force", "1e999", "N")
@example("force", "1e-999", "N")
def test_random_text_is_an_input_error_or_a_finite_number(dimension: str, text: str, unit: str) -> None:
    try:
        parsed = units.parse(dimension, text, unit)
    except InputError as error:
        event(error.code)
        return
    assert math.isfinite(parsed.value)
    again = units.parse(dimension, parsed.text)
    assert (again.value, again.unit, again.text) == (parsed.value, parsed.unit, parsed.text)


# --- what is shown -------------------------------------------------------------------------------------------------


@pytest.mark.parametrize(
    ("dimension", "si", "metric", "us"),
    [
        ("length", 5.62, "5.62 m", "18' 5 1/4\""),
        ("length", 5.6234, "5.623 m", "18' 5 3/8\""),
        ("length", 0.3048, "0.305 m", "1' 0\""),
        ("length", 0.1143, "0.114 m", '4 1/2"'),
        ("length", 0.0, "0 m", '0"'),
        ("small_length", 0.0123456, "12.3 mm", "0.486 in"),
        ("small_length", 1.0163, "1016 mm", "40.0 in"),
        ("force", 12000.0, "12.0 kN", "2.70 kip"),
        ("force", -1112.0554, "-1.11 kN", "-250 lb"),
        ("line_load", 3648.4757, "3.65 kN/m", "250 plf"),
        ("area_load", 4788.0259, "4.79 kN/m²", "100 psf"),
        ("moment", 30000.0, "30.0 kN·m", "22.1 kip·ft"),
        ("moment", 99960.0, "100 kN·m", "73.7 kip·ft"),
        ("moment", 1e-12, "0 kN·m", "0 kip·ft"),
        ("bending_stiffness", 2.05e7, "20500 kN·m²", "49600 kip·ft²"),
        ("spring", 5e6, "5000 kN/m", "28.6 kip/in"),
        ("number", 1.35, "1.35", "1.35"),
    ],
)
def test_three_figures_are_shown_in_either_system(dimension: str, si: float, metric: str, us: str) -> None:
    assert (units.show(dimension, si), units.show(dimension, si, "us")) == (metric, us)
    assert (units.also(dimension, si), units.also(dimension, si, "us")) == (us, metric)


INCH = 0.0254
SYSTEMS = st.sampled_from(["metric", "us"])
WITH_ROOM = st.sampled_from(["force", "moment", "line_load", "length", "small_length"])


@given(st.sampled_from([name for name in DIMENSIONS if name != "number"]), st.floats(1e-2, 0.99), SYSTEMS)
def test_what_is_shown_reads_back_within_its_rounding(dimension: str, part: float, system: units.System) -> None:
    si = part * float(units.DIMENSIONS[dimension].cap)
    assert value(dimension, units.show(dimension, si, system)) == pytest.approx(si, rel=5.1e-3, abs=INCH / 32)


@given(WITH_ROOM, st.floats(0, 9.9), SYSTEMS)
def test_room_shown_is_never_more_than_there_is(dimension: str, si: float, system: units.System) -> None:
    shown = units.show_room(dimension, si, system)
    assert value(dimension, shown) <= si * (1 + 1e-11)
    assert value(dimension, shown) >= si * 0.99 - (INCH / 16 if dimension in ("length", "small_length") else 1.36)


def test_room_is_not_lost_to_the_last_bit_of_a_float() -> None:
    assert units.show_room("force", 11999.999999999998) == "12.0 kN"
    assert units.show_room("force", 12990.0) == "12.9 kN"


@pytest.mark.parametrize(
    ("ratio", "shown"),
    [(0.0, "0.00"), (0.5, "0.50"), (0.851, "0.86"), (0.1 + 0.2, "0.30"), (0.99, "0.99"), (0.9901, "0.991"),
     (0.998, "0.998"), (0.9991, "0.9991"), (0.99995, "just under 1"), (math.nextafter(1, 0), "just under 1"),
     (1.0, "1.00"),
     (math.nextafter(1, 2), "1.001"), (1.0004, "1.001"), (1.0091, "1.01"), (1.011, "1.02"), (12.341, "12.35"),
     (math.inf, "limit is zero")],
)
def test_ratios_round_up_without_crossing_one(ratio: float, shown: str) -> None:
    assert units.show_ratio(ratio) == shown


@given(st.one_of(st.floats(0, 3), st.floats(0.985, 1.015)))
def test_a_ratio_is_shown_on_its_own_side_of_one_and_never_below_itself(ratio: float) -> None:
    shown = units.show_ratio(ratio)
    if shown == "just under 1":
        assert 0.9999 < ratio < 1
        return
    number = float(shown)
    assert (number > 1, number < 1) == (ratio > 1, ratio < 1)
    assert ratio - 1e-11 <= number <= ratio + 0.01 + 1e-11


@given(st.floats(1, 1e6), st.floats(-1e-3, 1e-3), SYSTEMS)
def test_an_effect_beside_its_limit_shows_which_is_larger(limit: float, part: float, system: units.System) -> None:
    effect = limit * (1 + part)
    first, second = (value("moment", text) for text in units.show_beside("moment", effect, limit, system))
    if abs(part) > 1e-5:
        assert (first > second) == (effect > limit)
        assert first != second


def test_more_figures_are_shown_where_three_would_look_equal() -> None:
    assert units.show_beside("moment", 30040.0, 30000.0) == ("30.04 kN·m", "30.00 kN·m")
    assert units.show_beside("moment", 28000.0, 30000.0) == ("28.0 kN·m", "30.0 kN·m")


@pytest.mark.parametrize(
    ("dimension", "low", "high", "system", "shown"),
    [("length", 5.615, 5.625, "metric", "5.615 to 5.625 m"), ("length", 1.0, 2.0, "us", "3' 3 5/16\" to 6' 6 3/4\""),
     ("force", 3000.0, 5000.0, "us", "0.674 to 1.13 kip"), ("number", 1.0, 2.0, "us", "1.00 to 2.00"),
     ("force", 3001.0, 3009.0, "metric", "3.00 to 3.01 kN"), ("force", 3000.0, 3000.0, "metric", "3.00 kN")],
)
def test_a_range_shown_holds_the_range_meant(
    dimension: str, low: float, high: float, system: units.System, shown: str
) -> None:
    assert units.show_range(dimension, low, high, system) == shown


@pytest.mark.parametrize("number", [math.nan, math.inf, -math.inf])
def test_a_number_that_is_not_finite_is_never_shown(number: float) -> None:
    with pytest.raises(InternalError):
        units.show("force", number)


@pytest.mark.parametrize("system", ["metric", "us"])
def test_every_unit_on_the_pad_can_be_read(system: units.System) -> None:
    fields = units.field_units(system)
    assert sorted(fields) == DIMENSIONS
    for dimension, field in fields.items():
        assert units.parse(dimension, "5", field["unit"]).value > 0
        for key in field["keys"]:
            assert units.parse(dimension, f"5 {key}").unit == key


def test_an_error_is_given_its_field_once() -> None:
    error = refused("length", "5 kN", "m").at("/spans/0/length")
    assert error.field == error.at("/loads/0").field == "/spans/0/length"
    assert error.moved("/loads/0").field == "/loads/0"
    assert error.message == str(error)
