"""How is a drawing written as SVG? Strings in, one markup string out; every text is escaped here and nowhere else.

Coordinates are viewBox units (one CSS pixel at natural size), x to the right, y down. No colours, no style, no script
and nothing external: parts carry classes that the page's style sheet inks. `currentColor` on the root keeps a drawing
readable where no style sheet is loaded (a printed report, a file opened by itself); any class rule overrides it.
"""

import math
from collections.abc import Iterable, Sequence
from html import escape as escape_html

from pysolver.errors import InternalError

SMALL = 12.0  # font sizes; nothing smaller is written
PLAIN = 13.0
TITLE = 15.0

# not allowed in XML 1.0 (chapter 2.2: controls, surrogates, U+FFFE, U+FFFF), or able to turn round the reading order
_BANNED = [*range(0x20), *range(0x7F, 0xA0), *range(0x200E, 0x2010), *range(0x2028, 0x202F), *range(0x2066, 0x206A),
           *range(0xD800, 0xE000), 0xFFFE, 0xFFFF]
_CLEAN = dict.fromkeys(_BANNED, " ")

Point = tuple[float, float]


def num(value: float) -> str:
    """A coordinate to a thousandth of a unit. InternalError when it is not finite: it would void the whole drawing."""
    if not math.isfinite(value):
        raise InternalError(code="drawing", message=f"A coordinate of a drawing is {value}.")
    shown = f"{value:.3f}".rstrip("0").rstrip(".")
    return "0" if shown == "-0" else shown


def clean(text: str, longest: int = 200) -> str:
    """A text from a record, still unescaped: without what XML forbids, cut to `longest` characters with an ellipsis."""
    one_line = " ".join(text.translate(_CLEAN).split())
    return one_line if len(one_line) <= longest else one_line[:longest - 1].rstrip() + "…"


def text(x: float, y: float, words: str, classes: str = "label", *, anchor: str = "middle", size: float = PLAIN,
         turned: bool = False) -> str:
    """One line of text with its baseline at y. anchor: start, middle or end. turned: reads from bottom to top."""
    turn = f' transform="rotate(-90 {num(x)} {num(y)})"' if turned else ""
    return (f'<text{_class(classes)} x="{num(x)}" y="{num(y)}" text-anchor="{anchor}" font-size="{num(size)}"'
            f' fill="currentColor" stroke="none"{turn}>{escape_html(clean(words))}</text>')


def line(x0: float, y0: float, x1: float, y1: float, classes: str, **extra: str) -> str:
    return f'<line{_class(classes)} x1="{num(x0)}" y1="{num(y0)}" x2="{num(x1)}" y2="{num(y1)}"{_extra(extra)}/>'


def path(d: str, classes: str, **extra: str) -> str:
    """d: path data made with num()."""
    return f'<path{_class(classes)} d="{d}"{_extra(extra)}/>'


def polyline(points: Sequence[Point], classes: str, *, closed: bool = False, **extra: str) -> str:
    d = "M" + "L".join(f"{num(x)} {num(y)}" for x, y in points) + ("Z" if closed else "")
    return path(d, classes, **extra)


def rect(x: float, y: float, width: float, height: float, classes: str, **extra: str) -> str:
    return (f'<rect{_class(classes)} x="{num(x)}" y="{num(y)}" width="{num(width)}" height="{num(height)}"'
            f'{_extra(extra)}/>')


def circle(x: float, y: float, radius: float, classes: str, **extra: str) -> str:
    return f'<circle{_class(classes)} cx="{num(x)}" cy="{num(y)}" r="{num(radius)}"{_extra(extra)}/>'


def group(parts: Iterable[str], classes: str, **extra: str) -> str:
    return f'<g{_class(classes)}{_extra(extra)}>{"".join(parts)}</g>'


def _class(classes: str) -> str:
    """Nothing for a part that takes the ink of its group."""
    return f' class="{escape_html(classes)}"' if classes else ""


def _extra(extra: dict[str, str]) -> str:
    """Presentation attributes, as stroke_width="2"."""
    return "".join(f' {name.replace("_", "-")}="{escape_html(value)}"' for name, value in extra.items())


def hatched(x: float, y: float, width: float, height: float, step: float = 5.0) -> str:
    """Strokes at 45 degrees, rising to the right, cut to a rectangle: the mark of something solid and cut through."""
    strokes = []
    k = 1
    while k * step < width + height:
        c = k * step  # strokes lie on u + v = c, u from the left and v from the top
        u0, u1 = max(0.0, c - height), min(width, c)
        if u1 - u0 > 0.5:
            strokes.append(f"M{num(x + u0)} {num(y + c - u0)}L{num(x + u1)} {num(y + c - u1)}")
        k += 1
    return path("".join(strokes), "hatch", stroke_width="0.8") if strokes else ""


def document(width: float, height: float, parts: Iterable[str], *, name: str, title: str, description: str) -> str:
    """The whole drawing. name: makes the ids of title and description differ between drawings on one page."""
    ids = f"asfound-{name}-title", f"asfound-{name}-desc"
    return (f'<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 {num(width)} {num(height)}" role="img"'
            f' aria-labelledby="{ids[0]} {ids[1]}" fill="none" stroke="currentColor" font-family="sans-serif">'
            f'<title id="{ids[0]}">{escape_html(clean(title))}</title>'
            f'<desc id="{ids[1]}">{escape_html(clean(description, 2000))}</desc>'
            f'{"".join(parts)}</svg>')
