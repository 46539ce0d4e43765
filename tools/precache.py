"""What makes a version: the hash of the whole site, the list by which the service worker checks it, the policy."""

import hashlib
import json
from pathlib import Path

from tools.paths import SERVICE_WORKER
from tools.progress import ToolError
from tools.stamps import sha256

# On every response, the workers' own included: a policy in the page's <meta> doesn't reach them.
POLICY = "; ".join(
    (
        "default-src 'none'",
        "script-src 'self' 'wasm-unsafe-eval'",
        "worker-src 'self'",
        "connect-src 'self'",
        "style-src 'self'",
        "img-src 'self' blob:",
        "media-src 'self' blob:",
        "font-src 'self'",
        "manifest-src 'self'",
        "object-src 'none'",
        "base-uri 'none'",
        "form-action 'none'",
        "frame-ancestors 'none'",
    )
)

CONTENT_TYPES = {
    ".html": "text/html; charset=utf-8",
    ".js": "text/javascript; charset=utf-8",
    ".mjs": "text/javascript; charset=utf-8",
    ".css": "text/css; charset=utf-8",
    ".json": "application/json",
    ".webmanifest": "application/manifest+json",
    ".wasm": "application/wasm",  # without exactly this Pyodide waits for ever
    ".zip": "application/zip",
    ".svg": "image/svg+xml",
    ".png": "image/png",
    ".ico": "image/x-icon",
    ".woff2": "font/woff2",
    ".txt": "text/plain; charset=utf-8",
}

# Written last, since they hold the hash of all others.
LATE = {"sw.js", "build.json", "runtime.js"}


def site_files(dist: Path) -> list[Path]:
    """Files of the site in a fixed order."""
    return sorted((path for path in dist.rglob("*") if path.is_file()), key=lambda path: path.relative_to(dist).as_posix())


def build_hash(dist: Path, runtime: dict[str, object]) -> str:
    """Hash of all files of the site, of the service worker's source and of the policy: 16 hex digits."""
    total = hashlib.sha256(SERVICE_WORKER.read_bytes() + POLICY.encode())
    total.update(json.dumps(runtime, sort_keys=True).encode())
    for path in site_files(dist):
        name = path.relative_to(dist).as_posix()
        if name not in LATE:
            total.update(f"{name} {sha256(path)}\n".encode())
    return total.hexdigest()[:16]


def write_build(dist: Path, runtime: dict[str, object], about: dict[str, str]) -> dict[str, str]:
    """Write runtime.js and build.json; returns the latter: version, build (hash), pyodide, numpy, python."""
    build = about | {"build": build_hash(dist, runtime)}
    (dist / "build.json").write_text(json.dumps(build, indent=1, sort_keys=True) + "\n")
    (dist / "runtime.js").write_text(
        "// Which run-time files belong to this build? Written by the assembly.\n"
        f"export const RUNTIME = {json.dumps(runtime, sort_keys=True)};\n"
        f"export const BUILD = {json.dumps(build, sort_keys=True)};\n"
    )
    return build


def precache_list(dist: Path) -> list[dict[str, object]]:
    """Path, SHA-256 and size of every file the service worker keeps: all but itself."""
    return [
        {"path": path.relative_to(dist).as_posix(), "sha256": sha256(path), "size": path.stat().st_size}
        for path in site_files(dist)
        if path.name != "sw.js"
    ]


def write_service_worker(dist: Path, build: str) -> None:
    """Write sw.js with version, policy, file list and content types filled in.

    Raises:
        ToolError: service-worker/sw.js lacks one of the four places for them.
    """
    source = SERVICE_WORKER.read_text(encoding="utf-8")
    types = json.dumps(CONTENT_TYPES)[1:-1]
    files = ",\n".join(json.dumps(entry) for entry in precache_list(dist))
    values = {
        "'@VERSION@'": json.dumps(build),
        "'@POLICY@'": json.dumps(POLICY),
        "/*@FILES@*/": f"\n{files},\n",
        "/*@TYPES@*/": types,
    }
    for place, value in values.items():
        if source.count(place) != 1:
            raise ToolError(f"service-worker/sw.js must hold {place} exactly once: put it back.")
        source = source.replace(place, value)
    (dist / "sw.js").write_text(source, encoding="utf-8")
