"""Can every screen be read, reached and touched, on a phone of 360 x 740 and on a desk of 1280 x 800? Pictures: e2e/shots."""

from collections.abc import Callable
from pathlib import Path

import pytest
from browsing import START, Device, solver_ready
from playwright.sync_api import Page, expect
from serving import ROOT
from steps import Person, demonstration, judged, new_check

from pysolver.demo import demo
from pysolver.link import encode
from pysolver.recorded import carried, short

SHOTS = Path(__file__).parent / "shots"
AXE = (ROOT / "tools" / "node_modules" / "axe-core" / "axe.min.js").read_text(encoding="utf-8")
RULES = "{runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'], resultTypes: ['violations']}"
VIOLATIONS = f"""async () => (await axe.run(document, {RULES})).violations.map((one) => [one.impact, one.id,
  one.nodes.map((node) => `${{node.target.join(' ')}} ${{node.failureSummary}}`).slice(0, 4)])"""
SMALLEST = 44  # CSS px: WCAG 2.2, 2.5.5 (enhanced target size)

# Whatever takes a touch: for a radio or check box that is its whole label.
TARGETS = """() => [...document.querySelectorAll(
    'button, a[href], select, textarea, summary, label:has(input), input:not(label input)')]
  .filter((one) => one.checkVisibility({visibilityProperty: true}) && !one.disabled && one.getClientRects().length)
  .map((one) => ({ name: one.getAttribute('aria-label') || one.id || one.textContent.trim().slice(0, 60),
    box: one.getBoundingClientRect() }))
  .filter(({box}) => box.width > 0 && (box.width < MIN - 0.5 || box.height < MIN - 0.5))
  .map(({name, box}) => `${name}: ${Math.round(box.width)} x ${Math.round(box.height)}`)""".replace("MIN", str(SMALLEST))

CUT_OFF = """() => [...document.querySelectorAll(
    'button, label, p, h1, h2, h3, dd, dt, td, th, li, legend, summary, b, small, span')]
  .filter((one) => one.checkVisibility({visibilityProperty: true, opacityProperty: true}))
  .filter((one) => one.closest('svg') === null && one.getClientRects().length)
  .filter((one) => one.getBoundingClientRect().right > innerWidth + 1 && !one.closest('.drawing'))
  .map((one) => one.textContent.trim().slice(0, 60))"""

# With the check screen in view only its middle scrolls: the bar at the foot never leaves.
BAR_LEAVES = """() => { const bar = document.querySelector('.outcome-bar');
  if (!bar) return false;
  scrollTo(0, 10000);
  const away = scrollY > 1 || bar.getBoundingClientRect().bottom > innerHeight + 1;
  scrollTo(0, 0);
  return away; }"""

# Above the number pad stands which number it is for.
LABEL_COVERED = """() => { const label = document.querySelector('.pad-panel label');
  if (!label) return false;
  const box = label.getBoundingClientRect();
  return [box.top + 2, box.bottom - 2].some((y) => !label.contains(document.elementFromPoint(box.left + 8, y))); }"""


def faults(page: Page, name: str, *, wide: bool) -> list[str]:
    """What is wrong with the screen as it stands; also takes its picture."""
    SHOTS.mkdir(exist_ok=True)
    page.screenshot(path=SHOTS / f"{'desk' if wide else 'phone'}-{name}.png")
    page.evaluate(AXE)
    found = page.evaluate(VIOLATIONS)
    wrong = [f"axe {impact}: {rule} {nodes}" for impact, rule, nodes in found if impact in ("serious", "critical")]
    width = page.evaluate("innerWidth")
    if width != (1280 if wide else 360):
        wrong.append(f"the page is {width} px wide")
    if page.evaluate(BAR_LEAVES):
        wrong.append("the bar at the foot can be scrolled away")
    if page.evaluate(LABEL_COVERED):
        wrong.append("the name of the number above the pad is covered")
    wrong += [f"cut off at the right: {text}" for text in page.evaluate(CUT_OFF)]
    if not wide:
        wrong += [f"too small to touch: {text}" for text in page.evaluate(TARGETS)]
    return [f"{name}: {text}" for text in wrong]


def nothing_wrong(found: list[str]) -> None:
    """Fail with the whole list."""
    if found:
        pytest.fail(f"{len(found)} faults:\n" + "\n".join(found), pytrace=False)


def unfold(page: Page) -> None:
    """Open everything that can be folded out."""
    page.evaluate("() => document.querySelectorAll('details').forEach((one) => { one.open = true; })")


def every_screen(device: Device) -> list[str]:
    """Walk through all screens and gather what is wrong."""
    wide, touch = device.wide, not device.wide
    wrong: list[str] = []

    def look(name: str) -> None:
        wrong.extend(faults(page, name, wide=wide))

    page = solver_ready(device.open())
    look("01-list-empty")
    person = Person(page, touch)
    for button, name in (("Settings", "02-settings"), ("What this tool does not do, notices and licences", "03-about")):
        person.press(button)
        expect(page.get_by_role("heading", level=1)).not_to_have_text("Asfound")
        look(name)
        page.get_by_role("button", name="‹ List").click()
    demonstration(page, touch=touch)
    look("10-result")
    page.get_by_role("region", name="Decision").scroll_into_view_if_needed()
    look("11-result-decision")
    page.get_by_role("region", name="Governing").scroll_into_view_if_needed()
    look("12-result-governing")
    page.get_by_role("region", name="Reactions").scroll_into_view_if_needed()
    look("13-result-reactions")
    if not wide:
        stations(page, person, look)
    share_and_list(page, person, look)
    page = solver_ready(device.open("#" + encode(short(carried(demo())))))
    expect(page.get_by_role("region", name="Agreement")).to_be_visible(timeout=START)
    look("50-opened-link")
    page.goto("about:blank")
    page.goto(device.url + "#r1.damaged")
    expect(page.get_by_role("alert")).to_be_visible(timeout=START)
    look("51-broken-link")
    page.goto("about:blank")
    page.goto(device.url)
    person = new_check(solver_ready(page), touch=touch)
    look("60-new-check")
    person.result()
    expect(judged(page)).to_be_visible(timeout=START)
    look("61-new-check-result")
    return wrong


def stations(page: Page, person: Person, look: Callable[[str], None]) -> None:
    """All things of the walk on a phone, the number pad, and the plain list of fields."""
    titles = page.get_by_role("combobox", name="Go to", exact=True).locator("option").all_inner_texts()
    for at, title in enumerate(titles[:-1]):
        person.go_to(title)
        look(f"20-{at:02}-{title.partition(':')[0].replace(' ', '-').lower()}")
    unfold(page)
    person.go_to("Member")
    unfold(page)
    look("21-member-all-open")
    person.go_to("Load 2: pack of paving")
    person.tap(page.get_by_role("textbox", name="Load 2, size per length", exact=True))
    look("30-pad")
    person.key("Backspace")
    look("31-pad-typing")
    person.close_pad()
    look("32-half-typed")
    person.tap(page.get_by_role("textbox", name="Load 2, size per length", exact=True))
    person.key("Next")
    look("33-after-next")
    person.close_pad()
    person.go_to("Overhangs")
    person.type_number("Overhangs, beyond A", "0.4")
    person.key("Next")
    look("34-pad-how-known")
    person.choose("Overhangs, beyond A, how known", "steel tape")
    expect(person.pad().get_by_role("textbox", name="Overhangs, beyond C", exact=True)).to_be_visible()
    person.close_pad()


def share_and_list(page: Page, person: Person, look: Callable[[str], None]) -> None:
    """Sharing, the list with a check, distress."""
    if person.touch:
        person.press("All fields")
        look("40-all-fields")
        person.press("All fields")
        person.result()
        expect(judged(page)).to_be_visible(timeout=START)
    person.press("Share this check")
    expect(page.get_by_role("textbox", name="The link, ")).to_be_visible(timeout=START)
    look("41-share")
    person.press("Back to the check")
    person.back_to_list()
    look("42-list")
    person.press("Delete T4")
    look("43-list-deleted")
    person.press("Undo delete")
    person.press("Open T4, hall wall – quay side")
    if person.touch:
        person.go_to("Look")
    person.choose("Look, at the ends", "Something")
    expect(page.get_by_role("alertdialog")).to_be_visible(timeout=START)
    look("44-clear-the-area")


def test_every_screen_on_a_phone(phone: Device) -> None:
    nothing_wrong(every_screen(phone))


def test_every_screen_on_a_desk(desk: Device) -> None:
    nothing_wrong(every_screen(desk))


@pytest.mark.parametrize("light", ["Dark", "Bright sun: black on white"])
def test_other_light_and_large_type(phone: Device, light: str) -> None:
    page = solver_ready(phone.open())
    person = Person(page)
    person.press("Settings")
    person.choose("Light", light)
    person.choose("Type", "Large type")
    page.get_by_role("button", name="‹ List").tap()
    name = light.partition(":")[0].lower().replace(" ", "-")
    wrong = faults(page, f"70-{name}-list", wide=False)
    person = demonstration(page)
    wrong += faults(page, f"71-{name}-result", wide=False)
    person.go_to("Load 2: pack of paving")
    wrong += faults(page, f"72-{name}-load", wide=False)
    person.tap(page.get_by_role("textbox", name="Load 2, size per length", exact=True))
    wrong += faults(page, f"73-{name}-pad", wide=False)
    nothing_wrong(wrong)
