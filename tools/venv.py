"""The virtual environment .venv with the pinned Python packages. Works without ensurepip (Debian leaves it out)."""

import shutil
import sys
from pathlib import Path

from tools.downloads import PIP_SHA256, pip_wheel
from tools.paths import REQUIREMENTS, VENV, venv_python
from tools.progress import megabytes, run, size_of, step, up_to_date
from tools.stamps import digest, is_fresh, set_fresh


def create(venv: Path) -> None:
    """Make an empty environment and install the pinned pip in it, run straight out of its wheel."""
    wheel = pip_wheel()
    shutil.rmtree(venv, ignore_errors=True)
    run(
        [sys.executable, "-m", "venv", "--without-pip", venv],
        name="venv",
        advice="check that the disk has room and that Python's own venv module is there.",
    )
    run(
        [venv_python(venv), f"{wheel}/pip", "install", "--quiet", "--no-index", "--no-deps", wheel],
        name="pip",
        advice=f"delete {wheel} and try again.",
    )


def ensure() -> None:
    """Make `.venv` with all pinned packages unless it is there already."""
    title = "Python packages in .venv"
    wanted = digest([REQUIREMENTS], sys.version, str(VENV), PIP_SHA256)
    if is_fresh("venv", wanted, venv_python()):
        up_to_date(title)
        return
    with step(title) as running:
        create(VENV)
        run(
            [
                venv_python(),
                "-m",
                "pip",
                "install",
                "--quiet",
                "--no-deps",
                "--require-hashes",
                "--only-binary=:all:",
                "-r",
                REQUIREMENTS,
            ],
            name="pip-install",
            advice="check the connection to the Python package index and try again.",
        )
        running.note(megabytes(size_of(VENV)))
    set_fresh("venv", wanted)
