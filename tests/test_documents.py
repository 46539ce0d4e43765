"""Do README and DEVELOPERS say what is true? Their commands run, the tests they name exist, the pictures are there."""

import os
import re
import shlex
import shutil
import subprocess
import sys
from pathlib import Path

import pytest

pytestmark = pytest.mark.cpython_only  # reads the source tree, runs commands

ROOT = Path(__file__).parent.parent
README, DEVELOPERS = (ROOT / name for name in ("README.md", "DEVELOPERS.md"))
RULES = {f"J{n}" for n in (*range(1, 10), *range(12, 18), 19, 20, *range(22, 28))}


def commands(page: Path) -> list[str]:
    """The indented command lines, and the commands in back quotes, that start with python."""
    text = page.read_text("utf-8")
    blocks = re.findall(r"^ {4}((?:python3|\.venv/bin/python) .*)$", text, re.MULTILINE)
    return blocks + re.findall(r"`((?:python3|\.venv/bin/python) -?[^`]*)`", text)


@pytest.mark.parametrize("page", [README, DEVELOPERS], ids=lambda p: p.name)
def test_every_command_is_one_that_is_tried_here(page):
    """Each is run below, except what the test run itself is made of: set-up, assembly, the whole test, benches."""
    known = {"python3 -m tools serve", "python3 -m tools test", "python3 -m tools test --list", "python3 -m tools assemble",
             "python3 -m tools test lint types", "python3 -m tools test wasm", ".venv/bin/python -m tools.record_validator",
             ".venv/bin/python bench/solver.py", ".venv/bin/python -m tools.first_words", ".venv/bin/python bench/start_up.py",
             ".venv/bin/python -m pysolver demo > check.json", ".venv/bin/python -m pysolver check check.json",
             ".venv/bin/python -m pysolver link check.json --app-url https://beams.example/"}
    assert set(commands(page)) <= known


def test_the_terminal_commands_of_the_readme_run(tmp_path):
    ran = 0
    for line in commands(README):
        if "pysolver" not in line:
            continue
        words, _, target = line.removeprefix(".venv/bin/python ").partition(" > ")
        done = subprocess.run([sys.executable, *shlex.split(words)], cwd=tmp_path, capture_output=True, text=True,
                              env={**os.environ, "PYTHONPATH": str(ROOT), "PYTHONIOENCODING": "utf-8"}, check=False)
        assert not done.stderr, line
        if target:
            (tmp_path / target).write_text(done.stdout, "utf-8")
        ran += 1
    assert ran == 3


def test_the_list_of_checks_is_printed():
    done = subprocess.run([sys.executable, "-m", "tools", "test", "--list"], cwd=ROOT, capture_output=True, text=True, check=True)
    assert [line.split()[0] for line in done.stdout.splitlines()] == ["lint", "types", "unit", "wasm", "js", "e2e"]


@pytest.mark.parametrize("script", ["solver.py", "start_up.py"])
def test_the_benches_are_there_and_compile(script):
    compile((ROOT / "bench" / script).read_text("utf-8"), script, "exec")


def test_every_rule_in_force_is_told_with_a_test_that_exists():
    told = dict(re.findall(r"^\| (J\d+) \| .* \| `?(\w+)", DEVELOPERS.read_text("utf-8"), re.MULTILINE))
    assert set(told) >= RULES
    tests = "\n".join(p.read_text("utf-8") for p in (ROOT / "tests").glob("test_*.py"))
    for rule, name in told.items():
        assert f"def {name}(" in tests or (ROOT / "tests" / f"{name}.py").exists(), rule


def test_the_pictures_of_the_readme_are_there():
    named = re.findall(r"\]\((\S+\.png)\)", README.read_text("utf-8"))
    assert named
    for picture in named:
        assert (ROOT / picture).stat().st_size > 5_000


def test_the_version_is_the_newest_of_the_changelog():
    newest = re.search(r"^## (\S+)", (ROOT / "CHANGELOG.md").read_text("utf-8"), re.MULTILINE)
    assert newest is not None
    assert f'__version__ = "{newest[1]}"' in (ROOT / "pysolver" / "__init__.py").read_text("utf-8")
    assert f'version = "{newest[1]}"' in (ROOT / "pyproject.toml").read_text("utf-8")


def test_the_validator_is_the_schema():
    from tools.record_validator import code

    assert (ROOT / "pysolver" / "record_validator.py").read_text("utf-8") == code()


def test_the_first_words_of_the_page_are_those_of_python():
    from tools.first_words import code

    assert (ROOT / "web" / "first-words.js").read_text("utf-8") == code()


def test_no_text_names_where_this_was_made():
    """Set-up works anywhere: no path of somebody's machine stands in the project."""
    listed = subprocess.run([shutil.which("git") or "git", "ls-files"], cwd=ROOT, capture_output=True, text=True, check=False)
    for name in listed.stdout.splitlines():
        path = ROOT / name
        if path.suffix in {".py", ".js", ".mjs", ".md", ".toml", ".html", ".css"} and path.exists():
            assert not re.search(r"/(?:Users|work)/\w", path.read_text("utf-8")), name
