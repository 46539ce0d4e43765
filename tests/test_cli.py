"""Does the terminal say the same as the page, with the exit code that its help names?"""

import json
import subprocess
import sys
from pathlib import Path
from typing import Any

import pytest
from records import SAG, SHEAR, entry, q, sheet, simple

from pysolver.cli import main
from pysolver.demo import demo

EN = {"basis": "factored", "set": "en1990-6.10-str"}
URL = "https://example.invalid/app/"


def limited(sagging: str, **more: Any) -> dict[str, Any]:
    return simple(limits=[sheet(entry(SAG, sagging), entry(SHEAR, "100 kN"), **more)])


def unranged() -> dict[str, Any]:
    record = simple()
    record["section"]["depth"] = q("300 mm")
    return record


def changed(path: str, value: Any, record: dict[str, Any] | None = None) -> dict[str, Any]:
    made = record or simple()
    at: Any = made
    *parents, last = path.split("/")
    for part in parents:
        at = at[part]
    at[last] = value
    return made


VOID = {"answer": "some", "which": ["holes"], "note": ""}


@pytest.fixture
def saved(tmp_path: Path) -> Any:
    def save(record: Any) -> str:
        path = tmp_path / "record.json"
        path.write_text(record if isinstance(record, str) else json.dumps(record), encoding="utf-8")
        return str(path)

    return save


@pytest.mark.parametrize(("record", "code", "words"), [
    (simple(), 0, "WITHIN THE ENTERED LIMITS"), (unranged(), 1, "CLOSE: RANGES NOT STATED"),
    (limited("40 kNm"), 3, "OVER THE ENTERED LIMIT"),
    (changed("condition/void", VOID, limited("40 kNm")), 3, "CANNOT BE JUDGED; THE NUMBERS ALONE ARE OVER"),
    (changed("condition/void", VOID), 4, "CANNOT BE JUDGED"), (limited("43 kNm", **EN), 5, "CLEAR THE AREA"),
], ids=["within", "close", "over", "void and over", "cannot", "clear"])
def test_check_ends_with_the_exit_code_of_its_outcome(record: dict[str, Any], code: int, words: str, saved: Any,
                                                     capsys: pytest.CaptureFixture[str], monkeypatch: pytest.MonkeyPatch) -> None:
    monkeypatch.setattr("pysolver.cli._now", lambda: "2031-05-04T10:00:00+00:00")
    assert main(["check", saved(record)]) == code
    printed = capsys.readouterr().out
    assert words in printed
    assert "neither an approval" in printed
    assert "22.0 kN" in printed  # the reactions of the base record, whatever the outcome


def test_check_as_json_is_the_answer(saved: Any, capsys: pytest.CaptureFixture[str]) -> None:
    main(["check", saved(simple()), "--json"])
    told = json.loads(capsys.readouterr().out)
    assert told["numbers"]["moment N·m:largest"] == pytest.approx(43500, rel=1e-9)
    assert "drawings" not in told


def test_a_link_opens_again_with_equal_numbers(saved: Any, monkeypatch: pytest.MonkeyPatch,
                                               capsys: pytest.CaptureFixture[str]) -> None:
    monkeypatch.setattr("pysolver.cli._now", lambda: "2031-05-04T10:00:00+00:00")
    assert main(["link", saved(unranged()), "--app-url", f"{URL}#old"]) == 0
    link = capsys.readouterr().out.strip()
    assert link.startswith(f"{URL}#r1.")
    assert main(["open", link]) == 1  # close: ranges not stated
    assert "numbers equal the recorded ones" in capsys.readouterr().out
    assert main(["open", link.partition("#")[2], "--json"]) == 1
    assert json.loads(capsys.readouterr().out)["record"] == unranged()


def test_a_link_whose_numbers_differ_has_its_own_exit_code(capsys: pytest.CaptureFixture[str]) -> None:
    from pysolver.link import encode
    from pysolver.recorded import carried, short

    document = short(carried(simple()))
    document["numbers"]["reaction N:1A"] *= 1.001
    assert main(["open", f"{URL}#{encode(document)}"]) == 7
    assert "differ" in capsys.readouterr().out


def test_a_damaged_link_is_unreadable(saved: Any, capsys: pytest.CaptureFixture[str]) -> None:
    main(["link", saved(simple()), "--app-url", URL])
    link = capsys.readouterr().out.strip()
    assert main(["open", link[:-30]]) == 6
    assert capsys.readouterr().err.startswith("asfound: ")


def test_a_carried_file_is_read_like_a_bare_record(saved: Any, capsys: pytest.CaptureFixture[str]) -> None:
    from pysolver.recorded import carried

    main(["check", saved(carried(simple())), "--json"])
    assert json.loads(capsys.readouterr().out)["numbers"]["reaction N:1A"] == pytest.approx(22000, rel=1e-9)


@pytest.mark.parametrize("text", ["", "{", "[]", "null", "3", '"x"', "{}", '{"record": 5}', "not json", "[" * 5000 + "]" * 5000,
                                  "[" * 200_000, "1" * 5000])
def test_a_file_that_is_no_record_is_unreadable(text: str, saved: Any, capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["check", saved(text)]) == 6
    caught = capsys.readouterr()
    assert caught.out == ""
    assert caught.err.startswith("asfound: ")


def test_a_file_that_is_missing_or_no_text_is_unreadable(tmp_path: Path, capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["check", str(tmp_path / "none.json")]) == 6
    assert main(["check", str(tmp_path)]) == 6
    (tmp_path / "photo.json").write_bytes(bytes(range(256)))
    assert main(["check", str(tmp_path / "photo.json")]) == 6
    assert capsys.readouterr().out == ""


def test_a_file_that_is_too_large_is_unreadable(saved: Any, capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["check", saved(" " * 4_000_001)]) == 6
    assert "larger than" in capsys.readouterr().err


@pytest.mark.parametrize("value", ["\ud800", "\u202e", "\x00"])
def test_text_that_no_terminal_can_show_never_ends_as_another_outcome(value: str, saved: Any, monkeypatch: pytest.MonkeyPatch,
                                                                     capsys: pytest.CaptureFixture[str]) -> None:
    monkeypatch.setattr("pysolver.cli._now", lambda: "2031-05-04T10:00:00+00:00")
    record = simple()
    record["place"]["site"] = f"yard {value}"
    assert main(["check", saved(record)]) == 0
    assert "yard" in capsys.readouterr().out


@pytest.mark.parametrize("arguments", [[], ["check"], ["link", "x.json"], ["no-such-command"], ["check", "a", "b"]])
def test_wrong_use_ends_with_two(arguments: list[str], capsys: pytest.CaptureFixture[str]) -> None:
    with pytest.raises(SystemExit) as ended:
        main(arguments)
    assert ended.value.code == 2
    assert "usage" in capsys.readouterr().err


def test_demo_prints_the_demonstration_record(capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["demo"]) == 0
    assert json.loads(capsys.readouterr().out) == demo()


def test_a_lapsed_outcome_never_ends_as_within(saved: Any, monkeypatch: pytest.MonkeyPatch,
                                              capsys: pytest.CaptureFixture[str]) -> None:
    """Rule J26: found at 09:00, looked at three days later."""
    monkeypatch.setattr("pysolver.cli._now", lambda: "2031-05-07T10:00:00+00:00")
    assert main(["check", saved(simple())]) != 0
    assert "LOOK AGAIN" in capsys.readouterr().out


@pytest.mark.cpython_only
def test_the_command_runs_as_a_module_and_reads_standard_input() -> None:
    record = json.dumps(limited("43 kNm", **EN))
    ended = subprocess.run([sys.executable, "-m", "pysolver", "check", "-"], input=record, capture_output=True, text=True,
                           timeout=60, check=False)
    assert ended.returncode == 5
    assert "CLEAR THE AREA" in ended.stdout
    assert ended.stderr == ""


@pytest.mark.cpython_only
def test_a_hostile_file_never_ends_as_close(tmp_path: Path) -> None:
    """A Python traceback ends with 1, which is "close" here."""
    (tmp_path / "deep.json").write_text("[" * 200_000)
    ended = subprocess.run([sys.executable, "-m", "pysolver", "check", str(tmp_path / "deep.json")], capture_output=True,
                           text=True, timeout=60,
                           check=False)
    assert ended.returncode == 6
    assert "Traceback" not in ended.stderr
