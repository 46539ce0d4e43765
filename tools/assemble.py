"""Assemble `dist/`: the whole site as any static host can serve it. The same inputs give the same bytes."""

import hashlib
import re
import shutil
import tomllib
from pathlib import Path

from tools import archive, downloads, node, precache, runtime, stamps, vendor, venv
from tools.notices import notices
from tools.paths import BUILD, DIST, NPM_PYODIDE, PYSOLVER, REQUIREMENTS, ROOT, SERVICE_WORKER, TOOLS, WEB
from tools.progress import ToolError, megabytes, size_of, step, up_to_date

NOT_PUBLISHED = shutil.ignore_patterns("tests", "*.test.js", "*.md", "__pycache__", ".*")


def set_up() -> list[Path]:
    """Everything that assembly needs; returns the wheels for Pyodide: numpy, micropip, packaging."""
    venv.ensure()
    node.ensure()
    return runtime.ensure()


def check_page(dist: Path) -> None:
    """No inline script, style or handler in the page: the site's own policy would block it.

    Raises:
        ToolError: the page is missing or has one; names it.
    """
    page = dist / "index.html"
    if not page.is_file():
        raise ToolError("web/index.html is missing: the clone is not complete; fetch it again.")
    text = re.sub(r"<!--.*?-->", "", page.read_text(encoding="utf-8"), flags=re.S)
    patterns = {
        "an inline script": r"<script(?![^>]*\bsrc=)[^>]*>",
        "an inline style": r"<style\b|<[^>]+\sstyle=",
        "an inline handler": r"<[^>]+\son\w+=",
    }
    for what, pattern in patterns.items():
        found = re.search(pattern, text, re.I)
        if found:
            raise ToolError(f"web/index.html has {what} ({found[0][:60]}): move it into a file, the site's policy blocks it.")


def about(python: str) -> dict[str, str]:
    """Versions that build.json states besides the build's own hash."""
    project = tomllib.loads((ROOT / "pyproject.toml").read_text())["project"]
    numpy = next(file for file in runtime.locked_files() if file.package == "numpy")
    info = runtime.lock_info()
    return {"version": project["version"], "pyodide": info["version"], "python": python, "numpy": numpy.version}


def lay_out(dist: Path, wheels: list[Path], archives: archive.Archives) -> dict[str, str]:
    """Write the whole site into an empty folder and return its build.json."""
    shutil.copytree(WEB, dist, ignore=NOT_PUBLISHED)
    vendor.copy_vendor_modules(dist)
    told = archive.lay_out(archives, dist)
    pure = downloads.pure_wheels(archive.RUN_TIME_WHEELS | archive.GENERATORS)
    (dist / "notices.txt").write_text(notices([wheels[0], *pure]), encoding="utf-8")
    build = precache.write_build(dist, told, about(archives.python))
    check_page(dist)
    vendor.check_imports(dist)
    precache.write_service_worker(dist, build["build"])
    return build


def prove(dist: Path) -> str:
    """Start the finished run-time alone under Node and replay every example request; returns what it says."""
    printed = node.run_script(
        TOOLS / "pyodide" / "replay.mjs",
        dist,
        name="replay",
        advice="a module or data file is missing in the archives (tools/pyodide/archives.py), or pysolver fails there.",
    )
    return printed.strip().splitlines()[-1]


def replace(dist: Path, fresh: Path) -> None:
    """Put the finished site in the place of the older one."""
    old = BUILD / "site-old"
    shutil.rmtree(old, ignore_errors=True)
    if dist.exists():
        shutil.move(dist, old)
    dist.parent.mkdir(parents=True, exist_ok=True)
    shutil.move(fresh, dist)
    shutil.rmtree(old, ignore_errors=True)


def inputs() -> list[Path]:
    """All that the site is made from."""
    sources = [WEB, PYSOLVER, SERVICE_WORKER, REQUIREMENTS, ROOT / "pyproject.toml", ROOT / "LICENSE"]
    ours = [*TOOLS.glob("*.py"), *TOOLS.glob("package*.json"), TOOLS / "pyodide", TOOLS / "licences"]
    return [*sources, *ours, NPM_PYODIDE / "pyodide-lock.json"]


def assemble(dist: Path = DIST, *, anew: bool = False) -> None:
    """Set up what is missing and bring the site in `dist` up to date; an older one stays until the new one is proved.

    Raises:
        ToolError: a step failed; says which and what to do.
    """
    with stamps.one_at_a_time():
        wheels = set_up()
        title, stamp = f"Site in {dist.name}/", f"site-{hashlib.sha256(str(dist).encode()).hexdigest()[:8]}"
        wanted = stamps.digest(inputs())
        if not anew and stamps.is_fresh(stamp, wanted, dist / "sw.js"):
            up_to_date(title)
            return
        archives, fresh = archive.build(wheels), BUILD / "site-new"
        shutil.rmtree(fresh, ignore_errors=True)
        with step(title) as running:
            build = lay_out(fresh, wheels, archives)
            running.note(f"version {build['version']}, build {build['build']}, {megabytes(size_of(fresh))}")
        with step("Start of the finished site's Python") as running:
            running.note(prove(fresh))
        replace(dist, fresh)
        stamps.set_fresh(stamp, wanted)
