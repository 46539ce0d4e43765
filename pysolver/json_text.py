"""How deep does JSON nest, before a reader that recurses sees it?

Python's reader raises RecursionError on a computer, but in the browser the same text exhausts the engine's own stack and
ends the whole run-time. So brackets are counted first, for every text that a stranger can have written.
"""

import json
import re
from typing import Any

from pysolver.errors import InputError

MAX_DEPTH = 32  # a record nests nine deep

# Strings (closed or not) are skipped as a whole; possessive, so that hostile text costs linear time.
_STRING_OR_BRACKET = re.compile(r'"(?:[^"\\]|\\.)*+"?|[][{}]', re.DOTALL)


def depth(text: str) -> int:
    """How deep brackets nest at most, brackets in strings left out."""
    now = deepest = 0
    for found in _STRING_OR_BRACKET.finditer(text):
        if found[0] in "[{":
            now += 1
            deepest = max(deepest, now)
        elif found[0] in "]}":
            now -= 1
    return deepest


def loads(text: str) -> Any:
    """json.loads for text from strangers. Raises InputError when it nests too deep, ValueError when it is no JSON."""
    if depth(text) > MAX_DEPTH:
        raise InputError(code="too_deep", message="This is nested deeper than any record. Ask for it again.")
    return json.loads(text)
