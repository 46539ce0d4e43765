"""Do imports go only downward, and does nothing below the doors touch files, the network or the browser?"""

import ast
from pathlib import Path

import pytest

pytestmark = pytest.mark.cpython_only  # reads the source tree

PACKAGE = Path(__file__).parent.parent / "pysolver"

# from the bottom up: a module imports only modules named before it
LAYERS = [
    "__init__", "errors", "number_text", "unit_table", "display", "units", "piecewise",
    "beam", "loads", "mechanism", "stiffness", "statics", "envelope", "bounds",
    "record_validator", "record", "measured", "readings", "combinations", "vocabulary", "frame", "found", "limits", "facts",
    "comparison", "model", "uplift", "searching", "outcome", "governing", "check",
    "svg", "drawing_bezier", "drawing_labels", "drawing_symbols", "drawing_loads", "drawing_places", "drawing_scheme",
    "drawing_body", "drawing_curve_labels", "drawing_curves", "drawing", "figures", "answer", "recorded",
    "json_text", "link_dictionary", "link", "demo", "bridge", "cli", "__main__",
]
DOORS = {"bridge", "cli", "__main__"}
OUTSIDE = {"js", "pyodide", "socket", "urllib", "http", "subprocess", "os", "pathlib", "shutil", "tempfile", "sys"}


def imported(module: str) -> set[str]:
    tree = ast.parse((PACKAGE / f"{module}.py").read_text("utf-8"))
    names: set[str] = set()
    for node in ast.walk(tree):
        if isinstance(node, ast.ImportFrom) and node.module == "pysolver":
            names |= {f"pysolver.{a.name}" for a in node.names}
        elif isinstance(node, ast.ImportFrom) and node.module:
            names.add(node.module)
        elif isinstance(node, ast.Import):
            names |= {a.name for a in node.names}
    return names


def test_every_module_has_its_place():
    assert sorted(LAYERS) == sorted(p.stem for p in PACKAGE.glob("*.py"))


@pytest.mark.parametrize("module", LAYERS)
def test_imports_go_down_only(module):
    below = set(LAYERS[: LAYERS.index(module)])
    own = {name.removeprefix("pysolver.").partition(".")[0] for name in imported(module) if name.startswith("pysolver.")}
    own &= set(LAYERS)  # "from pysolver import __version__" names no module
    assert own <= below, f"{module} imports {sorted(own - below)}, which stand above it"


@pytest.mark.parametrize("module", [m for m in LAYERS if m not in DOORS])
def test_only_the_doors_touch_the_world(module):
    assert not {name.partition(".")[0] for name in imported(module)} & OUTSIDE
