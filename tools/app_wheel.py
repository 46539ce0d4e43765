"""The `asfound` wheel: built from pyproject.toml by its own backend, byte for byte the same each time."""

import os
import shutil
from pathlib import Path

from tools.paths import BUILD, PYSOLVER, ROOT, venv_python
from tools.progress import ToolError, run

SAME_DATE = "1767225600"  # 2026-01-01, so that the archive doesn't depend on when it was made


def build() -> Path:
    """Build the wheel of pysolver and return its path.

    Raises:
        ToolError: there is no pysolver yet, or the build failed.
    """
    if not (PYSOLVER / "__init__.py").is_file():
        raise ToolError("pysolver/__init__.py is missing: the clone is not complete; fetch it again.")
    folder = BUILD / "wheel"
    shutil.rmtree(folder, ignore_errors=True)
    folder.mkdir(parents=True)
    run(
        [venv_python(), "-m", "flit_core.wheel", "--outdir", folder, ROOT],
        name="build-wheel",
        env=os.environ | {"SOURCE_DATE_EPOCH": SAME_DATE},
        advice="correct pyproject.toml or pysolver/__init__.py.",
    )
    return next(folder.glob("asfound-*.whl"))
