"""`python3 -m tools test`: every check of the project as a named step, each with its time, and one exit code."""

import os
import shutil
import subprocess
import time
from collections.abc import Callable, Mapping, Sequence
from dataclasses import dataclass
from pathlib import Path

from tools import assemble, chromium, downloads, node, runtime, venv
from tools.paths import BUILD, DIST, NODE_MODULES, ROOT, TOOLS, WEB, venv_python
from tools.progress import ToolError
from tools.stamps import one_at_a_time

# What pytest itself needs inside Pyodide, pure Python all of it.
PYTEST_WHEELS = {"pytest", "pluggy", "iniconfig", "packaging", "pygments", "hypothesis", "sortedcontainers"}


def call(command: Sequence[str | Path], env: Mapping[str, str] | None = None) -> bool:
    """Run a check with its output in view; True if it ended with 0."""
    done = subprocess.run(
        [str(part) for part in command],
        cwd=ROOT,
        env=None if env is None else dict(env),
        stdin=subprocess.DEVNULL,
        check=False,
    )
    return done.returncode == 0


def lint() -> bool:
    """ruff over all Python."""
    return call([venv_python(), "-m", "ruff", "check", "."])


def types() -> bool:
    """mypy --strict, and tsc for page, worker and service worker apart, each with its own library."""
    good = [call([venv_python(), "-m", "mypy"])]
    tsc = NODE_MODULES / "typescript" / "bin" / "tsc"
    for thread in ("page", "worker", "service-worker"):
        print(f"tsc: {thread}", flush=True)
        good.append(call([node.node(), tsc, "--project", TOOLS / f"tsconfig.{thread}.json"], node.environment()))
    return all(good)


def unit() -> bool:
    """pytest tests/ in CPython."""
    return call([venv_python(), "-m", "pytest", "tests"])


def wasm() -> bool:
    """The tests of pysolver once more, in Pyodide under Node, against the archives that ship."""
    wheels = [*downloads.pure_wheels(PYTEST_WHEELS), runtime.ensure()[0]]
    options = ("--disable-warning=MODULE_TYPELESS_PACKAGE_JSON",)  # and Node's usual stack, about that of a browser's worker
    return call([node.node(), *options, TOOLS / "pyodide" / "run_pytest.mjs", DIST, ROOT / "tests", *wheels], node.environment())


def javascript() -> bool:
    """node --test on web/tests, against the modules as they are assembled (vendor modules in place)."""
    folder = BUILD / "web-tests"
    shutil.rmtree(folder, ignore_errors=True)
    shutil.copytree(DIST, folder, ignore=shutil.ignore_patterns("runtime-*"))
    shutil.copytree(WEB / "tests", folder / "tests")
    (folder / "package.json").write_text('{"type": "module"}')
    files = sorted((folder / "tests").rglob("*.test.js"))
    return call([node.node(), "--test", "--test-reporter=spec", *files], node.environment())


def browser() -> bool:
    """pytest e2e/: the assembled site in a browser."""
    program = chromium.ensure()
    return call([venv_python(), "-m", "pytest", "e2e"], os.environ | {"ASFOUND_CHROMIUM": program})


@dataclass(frozen=True, kw_only=True)
class Check:
    """A step of `test`: `run` says whether all was well; `files` is what there must be to check."""

    name: str
    run: Callable[[], bool]
    files: str

    @property
    def summary(self) -> str:
        """What it does, in a line."""
        return (self.run.__doc__ or self.name).splitlines()[0]


CHECKS = (
    Check(name="lint", run=lint, files="tools/*.py"),
    Check(name="types", run=types, files="tools/*.py"),
    Check(name="unit", run=unit, files="tests/test_*.py"),
    Check(name="wasm", run=wasm, files="tests/test_*.py"),
    Check(name="js", run=javascript, files="web/tests/*.test.js"),
    Check(name="e2e", run=browser, files="e2e/test_*.py"),
)


def list_checks() -> None:
    """Print the steps."""
    for check in CHECKS:
        print(f"{check.name:8}{check.summary}")


def chosen(names: Sequence[str]) -> list[Check]:
    """The steps of these names, all if there are none.

    Raises:
        ToolError: there is no step of that name.
    """
    known = {check.name: check for check in CHECKS}
    for name in names:
        if name not in known:
            raise ToolError(f"there is no step '{name}': choose from {', '.join(known)}.")
    return [check for check in CHECKS if not names or check.name in names]


def run_check(check: Check) -> str:
    """Run one step under a heading; returns the word for the summary."""
    print(f"\n=== {check.name}: {check.summary}", flush=True)
    if not list(ROOT.glob(check.files)):
        print(f"nothing matches {check.files}: a check that has nothing to check is broken")
        return "FAILED"
    try:
        return "good" if check.run() else "FAILED"
    except ToolError as error:
        print(error, flush=True)
        return "FAILED"


def run_checks(names: Sequence[str]) -> int:
    """Set up, assemble, run the steps (even after one has failed), print the summary; returns the exit code."""
    checks = chosen(names)
    if {check.name for check in checks} <= {"lint"}:
        with one_at_a_time():
            venv.ensure()
    else:
        assemble.assemble()
    results = []
    for check in checks:
        began = time.monotonic()
        results.append((check.name, run_check(check), time.monotonic() - began))
    print("\n=== summary")
    for name, word, seconds in results:
        print(f"{name:8}{word:18}{seconds:7.1f} s", flush=True)
    return 1 if any(word == "FAILED" for _, word, _ in results) else 0
