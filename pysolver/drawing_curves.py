"""How do shear, moment and sag run along the beam, and where are the limits they must stay between?

True scale along the beam. The curve is drawn from the polynomials (drawing_bezier.py), jumps as verticals, with
ordinates from the base line. Signs: shear that pushes the left part up is drawn above the line; a sagging moment and a
sag are drawn below it (the side in tension), and the drawing says so. Sag is measured from the line through the
supports as they stand after settling (comparison.from_chord). SI in; values are shown with three figures.
"""

from collections.abc import Sequence
from dataclasses import dataclass
from itertools import pairwise
from typing import Literal

import numpy as np

from pysolver import drawing_bezier as bezier
from pysolver import piecewise, svg
from pysolver.comparison import Along, from_chord
from pysolver.display import System, show
from pysolver.drawing_body import WIDTH, TrueScale
from pysolver.drawing_curve_labels import NAME_ROW, Figure, base_line, label_values, name_rows, peaks
from pysolver.drawing_symbols import LEAST, WORST, key, key_rows, rings
from pysolver.found import Layout
from pysolver.piecewise import Floats
from pysolver.record import SUPPORT_NAMES
from pysolver.statics import Batch, Response

Quantity = Literal["shear", "moment", "sag"]
Piece = tuple[float, float, Floats]  # start, end (m), coefficients ascending in x - start

TALL = 190.0  # of the plot
HEADING = 42.0
AIR = 21.0  # over the plot, for values
UNDER = 22.0  # under the plot, for values and the text of a rail
RESIDUE = 1e-9
SHORTEST = 1e-9  # m, of a part of a curve
NO_FORCE = 1e-6  # N, N·m
FAR = 3.0  # a rail farther out than this many times the curve is named, not drawn
DOWN = {"shear": -1.0, "moment": 1.0, "sag": 1.0}  # the way of positive values on the paper (y runs down)
DIMENSION = {"shear": "force", "moment": "moment", "sag": "small_length"}
HEADINGS = {"shear": ("Shear", "+ : left part pushed up, drawn above the line"),
            "moment": ("Moment", "sagging drawn below the line (side in tension)"),
            "sag": ("Sag", "measured down from the line through the supports")}
NAUGHT = {"shear": "no shear", "moment": "no moment", "sag": "no sag"}


@dataclass(frozen=True, slots=True, kw_only=True)
class Rail:
    """A limit where it holds: start, end (m), value > 0 (SI), sign of the effect that it limits, the text beside it."""

    start: float
    end: float
    value: float
    sign: int
    label: str


@dataclass(frozen=True, slots=True, kw_only=True)
class Mark:
    """A governing place: x (m), the value there (SI, with its sign), the text beside it."""

    x: float
    value: float
    label: str


def curve(quantity: Quantity, response: Response, layout: Layout, *, high: Sequence[Piece] | None,
          low: Sequence[Piece] | None, rails: Sequence[Rail], governing: Sequence[Mark], system: System,
          names: Sequence[str] = SUPPORT_NAMES) -> str:
    """The curve of one quantity as SVG.

    response: unfactored best estimates. high, low: the largest and smallest values of the worst case (already from the
    chord, for sag). names: of the supports of the record, in order.
    """
    pieces = best_pieces(quantity, response, layout)
    floor = residue(quantity, response, layout)
    sides = [_sides(one, sign, floor) for one, sign in ((high, 1.0), (low, -1.0)) if one]
    edges = [edge for side in sides for edge in side if edge]
    reach = _reach([*pieces, *(p for edge in edges for p in edge)], governing, floor)
    near, far = _drawn_rails(rails, max(abs(r) for r in reach))
    figure = _figure(quantity, layout, reach, near, system)
    labels = label_values(figure, layout, pieces, edges, [(r.start, r.end, r.sign * r.value, r.label) for r in near],
                          [(m.x, m.value, m.label) for m in governing], floor)
    parts = [*_heading(quantity, figure.unit), *_wash_and_ordinates(figure, pieces),
             *(_least(figure, least) for _, least in sides if least),
             *(_worst(figure, worst) for worst, _ in sides if worst), *(_rail(figure, one) for one in near),
             base_line(figure, layout, names), _best(figure, pieces),
             *(ring for one in governing for ring in rings(figure.x(one.x), figure.y(one.value))), labels.markup]
    flat = "" if any(_reach(pieces, (), floor)) else f"{NAUGHT[quantity]} under these loads"
    ring = ("governs" if quantity == "sag" else "factored") if governing else ""
    drawn_key, foot = key(key_rows(flat=flat, worst=any(worst for worst, _ in sides), railed=bool(near),
                                      least=any(least for _, least in sides), factored=quantity != "sag"),
                    figure.bottom + 26.0 + NAME_ROW * max(name_rows(figure, layout, names)), ring=ring)
    notes = [*labels.homeless, *_beyond(far), *_left_out(labels.left_out)]
    parts += drawn_key + [svg.text(10, foot + 15 * (k + 1), note, "label-small", anchor="start", size=svg.SMALL)
                    for k, note in enumerate(notes)]
    return svg.document(WIDTH, foot + 15 * len(notes) + 8, parts, name=quantity,
                        title=f"{HEADINGS[quantity][0]} along the beam",
                        description=f"{HEADINGS[quantity][1]}. {labels.words} {' '.join(r.label + '.' for r in rails)}")


def _sides(pieces: Sequence[Piece], sign: float, floor: float) -> tuple[list[Piece], list[Piece]]:
    """The worst case on the side of its own limit, which must stay inside the rail, and on the other side, where the
    same line is only the least effect. Cut where the polynomials change sign; up to the floor counts as the other."""
    sides: tuple[list[Piece], list[Piece]] = [], []
    for start, end, c in sorted(pieces, key=lambda piece: piece[0]):
        inner = piecewise.zeros(c, np.asarray(end - start))
        cuts = [0.0, *np.sort(inner[~np.isnan(inner)]).tolist(), end - start]
        for a, b in pairwise(cuts):
            if b - a > SHORTEST:
                middle = float(piecewise.evaluate(c, np.asarray(0.5 * (a + b))))
                sides[sign * middle <= floor].append((start + a, start + b, piecewise.shifted(c, np.asarray(a))))
    return sides


def residue(quantity: Quantity, response: Response, layout: Layout) -> float:
    """Magnitudes up to this are rounding residues of the solver: not drawn as a curve, not written as a value.

    Own rule: 1e-9 of the forces, for a moment times the length of the beam, and never less than a millionth of a newton
    (loads that cancel leave no force to compare with); a nanometre for sag.
    """
    length = layout.beam.length
    forces = float(np.abs(response.reactions).sum() + np.abs(response.shear[:, 0]).max(initial=0.0)
                   + np.abs(response.moment[:, 0]).max(initial=0.0) / length)
    return {"shear": max(RESIDUE * forces, NO_FORCE), "moment": max(RESIDUE * forces * length, NO_FORCE),
            "sag": RESIDUE}[quantity]


def best_pieces(quantity: Quantity, response: Response, layout: Layout) -> list[Piece]:
    """The polynomials of the best estimate, left to right."""
    coefficients: Floats = getattr(response, quantity)
    if quantity == "sag":
        one = {name: getattr(response, name)[None, :, None, :] for name in ("shear", "moment", "slope", "sag")}
        batch = Batch(sources=("all",), x=response.x[None, :], residual=np.array([response.residual]),
                      reactions=response.reactions[None, :, None],
                      fixing_moments=response.fixing_moments[None, :, None], **one)
        coefficients = from_chord(Along(batch=batch, layouts=[layout]))[0, :, 0, :]
    return [(float(a), float(b), c) for (a, b), c in zip(pairwise(response.x), coefficients, strict=True) if b > a]


def _reach(pieces: Sequence[Piece], governing: Sequence[Mark], floor: float) -> tuple[float, float]:
    """The smallest and largest value to be drawn, zero included; exact from ends and stationary points. Zeros when all
    is below the floor."""
    values = [0.0, *(mark.value for mark in governing), *(v for many in peaks(pieces) for _, v in many)]
    return (min(values), max(values)) if max(abs(v) for v in values) > floor else (0.0, 0.0)


def _drawn_rails(rails: Sequence[Rail], largest: float) -> tuple[list[Rail], list[Rail]]:
    """The rails to draw, and those too far out. Beside a curve of zeros only the nearest rails give a scale."""
    limit = FAR * (largest or min((r.value for r in rails), default=1.0))
    return [r for r in rails if r.value <= limit], [r for r in rails if r.value > limit]


def _figure(quantity: Quantity, layout: Layout, reach: tuple[float, float], rails: Sequence[Rail],
            system: System) -> Figure:
    values = [*reach, *(r.sign * r.value for r in rails)]
    span = [DOWN[quantity] * v for v in (min(values), max(values))]
    up, down = min(span), max(span)
    size = (down - up) or 1.0
    flat = not down - up
    scale = (0.0 if flat else TALL / size) * DOWN[quantity]
    base = HEADING + AIR + (40.0 if flat else -up / size * TALL)
    bottom = HEADING + AIR + (80.0 if flat else TALL) + UNDER
    unit = show(DIMENSION[quantity], max(abs(v) for v in values) or 1e4, system).rpartition(" ")[2]
    return Figure(across=TrueScale(layout.beam.length), base=base, scale=scale, top=HEADING, bottom=bottom, unit=unit,
                  dimension=DIMENSION[quantity], system=system)


def _curves(figure: Figure, pieces: Sequence[Piece]) -> list[bezier.Curve]:
    tolerance = bezier.TOLERANCE / abs(figure.scale) if figure.scale else 0.0
    return [one for start, end, c in pieces for one in bezier.curves(start, end, c, tolerance)]


def _wash_and_ordinates(figure: Figure, pieces: Sequence[Piece]) -> list[str]:
    """A light wash between base line and curve, and thin verticals at regular places and at breakpoints."""
    wash = svg.path(bezier.path_data(_curves(figure, pieces), figure.x, figure.y, base=figure.base) + "Z", "wash",
                    fill="currentColor", fill_opacity="0.07", stroke="none")
    length = pieces[-1][1]
    breaks = [x for x, _, _ in pieces]
    regular = [length * k / 20 for k in range(21)]
    apart = 5.0 / (figure.x(length) - figure.x(0.0)) * length
    chosen = breaks + [x for x in regular if all(abs(x - b) > apart for b in breaks)]
    drawn = []
    for x in chosen:
        start, _, c = next((p for p in reversed(pieces) if p[0] <= x), pieces[0])
        y = figure.y(float(piecewise.evaluate(c, np.asarray(x - start))))
        if abs(y - figure.base) > 1.0:
            drawn.append(f"M{svg.num(figure.x(x))} {svg.num(figure.base)}L{svg.num(figure.x(x))} {svg.num(y)}")
    return [wash, svg.path("".join(drawn), "ordinate", stroke_width="0.6")] if drawn else [wash]


def _best(figure: Figure, pieces: Sequence[Piece]) -> str:
    data = bezier.path_data(_curves(figure, pieces), figure.x, figure.y, base=figure.base)
    return svg.path(data, "curve", fill="none", stroke_width="2", stroke_linejoin="round")


def _worst(figure: Figure, pieces: Sequence[Piece]) -> str:
    data = bezier.path_data(_curves(figure, pieces), figure.x, figure.y, base=figure.base)
    return svg.path(data, "curve-high", fill="none", stroke_width=WORST[0], stroke_dasharray=WORST[1])


def _least(figure: Figure, pieces: Sequence[Piece]) -> str:
    data = bezier.path_data(_curves(figure, pieces), figure.x, figure.y)
    return svg.path(data, "curve-least", fill="none", stroke_width=LEAST[0], stroke_dasharray=LEAST[1])


def _rail(figure: Figure, rail: Rail) -> str:
    """A straight line with short strokes on its outer side: the curve must not cross it."""
    x0, x1, y = figure.x(rail.start), figure.x(rail.end), figure.y(rail.sign * rail.value)
    out = 1.0 if y > figure.base else -1.0
    count = max(2, round((x1 - x0) / 9))
    ticks = "".join(f"M{svg.num(x)} {svg.num(y)}L{svg.num(x + 4)} {svg.num(y + 5 * out)}"
                    for x in (x0 + (x1 - x0 - 4) * k / count for k in range(count + 1)))
    return svg.line(x0, y, x1, y, "rail", stroke_width="2.4") + svg.path(ticks, "hatch", stroke_width="0.8")


def _heading(quantity: Quantity, unit: str) -> list[str]:
    title, sign = HEADINGS[quantity]
    return [svg.text(10, 18, f"{title}, {unit}", "name", anchor="start", size=svg.TITLE),
            svg.text(10, 34, sign, "label-small", anchor="start", size=svg.SMALL)]


def _beyond(rails: Sequence[Rail]) -> list[str]:
    return list(dict.fromkeys(f"{svg.clean(rail.label, 30)}, beyond this drawing" for rail in rails))


def _left_out(count: int) -> list[str]:
    return [f"{count} more value{'s' if count > 1 else ''} had no room here"] if count else []
