"""Do numbers travel unchanged, and is every change of input or number noticed when a record is opened elsewhere?"""

import copy
import json
import math
from typing import Any

import pytest
from records import SAG, SHEAR, entry, q, sheet, simple, two_spans

from pysolver.check import run_check
from pysolver.demo import demo
from pysolver.errors import InputError
from pysolver.link import decode, encode
from pysolver.record import blank
from pysolver.recorded import carried, differences, opened, short


def travelled(record: dict[str, Any]) -> dict[str, Any]:
    return decode(encode(short(carried(record))))


@pytest.mark.parametrize("record", [demo(), simple(), two_spans(), blank()])
def test_numbers_agree_after_a_journey_as_link(record: dict[str, Any]) -> None:
    told = opened(travelled(record))
    assert told["agreement"]["equal"] is True
    assert told["agreement"]["differs"] == []
    assert told["record"] == record


def test_numbers_agree_after_a_journey_as_file() -> None:
    told = opened(json.loads(json.dumps(carried(two_spans()), allow_nan=False)))
    assert told["agreement"]["equal"] is True


def test_the_numbers_that_travel_are_those_of_the_hand_calculation() -> None:
    """M = 43.5 kN·m and R = 22 kN of the base record (records.py); ratio 0.435 of 100 kN·m."""
    numbers = travelled(simple())["numbers"]
    assert numbers["moment N·m:largest"] == pytest.approx(43500, rel=1e-9)
    assert numbers["reaction N:1A"] == numbers["reaction N:2B"] == pytest.approx(22000, rel=1e-9)
    assert numbers["ratio:1 Bending, sagging"] == pytest.approx(0.435, rel=1e-9)


def test_a_value_beside_its_text_travels_in_a_file_and_not_in_a_link() -> None:
    assert carried(simple())["record"]["spans"][0]["length"]["value"] == 6.0
    assert "value" not in travelled(simple())["record"]["spans"][0]["length"]


@pytest.mark.parametrize("change", [
    lambda r: r["loads"][1]["magnitude"].update(text="14.1 kN"),
    lambda r: r["loads"][1]["position"]["distance"].update(text="3.01 m"),
    lambda r: r["spans"][0]["length"].update(text="6.001 m"),
    lambda r: r["limits"][0]["entries"][0]["value"].update(text="101 kNm"),
    lambda r: r["limits"][0].update(kind=None),
    lambda r: r["condition"]["distress"].update(ends="something"),
    lambda r: r["loads"].pop(1),
    lambda r: r["loads"][1].update(magnitude=q("14 kN", "counted")),
    lambda r: r["limits"][0]["entries"].append(entry("reaction", "100 kN")),
])
def test_a_changed_input_is_noticed(change: Any) -> None:
    document = travelled(simple())
    change(document["record"])
    told = opened(document)
    assert told["agreement"]["equal"] is False
    assert told["agreement"]["differs"]
    assert "differ" in told["agreement"]["shown"]


@pytest.mark.parametrize("share", [1e-6, -1e-7, 3e-9])
def test_a_changed_number_is_noticed(share: float) -> None:
    document = travelled(simple())
    document["numbers"]["moment N·m:largest"] *= 1 + share
    told = opened(document)
    assert [d["name"] for d in told["agreement"]["differs"]] == ["moment N·m:largest"]


def test_a_number_too_many_or_too_few_is_noticed() -> None:
    for change in (lambda n: n.pop("reaction N:1A"), lambda n: n.update({"reaction N:Z": 1.0}), lambda n: n.clear()):
        document = travelled(simple())
        change(document["numbers"])
        assert opened(document)["agreement"]["equal"] is False


def test_a_changed_outcome_is_noticed() -> None:
    document = travelled(simple(limits=[sheet(entry(SAG, "40 kNm"), entry(SHEAR, "100 kN"))]))
    assert document["outcome"]["word"] == "over"
    document["outcome"]["word"] = "within"
    told = opened(document)
    assert told["agreement"]["differs"] == [{"name": "outcome", "recorded": "within", "now": "over"}]
    assert told["result"]["outcome"]["word"] == "over"


def test_what_is_shown_is_recomputed_and_never_the_recorded_outcome() -> None:
    document = travelled(simple())
    document["numbers"] = {"moment N·m:largest": 1.0}
    document["outcome"] = {"word": "clear", "title": "clear"}
    assert opened(document)["result"]["outcome"]["word"] == run_check(simple()).outcome.word == "within"


@pytest.mark.parametrize("wrong", [None, [], "numbers", 3, {"a": "1"}, {"a": None}, {"a": True}, {"a": [1.0]}, {"a": math.nan},
                                   {"a": math.inf}, {"a": -math.inf}, {"a": 10**400}, {"x" * 201: 1.0},
                                   {str(i): 1.0 for i in range(2001)}])
def test_numbers_that_are_none_are_refused(wrong: Any) -> None:
    document = copy.deepcopy(carried(simple()))
    document["numbers"] = wrong
    with pytest.raises(InputError) as caught:
        opened(document)
    assert caught.value.field == "/numbers"


@pytest.mark.parametrize("wrong", [None, [], {}, {"word": 3}, "within", {"word": ["within"]}])
def test_an_outcome_that_is_none_never_agrees(wrong: Any) -> None:
    document = carried(simple())
    document["outcome"] = wrong
    assert opened(document)["agreement"]["equal"] is False


@pytest.mark.parametrize("wrong", [None, [], "1", {"asfound": "x" * 10_000}, {str(i): "v" for i in range(999)}])
def test_versions_from_a_stranger_are_cut_short(wrong: Any) -> None:
    document = carried(simple())
    document["versions"] = wrong
    told = opened(document)
    assert len(json.dumps(told["recorded"]["versions"])) < 6000
    assert told["agreement"]["equal"] is True


def test_a_bare_record_is_opened_without_claiming_agreement() -> None:
    told = opened(simple())
    assert told["agreement"]["equal"] is None
    assert told["result"]["outcome"]["word"] == "within"


@pytest.mark.parametrize("record", [None, [], 3, {}, {"format": "other"}])
def test_a_carried_document_with_a_damaged_record_is_refused(record: Any) -> None:
    document = carried(simple())
    document["record"] = record
    with pytest.raises(InputError):
        opened(document)


def test_differences_are_measured_by_the_largest_of_their_kind() -> None:
    """1e-9 of 100 is 1e-7: a moment that should be 0 may be 5e-8 and not 2e-7; a shear of the same size may not help it."""
    kept = {"moment N·m:largest": 100.0, "moment N·m:smallest": 0.0, "shear N:largest": 1e9}
    assert differences(kept, {**kept, "moment N·m:smallest": 5e-8}) == []
    assert [d["name"] for d in differences(kept, {**kept, "moment N·m:smallest": 2e-7})] == ["moment N·m:smallest"]


def test_no_reaction_is_lost_because_two_supports_have_one_name() -> None:
    record = two_spans()
    record["supports"][2]["name"] = "A"
    try:
        numbers = carried(record)["numbers"]
    except InputError:
        return
    assert len([name for name in numbers if name.startswith("reaction N:")]) == 3
