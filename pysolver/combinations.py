"""By which factors do the loads of a standard's combinations enter?

Factors are data (combinations.json) with standard, edition, clause and where they were read. A case is one combination
with one leading variable action. In it a source takes its unfavourable factor where it adds to the effect and its
favourable one where it relieves it: one factor per source over all spans (J14), a favourable variable action zero.
"""

import json
from collections.abc import Sequence
from dataclasses import dataclass, replace
from functools import cache
from importlib import resources
from typing import Any

import numpy as np
from numpy.typing import NDArray

Floats = NDArray[np.float64]

PERMANENT, SETTLED = "permanent", "settlement"


@dataclass(frozen=True, slots=True, kw_only=True)
class Source:
    """One unknown that loads the beam. low and high are shares of its best estimate; category None is not known."""

    name: str
    category: str | None
    low: float = 1.0
    high: float = 1.0
    removable: bool = True


@dataclass(frozen=True, slots=True, kw_only=True)
class CombinationSet:
    """A standard's set of combinations. data: its entry of combinations.json."""

    id: str
    label: str
    edition: str
    basis: str
    rule: str
    from_memory: bool
    data: dict[str, Any]


@dataclass(frozen=True, slots=True, kw_only=True)
class Case:
    """One combination: its name, and for each source the factor where it relieves and where it adds."""

    name: str
    favourable: tuple[float, ...]
    unfavourable: tuple[float, ...]


@cache
def sets() -> dict[str, CombinationSet]:
    """All known sets by id."""
    entries = json.loads(resources.files("pysolver").joinpath("combinations.json").read_text("utf-8"))
    names = ("id", "label", "edition", "basis", "rule", "from_memory")
    return {e["id"]: CombinationSet(**{n: e[n] for n in names}, data=e) for e in entries}


def own_set(permanent: float, permanent_favourable: float, leading: float, accompanying: float) -> CombinationSet:
    """The set of factors that an office gave: accompanying is the product of its factor and psi."""
    base = sets()["own"]
    data = {**base.data, "permanent": [permanent, permanent_favourable], "leading": leading,
            "accompanying": accompanying}
    return replace(base, data=data)


def cases(chosen: CombinationSet, sources: Sequence[Source]) -> tuple[Case, ...]:
    """Every case of a set for these sources; cases with equal factors are listed once."""
    made = {"plain": _plain, "leading": _leading, "listed": _listed}[chosen.rule](chosen.data, sources)
    distinct = {(c.favourable, c.unfavourable): c for c in reversed(made)}
    return tuple(reversed(distinct.values()))


def _case(name: str, pairs: Sequence[tuple[float, float]]) -> Case:
    return Case(name=name, favourable=tuple(f for f, _ in pairs), unfavourable=tuple(u for _, u in pairs))


def _plain(data: dict[str, Any], sources: Sequence[Source]) -> list[Case]:
    """Every factor 1; a load that can be removed is also run removed (J17)."""
    def pair(s: Source) -> tuple[float, float]:
        stays = s.category in (PERMANENT, SETTLED) or not s.removable
        return (1.0 if stays else 0.0), 1.0
    return [_case("all loads as they are", [pair(s) for s in sources])]


def _leading(data: dict[str, Any], sources: Sequence[Source]) -> list[Case]:
    """Each variable category leads in turn (EN 1990 expression 6.10): gamma_G G + gamma_Q Qk,1 + gamma_Q psi0 Qk,i."""
    sup, inf = data["permanent"]
    categories = list(dict.fromkeys(s.category for s in sources if s.category not in (PERMANENT, SETTLED, None)))
    whole = data["leading"]

    def accompanying(category: str | None) -> float:
        return float(data["accompanying"]) if "accompanying" in data else whole * float(data["psi0"][category])

    def pair(s: Source, leader: str | None) -> tuple[float, float]:
        if s.category == PERMANENT:
            return inf, sup
        if s.category == SETTLED:
            adding, relieving = data.get("settlement", (1.0, 1.0))
            return relieving, adding
        leads = s.category == leader or s.category is None  # not known: always the largest factor (J17)
        return 0.0, whole if leads else accompanying(s.category)

    def name(leader: str | None) -> str:
        if leader is None:
            return f"{sup:g} permanent + {whole:g} variable"
        return f"{sup:g} permanent + {whole:g} {leader} leading" + (", others accompanying" if len(categories) > 1 else "")

    leaders: list[str | None] = [*categories] or [None]
    return [_case(name(c), [pair(s, c) for s in sources]) for c in leaders]


def _listed(data: dict[str, Any], sources: Sequence[Source]) -> list[Case]:
    """Combinations as a standard lists them by class of load (D, L, Lr, S, R)."""
    relieving = float(data["favourable_permanent"])
    largest = max(v for c in data["combinations"] for k, v in c.items() if k not in ("name", "D"))

    def pair(s: Source, c: dict[str, Any]) -> tuple[float, float]:
        if s.category == PERMANENT:
            return relieving, float(c["D"])
        if s.category == SETTLED:
            return 1.0, 1.0
        if s.category is None:
            return 0.0, largest
        return 0.0, float(c.get(data["classes"][s.category], 0.0))

    return [_case(c["name"], [pair(s, c) for s in sources]) for c in data["combinations"]]


def ranges(chosen: Sequence[Case], sources: Sequence[Source], *, best: bool) -> tuple[Floats, Floats]:
    """(K, S) the smallest and the largest share of its best estimate that each source can take in each case.

    best: sources at their best estimate, factors by sign; otherwise the whole range of what was measured, with the
    factors on top, never reduced because something was weighed (J14).
    """
    low = np.array([1.0 if best else s.low for s in sources])
    high = np.array([1.0 if best else s.high for s in sources])
    relieving = np.array([c.favourable for c in chosen]).reshape(len(chosen), len(sources))
    adding = np.array([c.unfavourable for c in chosen]).reshape(len(chosen), len(sources))
    return np.minimum(relieving * low, adding * high), np.maximum(relieving * low, adding * high)
