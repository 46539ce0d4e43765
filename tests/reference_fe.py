"""What does a general-purpose finite element library say about the same beam?

scikit-fem assembles cubic Hermite elements (exact at nodes for Euler-Bernoulli beams with piecewise constant EI) and
integrates the loads by its quadrature. Section forces are element end forces K u - f, never second derivatives of the
shape functions. The beam is cut wherever anything changes and into at least four elements a span. At a hinge the mesh
is cut in two, and the deflections (not the rotations) of both sides are made one unknown. Supports that do not give
are condensed, springs are added to the diagonal.

SI units and signs as in pysolver.statics. pysolver's Beam and loads are read as plain data; nothing else of it is used.
"""

from dataclasses import dataclass
from itertools import pairwise

import numpy as np
from numpy.typing import NDArray
from scipy import sparse
from scipy.sparse.linalg import splu
from skfem import Basis, BilinearForm, ElementLineHermite, LinearForm, MeshLine

Floats = NDArray[np.float64]

ELEMENTS_A_SPAN = 4
SAME_PLACE = 1e-9  # m


@dataclass(frozen=True, slots=True, kw_only=True)
class Reference:
    """For E elements the places x (E, 2) of their ends, and just inside these shear, moment, slope and sag (E, 2)."""

    x: Floats
    shear: Floats
    moment: Floats
    slope: Floats
    sag: Floats
    reactions: Floats
    fixing_moments: Floats


@BilinearForm
def bending(u, v, w):
    return w.stiffness * u.hess[0][0] * v.hess[0][0]


@LinearForm
def work_of_line_loads(v, w):
    return w.intensity * v


def reference_solution(beam, loads) -> Reference:
    """Section forces, slopes and sags at the ends of all elements; reactions and fixing moments of all supports."""
    nodes, elements = _mesh(beam, loads)
    left, right = nodes[elements]
    unknowns = np.array([2 * elements[0], 2 * elements[0] + 1, 2 * elements[1], 2 * elements[1] + 1]).T  # (E, 4)
    matrices, pushes = _assemble_each(beam, loads, left, right)
    motion, reactions, fixing_moments = _solve(beam, loads, nodes, unknowns, matrices, pushes)
    of_element = motion[unknowns]
    end_forces = np.einsum("eij,ej->ei", matrices, of_element) - pushes  # on the element: down and clockwise
    return Reference(x=nodes[elements].T, shear=end_forces[:, [0, 2]] * [-1, 1], moment=end_forces[:, [1, 3]] * [1, -1],
                     slope=of_element[:, [1, 3]], sag=of_element[:, [0, 2]],
                     reactions=reactions, fixing_moments=fixing_moments)


def _assemble_each(beam, loads, left, right):
    """Stiffness (E, 4, 4) and work-equivalent loads (E, 4) of each element, in deflection and rotation at both ends.

    Each element is given to the library with its own origin: it fits its cubics in powers of x, which makes the
    stiffness of a 200 mm element wrong by 2e-7 at 100 m from the origin and by 3e-15 beside it (seen).
    """
    ends = np.array([np.zeros_like(left), right - left]).T.ravel()
    apart = MeshLine(ends[None, :], np.arange(len(ends)).reshape(-1, 2).T)
    basis = Basis(apart, ElementLineHermite(), intorder=6)
    middles = (left + right) / 2
    places = left[:, None] + np.asarray(basis.global_coordinates())[0]
    matrices = bending.elemental(basis, stiffness=_bending_stiffness(beam, middles)[:, None]).tolocal()
    pushes = work_of_line_loads.elemental(basis, intensity=_intensity(loads, places, middles)).tolocal()
    return matrices, pushes


def _lines(loads):
    return [load for load in loads if hasattr(load, "start_intensity")]


def _concentrated(loads):
    return [load for load in loads if not hasattr(load, "start_intensity")]


def _mesh(beam, loads):
    """Nodes in order (two at each hinge) and the (2, E) nodes of the elements."""
    supports = [support.x for support in beam.supports]
    cuts = [0.0, beam.length, *supports, *beam.hinges, *(load.x for load in _concentrated(loads))]
    cuts += [end for piece in (*beam.stretches, *_lines(loads)) for end in (piece.start, piece.end)]
    bounds = sorted({0.0, *supports, beam.length})
    for left, right in pairwise(bounds):
        between = np.linspace(left, right, ELEMENTS_A_SPAN + 1)[1:-1]
        cuts += [x for x in between if np.abs(x - cuts).min() > SAME_PLACE]  # a given place stays as it was given
    cuts = np.sort(np.clip(cuts, 0.0, beam.length))
    cuts = cuts[np.append(True, np.diff(cuts) > SAME_PLACE)]
    twice = [1 + any(abs(x - hinge) < SAME_PLACE for hinge in beam.hinges) for x in cuts]
    nodes = np.repeat(cuts, twice)
    left = np.cumsum(twice)[:-1] - 1
    return nodes, np.array([left, left + 1])


def _bending_stiffness(beam, middles):
    return np.array([next(s.bending_stiffness for s in beam.stretches if s.start < x < s.end) for x in middles])


def _intensity(loads, places, middles):
    """(E, Q) line load at the quadrature places; each element lies wholly inside or outside each load."""
    total = np.zeros_like(places)
    for load in _lines(loads):
        share = (places - load.start) / (load.end - load.start)
        inside = (load.start < middles) & (middles < load.end)
        total += inside[:, None] * (load.start_intensity + share * (load.end_intensity - load.start_intensity))
    return total


def _solve(beam, loads, nodes, unknowns, matrices, pushes):
    """Deflection and rotation of all nodes in turn (2N,), reactions (up) and fixing moments (clockwise)."""
    def node(x):  # at a hinge the left one of the two nodes
        return int(np.argmin(np.abs(nodes - x)))

    size = 2 * len(nodes)
    one = np.arange(size)  # the unknown that stands for each unknown
    for hinge in beam.hinges:
        one[2 * (node(hinge) + 1)] = 2 * node(hinge)
    mine = one[unknowns]
    rows, columns = np.broadcast_arrays(mine[:, :, None], mine[:, None, :])
    bare = sparse.csr_matrix((matrices.ravel(), (rows.ravel(), columns.ravel())), shape=(size, size))
    load_vector = np.bincount(mine.ravel(), pushes.ravel(), minlength=size)
    for load in _concentrated(loads):
        if hasattr(load, "force"):
            load_vector[2 * node(load.x)] += load.force
        else:
            load_vector[2 * node(load.x) + 1] += load.moment

    held, springs, spring_pushes = _supports(beam, [2 * node(support.x) for support in beam.supports], size)
    free = np.setdiff1d(one, list(held))
    motion = np.zeros(size)
    motion[list(held)] = list(held.values())
    stiff = (bare + sparse.diags(springs)).tocsr()
    right = load_vector + spring_pushes - stiff @ motion
    motion[free] = splu(stiff[free][:, free].tocsc()).solve(right[free])
    unbalanced = bare @ motion - load_vector  # what the supports put on the beam: down and clockwise
    reactions = np.array([-unbalanced[2 * node(s.x)] for s in beam.supports])
    turned = [s.kind == "fixed" or s.rotational is not None for s in beam.supports]
    moments = np.array([unbalanced[2 * node(s.x) + 1] for s in beam.supports])
    return motion[one], reactions, np.where(turned, moments, 0.0)


def _supports(beam, at, size):
    """Held unknowns with their values, spring stiffness of all unknowns (size,) and what settled springs push."""
    held, springs, pushes = {}, np.zeros(size), np.zeros(size)
    for support, down in zip(beam.supports, at, strict=True):
        turn = down + 1
        if support.kind == "spring":
            springs[down] += support.stiffness
            pushes[down] += support.stiffness * support.settlement
        else:
            held[down] = support.settlement
        if support.kind == "fixed":
            held[turn] = 0.0
        elif support.rotational is not None:
            springs[turn] += support.rotational
    return held, springs, pushes
