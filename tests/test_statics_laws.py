"""Does every answer obey the laws that any beam obeys?

The laws are those of Euler-Bernoulli beam theory, as in any textbook of structural mechanics (from memory): together,
the differential equations, the jumps, the support and the hinge conditions have one solution only, so an answer that
obeys them all is the answer. Beams come from strategies.py. Only numpy and hypothesis are needed, so this runs in
Pyodide as well.
"""

from dataclasses import replace

import numpy as np
import pytest
from hypothesis import assume, given
from hypothesis import strategies as st
from numpy.polynomial import polynomial

from pysolver.beam import Beam, Stretch, Support
from pysolver.errors import InputError
from pysolver.loads import AppliedMoment, LineLoad, PointLoad
from pysolver.statics import Response, extremes, solve, value
from strategies import GRID, beams, randoms, situations

QUANTITIES = ("shear", "moment", "slope", "sag")
EXACT = 1e-12  # of the largest value: no linear system lies between the two sides
SOLVED = 1e-8  # of the largest value: the two sides come from systems with a condition number up to about 1e6


# ---- what is compared with what

def scales(*responses: Response) -> dict[str, float]:
    """The largest size of each quantity, so that "near" means near beside the beam's own values."""
    found = {}
    for quantity in QUANTITIES:
        found[quantity] = max([abs(e.value) for r in responses for e in extremes(r, quantity)])
    lengths = max(float(r.x[-1] - r.x[0]) for r in responses)
    push = max(float(np.abs(r.reactions).max()) for r in responses)
    found["shear"] = max(found["shear"], push, found["moment"] / lengths)
    found["moment"] = max(found["moment"], found["shear"] * 1e-3 * lengths)
    return {quantity: max(size, 1e-300) for quantity, size in found.items()}


def everywhere(response: Response, quantity: str, places: np.ndarray) -> np.ndarray:
    """(2, n) values just left and just right of each place."""
    return np.array([[value(response, quantity, float(x), side) for x in places] for side in ("left", "right")])


def spread(beam: Beam, count: int = 41) -> np.ndarray:
    """Places that no breakpoint can coincide with: the grid is 200 mm, these lie off it by an irrational part."""
    return (np.arange(count) + 0.5 / np.sqrt(2.0)) * beam.length / (count + 1.0)


def assert_near(found, expected, scale: float, tolerance: float) -> None:
    assert np.abs(np.asarray(found) - np.asarray(expected)).max() <= tolerance * scale


def same_answer(found: Response, expected: Response, places: np.ndarray, tolerance: float = SOLVED) -> None:
    size = scales(expected)
    for quantity in QUANTITIES:
        assert_near(everywhere(found, quantity, places), everywhere(expected, quantity, places), size[quantity], tolerance)
    assert_near(found.reactions, expected.reactions, size["shear"], tolerance)
    assert_near(found.fixing_moments, expected.fixing_moments, size["moment"], tolerance)


def ends(response: Response, quantity: str) -> tuple[np.ndarray, np.ndarray]:
    """Values just right of every breakpoint but the last, and just left of every one but the first."""
    coefficients = getattr(response, quantity)
    lengths = np.diff(response.x)
    return coefficients[:, 0], np.array([polynomial.polyval(h, c) for h, c in zip(lengths, coefficients, strict=True)])


def down_and_turn(loads) -> tuple[float, float]:
    """Sum of the loads, and of their clockwise moments about the left end."""
    down = turn = 0.0
    for load in loads:
        if isinstance(load, AppliedMoment):
            turn += load.moment
        elif isinstance(load, PointLoad):
            down, turn = down + load.force, turn + load.force * load.x
        else:
            run, first, last = load.end - load.start, load.start_intensity, load.end_intensity
            down += run * (first + last) / 2
            turn += run * (first + last) / 2 * load.start + run**2 * (first + 2 * last) / 6
    return down, turn


def intensity(loads, x: float) -> float:
    return sum(w.start_intensity + (x - w.start) / (w.end - w.start) * (w.end_intensity - w.start_intensity)
               for w in loads if isinstance(w, LineLoad) and w.start < x < w.end)


def unsettled(beam: Beam) -> Beam:
    return replace(beam, supports=tuple(replace(s, settlement=0.0) for s in beam.supports))


def mirrored(beam: Beam, loads) -> tuple[Beam, tuple]:
    def over(x: float) -> float:
        return (round(beam.length * GRID) - round(x * GRID)) / GRID

    turned = []
    for load in loads:
        if isinstance(load, LineLoad):
            turned.append(replace(load, start=over(load.end), end=over(load.start),
                                  start_intensity=load.end_intensity, end_intensity=load.start_intensity))
        elif isinstance(load, AppliedMoment):
            turned.append(replace(load, x=over(load.x), moment=-load.moment))
        else:
            turned.append(replace(load, x=over(load.x)))
    return replace(beam, supports=tuple(replace(s, x=over(s.x)) for s in reversed(beam.supports)),
                   stretches=tuple(replace(s, start=over(s.end), end=over(s.start)) for s in reversed(beam.stretches)),
                   hinges=tuple(over(x) for x in beam.hinges)), tuple(turned)


def rescaled(beam: Beam, loads, length: float, force: float) -> tuple[Beam, tuple]:
    """The same beam written in other units: every number times its powers of the two factors."""
    def support(s: Support) -> Support:
        return replace(s, x=s.x * length, settlement=s.settlement * length,
                       stiffness=None if s.stiffness is None else s.stiffness * force / length,
                       rotational=None if s.rotational is None else s.rotational * force * length)

    other = []
    for load in loads:
        if isinstance(load, LineLoad):
            other.append(replace(load, start=load.start * length, end=load.end * length,
                                 start_intensity=load.start_intensity * force / length,
                                 end_intensity=load.end_intensity * force / length))
        elif isinstance(load, AppliedMoment):
            other.append(replace(load, x=load.x * length, moment=load.moment * force * length))
        else:
            other.append(replace(load, x=load.x * length, force=load.force * force))
    stretches = tuple(Stretch(start=s.start * length, end=s.end * length,
                              bending_stiffness=s.bending_stiffness * force * length**2) for s in beam.stretches)
    return Beam(length=beam.length * length, supports=tuple(map(support, beam.supports)), stretches=stretches,
                hinges=tuple(x * length for x in beam.hinges)), tuple(other)


# ---- the one solution: equilibrium, differential equations, jumps, supports, hinges

@given(situations)
def test_reactions_balance_the_loads(situation):
    beam, loads = situation
    response = solve(beam, loads)
    down, turn = down_and_turn(loads)
    size = scales(response)
    at = np.array([s.x for s in beam.supports])
    assert_near(response.reactions.sum(), down, max(size["shear"], abs(down)), SOLVED)
    assert_near(response.reactions @ at, turn + response.fixing_moments.sum(),
                max(size["shear"], abs(down)) * beam.length, SOLVED)
    assert 0.0 <= response.residual < SOLVED


@given(situations)
def test_shear_moment_slope_and_sag_are_derivatives_of_each_other(situation):
    beam, loads = situation
    response = solve(beam, loads)
    middles = (response.x[:-1] + response.x[1:]) / 2
    lengths = np.diff(response.x)[:, None]
    ei = np.array([next(s.bending_stiffness for s in beam.stretches if s.start <= x <= s.end) for x in middles])
    size = scales(response)
    pairs = [("moment", response.shear), ("slope", -response.moment / ei[:, None]), ("sag", response.slope)]
    for quantity, derivative in pairs:
        coefficients = getattr(response, quantity)
        degree = np.arange(1, coefficients.shape[1])
        # both sides times the piece's length to the power of the term: the size that the term has on its piece
        found = coefficients[:, 1:] * degree * lengths ** degree
        assert_near(found, derivative * lengths ** degree, size[quantity], EXACT)


@given(situations)
def test_shear_falls_by_the_line_load(situation):
    beam, loads = situation
    response = solve(beam, loads)
    lengths = np.diff(response.x)
    for share in (0.25, 0.5, 0.75):
        s = share * lengths
        fall = -np.array([polynomial.polyval(d, polynomial.polyder(c)) for d, c in zip(s, response.shear, strict=True)])
        loaded = np.array([intensity(loads, float(x)) for x in response.x[:-1] + s])
        assert_near(fall, loaded, max([np.abs(loaded).max(), 1.0]), EXACT)


@given(situations)
def test_jumps_of_shear_and_moment_are_the_forces_and_moments_put_in_there(situation):
    beam, loads = situation
    response = solve(beam, loads)
    size = scales(response)
    for quantity, put_in in (("shear", _forces_put_in), ("moment", _moments_put_in)):
        right, left = ends(response, quantity)
        jump = np.append(right, 0.0) - np.append(0.0, left)  # outside the beam there is nothing
        expected = [put_in(beam, loads, response, float(x)) for x in response.x]
        assert_near(jump, expected, size[quantity], SOLVED)


def _forces_put_in(beam, loads, response, x: float) -> float:
    up = sum(r for s, r in zip(beam.supports, response.reactions, strict=True) if s.x == x)
    return up - sum(p.force for p in loads if isinstance(p, PointLoad) and p.x == x)


def _moments_put_in(beam, loads, response, x: float) -> float:
    fixing = sum(m for s, m in zip(beam.supports, response.fixing_moments, strict=True) if s.x == x)
    return fixing + sum(m.moment for m in loads if isinstance(m, AppliedMoment) and m.x == x)


@given(situations)
def test_sag_is_continuous_and_slope_is_except_at_hinges(situation):
    beam, loads = situation
    response = solve(beam, loads)
    size = scales(response)
    for quantity in ("sag", "slope"):
        right, left = ends(response, quantity)
        unbroken = [quantity == "sag" or x not in beam.hinges for x in response.x[1:-1]]
        jumps = (right[1:] - left[:-1])[unbroken]
        assert_near(np.append(jumps, 0.0), 0.0, size[quantity], SOLVED)


@given(situations)
def test_moment_is_zero_at_every_hinge(situation):
    beam, loads = situation
    assume(beam.hinges)
    response = solve(beam, loads)
    assert_near(everywhere(response, "moment", np.array(beam.hinges)), 0.0, scales(response)["moment"], SOLVED)


@given(situations)
def test_supports_hold_give_and_turn_as_they_were_said_to(situation):
    beam, loads = situation
    response = solve(beam, loads)
    size = scales(response)
    for support, reaction, fixing in zip(beam.supports, response.reactions, response.fixing_moments, strict=True):
        side = "left" if support.x == beam.length else "right"
        sag, slope = (value(response, quantity, support.x, side) for quantity in ("sag", "slope"))
        if support.kind == "spring":
            assert_near(reaction, support.stiffness * (sag - support.settlement),
                        max(size["shear"], support.stiffness * max(abs(sag), abs(support.settlement))), SOLVED)
        else:
            assert_near(sag, support.settlement, size["sag"], EXACT)
        if support.kind == "fixed":
            assert_near(slope, 0.0, size["slope"], EXACT)
        elif support.rotational is not None:
            assert_near(fixing, -support.rotational * slope, max(size["moment"], support.rotational * abs(slope)), SOLVED)
        else:
            assert fixing == 0.0


# ---- what follows from it: superposition, mirror, reciprocity, units, cuts

@given(situations, st.floats(-3.0, 3.0))
def test_effects_of_loads_add_up_and_grow_with_them(situation, factor):
    beam, loads = situation
    beam = unsettled(beam)
    half = len(loads) // 2
    some, others = solve(beam, loads[:half]), solve(beam, loads[half:])
    grown = tuple(replace(w, **{name: getattr(w, name) * factor for name in
                                ("force", "moment", "start_intensity", "end_intensity") if hasattr(w, name)})
                  for w in loads[half:])
    together = solve(beam, loads[:half] + grown)
    size = scales(some, others, together)
    places = np.concatenate([spread(beam), [s.x for s in beam.supports], beam.hinges])
    for quantity in QUANTITIES:
        expected = everywhere(some, quantity, places) + factor * everywhere(others, quantity, places)
        assert_near(everywhere(together, quantity, places), expected, size[quantity], SOLVED)
    assert_near(together.reactions, some.reactions + factor * others.reactions, size["shear"], SOLVED)


@given(situations)
def test_seen_from_the_other_side_it_is_the_same_beam(situation):
    beam, loads = situation
    here, there = solve(beam, loads), solve(*mirrored(beam, loads))
    size, places = scales(here), spread(beam)
    for quantity, sign in (("shear", -1.0), ("moment", 1.0), ("slope", -1.0), ("sag", 1.0)):
        assert_near(everywhere(there, quantity, beam.length - places), sign * everywhere(here, quantity, places)[::-1],
                    size[quantity], SOLVED)
    assert_near(there.reactions, here.reactions[::-1], size["shear"], SOLVED)
    assert_near(there.fixing_moments, -here.fixing_moments[::-1], size["moment"], SOLVED)


@given(beams, randoms)
def test_two_point_loads_do_the_same_work_on_each_others_sag(beam, rng):
    """Maxwell (1864) and Betti (1872)."""
    beam = unsettled(beam)
    a, b = (rng.randint(0, round(beam.length * GRID)) / GRID for _ in range(2))
    at_a, at_b = solve(beam, [PointLoad(x=a, force=1000.0)]), solve(beam, [PointLoad(x=b, force=1000.0)])
    size = scales(at_a, at_b)["sag"]
    assert_near(value(at_a, "sag", b), value(at_b, "sag", a), size, SOLVED)


@given(beams, randoms)
def test_a_point_load_and_a_moment_do_the_same_work_on_each_other(beam, rng):
    """Betti (1872), with a moment working on a rotation."""
    beam = unsettled(beam)
    a, b = (rng.randint(0, round(beam.length * GRID)) / GRID for _ in range(2))
    assume(b not in beam.hinges)
    by_load, by_moment = solve(beam, [PointLoad(x=a, force=1000.0)]), solve(beam, [AppliedMoment(x=b, moment=1000.0)])
    side = "left" if b == beam.length else "right"
    size = max(scales(by_load)["slope"], scales(by_moment)["sag"])
    assert_near(value(by_moment, "sag", a), value(by_load, "slope", b, side), size, SOLVED)


@given(situations, st.sampled_from([0.3048, 0.01, 3.28, 2.0]), st.sampled_from([1e-3, 4.4482216, 9.80665, 1e4]))
def test_other_units_give_the_same_beam(situation, length, force):
    beam, loads = situation
    assume(min(s.end - s.start for s in beam.stretches) * length > 2e-3)  # a millimetre is the shortest stretch allowed
    assume(all(abs(a.x - h) * length > 2e-3 for a in beam.supports for h in beam.hinges if a.x != h))
    here, there = solve(beam, loads), solve(*rescaled(beam, loads, length, force))
    size, places = scales(here), spread(beam)
    for quantity, factor in (("shear", force), ("moment", force * length), ("slope", 1.0), ("sag", length)):
        assert_near(everywhere(there, quantity, places * length) / factor, everywhere(here, quantity, places),
                    size[quantity], SOLVED)
    assert_near(there.reactions / force, here.reactions, size["shear"], SOLVED)


@given(situations, st.lists(st.floats(0.0, 1.0), min_size=1, max_size=5))
def test_further_cuts_change_nothing(situation, shares):
    beam, loads = situation
    cuts = [share * beam.length for share in shares]
    cut = solve(beam, loads, cuts=cuts)
    assert np.isin(np.array(cuts), cut.x).all()
    same_answer(cut, solve(beam, loads), spread(beam), EXACT)


@given(situations, st.integers(1, 9))
def test_a_line_load_or_a_stretch_in_two_parts_is_the_same_as_in_one(situation, tenths):
    beam, loads = situation
    parts = []
    for load in loads:
        if isinstance(load, LineLoad):
            share = tenths / 10
            x = load.start + share * (load.end - load.start)
            between = load.start_intensity + share * (load.end_intensity - load.start_intensity)
            parts += [replace(load, end=x, end_intensity=between), replace(load, start=x, start_intensity=between)]
        else:
            parts.append(load)
    first = beam.stretches[0]
    x = first.start + tenths / 10 * (first.end - first.start)
    stretches = (replace(first, end=x), replace(first, start=x), *beam.stretches[1:])
    same_answer(solve(replace(beam, stretches=stretches), tuple(parts)), solve(beam, loads), spread(beam))


@given(situations)
def test_loads_that_cancel_leave_what_the_settlements_do(situation):
    beam, loads = situation
    opposite = tuple(replace(w, **{name: -getattr(w, name) for name in
                                   ("force", "moment", "start_intensity", "end_intensity") if hasattr(w, name)})
                     for w in loads)
    both, none, loaded = solve(beam, loads + opposite), solve(beam, ()), solve(unsettled(beam), loads)
    size = scales(none, loaded)
    for quantity in QUANTITIES:
        assert_near(everywhere(both, quantity, spread(beam)), everywhere(none, quantity, spread(beam)), size[quantity], SOLVED)


# ---- extremes

@given(situations, st.sampled_from(QUANTITIES))
def test_extremes_bound_every_sample_and_are_reached(situation, quantity):
    beam, loads = situation
    response = solve(beam, loads)
    largest, smallest = extremes(response, quantity)
    size = scales(response)[quantity]
    places = np.concatenate([np.linspace(0.0, beam.length, 801), response.x])
    places = places[(places > 0.0) & (places < beam.length)]
    samples = np.concatenate([everywhere(response, quantity, places).ravel(),
                              [value(response, quantity, 0.0, "right"), value(response, quantity, beam.length, "left")]])
    assert samples.max() <= largest.value + EXACT * size
    assert samples.min() >= smallest.value - EXACT * size
    for extreme in (largest, smallest):
        reached = [value(response, quantity, extreme.x, side) for side in ("left", "right")]
        assert min(abs(r - extreme.value) for r in reached) <= 1e-9 * size


# ---- never NaN, never a mechanism, never nonsense

@given(situations)
def test_no_answer_holds_a_number_that_is_not_one(situation):
    response = solve(*situation)
    for array in (response.x, *(getattr(response, q) for q in QUANTITIES), response.reactions, response.fixing_moments):
        assert np.isfinite(array).all()
    assert np.isfinite(response.residual)
    assert (np.diff(response.x) > 0.0).all()


NAN, INFINITE, ABSURD = float("nan"), float("inf"), 1e300


def beam_of(length=6.0, supports=((0.0, "pinned"), (6.0, "bearing")), hinges=(), stretches=None) -> Beam:
    return Beam(length=length, hinges=hinges, supports=tuple(Support(x=x, kind=kind) for x, kind in supports),
                stretches=(Stretch(start=0.0, end=length, bending_stiffness=1e7),) if stretches is None else stretches)


def stiff(ei: float, start: float = 0.0, end: float = 6.0) -> Stretch:
    return Stretch(start=start, end=end, bending_stiffness=ei)


LINE = {"start": 1.0, "end": 2.0, "start_intensity": 1000.0, "end_intensity": 1000.0}
MID = PointLoad(x=3.0, force=1000.0)

# what is wrong: how to ask for it, and a word of which one has to be in the message
NONSENSE = {
    "a beam of no length": (lambda: beam_of(0.0, stretches=(stiff(1e7),)), "beam"),
    "a beam of negative length": (lambda: beam_of(-6.0, stretches=(stiff(1e7),)), "beam"),
    "a beam of NaN length": (lambda: beam_of(NAN, stretches=(stiff(1e7),)), "length"),
    "a beam of absurd length": (lambda: beam_of(ABSURD, stretches=(stiff(1e7),)), "length"),
    "two supports in one place": (lambda: beam_of(supports=((0.0, "pinned"), (3.0, "pinned"), (3.0, "pinned"))), "span"),
    "supports in the wrong order": (lambda: beam_of(supports=((6.0, "pinned"), (0.0, "pinned"))), "order"),
    "no supports": (lambda: solve(beam_of(supports=()), [MID]), "rests on nothing"),
    "a support off the beam": (lambda: beam_of(supports=((0.0, "pinned"), (6.5, "pinned"))), "support"),
    "a support at NaN": (lambda: beam_of(supports=((NAN, "pinned"), (6.0, "pinned"))), "support"),
    "a support at an absurd place": (lambda: beam_of(supports=((0.0, "pinned"), (ABSURD, "pinned"))), "support"),
    "a support of an unknown kind": (lambda: Support(x=0.0, kind="magnet"), "magnet"),
    "a spring without stiffness": (lambda: Support(x=0.0, kind="spring"), "stiffness"),
    "a spring of no stiffness": (lambda: Support(x=0.0, kind="spring", stiffness=0.0), "stiffness"),
    "a spring of NaN stiffness": (lambda: Support(x=0.0, kind="spring", stiffness=NAN), "stiffness"),
    "a negative rotational spring": (lambda: Support(x=0.0, kind="pinned", rotational=-1.0), "stiffness"),
    "a NaN settlement": (lambda: Support(x=0.0, kind="pinned", settlement=NAN), "settlement"),
    "an absurd settlement": (lambda: Support(x=0.0, kind="pinned", settlement=ABSURD), "settlement"),
    "EI of zero": (lambda: stiff(0.0), "EI"),
    "EI below zero": (lambda: stiff(-1e7), "EI"),
    "EI of NaN": (lambda: stiff(NAN), "EI"),
    "EI of infinity": (lambda: stiff(INFINITE), "EI"),
    "an absurd EI": (lambda: stiff(ABSURD), "EI"),
    "a stretch that runs backwards": (lambda: stiff(1e7, 4.0, 2.0), "stretch"),
    "no stretches": (lambda: beam_of(stretches=()), "EI"),
    "stretches with a gap": (lambda: beam_of(stretches=(stiff(1e7, 0.0, 2.0), stiff(1e7, 3.0, 6.0))), "EI"),
    "stretches that overlap": (lambda: beam_of(stretches=(stiff(1e7, 0.0, 4.0), stiff(1e7, 3.0, 6.0))), "EI"),
    "stretches that end early": (lambda: beam_of(stretches=(stiff(1e7, 0.0, 5.0),)), "EI"),
    "a hinge on a fixed support": (lambda: beam_of(supports=((0.0, "pinned"), (3.0, "fixed"), (6.0, "pinned")), hinges=(3.0,)), "hinge"),
    "a hinge at the end": (lambda: beam_of(hinges=(0.0,)), "hinge"),
    "a hinge off the beam": (lambda: beam_of(hinges=(7.0,)), "hinge"),
    "a hinge at NaN": (lambda: beam_of(hinges=(NAN,)), "hinge"),
    "one hinge twice": (lambda: beam_of(supports=((0.0, "fixed"), (6.0, "fixed")), hinges=(3.0, 3.0)), "hinge"),
    "a hinge in a simple beam": (lambda: solve(beam_of(hinges=(2.0,)), [MID]), "hinge"),
    "three hinges in a span": (lambda: solve(beam_of(supports=((0.0, "fixed"), (6.0, "fixed")), hinges=(1.0, 3.0, 5.0)), [MID]), "hinge"),
    "a beam on one pin": (lambda: solve(beam_of(supports=((3.0, "pinned"),)), [MID]), "support"),
    "a beam on one spring": (lambda: solve(Beam(length=6.0, supports=(Support(x=3.0, kind="spring", stiffness=1e6),), stretches=(stiff(1e7),)), [MID]), "support"),
    "a cantilever with a hinge": (lambda: solve(beam_of(supports=((0.0, "fixed"),), hinges=(3.0,)), [MID]), "hinge"),
    "a load left of the beam": (lambda: solve(beam_of(), [PointLoad(x=-0.1, force=1.0)]), "load"),
    "a load right of the beam": (lambda: solve(beam_of(), [PointLoad(x=6.1, force=1.0)]), "load"),
    "a line load that runs off the beam": (lambda: solve(beam_of(), [LineLoad(**{**LINE, "end": 6.1})]), "load"),
    "a line load of no length": (lambda: LineLoad(**{**LINE, "end": 1.0}), "load"),
    "a line load that runs backwards": (lambda: LineLoad(**{**LINE, "end": 0.5}), "load"),
    "a NaN line load": (lambda: LineLoad(**{**LINE, "end_intensity": NAN}), "load"),
    "a NaN load": (lambda: PointLoad(x=1.0, force=NAN), "load"),
    "an infinite load": (lambda: PointLoad(x=1.0, force=-INFINITE), "load"),
    "an absurd load": (lambda: PointLoad(x=1.0, force=ABSURD), "load"),
    "a load at NaN": (lambda: PointLoad(x=NAN, force=1.0), "load"),
    "a NaN moment": (lambda: AppliedMoment(x=1.0, moment=NAN), "moment"),
    "a moment off the beam": (lambda: solve(beam_of(), [AppliedMoment(x=9.0, moment=1.0)]), "load"),
    "a moment on a hinge": (lambda: solve(beam_of(supports=((0.0, "fixed"), (6.0, "pinned")), hinges=(3.0,)),
                                          [AppliedMoment(x=3.0, moment=1.0)]), "hinge"),
}


@pytest.mark.parametrize(("ask", "word"), NONSENSE.values(), ids=NONSENSE.keys())
def test_nonsense_is_refused_in_words_with_the_field_it_belongs_to(ask, word):
    with pytest.raises(InputError) as caught:
        ask()
    assert caught.value.code
    assert caught.value.field
    assert word.lower() in caught.value.message.lower()
    assert str(caught.value) == caught.value.message


@pytest.mark.parametrize("gap", [0.0, 1e-12, 1e-9, 1e-6, 1e-3])
def test_a_load_a_hair_beside_a_support_goes_into_that_support(gap):
    response = solve(beam_of(length=9.0, supports=((0.0, "pinned"), (3.0, "pinned"), (9.0, "pinned"))),
                     [PointLoad(x=3.0 + gap, force=1e6)])
    assert response.reactions[1] == pytest.approx(1e6, rel=2.0 * gap + 1e-9)
    assert max(abs(e.value) for e in extremes(response, "moment")) <= 1.1e6 * gap + 1e-3


@pytest.mark.parametrize("stiffness", [1e-3, 1.0, 1e3, 1e6, 1e9, 1e12, 1e15])
def test_springs_of_any_stiffness_lie_between_no_support_and_a_pin(stiffness):
    """Force method: R = (5wL^4/384EI) / (1/k + L^3/48EI)."""
    w, length, ei = 1e4, 8.0, 1e7
    beam = Beam(length=length, stretches=(stiff(ei, 0.0, length),),
                supports=(Support(x=0.0, kind="pinned"), Support(x=4.0, kind="spring", stiffness=stiffness),
                          Support(x=length, kind="pinned")))
    response = solve(beam, [LineLoad(start=0.0, end=length, start_intensity=w, end_intensity=w)])
    expected = 5 * w * length**4 / 384 / ei / (1 / stiffness + length**3 / 48 / ei)
    assert response.reactions[1] == pytest.approx(expected, rel=1e-7, abs=1e-12 * w * length)
    assert value(response, "moment", 4.0) == pytest.approx(w * length**2 / 8 - expected * length / 4, rel=1e-6)


@pytest.mark.parametrize("spans", [50, 200])
def test_very_many_equal_spans_hog_alike_in_the_middle(spans):
    """Far from the ends every span is fixed by its neighbours: M = -wL^2/12, by symmetry."""
    length, w = 5.0, 1e4
    beam = Beam(length=spans * length, stretches=(stiff(1e7, 0.0, spans * length),),
                supports=tuple(Support(x=i * length, kind="bearing") for i in range(spans + 1)))
    response = solve(beam, [LineLoad(start=0.0, end=beam.length, start_intensity=w, end_intensity=w)])
    assert value(response, "moment", spans // 2 * length) == pytest.approx(-w * length**2 / 12, rel=1e-9)
    assert response.reactions[0] == pytest.approx(w * length * (0.5 - (3 - np.sqrt(3)) / 12), rel=1e-9)


@pytest.mark.parametrize("spans", [2, 7])
def test_a_hinge_over_every_middle_support_leaves_simple_beams(spans):
    """M = wL^2/8 in each, reactions wL/2, wL, ..., wL/2 (statics)."""
    length, w = 4.0, 1e4
    beam = beam_of(length=spans * length, supports=tuple((i * length, "bearing") for i in range(spans + 1)),
                   hinges=tuple(i * length for i in range(1, spans)))
    response = solve(beam, [LineLoad(start=0.0, end=beam.length, start_intensity=w, end_intensity=w)])
    assert response.reactions == pytest.approx([w * length / 2, *[w * length] * (spans - 1), w * length / 2], rel=1e-9)
    assert extremes(response, "moment")[0].value == pytest.approx(w * length**2 / 8, rel=1e-9)
    assert abs(extremes(response, "moment")[1].value) <= 1e-8 * w * length**2
