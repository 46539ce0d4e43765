"""What does a person do with the page? Every step is a touch on something that can be seen, or a key of the phone's keyboard."""

import contextlib
from dataclasses import dataclass
from pathlib import Path

from browsing import START, solver_ready
from playwright.sync_api import Locator, Page, TimeoutError, expect

KEY_NAMES = {".": "Point", "/": "Slash", "'": "Feet mark", '"': "Inches mark", " ": "Space", "-": "Dash"}


@dataclass
class Person:
    """Someone with one thumb. Counts touches, and letters typed on the phone's own keyboard."""

    page: Page
    touch: bool = True
    touches: int = 0
    letters: int = 0

    def tap(self, what: Locator) -> None:
        """Touch it once (with a mouse where there is no touch)."""
        if self.touch:
            what.tap()
        else:
            what.click()
        self.touches += 1

    def press(self, name: str) -> None:
        """Touch the button of this name."""
        self.tap(self.page.get_by_role("button", name=name, exact=True))

    def choose(self, question: str, answer: str) -> None:
        """Touch one answer of a question with a few."""
        self.tap(self.page.get_by_label(f"{question}: {answer}", exact=True))

    def write(self, name: str, words: str) -> None:
        """Touch a text field and type with the phone's keyboard."""
        field = self.page.get_by_role("textbox", name=name, exact=True)
        self.tap(field)
        field.press_sequentially(words)
        self.letters += len(words)

    def pad(self) -> Locator:
        return self.page.get_by_role("region", name="Number pad")

    def key(self, sign: str) -> None:
        """One key of the number pad."""
        self.tap(self.pad().get_by_role("button", name=KEY_NAMES.get(sign, sign), exact=True))

    def type_number(self, name: str, figures: str, unit: str | None = None) -> None:
        """Key in a number without entering it. The field is touched first unless it is already there."""
        there = self.pad().get_by_role("textbox", name=name, exact=True)
        if there.count() == 0:
            self.tap(self.page.get_by_role("textbox", name=name, exact=True))
        expect(there).to_be_visible()
        for sign in figures:
            self.key(sign)
        if unit:
            self.key(f"Unit {unit}")
        if figures:
            expect(there).to_have_value(f"{figures} {unit}" if unit else figures)

    def enter(self, name: str, figures: str, means: str | None = None, *, unit: str | None = None) -> None:
        """Key in a number, Next, and say how it is known if that is asked."""
        self.type_number(name, figures, unit)
        self.key("Next")
        if means:
            self.choose(f"{name}, how known", means)
        expect(self.pad().get_by_role("textbox", name=name, exact=True)).to_have_count(0)

    def close_pad(self) -> None:
        """Close the pad if it is up."""
        close = self.pad().get_by_role("button", name="Close the pad", exact=True)
        if close.count():
            self.tap(close)

    def on_to(self, title: str) -> None:
        """The button at the foot of each thing, which leads to the next one. Nothing to do if Next led there already."""
        self.close_pad()
        if self.station() != title:
            with contextlib.suppress(TimeoutError):  # Next was just about to lead there
                self.page.get_by_role("button", name=f"On to {title}", exact=True).tap(timeout=3000)
                self.touches += 1
        self.arrive(title)

    def arrive(self, title: str) -> None:
        """Wait until the page has led to a thing."""
        expect(self.page.get_by_role("combobox", name="Go to", exact=True).locator("option:checked")).to_have_text(title)

    def station(self) -> str:
        """Title of the thing whose questions are shown."""
        return self.page.get_by_role("combobox", name="Go to", exact=True).locator("option:checked").inner_text()

    def go_to(self, title: str) -> None:
        """Pick a thing in the list of the walk."""
        self.close_pad()
        self.page.get_by_role("combobox", name="Go to", exact=True).select_option(label=title)
        self.touches += 2

    def back_to_list(self) -> None:
        self.close_pad()
        self.press("Back to the list")
        expect(self.page.get_by_role("heading", name="Checks on this device")).to_be_visible()

    def result(self) -> None:
        """Touch the bar at the foot."""
        self.close_pad()
        self.tap(self.bar())

    def bar(self) -> Locator:
        return self.page.get_by_role("button", name="Outcome: ")

    def photo(self, name: str, file: Path) -> None:
        """Take a photo: the phone's camera hands over a file."""
        self.page.get_by_label(f"{name}, take a photo", exact=True).set_input_files(file)
        self.touches += 2


def new_check(page: Page, *, touch: bool = True) -> Person:
    """From the list, by touch."""
    person = Person(page, touch)
    person.press("New check")
    expect(page.get_by_role("textbox", name="Where, member mark", exact=True)).to_be_visible()
    return person


def demonstration(page: Page, *, touch: bool = True) -> Person:
    """The demonstration check, opened at its result."""
    person = Person(solver_ready(page), touch)
    person.press("Demonstration check")
    expect(judged(page)).to_be_visible(timeout=START)
    return person


def judged(page: Page) -> Locator:
    """The outcome in full, once it is one (not "working")."""
    return page.locator("section[aria-label='Outcome in full']:not(.is-working)")


def link_text(page: Page, person: Person) -> str:
    """Touch Share and read the link that is shown."""
    person.press("Share this check")
    box = page.get_by_role("textbox", name="The link, ")
    expect(box).to_be_visible(timeout=START)
    return box.input_value()
