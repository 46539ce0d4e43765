"""`python3 -m tools serve`: set up, assemble and serve the site on this computer until it is stopped."""

import contextlib
import signal
import threading
from types import FrameType

from tools.paths import DIST
from tools.server import Site

USUAL_PORT = 8423


def open_site(port: int | None, prefix: str) -> Site:
    """The site on the wished port, on the usual one, or on a free one if that is taken."""
    if port is not None:
        return Site(DIST, port=port, prefix=prefix)
    with contextlib.suppress(OSError):
        return Site(DIST, port=USUAL_PORT, prefix=prefix)
    print(f"  Port {USUAL_PORT} is taken by another program; a free one is used.", flush=True)
    return Site(DIST, port=0, prefix=prefix)


def serve_until_stopped(port: int | None, prefix: str) -> None:
    """Serve `dist/` until Ctrl-C or a termination signal.

    Raises:
        OSError: the port that was asked for is taken.
    """
    stopped = threading.Event()

    def stop(signum: int, frame: FrameType | None) -> None:
        stopped.set()

    for number in (signal.SIGINT, signal.SIGTERM):
        signal.signal(number, stop)
    with open_site(port, prefix) as site:
        print(f"\nAsfound is at {site.url}", flush=True)
        print("Only this computer can open that. A phone needs an HTTPS address: put dist/ on any static HTTPS host.")
        print("Ctrl-C stops it.", flush=True)
        stopped.wait()
    print("Stopped.", flush=True)
