"""What is refused as no record, and does every refusal name its field? Records come from strangers (links, files)."""

import copy
import json
from typing import Any

import pytest
from records import bare, point, simple, two_spans

from pysolver.check import run_check
from pysolver.demo import demo
from pysolver.errors import InputError
from pysolver.record import SUPPORT_NAMES, blank, validated


def refused(document: Any) -> InputError:
    with pytest.raises(InputError) as caught:
        validated(document)
    assert len(caught.value.message) < 500
    assert caught.value.message.strip().endswith((".", "?"))
    return caught.value


def put(record: dict[str, Any], path: str, value: Any) -> dict[str, Any]:
    """A copy with one value replaced; path as a JSON pointer."""
    made = copy.deepcopy(record)
    *parents, last = path.strip("/").split("/")
    at: Any = made
    for part in parents:
        at = at[int(part) if isinstance(at, list) else part]
    at[int(last) if isinstance(at, list) else last] = value
    return made


@pytest.mark.parametrize("record", [blank(), demo(), simple(), two_spans()])
def test_records_made_here_are_valid_and_survive_json(record: dict[str, Any]) -> None:
    assert validated(record) == record
    assert validated(json.loads(json.dumps(record))) == record


def test_a_blank_record_has_nothing_preset() -> None:
    """Outside names, ids and settings everything is null, empty or false."""
    def leaves(value: Any) -> list[Any]:
        if isinstance(value, dict):
            return [leaf for v in value.values() for leaf in leaves(v)]
        return [leaf for v in value for leaf in leaves(v)] if isinstance(value, list) else [value]

    record = blank()
    for name in ("format", "version", "id", "settings"):
        del record[name]
    for support in record["supports"]:
        del support["name"]
    assert {leaf for leaf in leaves(record) if leaf is not None} <= {"", False}


@pytest.mark.parametrize("document", [None, 5, 1.5, True, "record", [], {}, [simple()], {"record": simple()}, {"format": "x"}])
def test_what_is_no_record_is_refused(document: Any) -> None:
    refused(document)


@pytest.mark.parametrize("name", sorted(blank()))
def test_a_record_without_one_of_its_parts_is_refused(name: str) -> None:
    record = simple()
    del record[name]
    refused(record)


@pytest.mark.parametrize("path", ["/unknown", "/place/unknown", "/spans/0/unknown", "/spans/0/length/unknown", "/loads/0/unknown",
                                  "/limits/0/entries/0/unknown", "/condition/unknown", "/__proto__"])
def test_unknown_keys_are_refused_at_their_place(path: str) -> None:
    error = refused(put(simple(), path, 1))
    assert error.field == path.rpartition("/")[0] or error.field == "/"


@pytest.mark.parametrize(("path", "value"), [
    ("/format", "other"), ("/id", ""), ("/id", "<script>"), ("/id", "x" * 65), ("/spans", []), ("/spans", {}), ("/spans", None),
    ("/spans/0/length", 6), ("/spans/0/length", "6 m"), ("/spans/0/length/text", 6), ("/spans/0/length/text", "9" * 41),
    ("/spans/0/length/value", "6"), ("/spans/0/length/means", 3), ("/spans/0/measure", "guess"), ("/supports/0/kind", "glued"),
    ("/loads", {}), ("/loads/0", None), ("/loads/0/whole_beam", None), ("/loads/0/whole_beam", 1), ("/loads/0/removable", "yes"),
    ("/loads/1/position/from", "middle"), ("/loads/1/position/support", -1), ("/loads/1/position/support", 1.5),
    ("/loads/0/photos", ["not a hash"]), ("/loads/0/name", "x" * 201), ("/limits/0/basis", "working"),
    ("/limits/0/entries", None),
    ("/limits/0/entries/0/criterion", None), ("/limits/0/entries/0/value", 70), ("/condition/distress/ends", "ok"),
    ("/condition/distress", None), ("/condition/void/which", "holes"), ("/found_at", "yesterday"), ("/found_at", 0),
    ("/settings/display", "imperial"), ("/decision", "carry_on"), ("/notes", None),
])
def test_wrong_types_and_values_are_refused_at_their_field(path: str, value: Any) -> None:
    """At the field itself or, for a written number or a position, at the whole of it."""
    field = refused(put(simple(), path, value)).field
    assert field != "/"
    assert f"{path}/".startswith(f"{field}/") or field.startswith(f"{path}/")


@pytest.mark.parametrize("version", [0, 2, "1", None, 1.5, [1], "x" * 100_000])
def test_another_version_is_refused(version: Any) -> None:
    assert refused(put(simple(), "/version", version)).field == "/version"


@pytest.mark.parametrize("value", [float("nan"), float("inf"), float("-inf"), 10**400])
def test_a_kept_value_that_is_no_number_is_refused(value: Any) -> None:
    """Beside "6.00 m" the record keeps what was read; a value that is not 6 is an error, whatever it is."""
    assert "/spans/0/length" in [f.removesuffix("/value") for f in fields_of(put(simple(), "/spans/0/length/value", value))]


def test_a_kept_value_that_is_another_number_is_refused() -> None:
    result = run_check(put(simple(), "/spans/0/length/value", 5.0))
    assert [(e.field, e.code) for e in result.errors] == [("/spans/0/length", "value_differs")]
    assert result.outcome.word == "cannot"
    assert not run_check(put(simple(), "/spans/0/length/value", 6.0)).errors


def test_deep_and_huge_documents_are_refused() -> None:
    deep: Any = 1
    for _ in range(200):
        deep = [deep]
    refused(put(simple(), "/loads", deep))
    refused(put(simple(), "/place", deep))
    refused(put(simple(), "/loads", simple()["loads"] * 150))
    refused(put(simple(), "/spans", simple()["spans"] * 13))
    refused(put(simple(), "/notes", "x" * 1_000_000))


def test_the_numbers_of_spans_and_supports_belong_together() -> None:
    record = simple()
    record["spans"].append(copy.deepcopy(record["spans"][0]))
    assert refused(record).field == "/supports"


@pytest.mark.parametrize("name", ["loads", "limits"])
def test_two_things_with_one_id_are_refused(name: str) -> None:
    record = simple()
    record[name].append(copy.deepcopy(record[name][0]))
    assert refused(record).field == f"/{name}"


@pytest.mark.parametrize(("path", "value", "field"), [
    ("/loads/1/position", {"from": "support", "support": 5, "side": "left", "at": "centre", "to": "middle",
                           "distance": bare("1 m")},
     "/loads/1/position/support"),
    ("/limits/0/entries/0/support", 9, "/limits/0/entries/0/support"),
    ("/limits/0/covers_loads", ["gone"], "/limits/0/covers_loads"),
])
def test_a_reference_to_what_is_not_there_is_refused_at_its_field(path: str, value: Any, field: str) -> None:
    record = simple()
    record["limits"][0].update(covers="added", covers_loads=["pallet"])
    assert fields_of(record) == []
    assert field in [f.removesuffix("/0") for f in fields_of(put(record, path, value))]


def fields_of(record: dict[str, Any]) -> list[str]:
    """The fields that a record is refused at, as no record or as one that cannot be judged."""
    try:
        result = run_check(record)
    except InputError as error:
        return [error.field]
    if result.outcome.word != "cannot":
        return []
    return [*(error.field for error in result.errors), *(gap.path for gap in result.outcome.gaps)]


def test_a_free_end_between_two_supports_is_refused() -> None:
    assert any(f.startswith("/supports/1") for f in fields_of(put(two_spans(), "/supports/1/kind", "free")))


def test_support_names_are_enough_for_the_longest_beam_and_hold_no_letter_that_reads_as_a_figure() -> None:
    assert len(set(SUPPORT_NAMES)) == 13
    assert not set("IO") & set(SUPPORT_NAMES)


def test_words_of_strangers_are_kept_as_they_are() -> None:
    """Escaping happens once, at the edge; nothing here alters or runs what somebody wrote."""
    hostile = "<img src=x onerror=alert(1)> {0} %s \u202e"
    record = simple(loads=[*simple()["loads"], point("l9", "1 kN", "1.00 m", name=hostile, note=hostile)])
    assert validated(record)["loads"][2]["name"] == hostile
