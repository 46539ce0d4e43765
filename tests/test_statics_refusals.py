"""Which beams and loads does the solver refuse, and does it say why in words and at which field?

What is nonsense follows from mechanics (a mechanism has no answer) and from what a tape can measure; no published
source. Only numpy is needed, so this runs in Pyodide as well.
"""

import pytest

from pysolver.beam import Beam, Stretch, Support
from pysolver.errors import InputError
from pysolver.loads import AppliedMoment, LineLoad, PointLoad
from pysolver.statics import solve

NAN, INFINITE, ABSURD = float("nan"), float("inf"), 1e300


def beam_of(length=6.0, supports=((0.0, "pinned"), (6.0, "bearing")), hinges=(), stretches=None) -> Beam:
    return Beam(length=length, hinges=hinges, supports=tuple(Support(x=x, kind=kind) for x, kind in supports),
                stretches=(Stretch(start=0.0, end=length, bending_stiffness=1e7),) if stretches is None else stretches)


def stiff(ei: float, start: float = 0.0, end: float = 6.0) -> Stretch:
    return Stretch(start=start, end=end, bending_stiffness=ei)


LINE = {"start": 1.0, "end": 2.0, "start_intensity": 1000.0, "end_intensity": 1000.0}
SPRING = Support(x=3.0, kind="spring", stiffness=1e6)
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
    "a hinge on a fixed support": (lambda: beam_of(supports=((0.0, "pinned"), (3.0, "fixed"), (6.0, "pinned")), hinges=(3.0,)),
                                  "hinge"),
    "a hinge at the end": (lambda: beam_of(hinges=(0.0,)), "hinge"),
    "a hinge off the beam": (lambda: beam_of(hinges=(7.0,)), "hinge"),
    "a hinge at NaN": (lambda: beam_of(hinges=(NAN,)), "hinge"),
    "one hinge twice": (lambda: beam_of(supports=((0.0, "fixed"), (6.0, "fixed")), hinges=(3.0, 3.0)), "hinge"),
    "a hinge in a simple beam": (lambda: solve(beam_of(hinges=(2.0,)), [MID]), "hinge"),
    "three hinges in a span": (lambda: solve(beam_of(supports=((0.0, "fixed"), (6.0, "fixed")), hinges=(1.0, 3.0, 5.0)),
                                               [MID]), "hinge"),
    "a beam on one pin": (lambda: solve(beam_of(supports=((3.0, "pinned"),)), [MID]), "support"),
    "a beam on one spring": (lambda: solve(Beam(length=6.0, stretches=(stiff(1e7),), supports=(SPRING,)), [MID]), "support"),
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
