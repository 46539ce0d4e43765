"""The run-time folder of the site: Pyodide's parts as they are, all Python code as archives of .pyc files."""

import json
import shutil
from dataclasses import dataclass
from pathlib import Path
from typing import Any

from tools import app_wheel, downloads, node, runtime
from tools.paths import BUILD, NPM_PYODIDE, PYSOLVER, REQUIREMENTS, ROOT, TOOLS
from tools.progress import megabytes, size_of, step, up_to_date
from tools.stamps import digest, is_fresh, set_fresh

SCRIPTS = TOOLS / "pyodide"
STANDARD_LIBRARY = BUILD / "archives" / "python-standard-library.zip"
APPLICATION = BUILD / "archives" / "application"
PYODIDE_PARTS = ("pyodide.mjs", "pyodide.asm.mjs", "pyodide.asm.wasm")
# Pure-Python packages that pysolver needs when it runs: none; and those whose output it carries, for the notices.
RUN_TIME_WHEELS: set[str] = set()
GENERATORS = {"fastjsonschema"}


@dataclass(frozen=True, kw_only=True)
class Archives:
    """What `build` made: `folder` with the files, `libraries` as pairs of file and place in site-packages."""

    folder: Path
    libraries: list[list[str]]
    packages: dict[str, int]
    python: str
    examples: int


def build_standard_library() -> None:
    """Compile Pyodide's standard library; depends on nothing of ours but the script."""
    title = "Standard library for the browser"
    wanted = digest([SCRIPTS / "archives.py", SCRIPTS / "archives.mjs", NPM_PYODIDE / "pyodide-lock.json"])
    if is_fresh("standard-library", wanted, STANDARD_LIBRARY):
        up_to_date(title)
        return
    STANDARD_LIBRARY.parent.mkdir(parents=True, exist_ok=True)
    with step(title) as running:
        node.run_script(
            SCRIPTS / "archives.mjs",
            "standard-library",
            NPM_PYODIDE,
            STANDARD_LIBRARY,
            name="archive-standard-library",
            advice="see the log for the Python error.",
        )
        running.note(megabytes(size_of(STANDARD_LIBRARY)))
    set_fresh("standard-library", wanted)


def build_application(wheels: list[Path]) -> None:
    """Install pysolver in Pyodide under Node and compile it with all it uses into APPLICATION."""
    title = "pysolver and numpy for the browser"
    pure = downloads.pure_wheels(RUN_TIME_WHEELS)
    wanted = digest(
        [
            PYSOLVER,
            ROOT / "pyproject.toml",
            REQUIREMENTS,
            SCRIPTS / "archives.py",
            SCRIPTS / "archives.mjs",
            NPM_PYODIDE / "pyodide-lock.json",
            TOOLS / "archive.py",
        ]
    )
    if is_fresh("application", wanted, APPLICATION / "result.json"):
        up_to_date(title)
        return
    shutil.rmtree(APPLICATION, ignore_errors=True)
    APPLICATION.mkdir(parents=True)
    numpy, *bootstrap = wheels
    with step(title) as running:
        installed = [numpy, *pure, app_wheel.build()]
        printed = node.run_script(
            SCRIPTS / "archives.mjs",
            "application",
            NPM_PYODIDE,
            APPLICATION,
            ",".join(map(str, bootstrap)),
            ",".join(map(str, installed)),
            name="archive-application",
            advice="a dependency of pysolver is not among the wheels, or pysolver fails in the browser's Python.",
        )
        (APPLICATION / "result.json").write_text(printed.strip().splitlines()[-1])
        running.note(megabytes(size_of(APPLICATION)))
    set_fresh("application", wanted)


def build(wheels: list[Path]) -> Archives:
    """Make all archives that are not up to date; `wheels` are numpy, micropip, packaging for Pyodide."""
    build_standard_library()
    build_application(wheels)
    result = json.loads((APPLICATION / "result.json").read_text())
    return Archives(folder=APPLICATION, **result)


def lay_out(archives: Archives, dist: Path) -> dict[str, Any]:
    """Write `runtime-HASH/` of the site and return what runtime.js tells the worker about it.

    pyodide.mjs loads its parts by fixed names, so the folder's name carries the hash of its contents.
    """
    parts = [NPM_PYODIDE / name for name in PYODIDE_PARTS] + [STANDARD_LIBRARY]
    parts += [archives.folder / name for name in ("numpy.zip", "app.zip", *(file for file, _ in archives.libraries))]
    folder = dist / f"runtime-{digest(parts)[:12]}"
    folder.mkdir()
    for part in parts:
        target = folder / part.name
        shutil.copyfile(part, target)
    info = runtime.lock_info()
    return {
        "folder": folder.name + "/",
        "pyodide": info["version"],
        "python": ".".join(info["python"].split(".")[:2]),
        "abi": info["abi_version"],
        "standardLibrary": STANDARD_LIBRARY.name,
        "archives": ["numpy.zip", "app.zip"],
        "libraries": archives.libraries,
        "sizes": {part.name: part.stat().st_size for part in parts},
    }
