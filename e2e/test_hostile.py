"""What can a link or a file from a stranger do? Nothing but be refused in words, or be shown as the text that it is."""

import json
import zipfile
from pathlib import Path

import pytest
from browsing import START, Device, solver_ready
from playwright.sync_api import expect
from steps import Person, demonstration

from pysolver.demo import demo
from pysolver.link import encode
from pysolver.recorded import carried, short

MARKUP = "<img src=x onerror=alert(1)><script>alert(2)</script>"
GOOD = encode(short(carried(demo())))
BROKEN = {
    "cut short": (GOOD[:-40], "cut short or changed"),
    "one letter changed": (GOOD[:200] + ("A" if GOOD[200] != "A" else "B") + GOOD[201:], "cut short or changed"),
    "another version": ("r9" + GOOD[2:], "form r9"),
    "no record": (encode({"hello": "world"}), ""),
    "very long": ("r1." + "A" * 200_001 + ".AAAAAAAAAAAA", "too large"),
}


@pytest.mark.parametrize("kind", BROKEN)
def test_a_broken_link_is_refused_with_words(phone: Device, kind: str) -> None:
    fragment, words = BROKEN[kind]
    page = solver_ready(phone.open("#" + fragment))
    alert = page.get_by_role("alert")
    expect(alert).to_contain_text("The link could not be read.", timeout=15_000)
    expect(alert).to_contain_text(words)
    expect(page.get_by_role("button", name="Keep a copy as a new check")).to_have_count(0)


def test_names_in_a_link_are_shown_as_the_text_they_are(phone: Device) -> None:
    record = demo()
    record["place"]["member"] = record["loads"][0]["name"] = MARKUP
    record["supports"][0]["name"] = MARKUP[:MARKUP.index(">") + 1]
    record["ends"]["left"] = record["found_by"]["name"] = record["limits"][0]["document"] = MARKUP
    page = solver_ready(phone.open("#" + encode(short(carried(record)))))
    expect(page.get_by_role("region", name="Agreement")).to_contain_text("the numbers are equal", timeout=START)
    expect(page.get_by_text(MARKUP).first).to_be_visible()
    person = Person(page)
    person.press("Keep a copy as a new check")
    expect(page.get_by_role("textbox", name="Where, member mark", exact=True)).to_have_value(MARKUP)
    person.result()
    expect(page.get_by_role("region", name="Governing")).to_be_visible(timeout=START)
    assert page.locator("img[src=x], main script").count() == 0
    assert page.evaluate("innerWidth") == 360


def test_numbers_that_were_changed_in_a_link_are_told_apart(phone: Device) -> None:
    document = short(carried(demo()))
    name = next(one for one in document["numbers"] if document["numbers"][one])
    document["numbers"][name] *= 1 + 1e-6
    document["outcome"]["word"] = "within"
    page = solver_ready(phone.open("#" + encode(document)))
    agreement = page.get_by_role("region", name="Agreement")
    expect(agreement).to_contain_text("the numbers differ", timeout=START)
    expect(page.get_by_role("alert")).to_contain_text("not those of the link")
    agreement.get_by_text("Which numbers differ").tap()
    expect(agreement.get_by_role("row", name=name)).to_be_visible()
    expect(agreement.get_by_role("row", name="outcome")).to_contain_text("within")


def bundle(file: Path, members: dict[str, bytes]) -> Path:
    with zipfile.ZipFile(file, "w", zipfile.ZIP_DEFLATED) as packed:
        for name, content in members.items():
            packed.writestr(name, content)
    return file


def test_files_that_are_no_export_are_refused_and_nothing_is_lost(phone: Device, tmp_path: Path) -> None:
    person = demonstration(phone.open())
    person.back_to_list()
    take_in = person.page.get_by_label("Import all", exact=True)
    notice = person.page.locator(".notices")
    (tmp_path / "text.zip").write_text("not a zip at all")
    take_in.set_input_files(tmp_path / "text.zip")
    expect(notice).to_contain_text("This is not a .zip file, or it is damaged.")
    take_in.set_input_files(bundle(tmp_path / "other.zip", {"readme.txt": b"hello"}))
    expect(notice).to_contain_text("no records.json")
    take_in.set_input_files(bundle(tmp_path / "bomb.zip", {"records.json": b" " * 25_000_000}))
    expect(notice).to_contain_text("would unpack to more than is taken in")
    records = {"format": "asfound-records", "version": 1, "exported": "", "records": [{"id": "x", "spans": "no"}, 7]}
    take_in.set_input_files(bundle(tmp_path / "wrong.zip", {
        "records.json": json.dumps(records).encode(), "photos/" + "0" * 64 + ".jpg": b"not that", "../../evil": b"no"}))
    expect(notice).to_contain_text("Entry 2 is no check of Asfound: left out.")
    expect(notice).to_contain_text("is not the picture its name says: left out.")
    expect(person.page.get_by_role("button", name="Open T4, hall wall – quay side", exact=True)).to_be_visible()


def test_a_photo_that_is_none_is_refused(phone: Device, tmp_path: Path) -> None:
    person = demonstration(phone.open())
    person.go_to("Load 2: pack of paving")
    page_of_a_stranger = tmp_path / "photo.svg"
    page_of_a_stranger.write_text("<svg xmlns='http://www.w3.org/2000/svg'><script>alert(1)</script></svg>")
    person.photo("Load 2", page_of_a_stranger)
    expect(person.page.locator(".notices")).to_contain_text("“photo.svg” is no photo that can be shown")
    expect(person.page.get_by_text("sha256")).to_have_count(0)
