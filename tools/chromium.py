"""A Chromium for the browser tests: Debian's as root, an installed one, Playwright's, or the command to run."""

import os
import shutil
import subprocess
import tempfile
from pathlib import Path

from tools.paths import BUILD, venv_python
from tools.progress import ToolError, run, step, up_to_date

CHOICE = BUILD / "chromium.txt"
INSTALLED = ("chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "microsoft-edge")
MAC = (
    "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
    "/Applications/Chromium.app/Contents/MacOS/Chromium",
)
ADVICE = "Chromium for the browser tests is missing: run `.venv/bin/playwright install --with-deps chromium` and try again."


def launches(program: str) -> bool:
    """Whether the program really renders a page (Ubuntu's `chromium` may be a stub that only talks about snap)."""
    with tempfile.TemporaryDirectory() as profile:
        command = [
            program,
            "--headless=new",
            "--no-sandbox",
            "--disable-gpu",
            f"--user-data-dir={profile}",
            "--dump-dom",
            "data:text/html,<p>rendered</p>",
        ]
        try:
            done = subprocess.run(command, capture_output=True, text=True, timeout=60, check=False)
        except (OSError, subprocess.TimeoutExpired):
            return False
    return "<p>rendered</p>" in done.stdout


def debian_root() -> bool:
    """Whether this is Debian itself and we may install packages."""
    release = Path("/etc/os-release")
    return (
        hasattr(os, "geteuid")
        and os.geteuid() == 0
        and release.is_file()
        and shutil.which("apt-get") is not None
        and "ID=debian" in release.read_text().split()
    )


def apt_install() -> None:
    """Install Debian's Chromium; the package lists are brought up to date only when that is needed."""
    environment = os.environ | {"DEBIAN_FRONTEND": "noninteractive"}
    install = ["apt-get", "install", "--yes", "--no-install-recommends", "chromium"]
    try:
        run(install, name="apt-install", advice="", env=environment)
    except ToolError:
        run(["apt-get", "update"], name="apt-update", advice=ADVICE, env=environment)
        run(install, name="apt-install", advice=ADVICE, env=environment)


def playwright_install() -> str | None:
    """Let Playwright fetch its own Chromium and return where it lies, or None when that doesn't work here."""
    python = venv_python()
    ask = "from playwright.sync_api import sync_playwright as s\nwith s() as p: print(p.chromium.executable_path)"
    try:
        run([python, "-m", "playwright", "install", "chromium"], name="playwright-install", advice="")
        return run([python, "-c", ask], name="playwright-path", advice="").strip()
    except ToolError:
        return None


def find() -> str | None:
    """The first browser that launches, installing one if need be."""
    wish = os.environ.get("ASFOUND_CHROMIUM")
    if wish:
        return wish if launches(wish) else None
    if debian_root():
        if not shutil.which("chromium"):
            apt_install()
        if launches("chromium"):
            return shutil.which("chromium")
    for program in filter(None, [*map(shutil.which, INSTALLED), *(path for path in MAC if Path(path).exists())]):
        if launches(program):
            return program
    fetched = playwright_install()
    return fetched if fetched and launches(fetched) else None


def ensure() -> str:
    """The path of a Chromium that launches.

    Raises:
        ToolError: none could be found or installed; the message holds the one command to run.
    """
    title = "Chromium"
    if CHOICE.is_file() and "ASFOUND_CHROMIUM" not in os.environ and Path(CHOICE.read_text()).exists():
        up_to_date(title)
        return CHOICE.read_text()
    with step(title) as running:
        found = find()
        if found is None:
            raise ToolError(ADVICE)
        running.note(found)
    CHOICE.write_text(found)
    return found
