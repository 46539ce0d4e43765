"""Does every answer obey the laws that any beam obeys?

The laws are those of Euler-Bernoulli beam theory, as in any textbook of structural mechanics (from memory): together,
the differential equations, the jumps, the support and the hinge conditions have one solution only, so an answer that
obeys them all is the answer. Beams come from strategies.py. Only numpy and hypothesis are needed, so this runs in
Pyodide as well.
"""

from dataclasses import replace

import numpy as np
from hypothesis import assume, given
from hypothesis import strategies as st
from law_tools import (
    EXACT,
    QUANTITIES,
    SOLVED,
    assert_near,
    down_and_turn,
    ends,
    everywhere,
    intensity,
    mirrored,
    rescaled,
    same_answer,
    scales,
    spread,
    unsettled,
)
from numpy.polynomial import polynomial
from strategies import GRID, beams, randoms, situations

from pysolver.loads import AppliedMoment, LineLoad, PointLoad
from pysolver.statics import extremes, solve, value

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


# ---- never NaN

@given(situations)
def test_no_answer_holds_a_number_that_is_not_one(situation):
    response = solve(*situation)
    for array in (response.x, *(getattr(response, q) for q in QUANTITIES), response.reactions, response.fixing_moments):
        assert np.isfinite(array).all()
    assert np.isfinite(response.residual)
    assert (np.diff(response.x) > 0.0).all()
