"""How long does a phone wait for the solver, against a stock start of the same Python? Prints the ratio of the two.

    .venv/bin/python bench/start_up.py [--runs 7]

Ours is the assembled site. Stock is Pyodide as published: `loadPyodide`, `loadPackage('numpy')`, and the same pysolver and
dependencies as sources unpacked from an archive. Both are kept by the same service worker, each in a browser profile of its
own, and are reopened with the server gone; the browser is started anew for each load, the two take turns, and each time runs
from `new Worker()` to the first answered check of the same record. Machines differ, so only the ratio says something.
"""

import argparse
import json
import re
import shutil
import statistics
import subprocess
import sys
import tempfile
import zipfile
from pathlib import Path

ROOT = Path(__file__).resolve().parent.parent
sys.path.insert(0, str(ROOT))

from playwright.sync_api import Playwright, sync_playwright

from tools import archive, assemble, chromium, downloads, precache, runtime
from tools.paths import BUILD, DIST, NPM_PYODIDE, venv_python
from tools.server import Site

PAGE = '<!doctype html><meta charset="utf-8"><title>Start-up</title><script type="module" src="start-up.js"></script>'

# One page for both: which worker is started is in the query string, which the service worker ignores.
PAGE_SCRIPT = """
const ours = location.search === '?ours';
await navigator.serviceWorker.register('./sw.js');
await navigator.serviceWorker.ready;
const request = await (await fetch('./start-up-request.json')).text();
const began = performance.now();
const worker = new Worker(ours ? './solver-worker.js' : './stock/worker.js', { type: 'module' });
worker.onmessage = ({ data }) => {
  if (data.type === 'ready') worker.postMessage({ id: 1, text: request });
  else if (data.type === 'failed') window.outcome = { failed: data.message };
  else if (data.type === 'answer') window.outcome = { ms: performance.now() - began, text: data.text };
};
worker.postMessage({ type: 'start', countBytes: false });
"""

STOCK_WORKER = """
import { loadPyodide } from './pyodide.mjs';
let handle;
self.onmessage = async ({ data }) => {
  if ('text' in data) return self.postMessage({ type: 'answer', id: data.id, text: handle(data.text) });
  try {
    const folder = new URL('./', import.meta.url).href;
    const archive = fetch(folder + 'app.zip').then((answer) => answer.arrayBuffer());
    const python = await loadPyodide({ indexURL: folder });
    await python.loadPackage('numpy', { messageCallback: () => {} });
    python.unpackArchive(await archive, 'zip', { extractDir: '/lib/python3.14/site-packages' });
    handle = python.pyimport('pysolver.bridge').handle;
    self.postMessage({ type: 'ready' });
  } catch (error) {
    self.postMessage({ type: 'failed', message: String(error) });
  }
};
"""


def first_check() -> str:
    """The request both answer: pysolver's own first example of the call 'check', else its self check."""
    code = "import json, pysolver.bridge as b; print(json.dumps(list(b.examples())))"
    printed = subprocess.run([venv_python(), "-c", code], cwd=ROOT, capture_output=True, text=True, check=True).stdout
    requests: list[str] = json.loads(printed)
    return next((text for text in requests if json.loads(text)["call"] == "check"), '{"call": "self_check"}')


def source_archive(target: Path) -> None:
    """pysolver and its dependencies as sources, as anybody would ship them."""
    wheels = [*downloads.pure_wheels(archive.RUN_TIME_WHEELS), *(BUILD / "wheel").glob("asfound-*.whl")]
    with zipfile.ZipFile(target, "w", zipfile.ZIP_DEFLATED) as whole:
        for wheel in wheels:
            with zipfile.ZipFile(wheel) as part:
                for name in part.namelist():
                    whole.writestr(name, part.read(name))


def lay_out(folder: Path, request: str) -> None:
    """The assembled site with the stock start beside it, all of it in the service worker's list."""
    shutil.copytree(DIST, folder)
    stock = folder / "stock"
    stock.mkdir()
    for name in (*archive.PYODIDE_PARTS, "python_stdlib.zip", "pyodide-lock.json"):
        shutil.copyfile(NPM_PYODIDE / name, stock / name)
    wheel = runtime.ensure()[0]
    shutil.copyfile(wheel, stock / wheel.name)
    source_archive(stock / "app.zip")
    (stock / "worker.js").write_text(STOCK_WORKER)
    (folder / "start-up.html").write_text(PAGE)
    (folder / "start-up.js").write_text(PAGE_SCRIPT)
    (folder / "start-up-request.json").write_text(request)
    precache.write_service_worker(folder, "bench")


def load(playwright: Playwright, browser: str, profile: Path, url: str, wait_for_install: bool = False) -> dict[str, object]:
    """Start the browser, open the page once and return what it measured."""
    context = playwright.chromium.launch_persistent_context(profile, executable_path=browser, args=["--no-sandbox"])
    try:
        page = context.pages[0]
        page.goto(url)
        page.wait_for_function("() => window.outcome", timeout=120_000)
        if wait_for_install:
            page.wait_for_function("() => navigator.serviceWorker.controller", timeout=120_000)
        outcome: dict[str, object] = page.evaluate("() => window.outcome")
    finally:
        context.close()
    if "failed" in outcome:
        raise SystemExit(f"{url} did not start: {outcome['failed']}")
    return outcome


def figures(text: object) -> object:
    """An answer without what may differ between two builds of the same solver: the versions, which name the build."""
    return re.sub(r'"versions": *\{[^}]*\}', "", str(text))


def measure(runs: int) -> dict[str, list[float]]:
    """Milliseconds of each load, by variant."""
    times: dict[str, list[float]] = {"ours": [], "stock": []}
    browser = chromium.ensure()
    with tempfile.TemporaryDirectory() as temporary, sync_playwright() as playwright:
        folder = Path(temporary)
        lay_out(folder / "site", first_check())
        site = Site(folder / "site").start()
        addresses = {name: f"{site.url}start-up.html?{name}" for name in times}
        answers = {}
        for name, address in addresses.items():
            load(playwright, browser, folder / name, address, wait_for_install=True)
            for _ in range(2):  # the browser keeps compiled code from the second start on
                answers[name] = figures(load(playwright, browser, folder / name, address)["text"])
        site.stop()
        if answers["ours"] != answers["stock"] or '"ok": true' not in str(answers["ours"]):
            raise SystemExit("the two starts do not answer the same: nothing to compare")
        for run in range(runs):
            for name in list(times)[:: 1 if run % 2 else -1]:
                times[name].append(float(str(load(playwright, browser, folder / name, addresses[name])["ms"])))
                print(f"  {name:6}{times[name][-1]:8.0f} ms", flush=True)
    return times


def main() -> None:
    """Print medians and their ratio."""
    options = argparse.ArgumentParser(description=(__doc__ or "").splitlines()[0])
    options.add_argument("--runs", type=int, default=7)
    runs = options.parse_args().runs
    assemble.assemble()
    times = measure(runs)
    for name, values in times.items():
        print(f"{name:6} median {statistics.median(values):6.0f} ms ({min(values):.0f} to {max(values):.0f}, {runs} loads)")
    print(f"ours / stock = {statistics.median(times['ours']) / statistics.median(times['stock']):.3f}")


if __name__ == "__main__":
    main()
