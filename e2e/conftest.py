"""With what is the assembled site looked at? A copy of dist/, servers that can be stopped, and browsers that are phones.

Each phone has a profile on disk, so it can be closed, killed and opened again. Most tests take a copy of one profile that
was prepared once: the app was opened there until it said "Ready without signal", then its server was ended for good. So
everything they do is done without a server.
"""

import os
import shutil
from collections.abc import Callable, Iterator
from dataclasses import dataclass
from pathlib import Path

import pytest
from browsing import Device, ready_without_signal
from playwright.sync_api import Playwright, sync_playwright
from serving import ROOT, SiteProcess

from tools import chromium

MakeDevice = Callable[..., Device]


@pytest.fixture(scope="session")
def dist(tmp_path_factory: pytest.TempPathFactory) -> Path:
    """A copy of the assembled site that no other assembly can change meanwhile. ASFOUND_DIST names another one."""
    source = Path(os.environ.get("ASFOUND_DIST", ROOT / "dist"))
    if not (source / "sw.js").is_file():
        pytest.fail(f"{source} is not assembled: run `python3 -m tools assemble` first.")
    return Path(shutil.copytree(source, tmp_path_factory.mktemp("site") / "dist"))


@pytest.fixture(scope="session")
def playwright() -> Iterator[Playwright]:
    with sync_playwright() as running:
        yield running


@pytest.fixture(scope="session")
def program() -> str:
    """The browser."""
    return os.environ.get("ASFOUND_CHROMIUM") or chromium.ensure()


@pytest.fixture
def serve() -> Iterator[Callable[..., SiteProcess]]:
    """Starts servers; all are stopped at the end."""
    running: list[SiteProcess] = []

    def start(folder: Path, *, port: int = 0, prefix: str = "/") -> SiteProcess:
        running.append(SiteProcess(folder, port=port, prefix=prefix))
        return running[-1]

    yield start
    for server in running:
        server.stop()


@pytest.fixture
def device(playwright: Playwright, program: str, tmp_path: Path) -> Iterator[MakeDevice]:
    """Makes phones (or, with wide=True, desktops) with profiles of their own; closes them and looks what they reported."""
    made: list[Device] = []

    def make(url: str, *, profile: Path | None = None, wide: bool = False, allow: tuple[str, ...] = ()) -> Device:
        folder = tmp_path / f"profile{len(made)}"
        if profile is not None:
            shutil.copytree(profile, folder, symlinks=True, ignore=shutil.ignore_patterns("Singleton*"))
        made.append(Device(playwright, program, folder, url, wide=wide, allow=allow))
        return made[-1]

    yield make
    for one in made:
        one.close()
    for one in made:
        assert one.complaints() == []


@dataclass(frozen=True)
class Installed:
    """A profile in which the app was installed from `url`, whose server is gone."""

    profile: Path
    url: str


@pytest.fixture(scope="session")
def installed(playwright: Playwright, program: str, dist: Path, tmp_path_factory: pytest.TempPathFactory) -> Installed:
    """The prepared profile. Its server is gone before any test gets it."""
    server = SiteProcess(dist)
    profile = tmp_path_factory.mktemp("installed") / "profile"
    phone = Device(playwright, program, profile, server.url)
    ready_without_signal(phone.open())
    phone.close()
    server.stop()
    assert phone.complaints() == []
    return Installed(profile=profile, url=server.url)


@pytest.fixture
def phone(device: MakeDevice, installed: Installed) -> Device:
    """A phone with the app installed and no server."""
    return device(installed.url, profile=installed.profile)


@pytest.fixture
def desk(device: MakeDevice, installed: Installed) -> Device:
    """A desktop of 1280 x 800 with the app installed and no server."""
    return device(installed.url, profile=installed.profile, wide=True)
