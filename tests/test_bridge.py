"""Does the door to the page hold whatever is pushed through it? It never raises, never says NaN, and an internal error,
which is our fault, is never what a strange record gets."""

import copy
import json
import random
from typing import Any

import pytest
from hypothesis import HealthCheck, given, settings
from hypothesis import strategies as st
from records import clear_span, overhanging, point, q, simple, texts, two_spans

from pysolver.bridge import CALLS, examples, handle
from pysolver.demo import demo

FORBIDDEN = {"safe", "pass", "passed", "passes", "approved", "ok", "okay"}


def asked(request: Any) -> dict[str, Any]:
    """The answer of the door to one request; refuses NaN and infinity in it."""
    def refuse(constant: str) -> None:
        raise AssertionError(f"{constant} in an answer")

    text = handle(request if isinstance(request, str) else json.dumps(request))
    answer = json.loads(text, parse_constant=refuse)
    assert answer["ok"] in (True, False)
    if not answer["ok"]:
        assert set(answer["error"]) == {"kind", "code", "field", "message"}
        assert answer["error"]["message"]
    return answer  # type: ignore[no-any-return]


def forbidden(answer: Any) -> set[str]:
    words = {w.strip(".,:;()\"'!?") for t in texts(answer) for w in t.lower().replace("-", " ").split()}
    return words & FORBIDDEN


EXAMPLES = [json.loads(text) for text in examples()]


@pytest.mark.parametrize("request_", EXAMPLES, ids=lambda r: r["call"])
def test_every_call_answers(request_: dict[str, Any]) -> None:
    answer = asked(request_)
    assert answer["ok"] is True
    assert not forbidden(answer)


def test_there_is_an_example_for_every_call() -> None:
    assert {request["call"] for request in EXAMPLES} == set(CALLS)


@pytest.mark.parametrize("text", ["", "null", "[]", "3", "{", '{"call": 3}', '{"call": "__class__"}', '{"call": null}', "\x00",
                                  '{"call":"check"}', '{"call":"read"}', '{"call":"open"}', "[" * 100_000, '"' * 9, "NaN",
                                  '{"call":"read","dimension":"length","text":5,"unit":"m"}'])
def test_what_is_no_request_gets_an_answer_and_no_exception(text: str) -> None:
    assert asked(text)["ok"] is False


def test_an_internal_error_says_whose_fault_it_is() -> None:
    error = asked({"call": "no such call"})["error"]
    assert error["kind"] == "internal"
    assert "our fault" in error["message"]


def test_too_much_data_is_an_input_error() -> None:
    assert asked(json.dumps({"call": "check", "record": "x" * 5_000_000}))["error"]["kind"] == "input"


@pytest.mark.parametrize("record", [None, 3, [], {}, "x", {"format": "asfound-record"}, [[[[]]]]])
def test_what_is_no_record_is_an_input_error(record: Any) -> None:
    for call in ("check", "link", "file"):
        assert asked({"call": call, "record": record, "app_url": "https://example.invalid/"})["error"]["kind"] == "input"


def test_a_record_nested_without_end_is_an_input_error() -> None:
    text = '{"call":"check","record":' + "[" * 20_000 + "]" * 20_000 + "}"
    assert asked(text)["error"]["kind"] == "input"


@pytest.mark.parametrize("fragment", ["", "#", "r1.", "r1.abc.def", "https://example.invalid/#r1.AAAA.AAAAAAAAAAAA",
                                      "x" * 300_000, "r9.a.b"])
def test_a_link_that_is_none_is_an_input_error(fragment: str) -> None:
    assert asked({"call": "open", "fragment": fragment})["error"]["kind"] == "input"


@pytest.mark.parametrize("given", [
    {"dimension": "length", "text": "five", "unit": "m"}, {"dimension": "length", "text": "", "unit": "m"},
    {"dimension": "force", "text": "1,200", "unit": "kg"}, {"dimension": "force", "text": "2 ton", "unit": ""},
    {"dimension": "length", "text": "9" * 500, "unit": "m"}])
def test_a_number_that_cannot_be_read_is_an_input_error(given: dict[str, str]) -> None:
    assert asked({"call": "read", **given})["error"]["kind"] == "input"


def test_a_number_is_read_with_its_value() -> None:
    """18' 4 1/2" = 220.5 in = 5.6007 m (inch of 25.4 mm, 1959)."""
    request = {"call": "read", "dimension": "length", "text": "18' 4 1/2\"", "unit": "m"}
    assert asked(request)["result"]["value"] == pytest.approx(5.6007)


def test_the_best_estimate_comes_with_the_same_numbers_as_the_full_answer() -> None:
    record = clear_span("3.00 m", q("150 mm", "tape"), "300 mm")
    best, full = (asked({"call": "check", "record": record, "stage": s})["result"] for s in ("best", "full"))
    assert best["outcome"]["word"] == "working"
    assert full["outcome"]["word"] == "within"
    assert set(full["numbers"]) > set(best["numbers"])
    assert {k: v for k, v in best["numbers"].items() if not k.startswith("ratio_high")} == pytest.approx(
        {k: v for k, v in full["numbers"].items() if not k.startswith("ratio_high")}, rel=1e-12)


def test_text_that_no_screen_can_show_is_an_answer_all_the_same() -> None:
    record = simple()
    record["place"]["site"] = "\ud800 \u0000 \u202e"
    assert asked({"call": "check", "record": record})["ok"] is True


# --- records that somebody has meddled with ------------------------------------------------------------------------------


def places(value: Any, at: tuple[Any, ...] = ()) -> list[tuple[Any, ...]]:
    """The path of everything inside a record, the record itself left out."""
    inner = value.items() if isinstance(value, dict) else enumerate(value) if isinstance(value, list) else ()
    return [p for k, v in inner for p in ((*at, k), *places(v, (*at, k)))]


def replaced(record: Any, path: tuple[Any, ...], value: Any) -> Any:
    made = copy.deepcopy(record)
    at = made
    for part in path[:-1]:
        at = at[part]
    at[path[-1]] = value
    return made


NUMBERS = ["0 m", "0", "-1 m", "0.001 m", "1e3 m", "999 m", "5.40 m", "1e-9 m", "0 kN/m", "-50 kN/m", "1e7 kN/m", "3 kNm",
           "2 t", "nan", "inf", "L/250",
           "200 mm", "1 mm", "9999 mm", "0.0001 kN", "1e5 kN", "17500 kNm2", "1 Nmm2", "1e10 kNm2", "", "½ in", "1'2\""]
WORDS = [None, "permanent", "stored", "bearing", "pinned", "fixed", "spring", "free", "support", "left_end", "right_end",
         "face", "clear", "centres", "effective", "factored", "unfactored", "own", "asce7-16-lrfd", "asce7-16-asd",
         "en1990-6.10-str", "not_known", "added", "all", "sagging", "hogging", "reaction", "hold_down", "sag", "line_load",
         "area_load", "near_edge", "middle", "self weight", "paving",
         "settlement of support 0", "pack1", "none", "something", "same", "full", "spacing"]
MEANS = [None, "tape", "exact", "design", "by_eye", "counted", "level", "stated"]
FROM, SIDE = ["left_end", "right_end", "support", None], ["left", "right", None]
AT, TO = ["face", "centre", None], ["middle", "near_edge", None]


def quantity(text: str, means: str | None, low: str, high: str) -> dict[str, str]:
    return {"text": text, **({"means": means} if means else {}), **({"low": low, "high": high} if means == "stated" else {})}


TEXTS = st.sampled_from(NUMBERS)
QUANTITIES = st.builds(quantity, TEXTS, st.sampled_from(MEANS), TEXTS, TEXTS)
LEAVES = (st.none() | st.booleans() | st.integers(-3, 14) | st.integers() | st.text(max_size=8)
          | st.floats(allow_nan=False, allow_infinity=False))
JSON = st.recursive(LEAVES, lambda inner: st.lists(inner, max_size=3) | st.dictionaries(st.text(max_size=5), inner, max_size=3),
                    max_leaves=6)
POSITIONS = st.fixed_dictionaries({"from": st.sampled_from(FROM), "support": st.sampled_from([None, 0, 1, 2, 12]),
                                   "side": st.sampled_from(SIDE), "at": st.sampled_from(AT), "to": st.sampled_from(TO),
                                   "distance": st.none() | QUANTITIES})
VALUES = QUANTITIES | POSITIONS | st.sampled_from(WORDS) | st.sampled_from([0, 1, 2, True, False, [], {}]) | JSON
BASES = [demo(), simple(), overhanging(), two_spans(), clear_span("3.00 m", "150 mm", "300 mm"),
         overhanging(loads=[point("a", q("4 kN", "counted"), "5.5 m")])]
FIXED = [(base, path) for base in BASES for path in places(base)]


@settings(max_examples=100, suppress_health_check=[HealthCheck.too_slow, HealthCheck.data_too_large])
@given(st.sampled_from(range(len(FIXED))), VALUES, st.sampled_from(["best", "full"]))
def test_a_record_changed_anywhere_is_an_answer_or_an_input_error_and_never_our_fault(which: int, value: Any, stage: str) -> None:
    base, path = FIXED[which]
    stage = "best" if base["id"] == "demo" else stage  # its search takes seconds
    answer = asked({"call": "check", "record": replaced(base, path, value), "stage": stage, "now": "2031-05-04T10:00:00Z"})
    assert answer["ok"] or answer["error"]["kind"] == "input", answer["error"]
    assert not forbidden(answer)


def quantity_places(base: Any) -> list[tuple[Any, ...]]:
    """Where a written number, or nothing yet, stands."""
    def found(path: tuple[Any, ...]) -> bool:
        at = base
        for part in path:
            at = at[part]
        return isinstance(at, dict) and "text" in at
    return [path for path in places(base) if found(path)]


@settings(max_examples=50, suppress_health_check=[HealthCheck.too_slow])
@given(st.sampled_from(BASES[:4]), st.randoms(use_true_random=False), st.lists(QUANTITIES, min_size=1, max_size=3))
def test_other_numbers_in_their_places_are_an_answer_and_never_our_fault(base: Any, rng: random.Random,
                                                                         values: list[Any]) -> None:
    record = base
    for value in values:
        record = replaced(record, rng.choice(quantity_places(base)), value)
    answer = asked({"call": "check", "record": record, "stage": "best", "now": "2031-05-04T10:00:00Z"})
    assert answer["ok"] or answer["error"]["kind"] == "input", answer["error"]
    assert not forbidden(answer)


@pytest.mark.parametrize("change", [
    pytest.param((("overhangs", "left"), {"text": "0.1 m", "means": "stated", "low": "0 m", "high": "0.3 m"}),
                 id="overhang from nothing"),
    pytest.param((("loads", 0, "source"), "self weight"), id="source called self weight"),
    pytest.param((("loads", 0, "source"), "settlement of support 0"), id="source called like a settlement"),
    pytest.param((("spans", 0, "length", "value"), 10**400), id="value beyond floats"),
    pytest.param((("condition", "void", "which"), ["no-such-reason"]), id="unknown reason"),
    pytest.param((("loads",), []), id="no loads"),
    pytest.param((("limits",), []), id="no limits"),
    pytest.param((("limits", 0, "entries"), []), id="no entries"),
    pytest.param((("section", "depth"), {"text": "0 mm", "means": "tape"}), id="no depth"),
    pytest.param((("loads", 1, "magnitude"), {"text": "0 kN"}), id="no magnitude"),
    pytest.param((("supports", 0, "settlement"), {"text": "0 mm", "means": "level"}), id="settlement of nothing"),
    pytest.param((("decision",), {"choice": "carry_on", "name": "", "time": None}), id="decision"),
])
def test_a_known_trap_is_an_answer_or_an_input_error_and_never_our_fault(change: tuple[tuple[Any, ...], Any]) -> None:
    record = replaced(simple(self_weight=None), *change)
    for call in ("check", "file", "link"):
        answer = asked({"call": call, "record": record, "app_url": "https://example.invalid/", "now": "2031-05-04T10:00:00Z"})
        assert answer["ok"] or answer["error"]["kind"] == "input", answer["error"]


def test_drawings_carry_no_words_of_strangers_unescaped() -> None:
    hostile = "<script>alert(1)</script>"
    record = simple(loads=[*simple()["loads"], point("l9", "1 kN", "1.00 m", name=hostile)])
    record["supports"][0]["name"] = hostile[:40]
    result = asked({"call": "check", "record": record})["result"]
    assert not any("<script" in svg for svg in texts(result.get("drawings", {})))


@pytest.mark.parametrize(("asked_for", "text"), [
    ({"text": "2.3", "unit": "m", "by": "-10 mm"}, "2.29 m"), ({"text": "", "unit": "m", "by": "500 mm"}, "0.50 m"),
    ({"text": "1 m", "unit": "m", "by": "-500 mm"}, "0.50 m"), ({"text": "7' 11\"", "by": "1 in", "system": "us"}, "8' 0\""),
])
def test_a_distance_moves_by_the_step_that_was_pressed(asked_for: dict[str, str], text: str) -> None:
    assert asked({"call": "step", **asked_for})["result"]["text"] == text


def test_a_step_never_goes_behind_the_point_measured_from() -> None:
    assert asked({"call": "step", "text": "5 mm", "unit": "m", "by": "-10 mm"})["error"]["code"] == "negative"


def test_a_check_in_slices_says_the_same_as_one_in_a_single_go() -> None:
    request = {"call": "check", "record": demo(), "stage": "full", "now": "2031-05-04T10:00:00Z"}
    whole, sliced = asked(request)["result"], asked({**request, "sliced": True})["result"]
    slices = 0
    while "more" in sliced:
        sliced, slices = asked({"call": "go_on", "token": sliced["more"]})["result"], slices + 1
    assert slices > 0
    assert sliced == whole


def test_a_newer_check_takes_the_place_of_one_under_way() -> None:
    request = {"call": "check", "record": demo(), "stage": "full", "sliced": True}
    first, second = asked(request)["result"]["more"], asked(request)["result"]["more"]
    assert asked({"call": "go_on", "token": first})["result"] == {"dropped": True}
    assert "dropped" not in asked({"call": "go_on", "token": second})["result"]
