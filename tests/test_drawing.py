"""Do the drawings show what was solved and what was entered, whatever was entered?

Curves are held against the polynomials themselves (numpy.polynomial), control points against the de Casteljau rule
worked out here, markup against the XML parser of the standard library. Beams are built from an empty record.
"""

import json
import math
import re
import xml.etree.ElementTree as ET
from collections.abc import Sequence
from itertools import pairwise
from typing import Any

import numpy as np
import pytest
from numpy.polynomial import polynomial

from pysolver import drawing, drawing_bezier, drawing_curves
from pysolver.answer import answer
from pysolver.check import run_check
from pysolver.demo import demo
from pysolver.drawing import Mark, Rail
from pysolver.found import Layout, lay_out
from pysolver.frame import Reading
from pysolver.readings import Readings, read_all
from pysolver.record import Record, blank, blank_support, validated
from pysolver.statics import Response, solve

SVG = "{http://www.w3.org/2000/svg}"
HOSTILE = "<script>alert('1')</script> & \"two\" ]]> \x01\u202e\ud800"
NUMBER = r"-?\d+(?:\.\d+)?"


def written(text: str, unit: str, means: str = "exact") -> dict[str, Any]:
    return {"text": text, "unit": unit, "means": means}


def at(support: int, side: str, distance: str) -> dict[str, Any]:
    return {"from": "support", "support": support, "side": side, "at": "centre", "to": "middle",
            "distance": written(distance, "m")}


def load(number: int, form: str | None, magnitude: str | None, position: Any = None, **other: Any) -> dict[str, Any]:
    unit = {"point": "kN", "line": "kN/m", "moment": "kN·m"}.get(form or "", "kN")
    return {"id": f"l{number}", "name": f"load {number}", "category": "stored", "form": form,
            "magnitude": written(magnitude, unit) if magnitude else None, "magnitude_end": None, "position": position,
            "length": None, "whole_beam": False, "source": "", "removable": None, "note": "", "photos": [], **other}


def record_of(lengths: Sequence[str | None], kinds: Sequence[str | None], loads: list[Any] | None = None,
              hinges: list[Any] | None = None, right: str | None = None) -> Record:
    record = blank()
    record["spans"] = [{"measure": "centres", "length": written(one, "m") if one else None, "drawn": None}
                       for one in lengths]
    record["supports"] = [blank_support(i) | {"kind": kind} for i, kind in enumerate(kinds)]
    for one in record["supports"]:
        if one["kind"] == "spring":
            one["stiffness"] = written("5000", "kN/m")
    record["overhangs"]["right"] = written(right, "m") if right else None
    record["loads"], record["hinges"] = loads or [], [{"position": one} for one in hinges or []]
    record["section"]["stiffness"] = written("20000", "kN·m²")
    return record


def solved(record: Record) -> tuple[Readings, Layout, Response]:
    readings = read_all(record)
    assert not readings.errors
    layout = lay_out(record, readings, {p: m.best for p, m in readings.measured.items()}.__getitem__, Reading())
    return readings, layout, solve(layout.beam, layout.loads)


def varied() -> Record:
    """Three spans and an overhang with every kind of load, a hinge and four kinds of support."""
    return record_of(["5.2", "3.1", "6.0"], ["fixed", "bearing", "spring", "pinned"], [
        load(1, "line", "6", at(0, "right", "2.0"), magnitude_end=written("14", "kN/m"), length=written("3.0", "m")),
        load(2, "point", "20", at(1, "right", "1.5")), load(3, "moment", "8", at(2, "right", "2.0")),
        load(4, "line", "3", whole_beam=True, category="permanent"), load(5, "point", "-4", at(3, "right", "0.9"))],
        hinges=[at(1, "right", "0.8")], right="1.2")


def twelve() -> Record:
    forms = ["point", "line", "point", "moment"]
    loads = [load(i, forms[i % 4], str(3 + i % 7), at(i % 12, "right", f"{0.7 + 0.3 * (i % 8):.2f}"),
                  length=written("0.9", "m")) for i in range(40)]
    return record_of(["4.0"] * 5 + ["6.0"] + ["3.2"] * 6, ["bearing"] * 6 + ["pinned"] + ["bearing"] * 6, loads)


def curve(quantity: drawing_curves.Quantity, record: Record, rails: list[Rail] | None = None,
          marks: list[Mark] | None = None, worst: float | None = None) -> str:
    _, layout, response = solved(record)
    high = [(a, b, worst * c) for a, b, c in drawing_curves.best_pieces(quantity, response, layout)] if worst else None
    return drawing.curve(quantity, response, layout, high=high, low=None, rails=rails or [], governing=marks or [],
                         system="metric")


def every_drawing(record: Record) -> list[str]:
    readings, layout, response = solved(record)
    rails = [Rail(start=0.0, end=layout.beam.length, value=value, sign=sign, label=f"limit {value:g}")
             for value in (9.0, 3e4, 1e12) for sign in (1, -1)]
    marks = [Mark(x=layout.beam.length / 3, value=float(response.moment[0, 0]), label="governs")]
    curves = [drawing.curve(q, response, layout, high=None, low=None, rails=rails, governing=marks, system=system)
              for q in ("shear", "moment", "sag") for system in ("metric", "us")]
    return [drawing.working(record, layout, readings).svg, drawing.working(record, None, readings).svg,
            drawing.free_body(record, layout, response, "metric"), *curves]


def parsed(markup: str) -> ET.Element:
    return ET.fromstring(markup)


def path_of(markup: str, name: str) -> str:
    return next(e.attrib["d"] for e in parsed(markup).iter(f"{SVG}path") if e.attrib.get("class") == name)


def beziers(data: str) -> list[tuple[tuple[float, float], ...]]:
    """The cubic pieces of path data in absolute M, L and C, each as its four control points."""
    pieces, here = [], (0.0, 0.0)
    for command, numbers in re.findall(rf"([MLC])((?:\s*{NUMBER}\s*)+)", data):
        values = [float(n) for n in re.findall(NUMBER, numbers)]
        points = list(zip(values[::2], values[1::2], strict=True))
        if command == "C":
            pieces.append((here, *points))
        here = points[-1]
    return pieces


def de_casteljau(ordinates: Any, t: float) -> float:
    points = list(ordinates)
    while len(points) > 1:
        points = [(1 - t) * a + t * b for a, b in pairwise(points)]
    return float(points[0])


def texts(markup: str) -> list[str]:
    return [e.text or "" for e in parsed(markup).iter(f"{SVG}text")]


# --- curves ---------------------------------------------------------------------------------------------------------


@pytest.mark.parametrize("degree", [0, 1, 2, 3])
def test_a_polynomial_up_to_a_cubic_is_one_bezier_without_error(degree: int) -> None:
    rng = np.random.default_rng(degree)
    for _ in range(40):
        length, c = rng.uniform(0.01, 12.0), rng.normal(size=degree + 1) * 10.0 ** rng.uniform(-3, 6)
        [(start, end, ordinates)] = drawing_bezier.curves(2.0, 2.0 + length, c, 1.0)
        assert (start, end) == (2.0, 2.0 + length)
        scale = np.abs(polynomial.polyval(np.linspace(0, length, 30), c)).max()
        for t in rng.uniform(size=10):
            assert abs(de_casteljau(ordinates, t) - polynomial.polyval(t * length, c)) <= 1e-9 * scale


def test_a_quintic_is_cut_so_that_no_part_is_farther_than_the_tolerance_and_no_finer_than_the_bound_asks() -> None:
    rng = np.random.default_rng(5)
    for _ in range(40):
        length, c = rng.uniform(0.5, 9.0), rng.normal(size=6) / 9.0 ** np.arange(6)
        tolerance = 10.0 ** rng.uniform(-4, -1)
        parts = drawing_bezier.curves(0.0, length, c, tolerance)
        worst = max(abs(de_casteljau(b, t) - polynomial.polyval(start + t * (end - start), c))
                    for start, end, b in parts for t in np.linspace(0, 1, 21))
        assert worst <= tolerance * (1 + 1e-9)
        fourth = np.abs(polynomial.polyval(np.array([0.0, length]), polynomial.polyder(c, 4))).max()
        assert (length / max(len(parts) - 1, 1)) ** 4 / 384 * fourth > tolerance or len(parts) == 1


@pytest.mark.parametrize(("quantity", "allowed"), [("shear", 0.002), ("moment", 0.002), ("sag", 0.05)])
def test_the_drawn_curve_is_the_solved_polynomial_everywhere(quantity: drawing_curves.Quantity, allowed: float) -> None:
    """allowed in drawing units: coordinates are rounded to 0.001; sag as promised."""
    record = varied()
    _, layout, response = solved(record)
    pieces = drawing_curves.best_pieces(quantity, response, layout)
    drawn = beziers(path_of(curve(quantity, record), "curve"))
    assert len(drawn) >= len(pieces)
    across = np.array([p[0][0] for p in drawn] + [drawn[-1][3][0]])
    metres = layout.beam.length / (across[-1] - across[0])

    def exact(x: float) -> float:
        start, _, c = next(p for p in pieces if x <= p[1] + 1e-12)
        return float(polynomial.polyval(x - start, c))

    samples = [(de_casteljau([p[1] for p in piece], t), (de_casteljau([p[0] for p in piece], t) - across[0]) * metres)
               for piece in drawn if piece[3][0] - piece[0][0] > 0.5 for t in (0.11, 0.37, 0.5, 0.83)]
    y, v = np.array([s[0] for s in samples]), np.array([exact(s[1]) for s in samples])
    slope, base = np.polyfit(v, y, 1)
    steepest = max(abs(polynomial.polyval(np.linspace(0, b - a, 9), polynomial.polyder(c))).max() for a, b, c in pieces)
    steep = 0.002 * abs(slope) * metres * steepest
    assert np.abs(base + slope * v - y).max() <= allowed + steep
    assert (slope < 0) == (quantity == "shear"), "shear up, sagging and sag down"


def test_jumps_of_shear_and_moment_are_upright_strokes() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "1.0")),
                                                        load(2, "moment", "6", at(0, "right", "3.0"))])
    places: tuple[tuple[drawing_curves.Quantity, float], ...] = (("shear", 1.0), ("moment", 3.0))
    for quantity, place in places:
        data = path_of(curve(quantity, record), "curve")
        points = [(float(a), float(b)) for a, b in re.findall(rf"[ML]({NUMBER}) ({NUMBER})", data)]
        ends = [p[3] for p in beziers(data)]
        x = 22.0 + 296.0 * place / 4.0
        starts = [y for px, y in points if abs(px - x) < 0.01]
        stops = [y for px, y in ends if abs(px - x) < 0.01]
        assert starts, quantity
        assert stops
        assert max(abs(a - b) for a in starts for b in stops) > 20.0


def test_a_sagging_moment_is_drawn_below_the_base_line_and_the_drawing_says_so() -> None:
    markup = curve("moment", record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "2.0"))]))
    base = next(float(e.attrib["y1"]) for e in parsed(markup).iter(f"{SVG}line") if e.attrib.get("class") == "axis")
    assert all(y >= base - 1e-6 for piece in beziers(path_of(markup, "curve")) for _, y in piece)
    assert any("sagging drawn below the line" in one for one in texts(markup))
    assert "10.0" in texts(markup), "P L / 4 = 10 kN·m at mid-span, with three figures"


def test_a_sagging_rail_stands_outside_a_smaller_moment_and_a_far_one_is_named_instead() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "2.0"))])
    rails = [Rail(start=0.0, end=4.0, value=12e3, sign=1, label="limit 12.0 kN·m"),
             Rail(start=0.0, end=4.0, value=250e3, sign=-1, label="limit 250 kN·m")]
    markup = curve("moment", record, rails)
    drawn = [e for e in parsed(markup).iter(f"{SVG}line") if e.attrib.get("class") == "rail"]
    lowest = max(y for piece in beziers(path_of(markup, "curve")) for _, y in piece)
    assert len(drawn) == 1
    assert float(drawn[0].attrib["y1"]) > lowest
    assert "limit 12.0 kN·m" in texts(markup)
    assert "limit 250 kN·m, beyond this drawing" in texts(markup)


def test_the_worst_case_is_a_second_curve_at_its_own_height() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "2.0"))])
    markup = curve("moment", record, worst=1.5)
    base = next(float(e.attrib["y1"]) for e in parsed(markup).iter(f"{SVG}line") if e.attrib.get("class") == "axis")
    depth = {name: max(y for piece in beziers(path_of(markup, name)) for _, y in piece) - base
             for name in ("curve", "curve-high")}
    assert depth["curve-high"] == pytest.approx(1.5 * depth["curve"], rel=1e-3)


def upright_boxes(markup: str) -> list[tuple[str, float, float, float, float]]:
    """Text, left, right, top, bottom, from the count of characters at half the font size each (from memory: what a common
    sans-serif face needs), capitals 0.7 of it high."""
    boxes = []
    for e in parsed(markup).iter(f"{SVG}text"):
        if "transform" not in e.attrib:
            x, y, size = (float(e.attrib[name]) for name in ("x", "y", "font-size"))
            long = 0.5 * size * len(e.text or "")
            left = x - {"start": 0.0, "middle": long / 2, "end": long}[e.attrib["text-anchor"]]
            boxes.append((e.text or "", left, left + long, y - 0.7 * size, y))
    return boxes


def two_spans() -> Record:
    return record_of(["5.4", "4.2"], ["bearing", "bearing", "pinned"],
                     [load(1, "line", "8", whole_beam=True), load(2, "point", "20", at(0, "right", "2.2"))])


def figures_across(markup: str) -> list[str]:
    """Texts of a curve that lie across a rail or a governing mark."""
    rails = [(float(e.attrib["x1"]), float(e.attrib["x2"]), float(e.attrib["y1"])) for e in parsed(markup).iter(f"{SVG}line")
             if e.attrib.get("class") == "rail"]
    rings = [(float(e.attrib["cx"]), float(e.attrib["cy"]), float(e.attrib["r"])) for e in parsed(markup).iter(f"{SVG}circle")
             if e.attrib.get("class") == "gov"]
    assert rails
    assert rings
    return [words for words, left, right, top, bottom in upright_boxes(markup)
            if any(left < x1 and x0 < right and top < y < bottom for x0, x1, y in rails)
            or any(left < cx + r and cx - r < right and top < cy + r and cy - r < bottom for cx, cy, r in rings)]


def test_no_figure_lies_across_a_rail_or_a_governing_mark() -> None:
    """The demonstration check once had the moment over its support written across the limit."""
    for system in ("metric", "us"):
        record = demo()
        record["settings"]["display"] = system
        drawings = answer(run_check(record))["drawings"]
        for quantity in ("shear", "moment", "sag"):
            assert figures_across(drawings[quantity]) == [], f"{quantity}, {system}"


@pytest.mark.parametrize("times", [1.02, 1.2, 1.5, 2.0])
@pytest.mark.parametrize("quantity", ["shear", "moment"])
def test_nor_with_rails_at_any_distance(quantity: drawing_curves.Quantity, times: float) -> None:
    record = two_spans()
    _, layout, response = solved(record)
    values = [v for many in drawing_curves.peaks(drawing_curves.best_pieces(quantity, response, layout)) for _, v in many]
    rails = [Rail(start=0.0, end=9.6, value=abs(times * v), sign=1 if v > 0 else -1, label=f"limit {abs(times * v):.0f}")
             for v in (min(values), max(values))]
    governing = [Mark(x=5.4, value=1.2 * min(values), label="0.97 of the limit")]
    assert figures_across(curve(quantity, record, rails, governing, worst=1.3)) == []


def test_only_the_side_of_its_own_limit_is_drawn_as_the_worst_case_and_the_other_as_the_least_effect() -> None:
    record = two_spans()
    _, layout, response = solved(record)
    best = drawing_curves.best_pieces("moment", response, layout)
    high, low = ([(a, b, f * c) for a, b, c in best] for f in (1.5, 0.5))
    for sagging in (True, False):
        markup = drawing.curve("moment", response, layout, high=high if sagging else None, low=None if sagging else low,
                               rails=[], governing=[], system="metric")
        base = next(float(e.attrib["y1"]) for e in parsed(markup).iter(f"{SVG}line") if e.attrib.get("class") == "axis")
        worst, least = (beziers(path_of(markup, name)) for name in ("curve-high", "curve-least"))
        below, above = (worst, least) if sagging else (least, worst)
        assert min(p[3][1] for p in below) >= base - 0.01
        assert max(p[3][1] for p in above) <= base + 0.01
        across = sum(p[3][0] - p[0][0] for p in [*worst, *least])
        assert across == pytest.approx(296.0, abs=0.05), "the whole beam, once"


def test_the_key_fits_the_paper_and_names_every_line_that_is_drawn() -> None:
    rails = [Rail(start=0.0, end=9.6, value=60e3, sign=sign, label="limit 60.0 kN·m") for sign in (1, -1)]
    for markup in (curve("moment", two_spans(), rails, [Mark(x=5.4, value=-30e3, label="0.50 of the limit")], worst=1.3),
                   curve("moment", two_spans()), curve("moment", record_of(["4.0"], ["bearing", "pinned"]))):
        assert not [one for one in upright_boxes(markup) if one[2] > 340.0]
        lines = {e.attrib.get("class") for e in parsed(markup).iter(f"{SVG}path")} & {"curve-high", "curve-least"}
        samples = {e.attrib.get("class") for e in parsed(markup).iter(f"{SVG}line")} & {"curve-high", "curve-least"}
        assert lines == samples


def test_a_beam_without_any_moment_gets_a_straight_line_and_no_values_of_rounding_residues() -> None:
    cancelling = [load(i, "line", amount, whole_beam=True) for i, amount in enumerate(("0.1", "0.2", "-0.3"))]
    over_support = load(9, "point", "13.7", at(1, "right", "0"))
    beams = [record_of(["4.0"], ["bearing", "pinned"]), record_of(["3.7"], ["bearing", "pinned"], cancelling),
             record_of(["3.7", "2.2"], ["bearing", "bearing", "pinned"], [*cancelling, over_support])]
    assert 0.0 < np.abs(solved(beams[1])[2].moment).max() < 1e-9, "the floats 0.1 + 0.2 - 0.3 leave a residue"
    for record in beams:
        markup = curve("moment", record)
        assert len({y for piece in beziers(path_of(markup, "curve")) for _, y in piece}) == 1
        assert "no moment under these loads" in texts(markup)
        assert not [one for one in texts(markup) if re.fullmatch(NUMBER, one)]


def test_sag_is_drawn_from_the_line_between_settled_supports() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "2.0"))])
    plain = path_of(curve("sag", record), "curve")
    for support in record["supports"]:
        support["settlement"] = written("25", "mm")
    assert path_of(curve("sag", record), "curve") == plain


# --- what is entered ------------------------------------------------------------------------------------------------


def paths_of(record: Record) -> set[str]:
    ends = [f"/overhangs/{end}" for end, value in record["overhangs"].items() if value is not None]
    return {*ends, "/section", *(f"/{name}/{i}" for name in ("supports", "spans", "loads", "hinges")
                                 for i in range(len(record[name])))}


def two_hinges_in_one_place() -> Record:
    return record_of(["4.0", "3.0"], ["bearing", "bearing", None], hinges=[at(0, "right", "2.0")] * 2)


@pytest.mark.parametrize("make", [blank, varied, twelve, two_hinges_in_one_place])
@pytest.mark.parametrize("with_layout", [True, False])
def test_every_thing_of_the_record_can_be_picked_inside_the_drawing(make: Any, with_layout: bool) -> None:
    record = make()
    layout = solved(record)[1] if with_layout and make in (varied, twelve) else None
    made = drawing.working(record, layout, read_all(record))
    box = [float(n) for n in parsed(made.svg).attrib["viewBox"].split()]
    assert box == pytest.approx([0.0, 0.0, made.width, made.height], abs=1e-3)
    assert {pick.path for pick in made.picks} == paths_of(record)
    assert len(made.picks) == len(paths_of(record))
    assert all(0 <= pick.x <= made.width and 0 <= pick.y <= made.height for pick in made.picks)
    assert len({(pick.x, pick.y) for pick in made.picks}) == len(made.picks)


def test_neighbouring_supports_and_spans_are_far_enough_apart_for_a_finger() -> None:
    """32 CSS pixels: how far a touch reaches (web/picking.js, REACH)."""
    made = drawing.working(twelve(), None, read_all(twelve()))
    fixed = [p for p in made.picks if p.path.startswith(("/supports", "/spans")) or p.path == "/section"]
    assert min(math.hypot(a.x - b.x, a.y - b.y) for i, a in enumerate(fixed) for b in fixed[:i]) > 32
    uneven = record_of(["1.0", "9.0", "1.2", "8.0"], ["bearing"] * 4 + ["pinned"])
    xs = [p.x for p in drawing.working(uneven, None, read_all(uneven)).picks if p.path.startswith("/supports")]
    assert all(96 <= b - a <= 260 for a, b in pairwise(xs))


def test_a_blank_record_gives_a_drawing_of_questions() -> None:
    made = drawing.working(blank(), None, read_all(blank()))
    assert texts(made.svg).count("?") == 3, "two supports and the span"
    assert {"A", "B"} <= set(texts(made.svg))


def test_a_load_without_a_place_is_marked_unread_and_the_others_keep_theirs() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"],
                       [load(1, "point", "10", at(0, "right", "1.0")), load(2, "point", "7")])
    made = drawing.working(record, None, read_all(record))
    a, b = (next(p.x for p in made.picks if p.path == f"/supports/{i}") for i in (0, 1))
    assert next(p.x for p in made.picks if p.path == "/loads/0") == pytest.approx(a + (b - a) / 4, abs=0.02)
    assert "10.0 kN" in texts(made.svg)
    assert "7.00 kN ?" in texts(made.svg)
    assert len([e for e in parsed(made.svg).iter(f"{SVG}g") if e.attrib.get("class") == "load unread"]) == 1


def test_without_a_layout_a_read_load_stands_where_the_layout_puts_it() -> None:
    record = varied()
    readings, layout, _ = solved(record)
    assert drawing.working(record, None, readings).picks == drawing.working(record, layout, readings).picks


def test_supports_are_told_apart_by_shape() -> None:
    shapes = set()
    for kind in ("bearing", "pinned", "fixed", "spring", "free", None):
        record = record_of(["4.0"], ["bearing", kind])
        shapes.add(drawing.working(record, None, read_all(record)).svg)
    assert len(shapes) == 6


def test_no_label_of_a_load_covers_another() -> None:
    """Boxes from the count of characters, at half the font size each."""
    for markup in (drawing.working(twelve(), solved(twelve())[1], read_all(twelve())).svg, every_drawing(twelve())[2]):
        labels = [e for e in parsed(markup).iter(f"{SVG}text")
                  if e.attrib["class"] == "label" and "transform" not in e.attrib]
        boxes = [(float(e.attrib["x"]), float(e.attrib["y"]), 0.25 * float(e.attrib["font-size"]) * len(e.text or ""))
                 for e in labels if e.attrib["text-anchor"] == "middle"]
        assert len(boxes) > 40
        assert not [(a, b) for i, a in enumerate(boxes) for b in boxes[:i]
                    if abs(a[0] - b[0]) < a[2] + b[2] and abs(a[1] - b[1]) < 10.0]


def test_the_free_body_shows_every_reaction_with_its_direction() -> None:
    record = record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(1, "right", "1.0"))], right="1.0")
    markup = drawing.free_body(record, *solved(record)[1:], "metric")
    assert {"A -2.50 kN", "B 12.5 kN"} <= set(texts(markup)), "levers: 10 x 1 / 4 pulls A down"
    arrows = [e.attrib["d"] for e in parsed(markup).iter(f"{SVG}path") if e.attrib.get("class") == "reaction"]
    ways = [np.sign(float(b) - float(a)) for a, b in (re.findall(rf" ({NUMBER})", d)[:2] for d in arrows)]
    assert ways == [1.0, -1.0], "down at A, up at B"


# --- what no drawing may hold ---------------------------------------------------------------------------------------


def hostile(record: Record) -> Record:
    record["place"]["member"] = record["ends"]["left"] = record["ends"]["right"] = HOSTILE
    for one in [*record["supports"], *record["loads"]]:
        one["name"] = HOSTILE[:40]
    return record


@pytest.mark.parametrize("make", [varied, twelve, lambda: hostile(varied()),
                                  lambda: record_of(["3.0"], ["fixed", "free"])])
def test_every_drawing_is_sound_xml_with_classes_only_and_finite_numbers(make: Any) -> None:
    for markup in every_drawing(make()):
        root = parsed(markup)
        names = {e.tag.removeprefix(SVG) for e in root.iter()}
        assert names <= {"svg", "title", "desc", "g", "path", "line", "rect", "circle", "text"}
        assert root.attrib["role"] == "img"
        assert [e.attrib["id"] for e in root.iter() if "id" in e.attrib] == root.attrib["aria-labelledby"].split()
        assert not {"style", "href", "onload", "onclick"} & {name for e in root.iter() for name in e.attrib}
        assert not {"width", "height"} & set(root.attrib)
        inks = {e.attrib.get(name, "none") for e in root.iter() for name in ("fill", "stroke")}
        assert inks <= {"none", "currentColor"}
        assert not re.search(r"\b(nan|inf)\b", markup, re.IGNORECASE)
        assert min(float(e.attrib["font-size"]) for e in root.iter(f"{SVG}text")) >= 12


def test_a_hostile_name_comes_out_once_escaped_and_reads_as_written() -> None:
    record = hostile(record_of(["4.0"], ["bearing", "pinned"], [load(1, "point", "10", at(0, "right", "2.0"))]))
    readings, layout, response = solved(record)
    made = drawing.working(record, layout, readings)
    rail = Rail(start=0.0, end=4.0, value=12e3, sign=1, label=HOSTILE)
    for markup in (made.svg, drawing.free_body(record, layout, response, "metric"),
                   drawing.curve("moment", response, layout, high=None, low=None, rails=[rail], system="metric",
                                 governing=[Mark(x=2.0, value=1e4, label=HOSTILE)], names=[HOSTILE, HOSTILE])):
        assert "<script" not in markup
        assert "&amp;lt;" not in markup
        assert "<scr" in "".join(parsed(markup).itertext())
    assert any(pick.label.startswith("Load: <script>alert('1')</script> & \"two\"") for pick in made.picks)
    json.dumps([pick.label for pick in made.picks]).encode("utf-8")


def test_nothing_of_a_drawing_leaves_its_frame() -> None:
    for markup in [*every_drawing(varied()), *every_drawing(twelve())]:
        root = parsed(markup)
        _, _, width, height = (float(n) for n in root.attrib["viewBox"].split())
        for e in root.iter():
            for name, most in (("x", width), ("x1", width), ("x2", width), ("cx", width), ("y", height), ("y1", height),
                               ("y2", height), ("cy", height)):
                assert -0.5 <= float(e.attrib.get(name, 0)) <= most + 0.5, ET.tostring(e)


def test_the_fixtures_are_records_that_the_schema_accepts() -> None:
    for record in (varied(), twelve(), blank()):
        validated(record | {"created": "2026-03-01T08:00:00Z", "changed": "2026-03-01T08:00:00Z"})
