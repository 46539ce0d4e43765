"""Do the tools come up from a bare Python, skip what is done, and fail with one clear sentence?"""

import os
import re
import signal
import subprocess
import sys
import urllib.request
from pathlib import Path

import pytest

from tools import stamps, tests, venv
from tools.paths import ROOT
from tools.progress import ToolError

pytestmark = pytest.mark.cpython_only


def run_tools(*arguments: str, **environment: str) -> subprocess.CompletedProcess[str]:
    return subprocess.run(
        [sys.executable, "-m", "tools", *arguments],
        cwd=ROOT,
        env=os.environ | environment,
        capture_output=True,
        text=True,
        timeout=300,
        check=False,
    )


def test_every_module_of_the_tools_imports_with_the_standard_library_alone() -> None:
    names = [f"tools.{path.stem}" for path in (ROOT / "tools").glob("*.py") if not path.stem.startswith("__")]
    code = (
        f"import sys, importlib; sys.path.insert(0, {str(ROOT)!r})\n"
        f"for name in {names!r}: importlib.import_module(name)\n"
        "print(sorted({n.split('.')[0] for n in sys.modules} - set(sys.stdlib_module_names) - {'tools', '__main__'}))"
    )
    # -I: no environment, no user folder; -S: no site-packages
    done = subprocess.run([sys.executable, "-I", "-S", "-c", code], capture_output=True, text=True, check=False)
    assert done.stderr == ""
    assert done.stdout.strip() == "[]"


def test_the_environment_is_made_where_python_has_no_ensurepip_and_no_pip(tmp_path: Path) -> None:
    code = (
        f"import sys; sys.path.insert(0, {str(ROOT)!r})\n"
        "sys.modules['ensurepip'] = None; sys.modules['pip'] = None\n"
        "from pathlib import Path\nfrom tools import venv\n"
        f"venv.create(Path({str(tmp_path / 'venv')!r}))\n"
    )
    subprocess.run([sys.executable, "-S", "-c", code], check=True, cwd=tmp_path, timeout=300)
    python = venv.venv_python(tmp_path / "venv")
    shown = subprocess.run([python, "-m", "pip", "--version"], capture_output=True, text=True, check=True).stdout
    assert shown.startswith("pip 26.3 ")
    assert str(tmp_path / "venv") in shown


def test_a_step_is_fresh_until_an_input_changes_or_an_output_is_gone(tmp_path: Path, monkeypatch: pytest.MonkeyPatch) -> None:
    monkeypatch.setattr(stamps, "BUILD", tmp_path / "build")
    source, output = tmp_path / "source.py", tmp_path / "output"
    source.write_text("one")
    output.write_text("made")
    first = stamps.digest([source], "version 1")
    assert not stamps.is_fresh("step", first, output)
    stamps.set_fresh("step", first)
    assert stamps.is_fresh("step", first, output)
    assert stamps.digest([source], "version 2") != first
    source.write_text("two")
    assert not stamps.is_fresh("step", stamps.digest([source], "version 1"), output)
    output.unlink()
    assert not stamps.is_fresh("step", first, output)


def test_an_assembled_site_is_not_assembled_again() -> None:
    done = run_tools("assemble")
    assert done.returncode == 0, done.stderr
    lines = done.stdout.strip().splitlines()
    assert lines
    assert all(line.endswith("up to date") for line in lines), done.stdout


def test_the_steps_of_test_can_be_listed() -> None:
    done = run_tools("test", "--list")
    assert done.returncode == 0
    assert [line.split()[0] for line in done.stdout.splitlines()] == [check.name for check in tests.CHECKS]


def test_an_unknown_step_is_answered_with_the_known_ones() -> None:
    done = run_tools("test", "everything")
    assert done.returncode == 1
    assert "there is no step 'everything': choose from lint, types," in done.stderr
    assert "Traceback" not in done.stderr


def test_a_named_folder_without_the_runtime_ends_with_one_sentence(tmp_path: Path) -> None:
    done = run_tools("assemble", ASFOUND_RUNTIME_DIR=str(tmp_path))
    assert done.returncode == 1
    assert re.search(r"^asfound: .*numpy-[\w.-]+\.whl is missing: put .* ASFOUND_RUNTIME_DIR", done.stderr, re.M)
    assert "Traceback" not in done.stderr


def test_a_check_that_fails_makes_the_exit_code_of_all(
    monkeypatch: pytest.MonkeyPatch, capsys: pytest.CaptureFixture[str]
) -> None:
    def broken() -> bool:
        """Something that can't be done."""
        raise ToolError("the tool is missing: install it.")

    checks = (
        tests.Check(name="one", run=lambda: True, files="tools/*.py"),
        tests.Check(name="two", run=broken, files="tools/*.py"),
        tests.Check(name="three", run=lambda: True, files="tools/*.py"),
    )
    monkeypatch.setattr(tests, "CHECKS", checks)
    monkeypatch.setattr(tests.assemble, "assemble", lambda: None)
    assert tests.run_checks([]) == 1
    printed = capsys.readouterr().out
    assert re.search(r"^two +FAILED", printed, re.M)
    assert re.search(r"^three +good", printed, re.M)
    assert tests.run_checks(["one", "three"]) == 0


def test_serve_prints_an_address_that_answers_and_stops_when_told() -> None:
    command = [sys.executable, "-m", "tools", "serve", "--port", "0", "--prefix", "/sub/path/"]
    running = subprocess.Popen(command, cwd=ROOT, stdout=subprocess.PIPE, stderr=subprocess.STDOUT, text=True)
    try:
        assert running.stdout
        address = next(found[0] for line in running.stdout if (found := re.search(r"http://127\.0\.0\.1:\d+/sub/path/", line)))
        with urllib.request.urlopen(address, timeout=20) as answer:
            assert b"<html" in answer.read()
        running.send_signal(signal.SIGTERM)
        rest = running.stdout.read()
        assert running.wait(timeout=20) == 0
    finally:
        running.kill()
        running.wait()
        if running.stdout:
            running.stdout.close()
    assert "HTTPS" in rest
