"""What exactly is compared in this check? The record made ready for solving, once.

A Model holds the readings, the unknown sources with their ranges, the criteria with their combination sets, the
uncertain lengths and positions, and the ways to read the beam (span rule, front edges). It is built from a valid record
whose beam is complete; InputError otherwise.
"""

from collections.abc import Sequence
from dataclasses import dataclass, replace

import numpy as np
from numpy.typing import NDArray

from pysolver.beam import SHORTEST
from pysolver.combinations import PERMANENT, SETTLED, CombinationSet, Source, own_set, sets
from pysolver.comparison import Along, Judged, judged, solve_layouts
from pysolver.errors import InputError
from pysolver.facts import wrong_pairs
from pysolver.found import SELF_WEIGHT, Layout, lay_out, source_of
from pysolver.frame import Reading
from pysolver.limits import Criterion, criteria, set_of
from pysolver.readings import Readings
from pysolver.record import Record
from pysolver.stiffness import SETTLEMENT
from pysolver.units import parse

Floats = NDArray[np.float64]

GEOMETRY = ("length", "small_length", "bending_stiffness", "spring", "rotational_spring")
OWN_FACTORS = {"permanent": (1.0, 5.0), "permanent_favourable": (0.0, 1.0), "leading": (1.0, 5.0), "accompanying": (0.0, 5.0)}
TIMES_THE_BASE = "/section/stiffness"


@dataclass(frozen=True, slots=True, kw_only=True)
class Model:
    """See the module. variables: paths of the uncertain lengths, positions and stiffnesses that change the answer."""

    record: Record
    readings: Readings
    sources: tuple[Source, ...]
    judged: tuple[Judged, ...]
    variables: tuple[str, ...]
    ways: tuple[Reading, ...]
    errors: tuple[InputError, ...]

    def layouts(self, points: Floats, way: Reading) -> list[Layout]:
        """The layout of every point (C, n) of the box, n the variables in order."""
        best = {path: m.best for path, m in self.readings.measured.items()}
        return [lay_out(self.record, self.readings, {**best, **dict(zip(self.variables, p.tolist(), strict=True))}.__getitem__,
                        way) for p in points]

    def solved(self, points: Floats, way: Reading) -> Along:
        return solve_layouts(self.layouts(points, way))

    def best_point(self) -> Floats:
        return np.array([self.readings.measured[v].best for v in self.variables])

    @property
    def ranged(self) -> bool:
        """Whether any number of the record has a range (J13)."""
        return any(not m.exact for m in self.readings.measured.values())


def model(record: Record, readings: Readings) -> Model:
    """The check made ready. Raises InputError when the beam cannot stand as entered."""
    way = Reading(rule=span_rule(record))
    best = _at_best(record, readings, way)
    along = solve_layouts([best])
    sources = _sources(record, readings, along.batch.sources, best)
    found, errors = criteria(record, readings)
    pairs = wrong_pairs(record)
    usable = [c for c in found if _usable(c, record, readings, best, pairs)]
    ways = [way]
    if any(record["overhangs"].values()):
        edged = [replace(way, edge=edge) for edge in ("tip", "inner")]
        ways += [other for other in edged if _at_best(record, readings, other).supports != best.supports]
    return Model(record=record, readings=readings, sources=sources, variables=_variables(record, readings, usable),
                 judged=tuple(_judge(c, record, sources) for c in usable), ways=tuple(ways), errors=(*errors, *pairs))


def _at_best(record: Record, readings: Readings, way: Reading) -> Layout:
    return lay_out(record, readings, {p: m.best for p, m in readings.measured.items()}.__getitem__, way)


def span_rule(record: Record) -> str:
    """The rule for the effective span that all sheets state; centre to centre, the longer, when they differ or are silent."""
    rules = {sheet["span_rule"] for sheet in record["limits"]}
    return "effective" if rules == {"effective"} else "centres"


def _usable(one: Criterion, record: Record, readings: Readings, best: Layout, wrong: Sequence[InputError]) -> bool:
    if any(error.field == f"/limits/{one.sheet}/set" for error in wrong):
        return False
    if one.kind in ("reaction", "hold_down"):
        return one.support in best.real
    return one.kind != "sag" or stiffness_known(record, readings)


def stiffness_known(record: Record, readings: Readings) -> bool:
    """J12: without EI the sag is not compared."""
    return "/section/stiffness" in readings.measured


def stiffness_needed(record: Record) -> bool:
    """J12: with zones of other EI, springs or settlement the moments depend on EI, so it is asked for."""
    rests = any(s["stiffness"] is not None or s["rotational"] is not None or s["settlement"] is not None
                for s in record["supports"])
    return rests or bool(record["section"]["zones"])


def _sources(record: Record, readings: Readings, names: Sequence[str], best: Layout) -> tuple[Source, ...]:
    return tuple(_source(record, readings, name, best) for name in names)


def _source(record: Record, readings: Readings, name: str, best: Layout) -> Source:
    if name == SELF_WEIGHT:
        low, high = _shares(readings, ["/self_weight/mass"])
        return Source(name=name, category=PERMANENT, low=low, high=high, removable=False)
    for j, of_record in enumerate(best.real):
        if name == SETTLEMENT.format(j):
            low, high = _shares(readings, [f"/supports/{of_record}/settlement"])
            return Source(name=name, category=SETTLED, low=low, high=high, removable=False)
    members = [(i, load) for i, load in enumerate(record["loads"]) if source_of(load) == name]
    categories = {load["category"] for _, load in members}
    if len(categories) > 1:
        raise InputError(code="source", field=f"/loads/{members[1][0]}/category",
                         message=f"Loads of the one source \"{name}\" are of different categories. A source is one unknown "
                                 "with one factor: give its loads one category, or give them different sources.")
    paths = [f"/loads/{i}/{f}" for i, _ in members for f in ("magnitude", "magnitude_end")]
    low, high = _shares(readings, [p for p in paths if p in readings.measured])
    return Source(name=name, category=members[0][1]["category"], low=low, high=high,
                  removable=all(load["removable"] is not False for _, load in members))


def _shares(readings: Readings, paths: Sequence[str]) -> tuple[float, float]:
    """The widest range of the numbers at these paths, as shares of their best estimates."""
    lows, highs = [1.0], [1.0]
    for path in paths:
        m = readings.measured[path]
        if m.best == 0.0 and not m.exact:
            raise InputError(code="zero_best", field=path, message="The best estimate is zero but the range is not. Enter a "
                             "best estimate, or take the load off the list.")
        ends = (m.low / m.best, m.high / m.best) if m.best else (1.0, 1.0)
        lows.append(min(ends))
        highs.append(max(ends))
    return min(lows), max(highs)


def _variables(record: Record, readings: Readings, usable: Sequence[Criterion]) -> tuple[str, ...]:
    """Paths of what varies without acting linearly. A stiffness of the whole beam matters only where M depends on it or
    sag is compared, the depth only where spans were measured clear."""
    sag = any(c.kind == "sag" for c in usable)
    clear = any(span["measure"] == "clear" for span in record["spans"])
    chosen = []
    for path, m in readings.measured.items():
        if m.exact or m.dimension not in GEOMETRY or path.startswith("/restraint"):
            continue
        if path == TIMES_THE_BASE and not (sag or stiffness_needed(record)):
            continue
        if path == "/section/depth" and not clear:
            continue
        if path.startswith("/overhangs") and m.best < SHORTEST:
            continue
        chosen.append(path)
    return tuple(chosen)


def _judge(one: Criterion, record: Record, sources: Sequence[Source]) -> Judged:
    sheet = record["limits"][one.sheet]
    chosen = sets()["unfactored"] if one.kind == "sag" else _chosen_set(record, one.sheet)
    added = [source_of(load) for load in record["loads"] if load["id"] in sheet["covers_loads"]]

    def covers(s: Source) -> bool:
        if s.category == SETTLED or (one.kind != "sag" and sheet["covers"] in ("all", None)):
            return True
        if one.kind == "sag":
            return one.under == "total" or (s.name in added if added else s.category != PERMANENT)
        if sheet["covers"] == "all_but_self":
            return s.name != SELF_WEIGHT
        return s.name in added

    return judged(one, chosen, sources, [covers(s) for s in sources], sheet["moment_at"] == "face")


def _chosen_set(record: Record, sheet: int) -> CombinationSet:
    """The set of a sheet; unfactored while none is known, when no ratio will be shown anyway (J4)."""
    limits = record["limits"][sheet]
    chosen = set_of(limits)
    if limits["basis"] in (None, "not_known") or chosen not in sets():
        return sets()["unfactored"]
    if chosen != "own":
        return sets()[chosen]
    given = limits["own"] or {}
    return own_set(**{name: _own_factor(given, name, f"/limits/{sheet}/own/{name}")
                      for name in ("permanent", "permanent_favourable", "leading", "accompanying")})


def _own_factor(given: dict[str, str], name: str, field: str) -> float:
    try:
        value = parse("number", given.get(name, ""), "").value
    except InputError as error:
        raise error.at(field) from None
    low, high = OWN_FACTORS[name]
    if not low <= value <= high:
        raise InputError(code="own_factor", field=field, message=f"The factor {given.get(name)!r} is not between {low:g} and "
                         f"{high:g}. Enter it as the office gave it.")
    return value
