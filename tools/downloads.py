"""Fetching from the Python package index: one pinned wheel without pip, everything else with the pip of .venv."""

import configparser
import hashlib
import importlib.util
import os
import re
import ssl
import subprocess
import sys
import urllib.error
import urllib.parse
import urllib.request
from pathlib import Path

from tools.paths import REQUIREMENTS, cache_folder, venv_python
from tools.progress import ToolError, run
from tools.stamps import sha256

PIP_WHEEL = "pip-26.3-py3-none-any.whl"
PIP_SHA256 = "f3b60b20ffaadd4415ed7957212a38ac63fa4c5fa375bd0f4a797777940fad13"


def pip_setting(name: str) -> str | None:
    """A setting of pip as the user has it: environment first, then pip's own configuration files."""
    value = os.environ.get("PIP_" + name.upper().replace("-", "_"))
    if value:
        return value
    home, found = Path.home(), None
    named = os.environ.get("PIP_CONFIG_FILE")
    files = [
        Path("/etc/pip.conf"),
        Path("/etc/xdg/pip/pip.conf"),
        home / ".pip/pip.conf",
        home / ".config/pip/pip.conf",
        home / "pip/pip.ini",
        *([Path(named)] if named else []),
    ]
    for file in files:
        parser = configparser.RawConfigParser()
        if parser.read(file, encoding="utf-8"):
            found = parser.get("global", name, fallback=found)
    return found


def fetch(url: str) -> tuple[bytes, str]:
    """Body of an http(s) address and where it finally came from, trusting the certificates that pip trusts."""
    cafile = pip_setting("cert") or os.environ.get("REQUESTS_CA_BUNDLE")
    context = ssl.create_default_context(cafile=cafile)
    with urllib.request.urlopen(url, timeout=120, context=context) as answer:
        body: bytes = answer.read()
        return body, answer.geturl()


def pip_wheel_from_index() -> bytes:
    """The pinned pip wheel from the simple index that the user's pip would ask."""
    index = (pip_setting("index-url") or "https://pypi.org/simple").rstrip("/")
    try:
        page, address = fetch(f"{index}/pip/")
        link = re.search(r'href="([^"]*' + re.escape(PIP_WHEEL) + r')(#[^"]*)?"', page.decode("utf-8", "replace"))
        if not link:
            raise ToolError(f"{index} has no {PIP_WHEEL}: use an index that mirrors PyPI, or install pip for {sys.executable}.")
        return fetch(urllib.parse.urljoin(address, link[1]))[0]
    except (urllib.error.URLError, OSError) as error:
        raise ToolError(f"{index} can't be reached ({error}): connect, or set PIP_INDEX_URL to an index that can.") from None


def pip_wheel() -> Path:
    """The pinned pip wheel, from the cache or fetched; its hash is checked every time.

    Raises:
        ToolError: it can't be fetched, or what came has another hash.
    """
    wheel = cache_folder() / PIP_WHEEL
    if wheel.is_file() and sha256(wheel) == PIP_SHA256:
        return wheel
    wheel.parent.mkdir(parents=True, exist_ok=True)
    if importlib.util.find_spec("pip"):  # it knows proxies, mirrors and certificates of this machine
        command = [
            sys.executable,
            "-m",
            "pip",
            "download",
            "--quiet",
            "--no-deps",
            "--only-binary=:all:",
            "--dest",
            str(wheel.parent),
            "pip==" + PIP_WHEEL.split("-")[1],
        ]
        subprocess.run(command, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL, check=False)
    if not wheel.is_file() or sha256(wheel) != PIP_SHA256:
        body = pip_wheel_from_index()
        found = hashlib.sha256(body).hexdigest()
        if found != PIP_SHA256:
            raise ToolError(f"{PIP_WHEEL} has sha256 {found}, wanted {PIP_SHA256}: refused; try another network or mirror.")
        wheel.write_bytes(body)
    return wheel


def pinned(names: set[str]) -> str:
    """The blocks of tools/requirements.txt, pins and hashes, of the named packages.

    Raises:
        ToolError: a name has no pin.
    """
    blocks = re.findall(r"^([\w.-]+)==.*?(?=^[\w.-]+==|\Z)", REQUIREMENTS.read_text(), re.M | re.S)
    texts = re.split(r"^(?=[\w.-]+==)", REQUIREMENTS.read_text(), flags=re.M)[1:]
    missing = names - set(blocks)
    if missing:
        raise ToolError(f"{', '.join(sorted(missing))} has no pin in tools/requirements.txt: add it (python3 -m tools lock).")
    return "".join(text for name, text in zip(blocks, texts, strict=True) if name in names)


def pure_wheels(names: set[str]) -> list[Path]:
    """The pinned pure-Python wheels of the named packages, from the cache or fetched with hash check."""
    text = pinned(names)
    folder = cache_folder() / "wheels" / hashlib.sha256(text.encode()).hexdigest()[:16]
    if not (folder / "complete").is_file():
        folder.mkdir(parents=True, exist_ok=True)
        wish = folder / "requirements.txt"
        wish.write_text(text)
        run(
            [
                venv_python(),
                "-m",
                "pip",
                "download",
                "--quiet",
                "--require-hashes",
                "--no-deps",
                "--only-binary=:all:",
                "--platform",
                "any",
                "--implementation",
                "py",
                "--abi",
                "none",
                "--dest",
                folder,
                "-r",
                wish,
            ],
            name="pip-download-wheels",
            advice="check the connection to the Python package index and try again.",
        )
        (folder / "complete").touch()
    return sorted(folder.glob("*.whl"))
