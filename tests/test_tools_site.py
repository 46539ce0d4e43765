"""Is the assembled site whole, consistent with the list its service worker checks, and the same each time?"""

import filecmp
import hashlib
import json
import re
import shutil
from pathlib import Path

import pytest

from tools import app_wheel, archive, assemble, node, precache, runtime, vendor
from tools.paths import DIST, NPM_PYODIDE, WEB
from tools.progress import ToolError

pytestmark = pytest.mark.cpython_only


def module(folder: Path, source: str) -> None:
    (folder / "vendor").mkdir(exist_ok=True)
    (folder / "vendor" / "preact.js").write_text("export {};")
    (folder / "main.js").write_text(source)


@pytest.mark.parametrize(
    "source",
    [
        'import { h } from "preact";',
        "export { h } from 'preact/hooks';",
        'import"left-over";',
        'const later = () => import("left-over");',
        'import{a as b}from"@scope/left-over";',
    ],
)
def test_a_bare_import_left_over_stops_the_assembly(tmp_path: Path, source: str) -> None:
    module(tmp_path, source)
    with pytest.raises(ToolError, match="by a bare name"):
        vendor.check_imports(tmp_path)


def test_an_import_of_a_file_that_is_not_there_stops_the_assembly(tmp_path: Path) -> None:
    module(tmp_path, "import './vendor/preact.js'; import './gone.js';")
    with pytest.raises(ToolError, match=r"main\.js imports '\./gone\.js'"):
        vendor.check_imports(tmp_path)


def test_relative_imports_and_comments_are_left_in_peace(tmp_path: Path) -> None:
    module(tmp_path, "// from 'elsewhere'\n/* import 'x' */\nimport { h } from './vendor/preact.js';\n")
    vendor.check_imports(tmp_path)


def test_vendor_modules_import_each_other_by_relative_names() -> None:
    minified = 'import{h as a}from"preact";export{b}from"@preact/signals-core";import"left-over";//# sourceMappingURL=x\n'
    rewritten = vendor.with_relative_imports(minified)
    assert 'from"./preact.js"' in rewritten
    assert 'from"./signals-core.js"' in rewritten
    assert '"left-over"' in rewritten  # for check_imports to stop at


@pytest.mark.parametrize(
    ("page", "what"),
    [
        ("<script>alert(1)</script>", "an inline script"),
        ("<script type='module'>import './x.js'</script>", "an inline script"),
        ("<style>p { color: red }</style>", "an inline style"),
        ("<p style='color: red'>", "an inline style"),
        ("<button onclick='go()'>", "an inline handler"),
    ],
)
def test_a_page_with_inline_code_is_refused(tmp_path: Path, page: str, what: str) -> None:
    (tmp_path / "index.html").write_text(page)
    with pytest.raises(ToolError, match=what):
        assemble.check_page(tmp_path)


def test_the_page_of_the_site_has_no_inline_code() -> None:
    assemble.check_page(DIST)


def precached() -> dict[str, dict[str, object]]:
    source = (DIST / "sw.js").read_text(encoding="utf-8")
    found = re.search(r"^const FILES = (\[.*?^\]);", source, re.S | re.M)
    assert found
    return {entry["path"]: entry for entry in json.loads(re.sub(r",\s*\]$", "]", found[1]))}


def test_the_service_worker_lists_every_file_of_the_site_with_its_hash_and_size() -> None:
    listed = precached()
    there = {path.relative_to(DIST).as_posix() for path in DIST.rglob("*") if path.is_file()} - {"sw.js"}
    assert set(listed) == there
    for name, entry in listed.items():
        content = (DIST / name).read_bytes()
        assert entry["sha256"] == hashlib.sha256(content).hexdigest()
        assert entry["size"] == len(content)


def test_notices_cover_all_that_ships() -> None:
    text = (DIST / "notices.txt").read_text(encoding="utf-8")
    for name in (
        "Asfound (MIT)",
        "pyodide 314",
        "CPython",
        "numpy 2",
        "preact 11",
        "fastjsonschema",
        "Mozilla Public License",
    ):
        assert name in text


def test_an_app_that_imports_a_left_out_module_is_refused_at_assembly(tmp_path: Path) -> None:
    script = tmp_path / "check.mjs"
    script.write_text(f"""
        const {{ loadPyodide }} = await import('{(NPM_PYODIDE / "pyodide.mjs").as_posix()}');
        const python = await loadPyodide({{ indexURL: '{NPM_PYODIDE.as_posix()}/' }});
        const fs = await import('node:fs');
        const source = fs.readFileSync('{(archive.SCRIPTS / "archives.py").as_posix()}');
        python.FS.writeFile('/home/pyodide/archives.py', source);
        console.log(python.runPython(`
import archives
try:
    archives.check_imports({{"pysolver/a.py": b"import json", "pysolver/b.py": b"def f():\\\\n    import sqlite3"}}, set())
    message = "nothing found"
except ModuleNotFoundError as error:
    message = str(error)
message`)); process.exit(0);""")
    assert "pysolver/b.py imports sqlite3" in node.run_script(script, name="test-left-out", advice="see the log")


@pytest.mark.slow
def test_two_assemblies_give_the_same_bytes(tmp_path: Path, monkeypatch: pytest.MonkeyPatch) -> None:
    # One copy of the sources, so that who edits meanwhile doesn't fail this test; wheels are compared by themselves.
    wheel = shutil.copy(app_wheel.build(), tmp_path)
    assert Path(wheel).read_bytes() == app_wheel.build().read_bytes()
    monkeypatch.setattr("tools.app_wheel.build", lambda: Path(wheel))
    monkeypatch.setattr("tools.assemble.WEB", Path(shutil.copytree(WEB, tmp_path / "web")))
    wheels, sites = runtime.ensure(), [tmp_path / "site-1", tmp_path / "site-2"]
    for site in sites:
        made = tmp_path / f"made-for-{site.name}"
        monkeypatch.setattr("tools.stamps.BUILD", made)  # so that nothing counts as up to date
        monkeypatch.setattr("tools.archive.STANDARD_LIBRARY", made / archive.STANDARD_LIBRARY.name)
        monkeypatch.setattr("tools.archive.APPLICATION", made / "application")
        assemble.lay_out(site, wheels, archive.build(wheels))
    names, again = ({path.relative_to(site).as_posix() for path in precache.site_files(site)} for site in sites)
    assert names == again
    assert filecmp.cmpfiles(*sites, sorted(names), shallow=False) == (sorted(names), [], [])
