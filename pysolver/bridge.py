"""The only door for the browser: handle(json_text) -> json_text.

A request is {"call": name, ...}; an answer is {"ok": true, "result": ...} or {"ok": false, "error": {kind, code, field,
message}}. kind "input": the person can put it right; "internal": our fault, and it says so. Nothing raises.
"""

import json
import os
import time
from collections.abc import Callable, Generator
from itertools import count
from typing import Any

import pysolver
from pysolver.answer import answer, versions
from pysolver.beam import Beam, Stretch, Support
from pysolver.check import Result, check_in_slices, run_check
from pysolver.demo import demo
from pysolver.display import System, also, field_units, show
from pysolver.errors import InputError, InternalError
from pysolver.json_text import loads
from pysolver.link import decode, encode
from pysolver.loads import LineLoad
from pysolver.readings import is_part_of_span
from pysolver.record import blank
from pysolver.recorded import carried, opened, short
from pysolver.statics import extremes, solve
from pysolver.units import parse
from pysolver.vocabulary import words

pysolver.BUILD = os.environ.get("ASFOUND_BUILD", pysolver.BUILD)

MAX_REQUEST = 4_000_000  # characters
SLICE = 0.05  # s
STEPS = {"metric": ("-500 mm", "-100 mm", "-10 mm", "10 mm", "100 mm", "500 mm"), "us": ("-12 in", "-1 in", "1 in", "12 in")}
QR_LONGEST = 1000  # characters of a link that a phone's camera still reads from a phone's screen


def handle(text: str) -> str:
    """Answer one request. Always returns JSON text without NaN."""
    try:
        if len(text) > MAX_REQUEST:
            raise InputError(code="too_large", message="That is too much data for one check.")
        request = loads(text)
        call = CALLS.get(str(request.get("call"))) if isinstance(request, dict) else None
        if call is None:
            raise InternalError(code="call", message="The page asked for something that the solver does not know.")
        told: dict[str, Any] = {"ok": True, "result": call(request)}
        return json.dumps(told, allow_nan=False, ensure_ascii=False)
    except InputError as error:
        return _failed("input", error.code, error.field, error.message)
    except InternalError as error:
        return _failed("internal", error.code, error.field, f"{error.message} This is our fault, not yours; nothing is lost.")
    except Exception as error:  # the last door: whatever it is, the page must hear of it and go on
        return _failed("internal", type(error).__name__, "", "Something in the solver broke. This is our fault, not yours; "
                       f"nothing is lost. ({type(error).__name__}: {str(error)[:300]})")


def _failed(kind: str, code: str, field: str, message: str) -> str:
    return json.dumps({"ok": False, "error": {"kind": kind, "code": code, "field": field, "message": message}})


def hello(request: dict[str, Any]) -> dict[str, Any]:
    """Words, units, an empty record and versions: all that the page needs to offer its fields."""
    lists = words()
    return {"versions": versions(), "vocabulary": lists, "units": {s: field_units(s) for s in ("metric", "us")},
            "steps": STEPS, "blank": blank(), "cautions": lists["cautions"], "not_compared": lists["not_compared"],
            "limits_of_tool": lists["limits_of_tool"]}


def self_check(request: dict[str, Any]) -> dict[str, Any]:
    """A beam whose answer is known is solved: two equal spans, one loaded (closed form: R = 7/16, 5/8, -1/16 of w L)."""
    beam = Beam(length=10.0, supports=tuple(Support(x=x, kind="pinned") for x in (0.0, 5.0, 10.0)),
                stretches=(Stretch(start=0.0, end=10.0, bending_stiffness=1e7),))
    response = solve(beam, [LineLoad(start=0.0, end=5.0, start_intensity=1e4, end_intensity=1e4)])
    expected = (7 / 16 * 5e4, 5 / 8 * 5e4, -1 / 16 * 5e4, 49 / 512 * 25e4)
    found = (*response.reactions, extremes(response, "moment")[0].value)
    error = max(abs(a - b) / abs(b) for a, b in zip(found, expected, strict=True))
    if not error < 1e-9:
        raise InternalError(code="self_check", message="The solver does not get a known beam right on this device.")
    return {"ok": True, "shown": f"asfound {pysolver.__version__}: a known beam comes out right to {max(error, 1e-16):.0e}."}


def read(request: dict[str, Any]) -> dict[str, Any]:
    """Read one written number for the line under the pad."""
    dimension, system, text = request["dimension"], request.get("system", "metric"), request["text"]
    if not isinstance(text, str):
        raise InternalError(code="call", message="The page asked to read something that is not a text.")
    if request.get("sag") and is_part_of_span(text):
        return {"value": None, "shown": f"span divided by {text.partition('/')[2].strip()}", "also": ""}
    parsed = parse(dimension, text[:80], str(request.get("unit") or ""))
    return {"value": parsed.value, "text": parsed.text, "shown": show(dimension, parsed.value, system),
            "also": also(dimension, parsed.value, system) if dimension != "number" else ""}


def step(request: dict[str, Any]) -> dict[str, Any]:
    """A distance moved by one of STEPS, as the text that stands in the field then."""
    system: System = "us" if request.get("system") == "us" else "metric"
    if request["by"] not in STEPS[system]:
        raise InternalError(code="call", message="The page asked for a step that there is none of.")
    here = parse("length", str(request["text"])[:80], str(request.get("unit") or "")).value if request["text"] else 0.0
    there = here + parse("small_length", request["by"]).value
    if there < 0.0:
        raise InputError(code="negative", message=f"{request['by']} from there would be behind the point that it is measured "
                         "from. Measure from the other side of it.")
    return {"text": show("length", there, system)}


Going = tuple[int, Generator[None, None, Result], str | None]
_tokens = count(1)
_going: list[Going] = []  # the one check that is under way in slices: a newer one takes its place


def check(request: dict[str, Any]) -> dict[str, Any]:
    """The check of a record; stage "best" comes first and fast, "full" with the ranges.

    With "sliced", what takes longer than SLICE answers {"more": token}: ask go_on with it, or drop it for good.
    """
    full, now = request.get("stage") != "best", request.get("now")
    if not request.get("sliced"):
        return answer(run_check(request["record"], full=full), now)
    _going[:] = [(next(_tokens), check_in_slices(request["record"], full=full), now)]
    return _one_slice()


def go_on(request: dict[str, Any]) -> dict[str, Any]:
    """The next slice of the check that answered {"more": token}; {"dropped": true} when a newer one took its place."""
    if not _going or _going[0][0] != request["token"]:
        return {"dropped": True}
    return _one_slice()


def _one_slice() -> dict[str, Any]:
    token, steps, now = _going[0]
    began = time.monotonic()
    try:
        while time.monotonic() - began < SLICE:
            next(steps)
    except StopIteration as end:
        _going.clear()
        return answer(end.value, now)
    return {"more": token}


def link(request: dict[str, Any]) -> dict[str, Any]:
    """The record as a link. app_url: the address of the page, without fragment."""
    address = str(request["app_url"]).partition("#")[0]
    made = f"{address}#{encode(short(carried(request['record'])))}"
    return {"link": made, "length": len(made), "qr": len(made) <= QR_LONGEST}


def open_(request: dict[str, Any]) -> dict[str, Any]:
    """A link's fragment: the record, recomputed, and whether the numbers agree."""
    return opened(decode(str(request["fragment"])), request.get("now"))


def file(request: dict[str, Any]) -> dict[str, Any]:
    """The record as a JSON file, with values and numbers."""
    return {"text": json.dumps(carried(request["record"]), indent=1, ensure_ascii=False, allow_nan=False)}


CALLS: dict[str, Callable[[dict[str, Any]], dict[str, Any]]] = {
    "hello": hello, "self_check": self_check, "demo": lambda request: {"record": demo()}, "read": read, "step": step,
    "check": check, "go_on": go_on,
    "link": link, "open": open_, "file": file}


def examples() -> list[str]:
    """One request for every call: played against what ships, so that a missing module is found at assembly."""
    record = demo()
    fragment = encode(short(carried(record)))
    asked: list[dict[str, Any]] = [
        {"call": "hello"}, {"call": "self_check"}, {"call": "demo"},
        {"call": "read", "dimension": "length", "text": "18' 4 1/2\"", "unit": "m"},
        {"call": "step", "text": "2.3", "unit": "m", "by": "-10 mm"},
        {"call": "check", "record": record, "stage": "best"}, {"call": "check", "record": record, "stage": "full"},
        {"call": "check", "record": record, "stage": "full", "sliced": True}, {"call": "go_on", "token": 0},
        {"call": "link", "record": record, "app_url": "https://example.invalid/"}, {"call": "open", "fragment": fragment},
        {"call": "file", "record": record}, {"call": "check", "record": blank(), "stage": "full"}]
    return [json.dumps(request) for request in asked]
