"""How is the assembled site served so that it can really be gone? A server process of its own, with the project's headers.

As a program: python serving.py FOLDER PORT PREFIX; prints the address once it listens.
"""

import socket
import subprocess
import sys
import threading
from pathlib import Path
from urllib.parse import urlsplit

ROOT = Path(__file__).resolve().parent.parent


class SiteProcess:
    """The site served by another process. `stop` ends that process and looks that its port is refused."""

    def __init__(self, folder: Path, *, port: int = 0, prefix: str = "/") -> None:
        command = [sys.executable, str(Path(__file__)), str(folder), str(port), prefix]
        self._process = subprocess.Popen(command, cwd=ROOT, stdout=subprocess.PIPE, text=True)
        assert self._process.stdout is not None
        self.url = self._process.stdout.readline().strip()
        assert self.url, f"the server of {folder} did not start"
        self.port = urlsplit(self.url).port or 0

    def stop(self) -> None:
        """End the process; raises if anything still answers at its port. Nothing to do if it has ended."""
        if self._process.poll() is not None:
            return
        self._process.terminate()
        self._process.wait(20)
        if self._process.stdout:
            self._process.stdout.close()
        assert refused(self.port), f"something still listens at port {self.port}"


def refused(port: int) -> bool:
    """Whether a connection to the port of this computer is refused."""
    with socket.socket() as knock:
        knock.settimeout(2)
        return knock.connect_ex(("127.0.0.1", port)) != 0


def serve(folder: str, port: str, prefix: str) -> None:
    """Serve until the process is ended."""
    sys.path.insert(0, str(ROOT))
    from tools.server import Site

    with Site(Path(folder), port=int(port), prefix=prefix) as site:
        print(site.url, flush=True)
        threading.Event().wait()


if __name__ == "__main__":
    serve(*sys.argv[1:])
