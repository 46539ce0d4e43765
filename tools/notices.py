"""Notices of the software that the site is made of, from the licence files of the packages themselves."""

import json
import zipfile
from collections.abc import Iterable
from pathlib import Path

from tools.paths import NODE_MODULES, TOOLS
from tools.progress import ToolError
from tools.vendor import PACKAGES

# npm's pyodide comes without a licence text; this package under the same licence has it in full.
MPL_TEXT = NODE_MODULES / "axe-core" / "LICENSE"


def npm_notice(name: str) -> tuple[str, str]:
    """Heading and licence text of an npm package.

    Raises:
        ToolError: the package has no licence file.
    """
    folder = NODE_MODULES / name
    about = json.loads((folder / "package.json").read_text())
    texts = sorted(folder.glob("LICEN[CS]E*"))
    if not texts and about["license"] == "MPL-2.0":
        texts = [MPL_TEXT]
    if not texts:
        raise ToolError(f"npm package {name} has no licence file: add its text to tools/licences and tools/notices.py.")
    return f"{name} {about['version']} ({about['license']})", texts[0].read_text(encoding="utf-8")


def wheel_notices(wheel: Path) -> list[tuple[str, str]]:
    """Headings and texts of all licence files in a wheel."""
    title = " ".join(wheel.name.split("-")[:2])
    with zipfile.ZipFile(wheel) as archive:
        names = [
            name for name in archive.namelist() if "/licenses/" in name or name.rpartition("/")[2].upper().startswith("LICEN")
        ]
        found = [
            (f"{title}: {name.partition('.dist-info/')[2] or name}", archive.read(name).decode("utf-8", "replace"))
            for name in sorted(names)
        ]
    if not found:
        raise ToolError(f"{wheel.name} has no licence file: add its text to tools/licences and tools/notices.py.")
    return found


def notices(wheels: Iterable[Path]) -> str:
    """The whole text."""
    parts = [("Asfound (MIT)", (TOOLS.parent / "LICENSE").read_text(encoding="utf-8"))]
    parts += [npm_notice(name) for name in PACKAGES]
    parts += [
        (f"CPython, as part of pyodide: {path.stem}", path.read_text(encoding="utf-8"))
        for path in sorted((TOOLS / "licences").glob("*.txt"))
    ]
    parts += [notice for wheel in wheels for notice in wheel_notices(wheel)]
    lines = [
        "Asfound is made of the software named here. The source of pyodide (MPL-2.0) is published by its authors.",
        "",
    ]
    lines += [f"- {title}" for title, _ in parts]
    lines += [f"\n{'=' * 100}\n{title}\n{'=' * 100}\n\n{text.strip()}" for title, text in parts]
    return "\n".join(lines) + "\n"
