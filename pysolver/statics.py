"""What are the reactions, shear, moment, slope and sag of a beam under its loads, everywhere and exactly?

SI units. x from the left end; loads and sag positive down, reactions positive up, shear positive when the left part is
pushed up, moment positive sagging, rotations and applied moments positive clockwise.

Method: displacement (stiffness) method for Euler-Bernoulli beams, e.g. Przemieniecki, Theory of Matrix Structural
Analysis (1968), chapter 5. Elements end only where the beam changes (supports, hinges, changes of EI). Loads enter as
their work-equivalent end loads, which for these elements are the exact fixed-end forces. Between breakpoints V is then
a quadratic, M a cubic, the slope a quartic and the sag a quintic polynomial, built from the element end forces and the
loads themselves. No value is sampled. Many beams of one shape are solved in one batch.

numpy inside WebAssembly raises no LinAlgError: mechanisms are found by the rank of the constraints before solving
(mechanism.py), and every answer is checked for finite numbers and for equilibrium after it.
"""

from collections.abc import Sequence
from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray

from pysolver import piecewise
from pysolver.beam import Beam
from pysolver.errors import InputError, InternalError
from pysolver.loads import Load, check_on_beam
from pysolver.mechanism import refuse_mechanism
from pysolver.stiffness import (
    Forces,
    Nodes,
    assemble,
    displacements,
    element_loads,
    element_matrix,
    forces_of,
    freedoms,
    nodes_of,
    on_element,
    settlements,
)

Floats = NDArray[np.float64]
Ints = NDArray[np.intp]

RESIDUAL_ALLOWED = 1e-7  # of the load: beyond it the answer is not trusted (our bug, or a beam too extreme to solve)

NO_FORCE = 1e-3  # N
SAME = 1e-9  # m
ROUNDING = 1e-8  # of stiffness times displacement: a beam that follows its settlements freely has no forces but rounding

DEGREE = {"shear": 2, "moment": 3, "slope": 4, "sag": 5}


@dataclass(frozen=True, slots=True, kw_only=True)
class Batch:
    """C beams of one shape, S sources: the response to each source by itself.

    x (C, P+1) breakpoints; shear (C, P, S, 3), moment (C, P, S, 4), slope (C, P, S, 5), sag (C, P, S, 6) ascending in
    s = x - breakpoint; reactions (C, J, S) up; fixing_moments (C, J, S) clockwise, from the support on the beam;
    residual (C,) the largest equilibrium residual, relative to the load.
    """

    sources: tuple[str, ...]
    x: Floats
    shear: Floats
    moment: Floats
    slope: Floats
    sag: Floats
    reactions: Floats
    fixing_moments: Floats
    residual: Floats


@dataclass(frozen=True, slots=True, kw_only=True)
class Response:
    """One beam under all its loads: as Batch, without the axes of beams and sources."""

    x: Floats
    shear: Floats
    moment: Floats
    slope: Floats
    sag: Floats
    reactions: Floats
    fixing_moments: Floats
    residual: float


@dataclass(frozen=True, slots=True, kw_only=True)
class Extreme:
    """The largest or smallest value of a quantity, and the place where it is reached."""

    x: float
    value: float


def solve(beam: Beam, loads: Sequence[Load], cuts: Sequence[float] = ()) -> Response:
    """The response of one beam to all its loads and settlements together.

    cuts: further breakpoints (m). Raises InputError for a mechanism or a load off the beam, InternalError when the
    answer is not in equilibrium.
    """
    check_on_beam(beam, tuple(loads))
    batch = solve_batch([beam], [tuple(loads)], [tuple(cuts)])
    total = {name: getattr(batch, name)[0].sum(axis=1) for name in (*DEGREE, "reactions", "fixing_moments")}
    return Response(x=batch.x[0], residual=float(batch.residual[0]), **total)


def solve_batch(beams: Sequence[Beam], loads: Sequence[tuple[Load, ...]],
                cuts: Sequence[tuple[float, ...]] | None = None) -> Batch:
    """The response of C beams of one shape (stiffness.shape_of) with as many loads each, to each of their sources."""
    nodes, forces, moved, held = _moved(beams, loads)
    answer = _pieces(nodes, forces, moved, _breakpoints(nodes, forces, cuts))
    _refuse_untrusted((answer["moment"], answer["sag"], held.reactions), held.residual)
    return Batch(sources=held.sources, reactions=held.reactions, fixing_moments=held.fixing_moments, residual=held.residual,
                 **answer)


def solve_reactions(beams: Sequence[Beam], loads: Sequence[tuple[Load, ...]]) -> "Held":
    """As solve_batch, but only what the supports give."""
    held = _moved(beams, loads)[3]
    _refuse_untrusted((held.reactions,), held.residual)
    return held


@dataclass(frozen=True, slots=True, kw_only=True)
class Held:
    """What the supports of C beams give to each source: see Batch."""

    sources: tuple[str, ...]
    reactions: Floats
    fixing_moments: Floats
    residual: Floats


def _moved(beams: Sequence[Beam], loads: Sequence[tuple[Load, ...]]) -> tuple[Nodes, Forces, Floats, Held]:
    refuse_mechanism(beams[0])
    sources = tuple(dict.fromkeys([load.source for load in loads[0]] + settlements(beams)))
    nodes = nodes_of(beams)
    forces = forces_of(loads, sources)
    matrix, right = assemble(nodes, beams[0], forces)
    moved = displacements(nodes, beams, matrix, right, sources)
    reactions, fixing = _reactions(nodes, beams, moved, matrix, right)
    balance = residual(beams, forces, reactions, fixing, _rounding(matrix, moved))
    return nodes, forces, moved, Held(sources=sources, reactions=reactions, fixing_moments=fixing, residual=balance)


def _breakpoints(nodes: Nodes, forces: Forces, cuts: Sequence[tuple[float, ...]] | None) -> Floats:
    extra = np.array(cuts, dtype=float).reshape(len(nodes.x), -1) if cuts is not None else np.zeros((len(nodes.x), 0))
    everything = np.concatenate([nodes.x, forces.start, forces.end, extra], axis=1)
    inside = np.clip(everything, nodes.x[:, :1], nodes.x[:, -1:])
    x: Floats = np.sort(inside, axis=1)
    if len(x) == 1:  # one beam alone: drop doubles; in a batch every beam keeps the same number of pieces
        x = x[:, np.concatenate([[True], np.diff(x[0]) > 0.0])]
    return x


def _pieces(nodes: Nodes, forces: Forces, moved: Floats, x: Floats) -> dict[str, Floats]:
    """The polynomials of every piece, from the end forces of its element and the loads left of it on that element."""
    middle = 0.5 * (x[:, :-1] + x[:, 1:])
    cases, pieces, sources = *middle.shape, forces.owner.shape[1]
    out = {name: np.zeros((cases, pieces, sources, degree + 1)) for name, degree in DEGREE.items()}
    for e in range(nodes.x.shape[1] - 1):
        mine = (middle >= nodes.x[:, e, None]) & ((middle < nodes.x[:, e + 1, None]) | (e == nodes.x.shape[1] - 2))
        rows = np.nonzero(mine)
        if len(rows[0]):
            for name, coefficients in _element_pieces(nodes, forces, moved, e, rows[0], x[:, :-1][rows], middle[rows]).items():
                out[name][rows] = coefficients
    return {"x": x, **out}


def _element_pieces(nodes: Nodes, forces: Forces, moved: Floats, e: int, case: Ints, x: Floats,
                    middle: Floats) -> dict[str, Floats]:
    """Coefficients (n, S, d+1) of the n pieces of element e that start at x (n,) on the beams `case` (n,)."""
    f = freedoms(nodes, e)
    matrix = element_matrix(nodes.x[:, e + 1] - nodes.x[:, e], nodes.stiffness[:, e])
    start_forces = (matrix @ moved[:, f, :])[:, :2] - (element_loads(nodes, forces, e) @ forces.owner)[:, :2]
    d = (x - nodes.x[case, e])[:, None]
    v_end, m_end = -start_forces[case, 0], start_forces[case, 1]
    w_end, t_end = moved[case, f[0]], moved[case, f[1]]
    sums = [s @ forces.owner for s in _left_of(nodes, forces, e, case, x, middle)]
    lost_v, lost_m, lost_t, lost_w, q, growth = sums
    ei = nodes.stiffness[case, e][:, None]
    v = v_end - lost_v
    m = m_end + v_end * d - lost_m
    t = t_end - (m_end * d + v_end * d**2 / 2 - lost_t) / ei
    w = w_end + t_end * d - (m_end * d**2 / 2 + v_end * d**3 / 6 - lost_w) / ei
    return {"shear": np.stack([v, -q, -growth / 2], axis=-1),
            "moment": np.stack([m, v, -q / 2, -growth / 6], axis=-1),
            "slope": np.stack([t, -m / ei, -v / 2 / ei, q / 6 / ei, growth / 24 / ei], axis=-1),
            "sag": np.stack([w, t, -m / 2 / ei, -v / 6 / ei, q / 24 / ei, growth / 120 / ei], axis=-1)}


def _left_of(nodes: Nodes, forces: Forces, e: int, case: Ints, x: Floats, middle: Floats) -> tuple[Floats, ...]:
    """For each piece (n) and load (L): what the load on element e left of x takes from V, M, the integral of M and its
    double integral (Macaulay's brackets), and the intensity and its growth on the piece itself."""
    start, end, owns = (a[case] for a in on_element(nodes, forces, e))
    force, moment = forces.force[case] * owns, forces.moment[case] * owns
    here, mid = x[:, None], middle[:, None]
    arm = np.where(start <= mid, np.maximum(here - start, 0.0), 0.0)
    there = (start <= mid).astype(float)
    first = forces.intensity[case] + forces.growth[case] * (start - forces.start[case])
    growth = forces.growth[case]
    u = np.clip(here - start, 0.0, end - start)
    far, near = np.maximum(here - start, 0.0), np.maximum(here - start, 0.0) - u
    v = force * there + first * u + growth * u**2 / 2
    m = force * arm - moment * there + first * (far**2 - near**2) / 2 + growth * _moments(far, near, 1)
    t = force * arm**2 / 2 - moment * arm + first * (far**3 - near**3) / 6 + growth * _moments(far, near, 2) / 2
    w = force * arm**3 / 6 - moment * arm**2 / 2 + first * (far**4 - near**4) / 24 + growth * _moments(far, near, 3) / 6
    covers = ((start <= mid) & (mid <= end) & (end > start)).astype(float)
    return v, m, t, w, covers * (first + growth * (here - start)), covers * growth


def _moments(far: Floats, near: Floats, n: int) -> Floats:
    """Integral of (far - y) y^n over y from near to far: a load growing from zero, n-th moment about the place asked."""
    result: Floats = far * (far**(n + 1) - near**(n + 1)) / (n + 1) - (far**(n + 2) - near**(n + 2)) / (n + 2)
    return result


def _reactions(nodes: Nodes, beams: Sequence[Beam], moved: Floats, matrix: Floats, right: Floats) -> tuple[Floats, Floats]:
    """(C, J, S) upward reactions and clockwise fixing moments: what the supports must give for K u = loads."""
    push = matrix @ moved - right
    reactions = -push[:, nodes.deflection[nodes.supports], :]
    fixing = push[:, nodes.rotation_right[nodes.supports], :].copy()
    for j, support in enumerate(beams[0].supports):
        if support.kind != "fixed" and support.rotational is None:
            fixing[:, j, :] = 0.0
    return reactions, fixing


def _rounding(matrix: Floats, moved: Floats) -> Floats:
    """(C,) forces (N) below which a reaction is rounding."""
    size: Floats = NO_FORCE + ROUNDING * np.abs(matrix).max(axis=(1, 2)) * np.abs(moved).max(axis=(1, 2), initial=0.0)
    return size


def residual(beams: Sequence[Beam], forces: Forces, reactions: Floats, fixing: Floats, rounding: Floats) -> Floats:
    """(C,) the largest relative error of vertical and moment equilibrium of the whole beam, from loads and reactions
    alone: this check shares nothing with the stiffness matrix. rounding (C,): forces that count as none."""
    x = np.array([[s.x for s in b.supports] for b in beams])
    length = np.array([b.length for b in beams])[:, None]
    run = forces.end - forces.start
    down = forces.force + forces.intensity * run + forces.growth * run**2 / 2
    turn = (forces.force * forces.start + forces.moment + forces.intensity * run * (forces.start + run / 2)
            + forces.growth * run**2 * (forces.start / 2 + run / 3))
    up, back = reactions, reactions * x[:, :, None]
    vertical = np.abs(up.sum(axis=1) - down @ forces.owner)
    turning = np.abs(back.sum(axis=1) - fixing.sum(axis=1) - turn @ forces.owner) / length
    size = np.abs(down) @ forces.owner + np.abs(up).sum(axis=1) + (np.abs(fixing).sum(axis=1)
                                                                  + np.abs(forces.moment) @ forces.owner) / length
    worst: Floats = np.maximum(vertical, turning).max(axis=1, initial=0.0) / (size.sum(axis=1) + rounding)
    return worst


def _refuse_untrusted(arrays: Sequence[Floats], balance: Floats) -> None:
    if not all(np.isfinite(a).all() for a in (*arrays, balance)):
        raise InputError(code="not_solvable", field="", message="These numbers are too extreme to be solved. Check spans, "
                         "stiffnesses and springs for a slip of a unit.")
    if balance.max() > RESIDUAL_ALLOWED:
        raise InternalError(code="equilibrium", message=f"The answer is out of equilibrium by {balance.max():.1e} of the load, "
                            "so it is not shown.")


def value(response: Response, quantity: str, x: float, side: str = "right") -> float:
    """The value of shear, moment, slope or sag at x; at a jump, just to the `side` ("left" or "right") of it.

    A place within a nanometre of a breakpoint is that breakpoint. Raises InternalError off the beam.
    """
    near = int(np.abs(response.x - x).argmin())
    x = float(response.x[near]) if abs(response.x[near] - x) < SAME else x
    if not response.x[0] <= x <= response.x[-1]:
        raise InternalError(code="off_the_beam", message=f"A value was asked for at {x} m, which is off the beam.")
    if side == "left":
        i = int(np.searchsorted(response.x, x, side="left")) - 1
    else:
        i = int(np.searchsorted(response.x, x, side="right")) - 1
    i = min(max(i, 0), len(response.x) - 2)
    coefficients: Floats = getattr(response, quantity)[i]
    return float(piecewise.evaluate(coefficients, np.asarray(x - response.x[i])))


def extremes(response: Response, quantity: str) -> tuple[Extreme, Extreme]:
    """The largest and the smallest value of a quantity over the whole beam, both sides of every jump included."""
    coefficients: Floats = getattr(response, quantity)
    lengths = np.diff(response.x)
    inner = piecewise.stationary(coefficients, lengths)
    s = np.concatenate([np.zeros((len(lengths), 1)), inner, lengths[:, None]], axis=1)
    s = np.where(np.isnan(s), 0.0, s)
    values = piecewise.evaluate(coefficients[:, None, :], s)
    place = response.x[:-1, None] + s

    def at(flat: int) -> Extreme:
        return Extreme(x=float(place.flat[flat]), value=float(values.flat[flat]))

    return at(int(values.argmax())), at(int(values.argmin()))
