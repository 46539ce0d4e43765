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
from pysolver.loads import AppliedMoment, LineLoad, Load, PointLoad, check_on_beam
from pysolver.mechanism import refuse_mechanism

Floats = NDArray[np.float64]
Ints = NDArray[np.intp]

SETTLEMENT = "settlement of support {}"  # one source for each support (counted from 0) with a stated settlement
SAME_PLACE = 1e-6  # m
RESIDUAL_ALLOWED = 1e-7  # of the load: beyond it the answer is not trusted (our bug, or a beam too extreme to solve)

DEGREE = {"shear": 2, "moment": 3, "slope": 4, "sag": 5}

# three-point Gauss rule on [0, 1]: exact to degree 5; shape function times linear load has degree 4
GAUSS_PLACES = np.array([0.5 - np.sqrt(0.15), 0.5, 0.5 + np.sqrt(0.15)])
GAUSS_WEIGHTS = np.array([5.0, 8.0, 5.0]) / 18.0


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


@dataclass(frozen=True, slots=True)
class _Nodes:
    """The element ends of C beams of one shape, and which degree of freedom is which."""

    x: Floats  # (C, N)
    stiffness: Floats  # (C, E) EI of each element
    deflection: Ints  # (N,)
    rotation_left: Ints  # (N,) rotation of the element that ends at the node
    rotation_right: Ints  # (N,) rotation of the element that starts there; another number only at a hinge
    supports: Ints  # (J,) node of each support

    @property
    def count(self) -> int:
        return int(self.rotation_right.max()) + 1


@dataclass(frozen=True, slots=True)
class _Forces:
    """All loads of C beams as arrays (C, L); a load of another kind has zeros in its place."""

    start: Floats
    end: Floats
    force: Floats
    moment: Floats
    intensity: Floats  # at start
    growth: Floats  # of the intensity per metre
    owner: Floats  # (L, S) one where load l belongs to source s


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
    """The response of C beams, alike in supports, hinges, stretches and kinds of load, to each of their sources."""
    refuse_mechanism(beams[0])
    sources = tuple(dict.fromkeys([load.source for load in loads[0]] + settlements(beams)))
    nodes = _nodes(beams)
    forces = _forces(loads, sources)
    matrix, right = _assemble(nodes, beams[0], forces)
    moved = _displacements(nodes, beams, matrix, right, sources)
    answer = _pieces(nodes, forces, moved, _breakpoints(nodes, forces, cuts))
    reactions, fixing = _reactions(nodes, beams, moved, matrix, right)
    batch = Batch(sources=sources, reactions=reactions, fixing_moments=fixing,
                  residual=residual(beams, forces, reactions, fixing), **answer)
    _refuse_untrusted(batch)
    return batch


def settlements(beams: Sequence[Beam]) -> list[str]:
    """The names of the sources that stand for stated settlements."""
    return [SETTLEMENT.format(j) for j in range(len(beams[0].supports)) if any(b.supports[j].settlement for b in beams)]


def _nodes(beams: Sequence[Beam]) -> _Nodes:
    shapes = [_node_places(b) for b in beams]
    x = np.array([[place for place, _ in shape] for shape in shapes])
    hinged = [hinge for _, hinge in shapes[0]]
    if any([hinge for _, hinge in shape] != hinged for shape in shapes):
        raise InternalError(code="shape", message="Beams of different shape were put into one batch.")
    deflection, left, right, next_free = [], [], [], 0
    for hinge in hinged:
        deflection.append(next_free)
        left.append(next_free + 1)
        right.append(next_free + 1 + hinge)
        next_free += 2 + hinge
    middle = 0.5 * (x[:, :-1] + x[:, 1:])
    stiffness = np.array([[_stiffness_at(b, m) for m in row] for b, row in zip(beams, middle, strict=True)])
    supports = np.array([int(np.argmin(np.abs(x[0] - s.x))) for s in beams[0].supports], dtype=np.intp)
    return _Nodes(x, stiffness, np.array(deflection), np.array(left), np.array(right), supports)


def _node_places(beam: Beam) -> list[tuple[float, bool]]:
    """(x, is a hinge) of every element end, in order, places nearer than SAME_PLACE made one."""
    places = [(s.x, False) for s in beam.supports] + [(0.0, False), (beam.length, False)]
    places += [(h, True) for h in beam.hinges] + [(s.end, False) for s in beam.stretches[:-1]]
    merged: list[tuple[float, bool]] = []
    for x, hinge in sorted(places):
        if merged and x - merged[-1][0] < SAME_PLACE:
            merged[-1] = (merged[-1][0], merged[-1][1] or hinge)
        else:
            merged.append((x, hinge))
    return merged


def _stiffness_at(beam: Beam, x: float) -> float:
    return next((s.bending_stiffness for s in beam.stretches if s.start <= x <= s.end), beam.stretches[-1].bending_stiffness)


def _forces(loads: Sequence[tuple[Load, ...]], sources: tuple[str, ...]) -> _Forces:
    rows = np.array([[_as_row(load) for load in case] for case in loads], dtype=float).reshape(len(loads), -1, 6)
    owner = np.zeros((rows.shape[1], len(sources)))
    for i, load in enumerate(loads[0]):
        owner[i, sources.index(load.source)] = 1.0
    start, end, force, moment, intensity, growth = np.moveaxis(rows, 2, 0)
    return _Forces(start, end, force, moment, intensity, growth, owner)


def _as_row(load: Load) -> tuple[float, ...]:
    match load:
        case PointLoad():
            return load.x, load.x, load.force, 0.0, 0.0, 0.0
        case AppliedMoment():
            return load.x, load.x, 0.0, load.moment, 0.0, 0.0
        case LineLoad():
            growth = (load.end_intensity - load.start_intensity) / (load.end - load.start)
            return load.start, load.end, 0.0, 0.0, load.start_intensity, growth


def _freedoms(nodes: _Nodes, element: int) -> list[int]:
    """The four degrees of freedom of an element: deflection and rotation at its left and at its right end."""
    return [int(nodes.deflection[element]), int(nodes.rotation_right[element]),
            int(nodes.deflection[element + 1]), int(nodes.rotation_left[element + 1])]


def _element_matrix(length: Floats, stiffness: Floats) -> Floats:
    """(C, 4, 4) stiffness of elements of `length` (C,) for (deflection, rotation) at both ends."""
    one, q = np.ones_like(length), length
    rows = [[12 * one, 6 * q, -12 * one, 6 * q], [6 * q, 4 * q * q, -6 * q, 2 * q * q],
            [-12 * one, -6 * q, 12 * one, -6 * q], [6 * q, 2 * q * q, -6 * q, 4 * q * q]]
    matrix: Floats = np.moveaxis(np.array(rows), 2, 0) * (stiffness / length**3)[:, None, None]
    return matrix


def _shapes(share: Floats, length: Floats) -> Floats:
    """(4, ...) the shape functions of an element at `share` of its length: what each end carries of a unit force."""
    return np.array([1 - 3 * share**2 + 2 * share**3, length * (share - 2 * share**2 + share**3),
                     3 * share**2 - 2 * share**3, length * (share**3 - share**2)])


def _shape_slopes(share: Floats, length: Floats) -> Floats:
    """(4, ...) d(shape)/dx: what each end carries of a unit clockwise moment."""
    return np.array([6 * (share**2 - share) / length, 1 - 4 * share + 3 * share**2,
                     6 * (share - share**2) / length, 3 * share**2 - 2 * share])


def _on_element(nodes: _Nodes, forces: _Forces, e: int) -> tuple[Floats, Floats, Floats]:
    """For element e: where the part of each load on it starts and ends (C, L), and 1.0 where a point load is its own."""
    left, right = nodes.x[:, e, None], nodes.x[:, e + 1, None]
    last = e == nodes.x.shape[1] - 2
    owns = (forces.start >= left) & ((forces.start < right) | (last & (forces.start <= right + SAME_PLACE)))
    return np.clip(forces.start, left, right), np.clip(forces.end, left, right), owns.astype(float)


def _element_loads(nodes: _Nodes, forces: _Forces, e: int) -> Floats:
    """(C, 4, L) end loads of element e that do the same work as each load on it."""
    left, length = nodes.x[:, e, None], (nodes.x[:, e + 1] - nodes.x[:, e])[:, None]
    start, end, owns = _on_element(nodes, forces, e)
    share = (start - left) / length
    total = _shapes(share, length) * forces.force * owns + _shape_slopes(share, length) * forces.moment * owns
    for place, weight in zip(GAUSS_PLACES, GAUSS_WEIGHTS, strict=True):
        x = start + place * (end - start)
        intensity = forces.intensity + forces.growth * (x - forces.start)
        total += _shapes((x - left) / length, length) * intensity * (weight * (end - start))
    return np.moveaxis(total, 0, 1)


def _assemble(nodes: _Nodes, shape: Beam, forces: _Forces) -> tuple[Floats, Floats]:
    """The stiffness matrix (C, n, n) without supports, and the loads on it by source (C, n, S)."""
    cases, n = nodes.x.shape[0], nodes.count
    matrix, right = np.zeros((cases, n, n)), np.zeros((cases, n, forces.owner.shape[1]))
    for e in range(nodes.x.shape[1] - 1):
        f = _freedoms(nodes, e)
        matrix[:, np.array(f)[:, None], f] += _element_matrix(nodes.x[:, e + 1] - nodes.x[:, e], nodes.stiffness[:, e])
        right[:, f, :] += _element_loads(nodes, forces, e) @ forces.owner
    return matrix, right


def _displacements(nodes: _Nodes, beams: Sequence[Beam], matrix: Floats, right: Floats, sources: tuple[str, ...]) -> Floats:
    """(C, n, S) deflection and rotation of every node."""
    held, given = _held(nodes, beams, sources)
    stiff, push = matrix.copy(), right.copy()
    for j, node in enumerate(nodes.supports):
        d, r = nodes.deflection[node], nodes.rotation_right[node]
        k = np.array([b.supports[j].stiffness or 0.0 for b in beams])
        stiff[:, d, d] += k
        if SETTLEMENT.format(j) in sources:
            push[:, d, sources.index(SETTLEMENT.format(j))] += k * np.array([b.supports[j].settlement for b in beams])
        stiff[:, r, r] += np.array([b.supports[j].rotational or 0.0 for b in beams])
    free = np.setdiff1d(np.arange(nodes.count), held)
    moved = given
    if len(free):
        reduced = stiff[:, free[:, None], free]
        load = push[:, free, :] - stiff[:, free[:, None], held] @ given[:, held, :]
        moved[:, free, :] = _refined_solution(reduced, load)
    return moved


def _held(nodes: _Nodes, beams: Sequence[Beam], sources: tuple[str, ...]) -> tuple[Ints, Floats]:
    """The degrees of freedom that supports hold, and the displacements (C, n, S) that they are given."""
    given = np.zeros((len(beams), nodes.count, len(sources)))
    held: list[int] = []
    for j, node in enumerate(nodes.supports):
        kind = beams[0].supports[j].kind
        if kind != "spring":
            held.append(int(nodes.deflection[node]))
            if SETTLEMENT.format(j) in sources:
                given[:, held[-1], sources.index(SETTLEMENT.format(j))] = [b.supports[j].settlement for b in beams]
        if kind == "fixed":
            held.append(int(nodes.rotation_right[node]))
    return np.array(held, dtype=np.intp), given


def _refined_solution(matrix: Floats, right: Floats) -> Floats:
    """matrix^-1 right after scaling to a unit diagonal (Jacobi), with one step of iterative refinement."""
    scale: Floats = 1.0 / np.sqrt(np.einsum("cii->ci", matrix))[:, :, None]
    scaled = matrix * scale * np.swapaxes(scale, 1, 2)
    y = np.linalg.solve(scaled, scale * right)
    y = y + np.linalg.solve(scaled, scale * right - scaled @ y)
    solution: Floats = scale * y
    return solution


def _breakpoints(nodes: _Nodes, forces: _Forces, cuts: Sequence[tuple[float, ...]] | None) -> Floats:
    extra = np.array(cuts, dtype=float).reshape(len(nodes.x), -1) if cuts is not None else np.zeros((len(nodes.x), 0))
    everything = np.concatenate([nodes.x, forces.start, forces.end, extra], axis=1)
    inside = np.clip(everything, nodes.x[:, :1], nodes.x[:, -1:])
    x: Floats = np.sort(inside, axis=1)
    if len(x) == 1:  # one beam alone: drop doubles; in a batch every beam keeps the same number of pieces
        x = x[:, np.concatenate([[True], np.diff(x[0]) > 0.0])]
    return x


def _pieces(nodes: _Nodes, forces: _Forces, moved: Floats, x: Floats) -> dict[str, Floats]:
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


def _element_pieces(nodes: _Nodes, forces: _Forces, moved: Floats, e: int, case: Ints, x: Floats,
                    middle: Floats) -> dict[str, Floats]:
    """Coefficients (n, S, d+1) of the n pieces of element e that start at x (n,) on the beams `case` (n,)."""
    f = _freedoms(nodes, e)
    matrix = _element_matrix(nodes.x[:, e + 1] - nodes.x[:, e], nodes.stiffness[:, e])
    start_forces = (matrix @ moved[:, f, :])[:, :2] - (_element_loads(nodes, forces, e) @ forces.owner)[:, :2]
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


def _left_of(nodes: _Nodes, forces: _Forces, e: int, case: Ints, x: Floats, middle: Floats) -> tuple[Floats, ...]:
    """For each piece (n) and load (L): what the load on element e left of x takes from V, M, the integral of M and its
    double integral (Macaulay's brackets), and the intensity and its growth on the piece itself."""
    start, end, owns = (a[case] for a in _on_element(nodes, forces, e))
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


def _reactions(nodes: _Nodes, beams: Sequence[Beam], moved: Floats, matrix: Floats, right: Floats) -> tuple[Floats, Floats]:
    """(C, J, S) upward reactions and clockwise fixing moments: what the supports must give for K u = loads."""
    push = matrix @ moved - right
    reactions = -push[:, nodes.deflection[nodes.supports], :]
    fixing = push[:, nodes.rotation_right[nodes.supports], :].copy()
    for j, support in enumerate(beams[0].supports):
        if support.kind != "fixed" and support.rotational is None:
            fixing[:, j, :] = 0.0
    return reactions, fixing


def residual(beams: Sequence[Beam], forces: _Forces, reactions: Floats, fixing: Floats) -> Floats:
    """(C,) the largest relative error of vertical and moment equilibrium of the whole beam, from loads and reactions
    alone: this check shares nothing with the stiffness matrix."""
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
    worst: Floats = (np.maximum(vertical, turning) / np.where(size > 0.0, size, 1.0)).max(axis=1, initial=0.0)
    return worst


def _refuse_untrusted(batch: Batch) -> None:
    arrays = (batch.moment, batch.sag, batch.reactions, batch.residual)
    if not all(np.isfinite(a).all() for a in arrays):
        raise InputError(code="not_solvable", field="", message="These numbers are too extreme to be solved. Check spans, "
                         "stiffnesses and springs for a slip of a unit.")
    if batch.residual.max() > RESIDUAL_ALLOWED:
        raise InternalError(code="equilibrium", message=f"The answer is out of equilibrium by {batch.residual.max():.1e} of the load, so it is not "
                            "shown. This is our fault: please send us this record.")


def value(response: Response, quantity: str, x: float, side: str = "right") -> float:
    """The value of shear, moment, slope or sag at x; at a jump, just to the `side` ("left" or "right") of it."""
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
