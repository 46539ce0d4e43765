"""Is the worst that is found really the worst of the box? (Rule J15.)

Loads by the sign of their influence are compared with every one of the 2^n choices of their ends; lengths and positions
with dense sampling of their ranges and with closed forms (P a (L - a) / L under a point load, P L / 4 at mid-span).
"""

import itertools
import random
from dataclasses import replace
from typing import Any

import numpy as np
import pytest
from hypothesis import given, settings
from hypothesis import strategies as st
from records import (
    HOG,
    SAG,
    SHEAR,
    at,
    beam,
    entry,
    everywhere,
    generous,
    load,
    one,
    point,
    q,
    sheet,
    strip,
)

from pysolver.check import Result, run_check
from pysolver.loads import AppliedMoment, LineLoad, Load, PointLoad
from pysolver.outcome import SEARCH_MARGIN
from pysolver.statics import extremes, solve

P, SPAN = 14.0, 6.0  # kN, m


def pallets(count: int, best: str, low: str, high: str, limit: str = "900 kNm") -> dict[str, Any]:
    """Pallets of 14 kN, each somewhere between low and high of a span of 6 m; they may stand at one place."""
    loads = [everywhere("floor", "0 kN/m"), *(point(f"p{i}", "14 kN", at(q(best, low=low, high=high))) for i in range(count))]
    return beam(["6.00 m"], loads=loads, limits=[sheet(entry(SAG, limit), entry(SHEAR, "900 kN"))])


def largest(count: int, low: float, high: float) -> float:
    """kN·m: all pallets at the place in the range that is nearest to mid-span."""
    a = min(max(SPAN / 2, low), high)
    return count * P * a * (SPAN - a) / SPAN


# --- lengths and positions ----------------------------------------------------------------------------------------


@pytest.mark.parametrize("best", ["2.00 m", "2.30 m", "3.00 m", "4.00 m"])
def test_J15_a_pallet_between_two_corners_is_never_judged_at_the_corners_alone(best: str) -> None:
    """Both corners 14 x 2 x 4 / 6 = 18.67 kN·m; inside 14 x 6 / 4 = 21.0 kN·m."""
    for corner in ("2.00 m", "4.00 m"):
        assert one(run_check(pallets(1, corner, corner, corner)), SAG).ratio == pytest.approx(18.6667 / 900, rel=1e-5)
    found = one(run_check(pallets(1, best, "2.00 m", "4.00 m", "24 kNm")), SAG)
    assert found.high == pytest.approx(21.0 / 24, rel=1e-6)
    assert found.searched


@settings(max_examples=12)
@given(st.integers(1, 58), st.integers(1, 40))
def test_J15_a_pallet_anywhere_is_never_worse_than_the_bound(start: int, width: int) -> None:
    """Wherever the range lies on the span; 0.1 % is left to a search that says of itself that it is none but a search."""
    low, high = start / 10, min((start + width) / 10, 5.9)
    expected = largest(1, low, high) / 22.0
    found = one(run_check(pallets(1, f"{low:.1f} m", f"{low:.1f} m", f"{high:.1f} m", "22 kNm")), SAG).high
    assert found is not None
    assert expected * (1 - 1e-3) <= found <= expected * (1 + 1e-9)


@pytest.mark.parametrize(("count", "best", "low", "high"), [
    (2, 2.0, 2.0, 5.0), (2, 3.5, 2.0, 5.0), (3, 4.0, 1.0, 4.5), (4, 2.0, 2.0, 5.0), (5, 2.4, 2.0, 4.0),
])
def test_J15_several_pallets_are_never_worse_than_the_bound(count: int, best: float, low: float, high: float) -> None:
    """They are worst together at mid-span; moving one of them alone from any other place makes things look better."""
    limit = 0.994 * largest(count, low, high)
    result = run_check(pallets(count, f"{best:.2f} m", f"{low:.2f} m", f"{high:.2f} m", f"{limit:.4f} kNm"))
    assert result.outcome.word != "within"


@pytest.mark.parametrize(("low", "high"), [("5.90 m", "6.00 m"), ("3.00 m", "8.00 m")])
def test_J15_the_worst_of_the_box_is_never_better_than_the_best_estimate(low: str, high: str) -> None:
    """14 kN at 5.9 m of 6 (5 kN/m): V = 15 + 13.767 = 28.767 kN, and 29 kN with the load next to the support. The end of
    the range is over the support itself, where the load makes no shear: that place must not stand for the worst."""
    loads = [everywhere("floor", "5 kN/m"), point("stack", "14 kN", at(q("5.90 m", low=low, high=high)))]
    record = beam(["6.00 m"], loads=loads, limits=[sheet(entry(SAG, "900 kNm"), entry(SHEAR, "28.8 kN"))])
    result = run_check(record)
    shear = one(result, SHEAR)
    assert shear.ratio == pytest.approx((15 + 14 * 5.9 / 6) / 28.8, rel=1e-9)
    assert shear.high is not None
    assert shear.high >= shear.ratio
    assert result.outcome.word != "within"


def test_J15_no_uncertain_place_is_ever_left_at_its_best_estimate_in_a_bound() -> None:
    """Cantilever, nine loads of 1 kN each, seen at 1 m and perhaps as far out as 2 m: 18 kN·m with all at 2 m, against 17.6."""
    loads = [everywhere("floor", "0 kN/m"), *(point(f"p{i}", "1 kN", at(q("1 m", low="1 m", high="2 m"))) for i in range(9))]
    record = beam(["3.00 m"], kinds=["fixed", "free"], loads=loads,
                  limits=[sheet(entry(HOG, "17.6 kNm"), entry(SHEAR, "900 kN"))])
    assert run_check(record).outcome.word != "within"


def test_J15_a_record_whose_lengths_are_all_exact_is_never_a_crash() -> None:
    assert run_check(pallets(1, "3.00 m", "3.00 m", "3.00 m")).outcome.word == "within"


def test_J15_an_uncertain_bearing_is_never_left_out_because_spans_were_measured_centre_to_centre() -> None:
    """10 kN at the tip, 2 m beyond B; A bears on 100 to 600 mm: at its inner edge 10 x 2 / (4 - 0.3) = 5.405 kN pulls."""
    limits = [generous()]
    limits[0]["entries"].append(entry("hold_down", "100 kN", support=0))
    record = beam(["4.00 m"], kinds=["pinned", "bearing"], right="2.00 m", limits=limits,
                  loads=[everywhere("floor", "0 kN/m"), point("tip", "10 kN", "6.00 m")])
    record["supports"][0]["bearing"] = q("100 mm", low="100 mm", high="600 mm")
    assert one(run_check(record), "hold_down", "A").high == pytest.approx(10 * 2 / 3.7 / 100, rel=1e-6)


def uncertain() -> dict[str, Any]:
    """Two spans and an overhang with an uncertain place, an uncertain length of a load and an uncertain span."""
    record = beam(["5.00 m", "4.00 m"], right="1.20 m", kinds=["pinned", "pinned", "pinned"], limits=[generous()],
                  loads=[everywhere("floor", "2 kN/m"),
                         point("a", "20 kN", at(q("1.6 m", low="1.1 m", high="3.4 m")), removable=False),
                         strip("b", "6 kN/m", "5.50 m", q("1.4 m", low="1.0 m", high="2.2 m"), removable=False),
                         point("c", "5 kN", at("0.3 m", "right_end"), removable=False)])
    record["limits"][0]["entries"] += [entry("hold_down", "900 kN"), entry("reaction", "900 kN")]
    record["spans"][1]["length"] = q("4.00 m", low="3.90 m", high="4.15 m")
    return record


def test_J15_dense_sampling_never_exceeds_the_bound() -> None:
    """By no more than what the outcome allows a search to miss (2 %)."""
    result = run_check(uncertain())
    model = result.model
    assert model is not None
    low, high = (np.array([getattr(model.readings.measured[v], end) for v in model.variables]) for end in ("low", "high"))
    rng = np.random.default_rng(4)
    shares = np.concatenate([np.array(list(itertools.product([0.0, 0.5, 1.0], repeat=len(low)))), rng.random((60, len(low)))])
    worst = {SAG: 0.0, HOG: 0.0, SHEAR: 0.0}
    for layout in model.layouts(low + shares * (high - low), model.ways[0]):
        response = solve(layout.beam, layout.loads)
        top, bottom = extremes(response, "moment")
        found = {SAG: top.value, HOG: -bottom.value, SHEAR: max(abs(e.value) for e in extremes(response, "shear"))}
        worst = {kind: max(worst[kind], value) for kind, value in found.items()}
    for kind, value in worst.items():
        bound = one(result, kind).high
        assert bound is not None
        assert value <= bound * 900e3 / SEARCH_MARGIN


# --- loads by the sign of their influence -----------------------------------------------------------------------------


def random_record(rng: random.Random) -> dict[str, Any]:
    """A continuous beam of exact lengths under three to five uncertain sources of every form, held down everywhere."""
    spans = [f"{rng.randint(20, 60) / 10} m" for _ in range(rng.randint(1, 3))]
    whole = sum(float(s.split()[0]) for s in spans)
    overhang = rng.choice([None, "1.50 m"])
    loads = [everywhere("floor", q("3 kN/m", low="2 kN/m", high="5 kN/m"))]
    for i in range(rng.randint(2, 4)):
        place = at(f"{rng.randint(1, int(whole * 10) - 11) / 10:.1f} m", edge=True)
        least, best, most = sorted(rng.randint(1, 30) for _ in range(3))
        form, unit = rng.choice([("point", "kN"), ("line", "kN/m"), ("moment", "kNm")])
        loads.append(load(f"l{i}", form, q(f"{best} {unit}", low=f"{least} {unit}", high=f"{most} {unit}"), "stored",
                          position=place,
                          length=q("1.00 m"), removable=False))
    made = beam(spans, kinds=["pinned"] * (len(spans) + 1), right=overhang, loads=loads, limits=[generous()])
    made["limits"][0]["entries"] += [entry("hold_down", "900 kN"), entry("reaction", "900 kN")]
    return made


def scaled(loads: tuple[Load, ...], share: dict[str, float]) -> list[Load]:
    made: list[Load] = []
    for one_ in loads:
        f = share[one_.source]
        if isinstance(one_, LineLoad):
            made.append(replace(one_, start_intensity=one_.start_intensity * f, end_intensity=one_.end_intensity * f))
        elif isinstance(one_, PointLoad):
            made.append(replace(one_, force=one_.force * f))
        else:
            assert isinstance(one_, AppliedMoment)
            made.append(replace(one_, moment=one_.moment * f))
    return made


def enumerated(result: Result) -> dict[str, float]:
    """The worst of all 2^n choices of the ends of the sources' ranges, each solved as a whole (N, N·m)."""
    assert result.model is not None
    assert result.governed is not None
    layout = result.governed.best.layouts[0]
    ends = [(s.low, s.high) for s in result.model.sources]
    worst: dict[str, float] = dict.fromkeys((SAG, HOG, SHEAR), 0.0)
    for choice in itertools.product(*ends):
        share = {s.name: f for s, f in zip(result.model.sources, choice, strict=True)}
        response = solve(layout.beam, scaled(layout.loads, share))
        top, bottom = extremes(response, "moment")
        found = {SAG: top.value, HOG: -bottom.value, SHEAR: max(abs(e.value) for e in extremes(response, "shear"))}
        for j, name in enumerate(s["name"] for s in result.record["supports"]):
            found[f"reaction {name}"] = float(response.reactions[j])
            found[f"hold_down {name}"] = -float(response.reactions[j])
        worst = {k: max(worst.get(k, 0.0), v) for k, v in found.items()}
    return worst


@pytest.mark.parametrize("seed", range(10))
def test_J15_loads_by_the_sign_of_their_influence_are_never_less_or_more_than_the_worst_of_all_choices(seed: int) -> None:
    result = run_check(random_record(random.Random(seed)))
    assert not result.errors
    worst = enumerated(result)
    scale = max(worst.values())
    for kind in (SAG, HOG, SHEAR):
        assert one(result, kind).worst == pytest.approx(worst[kind] * np.sign(one(result, kind).worst or 1.0), abs=1e-9 * scale)
    for support in result.record["supports"]:
        for kind in ("reaction", "hold_down"):
            found = one(result, kind, support["name"]).high
            assert found is not None
            assert found * 900e3 == pytest.approx(worst[f"{kind} {support['name']}"], abs=1e-9 * scale)
