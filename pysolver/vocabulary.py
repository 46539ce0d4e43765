"""Which words and choices does the page offer? One list (vocabulary.json) for page, terminal and reports."""

import json
from functools import cache
from importlib import resources
from typing import Any

from pysolver.combinations import sets
from pysolver.measured import means_table


@cache
def words() -> dict[str, Any]:
    """The lists of vocabulary.json, with combination sets and ways of measuring added from their own data."""
    lists: dict[str, Any] = json.loads(resources.files("pysolver").joinpath("vocabulary.json").read_text("utf-8"))
    lists["sets"] = [{"id": s.id, "label": s.label, "edition": s.edition, "basis": s.basis, "from_memory": s.from_memory,
                      "help": s.data["source"]} for s in sets().values()]
    for group in ("length", "load", "stiffness", "settlement"):
        lists[f"means_{group}"] = [{"id": row["id"], "label": row["label"], "help": row["range"]}
                                   for (_, of), row in means_table().items() if of == group]
    return lists


def label(name: str, item: str) -> str:
    """The label of one item of a list; the item itself when the list does not have it."""
    return next((str(entry["label"]) for entry in words()[name] if entry["id"] == item), item)
