"""How is a check drawn? As SVG markup: the working drawing, the free body, the curves of shear, moment and sag.

Surveyor's field book, ink on paper: a ruled base line, ordinates under the curve, limits as rails that the curve must
stay between, dimension lines with oblique strokes, hatching under supports. Classes only; the page inks them.
Parts: svg (markup, escaping), drawing_symbols and drawing_loads (what is drawn), drawing_labels (what may stand where),
drawing_scheme, drawing_body, drawing_curves (the drawings).
"""

from pysolver.drawing_body import free_body
from pysolver.drawing_curves import Mark, Piece, Quantity, Rail, curve
from pysolver.drawing_scheme import Pick, Working, working

__all__ = ["Mark", "Pick", "Piece", "Quantity", "Rail", "Working", "curve", "free_body", "working"]
