"""Where everything lies: the folders of the clone, what is made beside them, and the download cache of the user."""

import os
import sys
from pathlib import Path

ROOT = Path(__file__).resolve().parent.parent
TOOLS = ROOT / "tools"
WEB = ROOT / "web"
SERVICE_WORKER = ROOT / "service-worker" / "sw.js"
PYSOLVER = ROOT / "pysolver"
DIST = ROOT / "dist"
BUILD = ROOT / ".build"
VENV = ROOT / ".venv"
NODE_MODULES = TOOLS / "node_modules"
NPM_PYODIDE = NODE_MODULES / "pyodide"
REQUIREMENTS = TOOLS / "requirements.txt"


def cache_folder() -> Path:
    """Downloads that outlive the clone: ASFOUND_CACHE, else the user's cache folder."""
    wish = os.environ.get("ASFOUND_CACHE")
    if wish:
        return Path(wish).expanduser().resolve()
    return Path(os.environ.get("XDG_CACHE_HOME") or Path.home() / ".cache") / "asfound"


def venv_python(venv: Path = VENV) -> Path:
    """The interpreter of the virtual environment."""
    return venv / ("Scripts/python.exe" if sys.platform == "win32" else "bin/python")
