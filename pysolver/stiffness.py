"""How stiff is the beam, and how do its element ends move?

SI units; deflection positive down, rotation positive clockwise. Element matrices, work-equivalent end loads and the
solution for many beams of one shape at once. Method and source: see statics.py, which turns the movements into V and M.
"""

from collections.abc import Sequence
from dataclasses import dataclass
from itertools import pairwise

import numpy as np
from numpy.typing import NDArray

from pysolver.beam import Beam
from pysolver.errors import InternalError
from pysolver.loads import AppliedMoment, LineLoad, Load, PointLoad

Floats = NDArray[np.float64]
Ints = NDArray[np.intp]

SETTLEMENT = "settlement of support {}"  # one source for each support (counted from 0) with a stated settlement
SAME_PLACE = 1e-6  # m

# three-point Gauss rule on [0, 1]: exact to degree 5; shape function times linear load has degree 4
GAUSS_PLACES = np.array([0.5 - np.sqrt(0.15), 0.5, 0.5 + np.sqrt(0.15)])
GAUSS_WEIGHTS = np.array([5.0, 8.0, 5.0]) / 18.0


@dataclass(frozen=True, slots=True)
class Nodes:
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
class Forces:
    """All loads of C beams as arrays (C, L); a load of another kind has zeros in its place."""

    start: Floats
    end: Floats
    force: Floats
    moment: Floats
    intensity: Floats  # at start
    growth: Floats  # of the intensity per metre
    owner: Floats  # (L, S) one where load l belongs to source s


def settlements(beams: Sequence[Beam]) -> list[str]:
    """The names of the sources that stand for stated settlements."""
    return [SETTLEMENT.format(j) for j in range(len(beams[0].supports)) if any(b.supports[j].settlement for b in beams)]


def shape_of(beam: Beam) -> tuple[tuple[bool, int], ...]:
    """What must be alike for beams to be solved in one batch: for each element end, is it a hinge, which support is it."""
    places = _node_places(beam)
    at = {int(np.argmin([abs(s.x - x) for x, _ in places])): j for j, s in enumerate(beam.supports)}
    return tuple((hinge, at.get(i, -1)) for i, (_, hinge) in enumerate(places))


def nodes_of(beams: Sequence[Beam]) -> Nodes:
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
    return Nodes(x, stiffness, np.array(deflection), np.array(left), np.array(right), supports)


def _node_places(beam: Beam) -> list[tuple[float, bool]]:
    """(x, is a hinge) of every element end, in order, places nearer than SAME_PLACE made one."""
    places = [(s.x, False) for s in beam.supports] + [(0.0, False), (beam.length, False)]
    places += [(h, True) for h in beam.hinges]
    places += [(a.end, False) for a, b in pairwise(beam.stretches) if a.bending_stiffness != b.bending_stiffness]
    merged: list[tuple[float, bool]] = []
    for x, hinge in sorted(places):
        if merged and x - merged[-1][0] < SAME_PLACE:
            merged[-1] = (merged[-1][0], merged[-1][1] or hinge)
        else:
            merged.append((x, hinge))
    return merged


def _stiffness_at(beam: Beam, x: float) -> float:
    return next((s.bending_stiffness for s in beam.stretches if s.start <= x <= s.end), beam.stretches[-1].bending_stiffness)


def forces_of(loads: Sequence[tuple[Load, ...]], sources: tuple[str, ...]) -> Forces:
    rows = np.array([[_as_row(load) for load in case] for case in loads], dtype=float).reshape(len(loads), -1, 6)
    owner = np.zeros((rows.shape[1], len(sources)))
    for i, load in enumerate(loads[0]):
        owner[i, sources.index(load.source)] = 1.0
    start, end, force, moment, intensity, growth = np.moveaxis(rows, 2, 0)
    return Forces(start, end, force, moment, intensity, growth, owner)


def _as_row(load: Load) -> tuple[float, ...]:
    match load:
        case PointLoad():
            return load.x, load.x, load.force, 0.0, 0.0, 0.0
        case AppliedMoment():
            return load.x, load.x, 0.0, load.moment, 0.0, 0.0
        case LineLoad():
            growth = (load.end_intensity - load.start_intensity) / (load.end - load.start)
            return load.start, load.end, 0.0, 0.0, load.start_intensity, growth


def freedoms(nodes: Nodes, element: int) -> list[int]:
    """The four degrees of freedom of an element: deflection and rotation at its left and at its right end."""
    return [int(nodes.deflection[element]), int(nodes.rotation_right[element]),
            int(nodes.deflection[element + 1]), int(nodes.rotation_left[element + 1])]


def element_matrix(length: Floats, stiffness: Floats) -> Floats:
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


def on_element(nodes: Nodes, forces: Forces, e: int) -> tuple[Floats, Floats, Floats]:
    """For element e: where the part of each load on it starts and ends (C, L), and 1.0 where a point load is its own."""
    left, right = nodes.x[:, e, None], nodes.x[:, e + 1, None]
    last = e == nodes.x.shape[1] - 2
    owns = (forces.start >= left) & ((forces.start < right) | (last & (forces.start <= right + SAME_PLACE)))
    return np.clip(forces.start, left, right), np.clip(forces.end, left, right), owns.astype(float)


def element_loads(nodes: Nodes, forces: Forces, e: int) -> Floats:
    """(C, 4, L) end loads of element e that do the same work as each load on it."""
    left, length = nodes.x[:, e, None], (nodes.x[:, e + 1] - nodes.x[:, e])[:, None]
    start, end, owns = on_element(nodes, forces, e)
    share = (start - left) / length
    total = _shapes(share, length) * forces.force * owns + _shape_slopes(share, length) * forces.moment * owns
    for place, weight in zip(GAUSS_PLACES, GAUSS_WEIGHTS, strict=True):
        x = start + place * (end - start)
        intensity = forces.intensity + forces.growth * (x - forces.start)
        total += _shapes((x - left) / length, length) * intensity * (weight * (end - start))
    return np.moveaxis(total, 0, 1)


def assemble(nodes: Nodes, shape: Beam, forces: Forces) -> tuple[Floats, Floats]:
    """The stiffness matrix (C, n, n) without supports, and the loads on it by source (C, n, S)."""
    cases, n = nodes.x.shape[0], nodes.count
    matrix, right = np.zeros((cases, n, n)), np.zeros((cases, n, forces.owner.shape[1]))
    for e in range(nodes.x.shape[1] - 1):
        f = freedoms(nodes, e)
        matrix[:, np.array(f)[:, None], f] += element_matrix(nodes.x[:, e + 1] - nodes.x[:, e], nodes.stiffness[:, e])
        right[:, f, :] += element_loads(nodes, forces, e) @ forces.owner
    return matrix, right


def displacements(nodes: Nodes, beams: Sequence[Beam], matrix: Floats, right: Floats, sources: tuple[str, ...]) -> Floats:
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


def _held(nodes: Nodes, beams: Sequence[Beam], sources: tuple[str, ...]) -> tuple[Ints, Floats]:
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
