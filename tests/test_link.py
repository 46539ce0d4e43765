"""Does a record survive its link unchanged, is damage noticed, and are hostile links refused cheaply?"""

import base64
import hashlib
import json
import string
import time
import tracemalloc
import zlib
from typing import Any

import pytest
from hypothesis import example, given
from hypothesis import strategies as st

from pysolver import link
from pysolver.errors import InputError
from pysolver.link_dictionary import DICTIONARY_R1

SCALARS = (
    st.none()
    | st.booleans()
    | st.integers(-(2**53), 2**53)
    | st.floats(allow_nan=False, allow_infinity=False)
    | st.text(st.characters(exclude_categories=["Cs"]), max_size=30)
)
KEYS = st.text(st.characters(exclude_categories=["Cs"]), max_size=12)
VALUES = st.recursive(SCALARS, lambda inner: st.lists(inner, max_size=4) | st.dictionaries(KEYS, inner, max_size=4))
PAYLOADS = st.dictionaries(KEYS, VALUES, max_size=6)


def written(text: str, unit: str, means: str, value: float) -> dict[str, Any]:
    return {"text": text, "unit": unit, "means": means, "value": value}


def two_span_record() -> dict[str, Any]:
    """An invented check: two spans, two loads and a limit sheet with three entries, as a site would fill it in."""

    def support(name: str, bearing: str) -> dict[str, Any]:
        return {
            "name": name, "kind": "bearing", "bearing": written(bearing, "mm", "tape", float(bearing) / 1000),
            "bearing_drawn": written("150", "mm", "design", 0.15), "stiffness": None, "rotational": None,
            "settlement": None, "note": "",
        }

    def load(number: int, name: str, kilonewtons: str, metres: str) -> dict[str, Any]:
        distance = written(metres, "m", "tape", float(metres))
        return {
            "id": f"l{number}", "name": name, "category": "stored", "form": "point",
            "magnitude": written(kilonewtons, "kN", "ticket", float(kilonewtons) * 1000), "magnitude_end": None,
            "position": {"from": "support", "support": 0, "side": "right", "at": "face", "to": "near_edge",
                         "distance": distance},
            "length": None, "whole_beam": False, "source": name, "removable": True, "note": "", "photos": [],
        }

    def entry(number: int, criterion: str, text: str, unit: str) -> dict[str, Any]:
        return {"id": f"e{number}", "criterion": criterion, "value": written(text, unit, "design", float(text) * 1000),
                "support": None, "zone": None, "width": None, "sag_under": None}

    return {
        "format": "asfound-record", "version": 1, "id": "7d1f0c52-9a3e-4b60-8f2d-1f6f2d0b9c44",
        "created": "2026-03-02T09:14:05+01:00", "changed": "2026-03-02T09:31:40+01:00",
        "found_at": "2026-03-02T09:30:12+01:00", "valid_until": "2026-03-02T17:00:00+01:00",
        "found_by": {"name": "R. Okafor", "role": "site engineer", "phone": "+00 555 0101"},
        "place": {"site": "Mill Lane infill", "member": "B12", "drawing": "S-204", "revision": "C", "stage": "slab 2"},
        "ends": {"left": "grid C", "right": "street side"}, "settings": {"display": "metric", "phone": "+00 555 0199"},
        "spans": [
            {"measure": "clear", "length": written("5.62", "m", "tape", 5.62),
             "drawn": written("5.40", "m", "design", 5.4)},
            {"measure": "clear", "length": written("4.18", "m", "tape", 4.18),
             "drawn": written("4.20", "m", "design", 4.2)},
        ],
        "overhangs": {"left": None, "right": None},
        "supports": [support("A", "140"), support("B", "215"), support("C", "150")], "hinges": [],
        "section": {"identity": "same", "depth": written("305", "mm", "tape", 0.305),
                    "stiffness": written("20500", "kN·m²", "steel_table", 2.05e7), "zones": [], "note": ""},
        "self_weight": {"answer": "entered", "mass": written("48.1", "kg/m", "steel_table", 471.699865)},
        "permanent": {"answer": "entered"}, "restraint": {"answer": "full", "spacing": None},
        "loads": [load(1, "pallet of blocks", "14.2", "2.35"), load(2, "bundle of rebar", "9.6", "7.05")],
        "limits": [{
            "id": "s1", "document": "S-204 beam schedule", "revision": "C", "issued_by": "Harrow & Pine",
            "kind": "resistance",
            "basis": "factored", "set": "en1990-6.10-str", "own": None, "covers": "all", "covers_loads": [],
            "span": written("5.55", "m", "design", 5.55), "span_rule": "effective", "restraint": "full",
            "restraint_spacing": None, "moment_at": "centre",
            "entries": [entry(1, "sagging", "92", "kN·m"), entry(2, "hogging", "92", "kN·m"),
                        entry(3, "shear", "160", "kN")],
        }],
        "condition": {"distress": {"ends": "none", "midspan": "none", "underside": "not_seen"}, "distress_note": "",
                      "void": {"answer": "none", "which": [], "note": ""}, "told": None},
        "photos": [], "decision": None, "notes": "",
    }  # fmt: skip


VERSIONS = {"asfound": "0.1.0", "numpy": "2.3.1", "python": "3.14.0", "record": 1}
PAYLOAD = {"record": two_span_record(), "versions": VERSIONS}


def refused(fragment: str) -> str:
    with pytest.raises(InputError) as caught:
        link.decode(fragment)
    assert caught.value.message.endswith(".")
    return caught.value.code


def hostile(raw: bytes, *, checksum: str | None = None, more: bytes = b"") -> str:
    """A link made by a stranger: whole and with the right checksum, whatever its content."""
    packer = zlib.compressobj(9, zlib.DEFLATED, -15, zdict=DICTIONARY_R1)
    packed = base64.urlsafe_b64encode(packer.compress(raw) + packer.flush() + more).rstrip(b"=").decode()
    right = base64.urlsafe_b64encode(hashlib.sha256(raw).digest()).decode()[:12]
    return f"r1.{packed}.{right if checksum is None else checksum}"


@given(PAYLOADS)
def test_what_is_encoded_comes_back_equal(payload: dict[str, Any]) -> None:
    back = link.decode(link.encode(payload))
    assert back == payload
    assert json.dumps(back, sort_keys=True) == json.dumps(payload, sort_keys=True)  # also 1 and 1.0, 0.0 and -0.0


@given(PAYLOADS)
def test_a_link_holds_only_characters_that_a_fragment_may_hold(payload: dict[str, Any]) -> None:
    assert set(link.encode(payload)) <= set(string.ascii_letters + string.digits + "-_.")  # RFC 3986, section 2.3


def test_the_order_of_keys_does_not_change_a_link() -> None:
    assert link.encode({"a": 1, "b": 2}) == link.encode({"b": 2, "a": 1})


def test_a_link_is_what_its_description_says() -> None:
    """Taken apart by RFC 1951, RFC 4648 and FIPS 180-4 as the standard library has them, not by link.py."""
    version, packed, checksum = link.encode(PAYLOAD).split(".")
    raw = zlib.decompressobj(-15, zdict=DICTIONARY_R1).decompress(base64.urlsafe_b64decode(packed + "=="))
    assert version == "r1"
    assert json.loads(raw) == PAYLOAD
    assert raw == json.dumps(PAYLOAD, sort_keys=True, separators=(",", ":"), ensure_ascii=False).encode()
    assert base64.urlsafe_b64encode(hashlib.sha256(raw).digest()).decode().startswith(checksum)
    assert len(checksum) == 12


@pytest.mark.parametrize(
    "around", ["{}", "#{}", "https://example.org/asfound/#{}", " <https://example.org/#{}>\n", "{}."]
)
def test_a_whole_address_is_taken_as_it_was_pasted(around: str) -> None:
    assert link.decode(around.format(link.encode(PAYLOAD))) == PAYLOAD


def test_a_link_broken_over_lines_by_a_mail_program_is_read() -> None:
    fragment = link.encode(PAYLOAD)
    assert link.decode("\r\n ".join(fragment[i : i + 76] for i in range(0, len(fragment), 76))) == PAYLOAD


def test_a_two_span_record_and_its_address_stay_below_a_thousand_characters() -> None:
    assert len("https://example.org/asfound/#" + link.encode(PAYLOAD)) < 1000


def test_the_dictionary_of_version_r1_is_never_changed() -> None:
    """Every r1 link ever sent points into it. If this fails, restore the text, or make a version r2 beside it."""
    digest = hashlib.sha256(DICTIONARY_R1).hexdigest()
    assert digest == "388aa8b7221b52fe18122aa6ddf2514702b7a33d19da28afeab852d2d7d4ae7b"


# --- damage --------------------------------------------------------------------------------------------------------


def test_any_changed_character_is_noticed_or_changes_nothing() -> None:
    fragment = link.encode(PAYLOAD)
    noticed = 0
    for place in range(len(fragment)):
        for other in "A0_.x":
            if fragment[place] == other:
                continue
            try:
                assert link.decode(fragment[:place] + other + fragment[place + 1 :]) == PAYLOAD
            except InputError:
                noticed += 1
    assert noticed > 4 * len(fragment)


@given(st.data())
def test_any_missing_or_doubled_or_swapped_part_is_noticed(data: st.DataObject) -> None:
    fragment = link.encode(PAYLOAD)
    start = data.draw(st.integers(0, len(fragment) - 2))
    end = data.draw(st.integers(start + 1, len(fragment) - 1))
    damaged = [fragment[:start] + fragment[end:], fragment[:end], fragment[:end] + fragment[start:]]
    for text in damaged:
        assert refused(text) in ("damaged", "not_a_link", "version")


def test_bits_beyond_the_last_byte_are_noticed() -> None:
    """RFC 4648, section 3.5: several base64 texts can stand for the same bytes; only the one with zero bits is read."""
    alphabet = string.ascii_uppercase + string.ascii_lowercase + string.digits + "-_"
    seen = 0
    for length in range(1, 9):
        version, packed, checksum = link.encode({"a": "~" * length}).split(".")
        if len(packed) % 4:
            seen += 1
            other = alphabet[alphabet.index(packed[-1]) + 1]
            assert refused(f"{version}.{packed[:-1]}{other}.{checksum}") == "damaged"
    assert seen


@pytest.mark.parametrize(
    ("text", "code"),
    [
        ("", "not_a_link"),
        ("#", "not_a_link"),
        ("https://example.org/asfound/", "not_a_link"),
        ("r1", "not_a_link"),
        ("r1.", "not_a_link"),
        ("r1..", "not_a_link"),
        ("r1.x.y", "damaged"),
        ("r2.AAAA.AAAAAAAAAAAA", "version"),
        ("x1.AAAA.AAAAAAAAAAAA", "not_a_link"),
        ("r1.AA AA==.AAAAAAAAAAAA", "damaged"),
        ("r1." + "A" * 200_000, "too_large"),
    ],
)
def test_what_is_no_link_is_refused_with_its_reason(text: str, code: str) -> None:
    assert refused(text) == code


FRAGMENTS = st.text(string.ascii_letters + string.digits + "-_.#", max_size=300).map("r1.".__add__)


@given(st.one_of(st.text(max_size=200), FRAGMENTS))
@example("r1.AwA.47DEQpj8HBSa")  # an empty deflate stream with its checksum: whole, but no JSON
def test_random_text_raises_nothing_but_input_errors(text: str) -> None:
    with pytest.raises(InputError):
        link.decode(text)


# --- hostile content -----------------------------------------------------------------------------------------------


@pytest.mark.parametrize(
    "raw",
    [
        b"",
        b"[]",
        b'"text"',
        b"null",
        b'{"a":1,"a":2}',
        b'{"a":NaN}',
        b'{"a":Infinity}',
        b'{"a":-Infinity}',
        b'{"a":1e999}',
        b'{"a":' + b"9" * 5000 + b"}",
        b'{"a": 1}',
        b'{"b":1,"a":1}',
        b'{"a":"\\ud800"}',
        b'{"a":"\xff"}',
        b'{"a":1}{}',
        b'{"a":' + b"[" * 32 + b"]" * 32 + b"}",
        b"[" * 1_000_000,
        b'{"a":' * 300_000,
        b'"' + b'\\"' * 500_000,
    ],
    ids=range(19),
)
def test_content_that_no_record_has_is_refused_quickly(raw: bytes) -> None:
    started = time.process_time()
    assert refused(hostile(raw)) == "not_a_record"
    assert time.process_time() - started < 5  # quadratic scanning of the long ones would take minutes


def test_nesting_up_to_the_cap_is_read() -> None:
    raw = b'{"a":' + b"[" * 31 + b"]" * 31 + b"}"
    assert link.decode(hostile(raw)) == json.loads(raw)


def test_brackets_in_text_do_not_count_as_nesting() -> None:
    payload = {"note": '[[{{"\\' * 50}
    assert link.decode(link.encode(payload)) == payload


def test_data_after_the_end_is_noticed() -> None:
    assert refused(hostile(b'{"a":1}', more=b"\0")) == "damaged"


def test_a_stream_without_an_end_is_noticed() -> None:
    packer = zlib.compressobj(9, zlib.DEFLATED, -15, zdict=DICTIONARY_R1)
    raw = b'{"a":1}'
    packed = packer.compress(raw) + packer.flush(zlib.Z_SYNC_FLUSH)
    right = hostile(raw).rpartition(".")[2]
    assert refused(f"r1.{base64.urlsafe_b64encode(packed).decode().rstrip('=')}.{right}") == "damaged"


def test_a_deflate_bomb_is_refused_without_being_inflated() -> None:
    bomb = hostile(b'{"a":"' + b"0" * 100_000_000 + b'"}')
    assert len(bomb) < link.MAX_FRAGMENT
    tracemalloc.start()
    try:
        assert refused(bomb) == "too_large"
        peak = tracemalloc.get_traced_memory()[1]
    finally:
        tracemalloc.stop()
    assert peak < 5 * link.MAX_INFLATED


def test_the_cap_on_inflated_bytes_is_exact() -> None:
    room = link.MAX_INFLATED - len(b'{"a":""}')
    assert len(link.decode(link.encode({"a": "0" * room}))["a"]) == room
    with pytest.raises(InputError, match="file"):
        link.encode({"a": "0" * (room + 1)})
    assert refused(hostile(b'{"a":"' + b"0" * (room + 1) + b'"}')) == "too_large"


@pytest.mark.parametrize("value", [float("nan"), float("inf"), "\ud800"])
def test_what_could_not_be_opened_is_never_made(value: object) -> None:
    with pytest.raises(InputError):
        link.encode({"a": value})


def test_a_record_without_end_is_never_made() -> None:
    nested: list[Any] = []
    for _ in range(40):
        nested = [nested]
    with pytest.raises(InputError):
        link.encode({"a": nested})
