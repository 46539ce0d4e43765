"""Takes the pictures of the README anew: .venv/bin/python e2e/readme_pictures.py (after an assembly)."""

import sys
from pathlib import Path

ROOT = Path(__file__).resolve().parent.parent
sys.path.insert(0, str(ROOT))

from playwright.sync_api import Page, Playwright, sync_playwright

from tools import chromium
from tools.server import Site

PICTURES = ROOT / "e2e" / "pictures"
PHONE = {"viewport": {"width": 360, "height": 740}, "device_scale_factor": 2, "is_mobile": True, "has_touch": True}
DESK = {"viewport": {"width": 1280, "height": 800}}


def demonstration(playwright: Playwright, address: str, screen: dict) -> Page:
    """The demonstration check, worked out in full, on a screen."""
    browser = playwright.chromium.launch(executable_path=chromium.ensure(), args=["--no-sandbox", "--disable-gpu"])
    page = browser.new_context(**screen).new_page()
    page.goto(address)
    page.wait_for_function("() => !document.querySelector('[aria-disabled=true]')", timeout=120_000)
    page.get_by_role("button", name="Demonstration check").click()
    page.get_by_text("close to the entered limits").first.wait_for(timeout=60_000)
    return page


def main() -> None:
    PICTURES.mkdir(exist_ok=True)
    site = Site(ROOT / "dist", port=0)
    site.start()
    with sync_playwright() as playwright:
        phone = demonstration(playwright, site.url, PHONE)
        phone.get_by_role("button", name="Outcome:").tap()
        phone.wait_for_timeout(500)
        phone.screenshot(path=PICTURES / "result-phone.png")
        phone.locator("section[aria-label=Drawings] svg").nth(0).scroll_into_view_if_needed()
        phone.wait_for_timeout(300)
        phone.screenshot(path=PICTURES / "diagrams-phone.png")
        desk = demonstration(playwright, site.url, DESK)
        desk.wait_for_timeout(500)
        desk.screenshot(path=PICTURES / "check-desk.png")
    site.stop()


if __name__ == "__main__":
    main()
