"""What is a valid record of one check, and how does an empty one look?

The form is fixed by record.schema.json (JSON Schema, draft 7). Records come from strangers (links, files): nothing is
read before the schema has accepted it. fastjsonschema turns the schema into Python once, at first use.
"""

import json
from collections.abc import Callable
from functools import cache
from importlib import resources
from typing import Any

import fastjsonschema

from pysolver.errors import InputError

Record = dict[str, Any]

VERSION = 1
SUPPORT_NAMES = "ABCDEFGHJKLMN"  # no I: it reads as 1


@cache
def _validator() -> Callable[[Any], Any]:
    schema = json.loads(resources.files("pysolver").joinpath("record.schema.json").read_text("utf-8"))
    return fastjsonschema.compile(schema)  # type: ignore[no-any-return]


def validated(document: Any) -> Record:
    """The record itself when the schema and its inner references hold; otherwise InputError with the field."""
    if isinstance(document, dict) and document.get("version", VERSION) != VERSION:
        raise InputError(code="version", field="/version", message=f"This record has version {document.get('version')!r}; "
                         f"this app reads version {VERSION}. Open it with the app that made it, or update this one.")
    try:
        record: Record = _validator()(document)
    except fastjsonschema.JsonSchemaValueException as error:
        path = "/" + "/".join(str(p) for p in error.path[1:])
        raise InputError(code="schema", field=path, message=f"The record is not in the form that this app reads: "
                         f"{error.message.removeprefix('data.')[:200]}.") from None
    _check_references(record)
    return record


def _check_references(record: Record) -> None:
    if len(record["supports"]) != len(record["spans"]) + 1:
        raise InputError(code="supports", field="/supports", message=f"{len(record['spans'])} spans need "
                         f"{len(record['spans']) + 1} supports, but {len(record['supports'])} are listed.")
    for name in ("loads", "limits"):
        ids = [item["id"] for item in record[name]]
        if len(set(ids)) != len(ids):
            raise InputError(code="ids", field=f"/{name}", message=f"Two {name} have the same id. Give each its own.")


def blank() -> Record:
    """A record of one span with everything unanswered; the caller adds id and times."""
    return {
        "format": "asfound-record", "version": VERSION, "id": "new", "created": None, "changed": None, "found_at": None,
        "valid_until": None, "found_by": {"name": "", "role": "", "phone": ""},
        "place": {"site": "", "member": "", "drawing": "", "revision": "", "stage": ""},
        "ends": {"left": "", "right": ""}, "settings": {"display": "metric", "phone": ""},
        "spans": [{"measure": None, "length": None, "drawn": None}], "overhangs": {"left": None, "right": None},
        "supports": [blank_support(0), blank_support(1)], "hinges": [],
        "section": {"identity": None, "depth": None, "stiffness": None, "zones": [], "note": ""},
        "self_weight": {"answer": None, "mass": None}, "permanent": {"answer": None},
        "restraint": {"answer": None, "spacing": None}, "loads": [], "limits": [],
        "condition": {"distress": {"ends": None, "midspan": None, "underside": None}, "distress_note": "",
                      "void": {"answer": None, "which": [], "note": ""}, "told": None},
        "photos": [], "decision": None, "notes": ""}


def blank_support(index: int) -> Record:
    """An unanswered support, named A, B, C ... from the left."""
    return {"name": SUPPORT_NAMES[index], "kind": None, "bearing": None, "bearing_drawn": None, "stiffness": None,
            "rotational": None, "settlement": None, "note": ""}
