"""The whole promise in one go: installed once, no server any more, a beam entered by touch, the same numbers as CPython's,
read by somebody else from the link alone, and a photo that outlives the browser's end."""

import hashlib
from collections.abc import Callable
from pathlib import Path

from agreement import screen_shows, told_by_cpython
from browsing import START, Device, ready_without_signal, solver_ready
from conftest import MakeDevice
from pictures import write_picture
from playwright.sync_api import expect
from serving import SiteProcess
from steps import Person, judged, link_text, new_check
from threespan import enter_three_spans, three_spans, without_names

FEWEST_AND_MOST_TOUCHES = (80, 220)  # none of it can be done with less; more is a page that has become a burden


def visited(device: MakeDevice, server: SiteProcess) -> Device:
    """A new phone whose owner opened the app once and waited until it was ready."""
    phone = device(server.url)
    ready_without_signal(phone.open())
    phone.close()
    return phone


def test_a_three_span_check_without_signal_and_its_link_on_a_second_phone(
        dist: Path, serve: Callable[..., SiteProcess], device: MakeDevice, tmp_path: Path) -> None:
    server = serve(dist)
    first = visited(device, server)
    server.stop()

    page = solver_ready(first.open())
    person = new_check(page)
    enter_three_spans(person)
    expect(judged(page)).to_be_visible(timeout=START)
    print(f"three spans from nothing: {person.touches} touches and {person.letters} letters")
    fewest, most = FEWEST_AND_MOST_TOUCHES
    assert fewest <= person.touches <= most

    expect(judged(page)).to_have_class("verdict is-within", timeout=START)
    link = link_text(page, person)
    document, answered = told_by_cpython(link)
    assert without_names(document["record"]) == without_names(three_spans())
    assert answered["outcome"]["word"] == "within"
    person.press("Back to the check")
    expect(judged(page)).to_be_visible(timeout=START)
    screen_shows(page, answered)

    attach_and_kill(first, person, write_picture(tmp_path / "pallet.png"))
    first.close()
    open_link_on_a_second_phone(dist, serve, device, server.port, link, answered["outcome"]["title"])


def attach_and_kill(phone: Device, person: Person, picture: Path) -> None:
    """A photo to the pallet; the browser's process killed; the photo and everything else still there."""
    person.go_to("Load 2: pallet of blocks")
    person.photo("Load 2", picture)
    expect(person.page.get_by_role("img", name="pallet.png")).to_be_visible()
    phone.kill()

    again = Person(solver_ready(phone.open()))
    again.press("Open B7, grid C – street")
    again.go_to("Load 2: pallet of blocks")
    photo = again.page.get_by_role("img", name="pallet.png")
    expect(photo).to_be_visible()
    assert photo.evaluate("(img) => img.decode().then(() => [img.naturalWidth, img.naturalHeight])") == [320, 240]
    expect(again.page.get_by_text(f"sha256 {hashlib.sha256(picture.read_bytes()).hexdigest()[:12]}")).to_be_visible()
    expect(again.page.get_by_role("textbox", name="Load 2, distance", exact=True)).to_have_value("1.50")


def open_link_on_a_second_phone(dist: Path, serve: Callable[..., SiteProcess], device: MakeDevice, port: int, link: str,
                                title: str) -> None:
    """The same address, a profile that never saw the record, and no server when the link is opened."""
    server = serve(dist, port=port)
    second = visited(device, server)
    server.stop()
    page = solver_ready(second.open("#" + link.partition("#")[2]))
    expect(page.get_by_role("heading", name="Worked out again: the numbers are equal")).to_be_visible(timeout=START)
    expect(page.get_by_role("region", name="Outcome in full").get_by_role("heading")).to_have_text(title)
    Person(page).press("Keep a copy as a new check")
    expect(page.get_by_role("textbox", name="Where, member mark", exact=True)).to_have_value("B7")
