"""Which steps are up to date? A stamp keeps the digest of everything a step was made from."""

import contextlib
import hashlib
from collections.abc import Iterable, Iterator
from pathlib import Path

from tools.paths import BUILD
from tools.progress import ToolError

SKIPPED_FOLDERS = {"__pycache__", "node_modules"}


def sha256(path: Path) -> str:
    """Hex digest of a file."""
    with path.open("rb") as file:
        return hashlib.file_digest(file, "sha256").hexdigest()


def files_below(*paths: Path) -> list[Path]:
    """Files of the given files and folders, without by-products, in a fixed order."""
    found = [file for path in paths for file in ([path] if path.is_file() else path.rglob("*")) if file.is_file()]
    return sorted(file for file in found if not SKIPPED_FOLDERS.intersection(file.parts) and file.suffix != ".pyc")


def digest(paths: Iterable[Path], *also: str) -> str:
    """One digest of the names and contents of files, and of further words (versions, options)."""
    total = hashlib.sha256()
    for path in files_below(*paths):
        total.update(f"{path.name}\0{sha256(path)}\n".encode())
    total.update("\0".join(also).encode())
    return total.hexdigest()


def is_fresh(name: str, wanted: str, *outputs: Path) -> bool:
    """Whether the step `name` was last done for the digest `wanted` and all its outputs still exist."""
    stamp = BUILD / "stamps" / name
    return stamp.is_file() and stamp.read_text() == wanted and all(path.exists() for path in outputs)


def set_fresh(name: str, done_for: str) -> None:
    """Remember that the step `name` was done for this digest."""
    stamp = BUILD / "stamps" / name
    stamp.parent.mkdir(parents=True, exist_ok=True)
    stamp.write_text(done_for)


@contextlib.contextmanager
def one_at_a_time() -> Iterator[None]:
    """Let a second set-up or assembly in the same clone wait for the first."""
    BUILD.mkdir(parents=True, exist_ok=True)
    try:
        import fcntl
    except ImportError:  # Windows: no waiting, two runs at once are the user's own risk there
        yield
        return
    with (BUILD / "lock").open("w") as lock:
        try:
            fcntl.flock(lock, fcntl.LOCK_EX | fcntl.LOCK_NB)
        except BlockingIOError:
            print("  waiting for another run of the tools in this folder ...", flush=True)
            fcntl.flock(lock, fcntl.LOCK_EX)
        except OSError as error:
            raise ToolError(f"{BUILD / 'lock'} can't be locked ({error}): put the clone on a local disk.") from None
        yield
