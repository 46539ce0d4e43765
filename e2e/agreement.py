"""What does CPython say to the record in a link, and are the numbers in the link and on the screen the same?"""

import re
from typing import Any

from playwright.sync_api import Page, expect

from pysolver.answer import answer, numbers
from pysolver.check import run_check
from pysolver.link import decode

OF_SCALE = 1e-9


def furthest(kept: dict[str, float], now: dict[str, float]) -> float:
    """The largest difference, as a part of the largest number of its kind (the part of the name before the colon)."""
    assert kept.keys() == now.keys()
    scale: dict[str, float] = {}
    for name, value in kept.items():
        kind = name.partition(":")[0]
        scale[kind] = max(scale.get(kind, 0.0), abs(value), abs(now[name]))
    return max(abs(kept[name] - now[name]) / (scale[name.partition(":")[0]] or 1.0) for name in kept)


def told_by_cpython(link: str) -> tuple[dict[str, Any], dict[str, Any]]:
    """The document in the link, and CPython's own answer to its record; the numbers of both agree."""
    document = decode(link)
    result = run_check(document["record"])
    assert len(document["numbers"]) >= 8
    assert furthest(document["numbers"], numbers(result)) <= OF_SCALE
    assert document["outcome"] == {"word": result.outcome.word, "title": result.outcome.title}
    return document, answer(result)


def squeezed(text: str) -> str:
    """Without differences of spacing."""
    return re.sub(r"\s+", " ", text).strip()


def screen_shows(page: Page, answered: dict[str, Any]) -> None:
    """Outcome, governing places and reactions on the result screen are CPython's, word for word."""
    expect(page.get_by_role("region", name="Outcome in full").get_by_role("heading")).to_have_text(answered["outcome"]["title"])
    governing = squeezed(page.get_by_role("region", name="Governing").inner_text())
    for one in answered["criteria"]:
        for key in ("title", "place", "unfactored", "factored", "high", "limit", "ratio", "ratio_high", "combination"):
            assert squeezed(one[key]) in governing, f"{one['title']}, {key}"
    table = squeezed(page.get_by_role("region", name="Reactions").inner_text())
    for one in answered["reactions"]:
        row = squeezed(f"{one['support']} {one['unfactored']} {one['low']} {one['high']}")
        assert row in table
