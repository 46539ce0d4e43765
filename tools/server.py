"""A static server with the headers the site needs, on every response: for `serve`, the browser tests and the bench."""

import contextlib
import email.utils
import gzip
import hashlib
import posixpath
import socket
import threading
from functools import lru_cache
from http import HTTPStatus
from http.server import BaseHTTPRequestHandler, ThreadingHTTPServer
from pathlib import Path
from typing import Any
from urllib.parse import unquote, urlsplit

from tools.precache import CONTENT_TYPES, POLICY

SECURITY_HEADERS = {
    "Content-Security-Policy": POLICY,
    "X-Content-Type-Options": "nosniff",
    "Referrer-Policy": "no-referrer",
    "Cross-Origin-Opener-Policy": "same-origin",
    "Cross-Origin-Resource-Policy": "same-origin",
    "Permissions-Policy": "camera=(self), geolocation=(self), microphone=(), payment=(), usb=()",
}
COMPRESSED = {".html", ".js", ".mjs", ".css", ".json", ".webmanifest", ".wasm", ".zip", ".svg", ".txt"}


@lru_cache(maxsize=256)
def etag_of(path: Path, changed: int, size: int) -> str:
    """Entity tag from the file's content; the other arguments make the cache notice a change."""
    return '"' + hashlib.sha256(path.read_bytes()).hexdigest()[:24] + '"'


@lru_cache(maxsize=256)
def gzipped(path: Path, changed: int, size: int) -> bytes:
    """The file compressed, once."""
    return gzip.compress(path.read_bytes(), compresslevel=6, mtime=0)


class SiteHandler(BaseHTTPRequestHandler):
    """GET and HEAD of files below `folder`, published below the path `prefix`."""

    protocol_version = "HTTP/1.1"
    server_version = "asfound"
    sys_version = ""
    folder: Path
    prefix: str
    requests_seen: list[str]

    def do_GET(self) -> None:
        """Answer with the file."""
        self.answer(with_body=True)

    def do_HEAD(self) -> None:
        """Answer with the headers of the file."""
        self.answer(with_body=False)

    def end_headers(self) -> None:
        """Add the security headers to whatever is answered, errors of the base class included."""
        for name, value in SECURITY_HEADERS.items():
            self.send_header(name, value)
        super().end_headers()

    def log_message(self, format: str, *args: Any) -> None:
        """Stay quiet: the terminal is for the person."""

    def answer(self, *, with_body: bool) -> None:
        """Find the file, or say plainly that there is none."""
        path = urlsplit(self.path).path
        self.requests_seen.append(path)
        if path + "/" == self.prefix:
            self.send_empty(HTTPStatus.MOVED_PERMANENTLY, {"Location": self.prefix})
            return
        file = self.file_for(path)
        if file is None:
            self.send_bytes(
                HTTPStatus.NOT_FOUND,
                b"There is nothing at this address.\n",
                {"Content-Type": CONTENT_TYPES[".txt"]},
                with_body,
            )
            return
        self.send_file(file, with_body)

    def file_for(self, path: str) -> Path | None:
        """The file for a request path, never outside the folder."""
        if not path.startswith(self.prefix):
            return None
        name = posixpath.normpath("/" + unquote(path[len(self.prefix) :])).lstrip("/")
        file = (self.folder / (name or "index.html")).resolve()
        return file if file.is_file() and file.is_relative_to(self.folder.resolve()) else None

    def send_file(self, file: Path, with_body: bool) -> None:
        """Send a file, compressed if the browser takes that, or 304 if it has it already."""
        stat = file.stat()
        key = (file, stat.st_mtime_ns, stat.st_size)
        zip_it = file.suffix in COMPRESSED and "gzip" in self.headers.get("Accept-Encoding", "")
        etag = etag_of(*key)
        headers = {
            "Content-Type": CONTENT_TYPES.get(file.suffix, "application/octet-stream"),
            "ETag": etag,
            "Last-Modified": email.utils.formatdate(stat.st_mtime, usegmt=True),
            "Cache-Control": "public, max-age=31536000, immutable" if file.parent.name.startswith("runtime-") else "no-cache",
            "Vary": "Accept-Encoding",
        }
        if self.is_unchanged(etag, headers["Last-Modified"]):
            self.send_empty(HTTPStatus.NOT_MODIFIED, headers)
            return
        if zip_it:
            headers["Content-Encoding"] = "gzip"
        self.send_bytes(HTTPStatus.OK, gzipped(*key) if zip_it else file.read_bytes(), headers, with_body)

    def is_unchanged(self, etag: str, modified: str) -> bool:
        """Whether the browser asked on condition, and has this very file."""
        known = self.headers.get("If-None-Match")
        if known is not None:
            return etag in [tag.strip().removeprefix("W/") for tag in known.split(",")]
        return self.headers.get("If-Modified-Since") == modified

    def send_empty(self, status: HTTPStatus, headers: dict[str, str]) -> None:
        """An answer without a body."""
        self.send_bytes(status, b"", headers, with_body=False)

    def send_bytes(self, status: HTTPStatus, body: bytes, headers: dict[str, str], with_body: bool) -> None:
        """Status, headers and body."""
        self.send_response(status)
        for name, value in headers.items():
            self.send_header(name, value)
        if status != HTTPStatus.NOT_MODIFIED:
            self.send_header("Content-Length", str(len(body)))
        self.end_headers()
        if with_body:
            self.wfile.write(body)


class Server(ThreadingHTTPServer):
    """Threads end with the process; a browser that goes away is no error."""

    daemon_threads = True

    def __init__(self, address: tuple[str, int], handler: type[SiteHandler]) -> None:
        """Bind and listen."""
        self.open_connections: set[socket.socket] = set()
        super().__init__(address, handler)

    def get_request(self) -> tuple[socket.socket, Any]:
        """Remember each connection: browsers keep them open and would go on being served after the end."""
        connection, address = super().get_request()
        self.open_connections.add(connection)
        return connection, address

    def shutdown_request(self, request: Any) -> None:
        """Forget a connection that has ended."""
        self.open_connections.discard(request)
        super().shutdown_request(request)

    def close_connections(self) -> None:
        """Cut all connections."""
        for connection in list(self.open_connections):
            with contextlib.suppress(OSError):
                connection.shutdown(socket.SHUT_RDWR)

    def handle_error(self, request: Any, client_address: Any) -> None:
        """Stay quiet when the browser closes a connection."""


class Site:
    """A running server: `with Site(dist) as site: site.url`. `stop` closes the port for good."""

    def __init__(self, folder: Path, *, port: int = 0, prefix: str = "/") -> None:
        """Bind 127.0.0.1; port 0 takes a free one.

        Raises:
            OSError: the port is taken.
        """
        self.prefix = "/" + prefix.strip("/") + "/" if prefix.strip("/") else "/"
        self.requests_seen: list[str] = []
        values = {"folder": folder, "prefix": self.prefix, "requests_seen": self.requests_seen}
        self._server = Server(("127.0.0.1", port), type("Handler", (SiteHandler,), values))
        self.url = f"http://127.0.0.1:{self._server.server_address[1]}{self.prefix}"
        self._thread = threading.Thread(target=self._server.serve_forever, kwargs={"poll_interval": 0.05}, daemon=True)

    def start(self) -> "Site":
        """Serve in a thread of its own."""
        self._thread.start()
        return self

    def stop(self) -> None:
        """Stop serving and close the port."""
        if self._thread.is_alive():
            self._server.shutdown()
            self._thread.join()
        self._server.server_close()
        self._server.close_connections()

    def __enter__(self) -> "Site":
        return self.start()

    def __exit__(self, *ignored: object) -> None:
        self.stop()
