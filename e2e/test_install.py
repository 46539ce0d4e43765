"""When may the app say that it opens without signal, and what if a host, a cable or a new version comes between?"""

import json
import shutil
import urllib.error
import urllib.request
import zipfile
from collections.abc import Callable
from pathlib import Path

from browsing import START, Device, ready_without_signal, solver_ready
from conftest import MakeDevice
from playwright.sync_api import Page, expect
from serving import SiteProcess
from steps import demonstration, new_check

from tools import precache

Serve = Callable[..., SiteProcess]
POLICY_PARTS = ("default-src 'none'", "script-src 'self' 'wasm-unsafe-eval'", "connect-src 'self'", "object-src 'none'",
                "frame-ancestors 'none'", "base-uri 'none'", "form-action 'none'")


def offline_words(page: Page) -> str:
    return page.locator(".offline").inner_text()


def test_every_answer_of_the_server_carries_the_policy(dist: Path, serve: Serve) -> None:
    server = serve(dist)
    names = [str(file.relative_to(dist)) for file in sorted(dist.rglob("*")) if file.is_file()]
    for name in ["", *names, "no/such/file", "%2e%2e/pyproject.toml"]:
        try:
            answer = urllib.request.urlopen(server.url + name)
        except urllib.error.HTTPError as error:
            answer = error
        with answer:
            policy = answer.headers["Content-Security-Policy"]
            assert all(part in policy for part in POLICY_PARTS), name
            assert "unsafe-inline" not in policy and "unsafe-eval'" not in policy.replace("wasm-unsafe-eval'", "")
            assert answer.headers["X-Content-Type-Options"] == "nosniff"
            assert (answer.status == 200) == (name in ["", *names]), name


def test_below_a_sub_path_it_installs_and_opens_without_the_server(dist: Path, serve: Serve, device: MakeDevice) -> None:
    server = serve(dist, prefix="/on/this/host/")
    assert server.url.endswith("/on/this/host/")
    phone = device(server.url)
    ready_without_signal(phone.open())
    phone.close()
    server.stop()
    phone.requested.clear()
    demonstration(phone.open())
    assert all(url.startswith((server.url, "blob:", "data:")) for url in phone.requested)


def test_a_file_that_arrives_changed_keeps_it_from_saying_ready(dist: Path, serve: Serve, device: MakeDevice,
                                                                tmp_path: Path) -> None:
    damaged = Path(shutil.copytree(dist, tmp_path / "damaged"))
    with (damaged / "css" / "print.css").open("a") as style:
        style.write("\n/* one line more on the way */\n")
    server = serve(damaged)
    phone = device(server.url, allow=("service worker", "ServiceWorker", "did not arrive as it was published"))
    page = solver_ready(phone.open())
    offline = page.locator(".offline")
    expect(offline).to_contain_text("storing failed", timeout=30_000)
    expect(offline).to_contain_text("print.css did not arrive as it was published")
    expect(page.get_by_text("Ready without signal.")).to_have_count(0)
    person = demonstration(page)
    person.back_to_list()
    port = server.port
    server.stop()
    serve(dist, port=port)
    person.press("Try storing again")
    ready_without_signal(page)


def newer(dist: Path, folder: Path) -> Path:
    """The site as it would be assembled after a change of the style: another build, another list of files."""
    site = Path(shutil.copytree(dist, folder))
    with (site / "css" / "base.css").open("a") as style:
        style.write("\n:root { --newer-version: 1; }\n")
    build = json.loads((site / "build.json").read_text()) | {"build": "newer-for-a-test"}
    (site / "build.json").write_text(json.dumps(build))
    precache.write_service_worker(site, build["build"])
    return site


def test_a_new_version_waits_until_the_user_says_so(dist: Path, serve: Serve, device: MakeDevice, tmp_path: Path) -> None:
    server = serve(dist)
    phone = device(server.url)
    page = ready_without_signal(phone.open())
    person = new_check(page)
    person.write("Where, member mark", "kept")
    person.back_to_list()
    port = server.port
    server.stop()
    serve(newer(dist, tmp_path / "newer"), port=port)
    page.reload()
    expect(page.get_by_role("button", name="Use the new version")).to_be_visible(timeout=START)
    mark = "getComputedStyle(document.documentElement).getPropertyValue('--newer-version').trim()"
    page.reload()
    expect(page.get_by_role("button", name="Use the new version")).to_be_visible(timeout=START)
    assert page.evaluate(mark) == "", "the new version took over by itself"
    page.get_by_role("button", name="Use the new version").tap()
    page.wait_for_function("() => getComputedStyle(document.documentElement).getPropertyValue('--newer-version').trim() === '1'",
                           timeout=START)
    ready_without_signal(page)
    expect(page.get_by_role("button", name="Open kept, ends not named", exact=True)).to_be_visible()


def test_without_web_assembly_it_says_so_and_entries_are_kept_and_exported(dist: Path, serve: Serve, device: MakeDevice,
                                                                          tmp_path: Path) -> None:
    blocked = Path(shutil.copytree(dist, tmp_path / "blocked"))
    for file in blocked.rglob("*.wasm"):
        file.unlink()
    server = serve(blocked)
    phone = device(server.url, allow=("404", "wasm", "service worker", "ServiceWorker"))
    page = phone.open()
    expect(page.get_by_text("The solver did not start.")).to_be_visible(timeout=START)
    expect(page.get_by_role("button", name="Try again", exact=True)).to_be_visible()
    expect(page.get_by_text("Ready without signal.")).to_have_count(0)
    person = new_check(page)
    person.write("Where, member mark", "B3")
    person.go_to("Span A–B")
    person.choose("Span A–B, measured how", "Centre to centre")
    person.type_number("Span A–B, centre to centre", "5.10")
    person.close_pad()
    expect(person.bar()).not_to_contain_text("within")
    page.reload()
    person.go_to("Span A–B")
    expect(page.get_by_role("textbox", name="Span A–B, centre to centre", exact=True)).to_have_value("5.10")
    person.back_to_list()
    with page.expect_download() as download:
        person.press("Export all")
    download.value.save_as(tmp_path / "kept.zip")
    with zipfile.ZipFile(tmp_path / "kept.zip") as packed:
        records = json.loads(packed.read("records.json"))["records"]
    assert [one["place"]["member"] for one in records] == ["B3"]
    expect(page.get_by_text("1 check and 0 photos handed")).to_be_visible()


def test_the_browser_finds_nothing_that_keeps_it_from_being_installed(phone: Device) -> None:
    """Asked of Chromium itself, from the cache alone: manifest, icons, service worker."""
    page = solver_ready(phone.open())
    browser = page.context.new_cdp_session(page)
    assert browser.send("Page.getAppManifest")["errors"] == []
    assert browser.send("Page.getInstallabilityErrors")["installabilityErrors"] == []
