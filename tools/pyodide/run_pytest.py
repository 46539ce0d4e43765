"""Run inside Pyodide: pytest on the copied tests, as far as they fit there."""

import os
import re
import sys
import zipfile
from pathlib import Path

WHEELS = Path("/wheels")
SITE = Path("/pytest-site")
NUMPY_AIDS = Path("/numpy-aids")
HOME = Path("/home/pyodide")
# Parts of numpy that tests and hypothesis use and pysolver doesn't.
TEST_AIDS = ("numpy/testing/", "numpy/random/", "numpy/polynomial/")
# A whole file that needs more than Pyodide has says so at module level; it can't even be imported there.
NOT_HERE = re.compile(r"^pytestmark\b.*\bcpython_only\b", re.M)


def unpack() -> None:
    """Put pytest and its kin on the path, and the parts of numpy that only tests use beside the shipped ones."""
    for wheel in WHEELS.glob("*.whl"):
        with zipfile.ZipFile(wheel) as archive:
            if wheel.name.startswith("numpy-"):
                aids = [name for name in archive.namelist() if name.startswith(TEST_AIDS)]
                archive.extractall(NUMPY_AIDS, aids)
            else:
                archive.extractall(SITE)
    sys.path.append(str(SITE))
    import numpy

    numpy.__path__.append(str(NUMPY_AIDS / "numpy"))


def run() -> int:
    """Run pytest; returns its exit code."""
    os.chdir(HOME)
    os.environ["PYTHONDONTWRITEBYTECODE"] = "1"
    unpack()
    import pytest

    left_out = [path for path in sorted(Path("tests").rglob("test_*.py")) if NOT_HERE.search(path.read_text())]
    ignored = [f"--ignore={path}" for path in left_out] + ["--ignore-glob=tests/test_tools_*"]
    print(f"CPython only, not run here: {', '.join(path.name for path in left_out) or 'none'}")
    options = ["tests", "-q", "-m", "not cpython_only", "-p", "no:cacheprovider", *ignored]
    return int(pytest.main(options))
