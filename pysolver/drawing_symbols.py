"""How are supports, arrows, moments and dimensions drawn, and which key explains the lines of a curve?

Ink symbols of the drawing office, told apart by shape alone. Viewbox units, y down.
(x, y) of a support is the place where the underside of the beam rests on it.
"""

import math
from collections.abc import Sequence

from pysolver.svg import SMALL, Point, circle, group, hatched, line, num, path, polyline, rect, text

HALF_WALL = 16.0
WALL = 15.0  # depth of the hatched wall
PLATE = 4.0
BEAM = 5.0  # depth of the bar
RING = 5.0  # radius of a hinge
KEY_LINE = 15.0  # from one row of the key to the next
SAMPLE = 26.0  # length of a sample
LEFT = 10.0
WORDS = LEFT + SAMPLE + 8
RING_AT = 236.0  # the ring shares the row of the best estimate
WORST, LEAST = ("1.8", "7 4"), ("1", "1 4")  # stroke width and dashes

KeyRow = tuple[str, str]  # class of a line of the key ("" for a row of words only), words


def support(kind: str | None, x: float, y: float, *, side: int = 0, rotational: bool = False) -> str:
    """The symbol of one support. side: -1 at the left end of the beam, 1 at the right end, 0 between."""
    draw = {"bearing": _bearing, "pinned": _held_down, "spring": _spring}
    if kind == "fixed":
        parts = _built_in(x, y, side)
    elif kind == "free":
        parts = free_end(x, y, side or 1)
    elif kind in draw:
        parts = draw[kind](x, y)
    else:
        parts = _not_known(x, y)
    if rotational and kind not in ("fixed", "free"):
        parts += path(_spiral(x, y - 4), "ground", fill="none")
    return parts


def _wall(x: float, y: float) -> str:
    """A hatched block with its top at y."""
    return (hatched(x - HALF_WALL, y, 2 * HALF_WALL, WALL)
            + polyline([(x - HALF_WALL, y + WALL), (x - HALF_WALL, y), (x + HALF_WALL, y), (x + HALF_WALL, y + WALL)],
                       "ground", stroke_width="1.2"))


def _bearing(x: float, y: float) -> str:
    return _wall(x, y + PLATE) + rect(x - 11, y, 22, PLATE, "support")


def _held_down(x: float, y: float) -> str:
    """A plate with a bolt at either side: head above the plate, shank into the wall."""
    bolts = "".join(line(x + dx, y - 5, x + dx, y + PLATE + 10, "support", stroke_width="2")
                    + line(x + dx - 3.5, y - 5, x + dx + 3.5, y - 5, "support", stroke_width="2.5") for dx in (-11, 11))
    return _wall(x, y + PLATE) + rect(x - 15, y, 30, PLATE, "support") + bolts


def _spring(x: float, y: float) -> str:
    turns = [(x, y)] + [(x + (6 if k % 2 else -6), y + 3 + 3 * k) for k in range(5)] + [(x, y + 18)]
    return (polyline(turns, "support", fill="none", stroke_width="1.6") + line(x - 12, y + 18, x + 12, y + 18, "ground")
            + hatched(x - 12, y + 18, 24, 5, 4))


def _built_in(x: float, y: float, side: int) -> str:
    """A hatched block above and below; at an end of the beam the beam runs into its face."""
    wide = 16.0
    left = {-1: x - wide, 1: x, 0: x - wide / 2}[side]
    top, height = y - 23.0, 42.0
    if side == 0:
        return "".join(hatched(left, a, wide, 15) + rect(left, a, wide, 15, "ground") for a in (y - 23, y))
    return (hatched(left, top, wide, height)
            + line(x, top, x, top + height, "support", stroke_width="2.6"))


def free_end(x: float, y: float, side: int) -> str:
    """Nothing below: an upright stroke just off the tip."""
    return line(x + 7 * side, y - 13, x + 7 * side, y + 8, "free-end", stroke_width="1.6", stroke_dasharray="3 3")


def _not_known(x: float, y: float) -> str:
    triangle = polyline([(x, y), (x - 13, y + 20), (x + 13, y + 20)], "support unread", closed=True,
                        stroke_dasharray="2 3")
    return triangle + text(x, y + 18, "?", "label unread")


def _spiral(x: float, y: float) -> str:
    points = [(x + (4 + t) * math.cos(t), y + (4 + t) * math.sin(t)) for t in (0.25 * math.pi * k for k in range(10))]
    return "M" + "L".join(f"{num(a)} {num(b)}" for a, b in points)


def name(x: float, y: float, words: str) -> str:
    """A name in a circle; a longer one in a box with round ends."""
    short = _short(words)
    if len(short) <= 2:
        return circle(x, y, 10.5, "axis", stroke_width="1.2", fill="none") + text(x, y + 5, short, "name", size=14)
    half = name_half(words)
    return (rect(x - half, y - 10.5, 2 * half, 21, "axis", rx="10.5", stroke_width="1.2", fill="none")
            + text(x, y + 5, short, "name", size=14))


def _short(words: str) -> str:
    short = words.strip() or "?"
    return short if len(short) <= 9 else short[:8] + "…"


def name_half(words: str) -> float:
    """Half the width of a name in its circle or box."""
    short = _short(words)
    return 10.5 if len(short) <= 2 else 5.0 * len(short) + 5


def beam(left: float, right: float, y: float, hinges: Sequence[float]) -> str:
    """The bar of the beam, parted at its hinges so that their rings stay open."""
    edges = [left, *(e for x in sorted(hinges) for e in (x - RING - BEAM / 2, x + RING + BEAM / 2)), right]
    bars = zip(edges[::2], edges[1::2], strict=True)
    return "".join(line(a, y, b, y, "beam", stroke_width=num(BEAM)) for a, b in bars if b > a)


def hinge(x: float, y: float, *, unread: bool = False) -> str:
    """A ring on the axis of the beam."""
    extra = text(x, y - 9, "?", "label unread") if unread else ""
    return circle(x, y, RING, "hinge unread" if unread else "hinge", stroke_width="2") + extra


def arrow(x: float, start: float, end: float, head: float = 6.0) -> str:
    """An upright arrow from start to its head at end, as path data."""
    way = 1.0 if end > start else -1.0
    back = num(end - way * head)
    return (f"M{num(x)} {num(start)}L{num(x)} {num(end)}"
            f"M{num(x - head / 2)} {back}L{num(x)} {num(end)}L{num(x + head / 2)} {back}")


def curved_arrow(x: float, y: float, radius: float, *, clockwise: bool) -> str:
    """Over the top of (x, y) from one side to the other, the head pointing down, as path data."""
    way = 1.0 if clockwise else -1.0
    dx, dy = radius * math.sin(math.radians(70)), radius * math.cos(math.radians(70))
    start, end = (x - way * dx, y + dy), (x + way * dx, y + dy)
    # the tangent at the end of the turn, from which the two strokes of the head are laid back
    tangent = math.atan2(dx, -way * dy)
    # the arc bends away from its tangent, so both strokes are turned a little towards the centre
    strokes = [(end[0] - 7 * math.cos(tangent + t), end[1] - 7 * math.sin(tangent + t))
               for t in (0.5 - 0.2 * way, -0.5 - 0.2 * way)]
    tip = f"{num(end[0])} {num(end[1])}"
    return (f"M{num(start[0])} {num(start[1])}A{num(radius)} {num(radius)} 0 1 {1 if clockwise else 0} {tip}"
            + "".join(f"M{num(a)} {num(b)}L{tip}" for a, b in strokes))


def dimension(x0: float, x1: float, y: float, words: str, *, below: str = "", known: bool = True) -> str:
    """A dimension line with short oblique strokes at its ends, its length above it and a remark below it."""
    strokes = "".join(f"M{num(x - 3.5)} {num(y + 3.5)}L{num(x + 3.5)} {num(y - 3.5)}" for x in (x0, x1))
    middle = 0.5 * (x0 + x1)
    parts = [path(f"M{num(x0 - 4)} {num(y)}L{num(x1 + 4)} {num(y)}", "", stroke_width="0.8"),
             path(strokes, "", stroke_width="1.4")]
    if words:
        parts.append(text(middle, y - 5, words, "label" if known else "label unread"))
    if below:
        parts.append(text(middle, y + 13, below, "label-small", size=SMALL))
    return group(parts, "dim")


def cross_section(x: float, y: float) -> str:
    """The section turned into the paper under the beam: the place to touch for the member itself."""
    outline: list[Point] = [(x - 5, y), (x + 5, y), (x + 5, y + 18), (x - 5, y + 18)]
    return hatched(x - 5, y, 10, 18, 4) + polyline(outline, "ground", closed=True, stroke_width="1.2")


def key_rows(*, flat: str, worst: bool, least: bool, railed: bool, factored: bool) -> list[KeyRow]:
    """flat: the words of a curve that is nowhere different from zero, else empty. worst, least, railed: what is drawn;
    factored: whether the worst case carries factors (sag never does)."""
    rows = [("", flat)] if flat else [("curve", "best estimate, unfactored")]
    if worst:
        rows.append(("curve-high", f"worst case, {'with the factors of the limit' if factored else 'unfactored'}" + ":" * railed))
        rows += [("", "the line to be kept inside the rails")] if railed else []
    return [*rows, ("curve-least", "least effect: only to look at")] if least else rows


def key(rows: Sequence[KeyRow], top: float, *, ring: str) -> tuple[list[str], float]:
    """Markup, and the ordinate below it. ring: also the mark of a governing place, with these words."""
    parts = []
    for k, (kind, words) in enumerate(rows):
        y = top + KEY_LINE * (k + 1)
        bare = not kind and k == 0
        parts += [_sample(kind, y - 4)] if kind else []
        parts.append(text(LEFT if bare else WORDS, y, words, "label-small", anchor="start", size=SMALL))
    if ring:
        parts += [*rings(RING_AT, top + KEY_LINE - 4, (3, 6)),
                  text(RING_AT + 12, top + KEY_LINE, ring, "label-small", anchor="start", size=SMALL)]
    return parts, top + KEY_LINE * len(rows)


def rings(x: float, y: float, radii: Sequence[float] = (4, 8)) -> list[str]:
    return [circle(x, y, radius, "gov", stroke_width="1.4", fill="none") for radius in radii]


def _sample(kind: str, y: float) -> str:
    dashes = {"curve-high": WORST, "curve-least": LEAST}.get(kind)
    extra = {"stroke_width": "2"} if dashes is None else {"stroke_width": dashes[0], "stroke_dasharray": dashes[1]}
    return line(LEFT, y, LEFT + SAMPLE, y, kind, **extra)
