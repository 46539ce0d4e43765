"""Does the local server send what the site needs, on every response?

Sources: the media types are those of the IANA registry (application/wasm, application/manifest+json, text/javascript by
RFC 9239); conditional requests by RFC 9110 section 13; the security policy by W3C CSP Level 3.
"""

import gzip
import http.client
import socket
from collections.abc import Iterator
from pathlib import Path

import pytest

from tools.server import Site

pytestmark = pytest.mark.cpython_only

FILES = {
    "index.html": b"<!doctype html><title>x</title>",
    "main.js": b"export const one = 1;\n" * 50,
    "python.mjs": b"export {};",
    "look.css": b"p { color: black }",
    "app.webmanifest": b"{}",
    "build.json": b"{}",
    "notices.txt": b"text",
    "icons/icon.svg": b"<svg xmlns='http://www.w3.org/2000/svg'/>",
    "runtime-0123/python.wasm": b"\0asm\1\0\0\0",
    "runtime-0123/app.zip": b"PK",
}


@pytest.fixture
def site(tmp_path: Path) -> Iterator[Site]:
    for name, content in FILES.items():
        (tmp_path / name).parent.mkdir(parents=True, exist_ok=True)
        (tmp_path / name).write_bytes(content)
    with Site(tmp_path, prefix="/sub/path") as running:
        yield running


def ask(site: Site, path: str, method: str = "GET", **headers: str) -> tuple[http.client.HTTPResponse, bytes]:
    connection = http.client.HTTPConnection(site.url.split("/")[2], timeout=10)
    connection.request(method, path, headers={name.replace("_", "-"): value for name, value in headers.items()})
    answer = connection.getresponse()
    body = answer.read()
    connection.close()
    return answer, body


def ask_again(connection: http.client.HTTPConnection) -> None:
    connection.request("GET", "/sub/path/")
    connection.getresponse()


REQUESTS = [("GET", f"/sub/path/{name}", 200) for name in FILES] + [
    ("GET", "/sub/path/", 200),
    ("GET", "/sub/path/index.html?from=a-link", 200),
    ("HEAD", "/sub/path/main.js", 200),
    ("GET", "/sub/path", 301),
    ("GET", "/sub/path/nothing.js", 404),
    ("GET", "/", 404),
    ("GET", "/sub/path/../../etc/passwd", 404),
    ("GET", "/sub/path/%2e%2e/%2e%2e/etc/passwd", 404),
    ("POST", "/sub/path/", 501),
]


@pytest.mark.parametrize(("method", "path", "status"), REQUESTS)
def test_every_response_carries_the_security_headers(site: Site, method: str, path: str, status: int) -> None:
    answer, _ = ask(site, path, method)
    assert answer.status == status
    policy = dict(part.split(" ", 1) for part in answer.headers["Content-Security-Policy"].split("; "))
    assert policy["default-src"] == "'none'"
    assert policy["script-src"] == "'self' 'wasm-unsafe-eval'"
    assert policy["object-src"] == policy["base-uri"] == policy["form-action"] == policy["frame-ancestors"] == "'none'"
    assert "unsafe-inline" not in str(policy)
    assert "'unsafe-eval'" not in str(policy)
    assert answer.headers["X-Content-Type-Options"] == "nosniff"
    assert answer.headers["Referrer-Policy"] == "no-referrer"


@pytest.mark.parametrize(
    ("name", "media_type"),
    [
        ("index.html", "text/html; charset=utf-8"),
        ("main.js", "text/javascript; charset=utf-8"),
        ("python.mjs", "text/javascript; charset=utf-8"),
        ("look.css", "text/css; charset=utf-8"),
        ("app.webmanifest", "application/manifest+json"),
        ("runtime-0123/python.wasm", "application/wasm"),
        ("icons/icon.svg", "image/svg+xml"),
    ],
)
def test_each_file_has_its_media_type(site: Site, name: str, media_type: str) -> None:
    assert ask(site, f"/sub/path/{name}")[0].headers["Content-Type"] == media_type


def test_an_unchanged_file_is_not_sent_again_and_a_changed_one_is(site: Site, tmp_path: Path) -> None:
    first, _ = ask(site, "/sub/path/main.js")
    etag, modified = first.headers["ETag"], first.headers["Last-Modified"]
    again, body = ask(site, "/sub/path/main.js", If_None_Match=etag)
    assert (again.status, body) == (304, b"")
    assert "Content-Security-Policy" in again.headers
    assert ask(site, "/sub/path/main.js", If_Modified_Since=modified)[0].status == 304
    (tmp_path / "main.js").write_bytes(b"export const two = 2;")
    assert ask(site, "/sub/path/main.js", If_None_Match=etag)[1] == b"export const two = 2;"


def test_text_is_compressed_for_who_takes_it(site: Site) -> None:
    answer, body = ask(site, "/sub/path/main.js", Accept_Encoding="gzip, br")
    assert answer.headers["Content-Encoding"] == "gzip"
    assert gzip.decompress(body) == FILES["main.js"]
    assert ask(site, "/sub/path/main.js")[1] == FILES["main.js"]


def test_only_the_folder_named_by_its_hash_is_kept_without_asking(site: Site) -> None:
    assert "immutable" in ask(site, "/sub/path/runtime-0123/app.zip")[0].headers["Cache-Control"]
    assert ask(site, "/sub/path/main.js")[0].headers["Cache-Control"] == "no-cache"


def test_after_stop_no_connection_is_served_any_more_not_even_an_open_one(site: Site) -> None:
    address = site.url.split("/")[2]
    kept_open = http.client.HTTPConnection(address, timeout=5)
    kept_open.request("GET", "/sub/path/")
    kept_open.getresponse().read()
    kept_open.auto_open = 0
    site.stop()
    with pytest.raises((http.client.HTTPException, ConnectionError)):
        ask_again(kept_open)
    host, port = address.split(":")
    with pytest.raises(ConnectionRefusedError):
        socket.create_connection((host, int(port)), timeout=5)
    kept_open.close()
