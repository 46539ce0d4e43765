"""Which forces act on the beam, cut free from its supports? A true-scale drawing that an engineer can check by hand.

Loads stand above as found, reactions below as arrows that push up (or pull down, when negative), fixing moments as curved
arrows in the sense in which the support turns the beam. Magnitudes with three figures; unfactored best estimates.
"""

from collections.abc import Sequence

from pysolver import drawing_symbols as symbols
from pysolver import svg
from pysolver.beam import finite
from pysolver.display import System, show
from pysolver.drawing_labels import Box, Place, Sheet, rows, width_of
from pysolver.drawing_loads import DrawnLoad, draw_loads, height_of
from pysolver.drawing_places import load_of
from pysolver.drawing_scheme import magnitude_words
from pysolver.found import Layout
from pysolver.loads import AppliedMoment, LineLoad, Load
from pysolver.record import Record
from pysolver.statics import Response

WIDTH = 340.0
MARGIN = 22.0
HEADING = 44.0
BEAM = 5.0
ARROW = 26.0
LINE = 16.0
NOTHING = 1e-6  # of the largest: below it a fixing moment is a rounding residue


class TrueScale:
    """Places in m across the paper, to scale."""

    def __init__(self, length: float, margin: float = MARGIN, width: float = WIDTH) -> None:
        self.left, self.right, self.length = margin, width - margin, finite(length, "length", "The length of the beam")

    def x(self, place: float) -> float:
        return self.left + (self.right - self.left) * place / self.length


def free_body(record: Record, layout: Layout, response: Response, system: System) -> str:
    """The free-body drawing as SVG. response: of all loads of the layout together, unfactored."""
    scale = TrueScale(layout.beam.length)
    loads = _loads(record, layout, scale, system)
    y = HEADING + max(height_of(loads, WIDTH), 20.0) + BEAM / 2
    under = y + BEAM / 2
    reactions, depth = _reactions(record, layout, response, scale, under, system)
    dimensions, foot = _dimensions(layout, scale, under + depth + 12, system)
    parts = [svg.text(10, 18, "Free body, unfactored, to scale", "name", anchor="start", size=svg.TITLE),
             svg.text(10, 34, f"all loads as found; beam {show('length', layout.beam.length, system)} long", "label-small",
                      anchor="start", size=svg.SMALL),
             draw_loads(loads, y - BEAM / 2, WIDTH).markup,
             svg.line(scale.left, y, scale.right, y, "beam", stroke_width=svg.num(BEAM)),
             *(symbols.hinge(scale.x(x), y) for x in layout.beam.hinges),
             _fixing(response, layout, scale, y, system), reactions, dimensions]
    names = ", ".join(f"{record['supports'][j]['name']} {show('force', float(r), system)}"
                      for j, r in zip(layout.real, response.reactions, strict=True))
    return svg.document(WIDTH, foot, parts, name="free-body", title="Free body of the beam with its reactions",
                        description=f"Reactions, positive up: {names}.")


def _loads(record: Record, layout: Layout, scale: TrueScale, system: System) -> list[DrawnLoad]:
    own = load_of(record, layout)
    drawn = []
    for i, load in enumerate(layout.loads):
        permanent = i < own or record["loads"][i - own]["category"] == "permanent"
        drawn.append(_drawn(load, permanent, "own weight " * (i < own), scale, system))
    return drawn


def _drawn(load: Load, permanent: bool, words: str, scale: TrueScale, system: System) -> DrawnLoad:
    if isinstance(load, LineLoad):
        form, x0, x1, start, end = "line", load.start, load.end, load.start_intensity, load.end_intensity
    elif isinstance(load, AppliedMoment):
        form, x0, x1, start, end = "moment", load.x, load.x, load.moment, load.moment
    else:
        form, x0, x1, start, end = "point", load.x, load.x, load.force, load.force
    return DrawnLoad(form=form, x0=scale.x(x0), x1=scale.x(x1), start=start, end=end, permanent=permanent,
                     label=words + magnitude_words(form, start, end, system))


def _reactions(record: Record, layout: Layout, response: Response, scale: TrueScale, under: float,
               system: System) -> tuple[str, float]:
    """The reactions with their values in as many rows as they need, and the depth they take."""
    xs = [scale.x(layout.supports[j]) for j in layout.real]
    words = [f"{svg.clean(record['supports'][j]['name'], 9)} {show('force', float(r), system)}"
             for j, r in zip(layout.real, response.reactions, strict=True)]
    halves = [width_of(one) / 2 + 4 for one in words]
    middles = [min(max(x, half), WIDTH - half) for x, half in zip(xs, halves, strict=True)]
    levels = rows([(m - half, m + half) for m, half in zip(middles, halves, strict=True)])
    parts = []
    for x, middle, one, level, r in zip(xs, middles, words, levels, response.reactions, strict=True):
        top, tail = under + 2, under + 2 + ARROW
        shaft = symbols.arrow(x, top, tail, 8) if r < 0 else symbols.arrow(x, tail, top, 8)
        parts.append(svg.path(shaft, "reaction", fill="none", stroke_width="2.2"))
        if level:
            parts.append(_leader(x, tail, tail + level * LINE, [m - h for m, h in zip(middles, halves, strict=True)],
                                 [m + h for m, h in zip(middles, halves, strict=True)], levels, level))
        parts.append(svg.text(middle, tail + 14 + level * LINE, one, "label"))
    return "".join(parts), 2 + ARROW + 18 + max(levels, default=0) * LINE


def _leader(x: float, top: float, bottom: float, left: Sequence[float], right: Sequence[float], levels: Sequence[int],
            level: int) -> str:
    """A thin line from an arrow to its value in a lower row, left out beside the values of the rows between."""
    open_rows = [k for k in range(level)
                 if not any(a < x < b for a, b, row in zip(left, right, levels, strict=True) if row == k)]
    return "".join(svg.line(x, top + k * LINE + 2, x, min(top + (k + 1) * LINE + 2, bottom + 2), "ordinate", stroke_width="0.6")
                   for k in open_rows)


def _fixing(response: Response, layout: Layout, scale: TrueScale, y: float, system: System) -> str:
    """Curved arrows at the supports that hold the beam against turning; the value stands beside the arrow below."""
    largest = max([abs(float(m)) for m in response.fixing_moments] + [1.0])
    parts = []
    for j, moment in zip(layout.real, response.fixing_moments, strict=True):
        if abs(float(moment)) <= NOTHING * largest:
            continue
        x = scale.x(layout.supports[j])
        words = show("moment", abs(float(moment)), system)
        at_right = x + 18 + width_of(words) < WIDTH - 4
        parts.append(svg.path(symbols.curved_arrow(x, y, 15, clockwise=float(moment) > 0), "reaction", fill="none",
                              stroke_width="2"))
        parts.append(svg.text(x + (19 if at_right else -19), y + 19, words, "label", anchor="start" if at_right else "end"))
    return "".join(parts)


def _dimensions(layout: Layout, scale: TrueScale, y: float, system: System) -> tuple[str, float]:
    """Dimension lines of overhangs and spans; lengths that do not fit across are written upwards below the line."""
    edges = sorted({0.0, *layout.supports, layout.beam.length})
    sections = [(a, b) for a, b in zip(edges, edges[1:], strict=False) if b - a > 1e-6]
    words = [show("length", b - a, system) for a, b in sections]
    flat = all(width_of(one) + 6 < scale.x(b) - scale.x(a) for one, (a, b) in zip(words, sections, strict=True))
    line = y + (12.0 if flat else 4.0)
    parts = [symbols.dimension(scale.x(a), scale.x(b), line, one if flat else "")
             for one, (a, b) in zip(words, sections, strict=True)]
    parts += [svg.line(scale.x(x), line - 8, scale.x(x), line + 5, "dim", stroke_width="0.6") for x in edges]
    if flat:
        return "".join(parts), line + 12
    tallest = max(width_of(one) for one in words)
    sheet = Sheet(frame=Box(x0=0, y0=0, x1=WIDTH, y1=1e6))
    for one, (a, b) in zip(words, sections, strict=True):
        middle = 0.5 * (scale.x(a) + scale.x(b)) + 4
        written = sheet.write(one, [Place(x=middle, y=line + 9, anchor="end", turned=True)])
        parts.append(written or "")
    return "".join(parts), line + 16 + tallest
