"""Which forces act on the beam, cut free from its supports? A true-scale drawing that an engineer can check by hand.

Loads stand above as found, reactions below as arrows that push up (or pull down, when negative), fixing moments as
curved arrows in the sense in which the support turns the beam. Three figures; unfactored best estimates.
"""

from collections.abc import Sequence
from itertools import pairwise

from pysolver import drawing_symbols as symbols
from pysolver import svg
from pysolver.beam import SHORTEST, finite
from pysolver.display import System, show
from pysolver.drawing_labels import rows, width_of
from pysolver.drawing_loads import DrawnLoad, draw_loads, height_of
from pysolver.drawing_places import load_of
from pysolver.drawing_scheme import magnitude_words
from pysolver.drawing_symbols import BEAM
from pysolver.found import Layout
from pysolver.loads import AppliedMoment, LineLoad, Load
from pysolver.record import Record
from pysolver.statics import Response

WIDTH = 340.0
MARGIN = 22.0
HEADING = 44.0
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
             svg.text(10, 34, f"all loads as found; beam {show('length', layout.beam.length, system)} long",
                      "label-small", anchor="start", size=svg.SMALL),
             draw_loads(loads, y - BEAM / 2, WIDTH).markup,
             symbols.beam(scale.left, scale.right, y, [scale.x(x) for x in layout.beam.hinges]),
             *(symbols.hinge(scale.x(x), y) for x in layout.beam.hinges),
             _fixing(response, layout, scale, y), reactions, dimensions]
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
    largest = _largest_fixing(response)
    words = [f"{svg.clean(record['supports'][j]['name'], 9)} {_given(float(r), float(m), largest, system)}"
             for j, r, m in zip(layout.real, response.reactions, response.fixing_moments, strict=True)]
    halves = [width_of(one) / 2 + 4 for one in words]
    middles = [min(max(x, half), WIDTH - half) for x, half in zip(xs, halves, strict=True)]
    levels = rows([(m - half, m + half) for m, half in zip(middles, halves, strict=True)])
    parts = []
    for x, middle, one, level, r in zip(xs, middles, words, levels, response.reactions, strict=True):
        top, tail = under + 2, under + 2 + ARROW
        shaft = symbols.arrow(x, top, tail, 8) if r < 0 else symbols.arrow(x, tail, top, 8)
        if abs(r) > NOTHING * max(1.0, float(abs(response.reactions).max())):
            parts.append(svg.path(shaft, "reaction", fill="none", stroke_width="2.2"))
        if level:
            parts.append(_leader(x, tail, [m - h for m, h in zip(middles, halves, strict=True)],
                                 [m + h for m, h in zip(middles, halves, strict=True)], levels, level))
        parts.append(svg.text(middle, tail + 14 + level * LINE, one, "label"))
    return "".join(parts), 2 + ARROW + 18 + max(levels, default=0) * LINE


def _leader(x: float, top: float, left: Sequence[float], right: Sequence[float], levels: Sequence[int],
            level: int) -> str:
    """A thin line from an arrow to its value in a lower row, left out beside the values of the rows between."""
    open_rows = [k for k in range(level)
                 if not any(a < x < b for a, b, row in zip(left, right, levels, strict=True) if row == k)]
    return "".join(svg.line(x, top + k * LINE + 2, x, top + (k + 1) * LINE + 2, "ordinate", stroke_width="0.6")
                   for k in open_rows)


def _given(force: float, moment: float, largest: float, system: System) -> str:
    """What a support gives: its reaction and, where it holds the beam against turning, the size of that moment."""
    turning = f", {show('moment', abs(moment), system)}" if abs(moment) > NOTHING * largest else ""
    return show("force", force, system) + turning


def _largest_fixing(response: Response) -> float:
    return max(1.0, float(abs(response.fixing_moments).max(initial=0.0)))


def _fixing(response: Response, layout: Layout, scale: TrueScale, y: float) -> str:
    """Curved arrows at the supports that hold the beam against turning; the value stands with the reaction."""
    largest = _largest_fixing(response)
    parts = []
    for j, moment in zip(layout.real, response.fixing_moments, strict=True):
        if abs(float(moment)) <= NOTHING * largest:
            continue
        x = scale.x(layout.supports[j])
        parts.append(svg.path(symbols.curved_arrow(x, y, 15, clockwise=float(moment) > 0), "reaction", fill="none",
                              stroke_width="2"))
    return "".join(parts)


def _dimensions(layout: Layout, scale: TrueScale, y: float, system: System) -> tuple[str, float]:
    """Dimension lines of overhangs and spans; a length that does not fit across is written upwards below its line."""
    edges = sorted({0.0, *layout.supports, layout.beam.length})
    parts, deepest = [], 12.0
    line = y + 12.0
    for a, b in pairwise(edges):
        x0, x1, words = scale.x(a), scale.x(b), show("length", b - a, system)
        if b - a < SHORTEST:
            continue
        if width_of(words) + 4 < x1 - x0:
            parts.append(symbols.dimension(x0, x1, line, words))
        else:
            turned = svg.text(0.5 * (x0 + x1) + 4, line + 10, words, anchor="end", turned=True) if x1 - x0 > 14 else ""
            parts.append(symbols.dimension(x0, x1, line, "") + turned)
            deepest = max(deepest, width_of(words) + 16)
    parts += [svg.line(scale.x(x), line - 8, scale.x(x), line + 5, "dim", stroke_width="0.6") for x in edges]
    return "".join(parts), line + deepest
