"""Does the solver stay exact where numbers are extreme: hairs' breadths, soft and hard springs, hundreds of spans?

Expected values are closed forms, named beside each. Only numpy is needed, so this runs in Pyodide as well.
"""

import numpy as np
import pytest

from pysolver.beam import Beam, Stretch, Support
from pysolver.loads import LineLoad, PointLoad
from pysolver.statics import extremes, solve, value


def beam_of(length=6.0, supports=((0.0, "pinned"), (6.0, "bearing")), hinges=(), stretches=None) -> Beam:
    return Beam(length=length, hinges=hinges, supports=tuple(Support(x=x, kind=kind) for x, kind in supports),
                stretches=(Stretch(start=0.0, end=length, bending_stiffness=1e7),) if stretches is None else stretches)


def stiff(ei: float, start: float = 0.0, end: float = 6.0) -> Stretch:
    return Stretch(start=start, end=end, bending_stiffness=ei)


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


@pytest.mark.parametrize("width", [0.002, 0.01, 0.1])
@pytest.mark.parametrize("at", [0.5, 2.995, 5.0])
def test_a_short_stretch_of_another_section_leaves_a_simple_beam_determinate(width, at):
    """M = wL^2/8, R = wL/2 whatever EI is (statics)."""
    w, length = 1e4, 6.0
    stretches = (stiff(1e7, 0.0, at), stiff(3e6, at, at + width), stiff(1e7, at + width, length))
    response = solve(beam_of(length=length, stretches=stretches),
                     [LineLoad(start=0.0, end=length, start_intensity=w, end_intensity=w)])
    assert response.reactions == pytest.approx([w * length / 2] * 2, rel=1e-6)
    assert value(response, "moment", 3.0) == pytest.approx(w * length**2 / 8, rel=1e-6)


@pytest.mark.parametrize("span", [0.001, 0.01, 0.1])
def test_a_very_short_span_between_long_ones_holds_the_beam_almost_fixed(span):
    """Three-moment equation, symmetric: MB·(2(L + s) + s) = -wL^3/4 - ws^3/4."""
    w, length = 1e4, 5.0
    places = (0.0, length, length + span, 2 * length + span)
    response = solve(beam_of(length=places[-1], supports=tuple((x, "pinned") for x in places)),
                     [LineLoad(start=0.0, end=places[-1], start_intensity=w, end_intensity=w)])
    expected = -w * (length**3 + span**3) / 4 / (2 * length + 3 * span)
    assert value(response, "moment", length) == pytest.approx(expected, rel=1e-6)
    assert value(response, "moment", length + span) == pytest.approx(expected, rel=1e-6)
    assert response.reactions[0] == pytest.approx(w * length / 2 + expected / length, rel=1e-6)
