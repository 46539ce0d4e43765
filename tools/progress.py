"""What a person sees while the tools work: one line per step, with time and size, one sentence when something fails."""

import subprocess
import time
from collections.abc import Iterator, Mapping, Sequence
from contextlib import contextmanager
from pathlib import Path

from tools.paths import BUILD, ROOT


class ToolError(Exception):
    """Something the person at the keyboard can act on: what was missing and what to do, in one sentence."""


class Step:
    """A running step; `note` sets what its closing line says."""

    def __init__(self) -> None:
        self.result = ""

    def note(self, text: str) -> None:
        """Say what came out of the step, e.g. a size."""
        self.result = text


@contextmanager
def step(title: str) -> Iterator[Step]:
    """Print `title ...` at once and its result and time at the end."""
    print(f"  {title} ... ", end="", flush=True)
    began, running = time.monotonic(), Step()
    try:
        yield running
    except BaseException:
        print("failed", flush=True)
        raise
    print(f"{running.result or 'done'} ({time.monotonic() - began:.1f} s)", flush=True)


def up_to_date(title: str) -> None:
    """Say that a step had nothing to do."""
    print(f"  {title} ... up to date", flush=True)


def size_of(path: Path) -> int:
    """Bytes of a file, or of all files below a folder."""
    return path.stat().st_size if path.is_file() else sum(p.stat().st_size for p in path.rglob("*") if p.is_file())


def megabytes(count: int) -> str:
    """A size as people read it."""
    return f"{count / 1e6:.1f} MB" if count >= 100_000 else f"{count / 1e3:.1f} kB"


def run(
    command: Sequence[str | Path],
    *,
    name: str,
    advice: str,
    cwd: Path = ROOT,
    env: Mapping[str, str] | None = None,
    timeout: float | None = None,
) -> str:
    """Run a program quietly and return what it printed.

    Its output is kept in `.build/logs/NAME.log`.

    Raises:
        ToolError: the program is missing, failed or took longer than `timeout` seconds; the message ends with `advice`.
    """
    log = BUILD / "logs" / f"{name}.log"
    log.parent.mkdir(parents=True, exist_ok=True)
    try:
        done = subprocess.run(
            [str(part) for part in command],
            cwd=cwd,
            env=None if env is None else dict(env),
            text=True,
            stdout=subprocess.PIPE,
            stderr=subprocess.STDOUT,
            stdin=subprocess.DEVNULL,
            timeout=timeout,
            check=False,
        )
    except FileNotFoundError:
        raise ToolError(f"{command[0]} is missing: {advice}") from None
    except subprocess.TimeoutExpired:
        raise ToolError(f"{name} did not end within {timeout:.0f} s: {advice}") from None
    log.write_text(done.stdout, encoding="utf-8")
    if done.returncode != 0:
        tail = "\n".join(line[:200] for line in done.stdout.strip().splitlines()[-20:])  # minified code has long lines
        raise ToolError(f"{name} failed (exit code {done.returncode}, all of it in {log.relative_to(ROOT)}): {advice}\n{tail}")
    return done.stdout
