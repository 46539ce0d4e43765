"""What is a phone here? A Chromium with a profile on disk, touch, a narrow screen, and an ear for everything that goes wrong."""

import contextlib
import os
import signal
import time
from pathlib import Path
from urllib.parse import urlsplit

from playwright.sync_api import BrowserContext, ConsoleMessage, Dialog, Error, Page, Playwright, Request, Response, expect

START = 90_000  # ms: the solver's start on a busy machine of two cores
PHONE = {"viewport": {"width": 360, "height": 740}, "is_mobile": True, "has_touch": True, "device_scale_factor": 2}
DESK = {"viewport": {"width": 1280, "height": 800}}
ARGUMENTS = ["--no-sandbox", "--disable-gpu", "--disable-background-networking", "--disable-component-update", "--no-first-run",
             "--no-default-browser-check", "--disable-sync", "--disable-default-apps"]
GONE = "net::ERR_CONNECTION_REFUSED"  # the look for a newer service worker while the server is gone


class Device:
    """A browser with its profile. Complaints: errors of page or console, foreign requests, answers without the policy."""

    def __init__(self, playwright: Playwright, program: str, profile: Path, url: str, *, wide: bool = False,
                 allow: tuple[str, ...] = ()) -> None:
        self.url, self.profile, self.wide = url, profile, wide
        self._playwright, self._program = playwright, program
        self._allow = (GONE, *allow)
        self._context: BrowserContext | None = None
        self._heard: list[str] = []
        self.requested: list[str] = []

    def open(self, fragment: str = "") -> Page:
        """Start the browser if it isn't running, and open the app in its first tab."""
        if self._context is None:
            self._start()
        page = self.context.pages[0] if self.context.pages else self.context.new_page()
        page.goto(self.url + fragment)
        return page

    def tab(self) -> Page:
        """The app in one more tab."""
        page = self.context.new_page()
        page.goto(self.url)
        return page

    @property
    def context(self) -> BrowserContext:
        assert self._context is not None, "the browser is not running"
        return self._context

    def _start(self) -> None:
        self._context = self._playwright.chromium.launch_persistent_context(
            self.profile, executable_path=self._program, args=ARGUMENTS, timeout=60_000, locale="en-GB",
            timezone_id="Europe/London", **(DESK if self.wide else PHONE))
        self._context.set_default_timeout(30_000)
        self._context.grant_permissions(["clipboard-read", "clipboard-write"], origin=self.url)
        self._context.on("request", self._on_request)
        self._context.on("response", self._on_response)
        self._context.on("console", self._on_console)
        self._context.on("weberror", lambda error: self._heard.append(f"page error: {error.error}"))
        self._context.on("dialog", self._on_dialog)

    def _on_dialog(self, box: Dialog) -> None:
        self._heard.append(f"dialog: {box.message}")
        box.dismiss()

    def _on_request(self, request: Request) -> None:
        self.requested.append(request.url)
        parts = urlsplit(request.url)
        if parts.scheme in ("http", "https", "ws", "wss") and not request.url.startswith(self.url):
            self._heard.append(f"a request left the app's own address: {request.url}")

    def _on_response(self, response: Response) -> None:
        if response.url.startswith("http") and "default-src 'none'" not in response.headers.get("content-security-policy", ""):
            self._heard.append(f"an answer without the policy: {response.status} {response.url}")

    def _on_console(self, message: ConsoleMessage) -> None:
        if message.type in ("error", "warning"):
            self._heard.append(f"console {message.type}: {message.text} ({message.location.get('url', '')})")

    def complaints(self) -> list[str]:
        """All that was heard and isn't allowed."""
        return [text for text in self._heard if not any(part in text for part in self._allow)]

    def close(self) -> None:
        """Close the browser in the ordinary way."""
        if self._context is not None:
            self._context.close()
            self._context = None

    def kill(self) -> None:
        """End the browser's process at once, as an empty battery or the system would."""
        pid = int((self.profile / "SingletonLock").readlink().name.rpartition("-")[2])
        os.kill(pid, signal.SIGKILL)
        for _ in range(100):
            if not alive(pid):
                break
            time.sleep(0.1)
        context, self._context = self.context, None
        with contextlib.suppress(Error):  # whatever it says of a browser that is gone
            context.close()
        for name in ("SingletonLock", "SingletonCookie", "SingletonSocket"):
            (self.profile / name).unlink(missing_ok=True)


def alive(pid: int) -> bool:
    """Whether the process runs (an ended one that nobody has waited for yet does not)."""
    try:
        return Path(f"/proc/{pid}/stat").read_text().rpartition(")")[2].split()[0] != "Z"
    except FileNotFoundError:
        return False


def solver_ready(page: Page) -> Page:
    """Wait until nothing on the page speaks of the solver's start any more."""
    expect(page.get_by_role("progressbar", name="Start of the solver")).to_have_count(0, timeout=START)
    expect(page.get_by_text("The solver did not start.")).to_have_count(0)
    return page


def ready_without_signal(page: Page) -> Page:
    """Wait until the list says that the app will open without signal."""
    expect(page.get_by_text("Ready without signal.")).to_be_visible(timeout=2 * START)
    return solver_ready(page)
