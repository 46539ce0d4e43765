"""The same check from a terminal: python -m pysolver check FILE.json, link FILE.json, open LINK.

Exit codes: 0 within; 1 close; 2 wrong use of the command; 3 over, or treated as over; 4 cannot be judged, or lapsed; 5 clear the
area; 6 the file or link cannot be read; 7 (open) the recomputed numbers differ from the recorded ones; 70 our fault.
"""

import argparse
import io
import json
import sys
from collections.abc import Callable, Sequence
from datetime import UTC, datetime
from pathlib import Path
from typing import Any

from pysolver import __version__
from pysolver.bridge import handle
from pysolver.demo import demo
from pysolver.errors import InputError
from pysolver.json_text import loads

EXIT = {"within": 0, "close": 1, "over": 3, "cannot": 4, "clear": 5}
UNREADABLE, DIFFERS, OUR_FAULT = 6, 7, 70
MAX_FILE = 4_000_000  # bytes


class _CommandError(Exception):
    """Ends a command with a message on standard error and an exit code."""

    def __init__(self, message: str, code: int) -> None:
        super().__init__(message)
        self.code = code


def main(arguments: Sequence[str] | None = None) -> int:
    """Run one command; returns the exit code."""
    for stream in (sys.stdout, sys.stderr):
        if isinstance(stream, io.TextIOWrapper):
            stream.reconfigure(errors="backslashreplace")  # a name from a stranger may hold what no terminal shows
    chosen = _parser().parse_args(arguments)
    run: Callable[[argparse.Namespace], int] = chosen.run
    try:
        return run(chosen)
    except _CommandError as failure:
        print(f"asfound: {failure}", file=sys.stderr)
        return failure.code


def _parser() -> argparse.ArgumentParser:
    parser = argparse.ArgumentParser(prog="asfound", description="Compare a beam as found with its designer's limits.",
                                     epilog=__doc__, formatter_class=argparse.RawDescriptionHelpFormatter)
    parser.add_argument("--version", action="version", version=f"asfound {__version__}")
    commands = parser.add_subparsers(required=True, metavar="COMMAND")
    check = commands.add_parser("check", help="work out a record and print the sheet")
    check.add_argument("file", help="a record (JSON), or - for standard input")
    check.add_argument("--json", action="store_true", help="print the whole answer as JSON")
    check.set_defaults(run=_check)
    link = commands.add_parser("link", help="make a link from a record")
    link.add_argument("file", help="a record (JSON), or - for standard input")
    link.add_argument("--app-url", required=True, help="address of the app that shall open the link")
    link.set_defaults(run=_link)
    open_ = commands.add_parser("open", help="open a link, recompute it and say whether the numbers agree")
    open_.add_argument("link", help="the link, or its part behind #")
    open_.add_argument("--json", action="store_true", help="print the whole answer as JSON")
    open_.set_defaults(run=_open)
    example = commands.add_parser("demo", help="print the demonstration record (invented)")
    example.set_defaults(run=_demo)
    return parser


def _ask(request: dict[str, Any]) -> dict[str, Any]:
    told = json.loads(handle(json.dumps(request)))
    if told["ok"]:
        result: dict[str, Any] = told["result"]
        return result
    error = told["error"]
    where = f" [{error['field']}]" if error["field"] else ""
    raise _CommandError(f"{error['message']}{where}", UNREADABLE if error["kind"] == "input" else OUR_FAULT)


def _record(path: str) -> Any:
    try:
        raw = sys.stdin.buffer.read(MAX_FILE + 1) if path == "-" else Path(path).read_bytes()[:MAX_FILE + 1]
    except OSError as error:
        raise _CommandError(f"cannot read {path}: {error.strerror}. Name a record file.", UNREADABLE) from None
    if len(raw) > MAX_FILE:
        raise _CommandError(f"{path} is larger than {MAX_FILE} bytes, which no record is.", UNREADABLE)
    try:
        document = loads(raw.decode())
    except InputError as error:
        raise _CommandError(f"{path}: {error.message}", UNREADABLE) from None
    except ValueError as error:
        raise _CommandError(f"{path} is not JSON: {error}. Export the record again.", UNREADABLE) from None
    return document["record"] if isinstance(document, dict) and "record" in document else document


def _now() -> str:
    return datetime.now(UTC).isoformat(timespec="seconds")


def _check(chosen: argparse.Namespace) -> int:
    record = _record(chosen.file)
    answer = _ask({"call": "check", "record": record, "stage": "full", "now": _now()})
    _print(answer, record, chosen.json)
    return _exit_code(answer)


def _exit_code(answer: dict[str, Any]) -> int:
    word = answer["outcome"]["word"]
    if answer["outcome"]["lapsed"] and word in ("within", "close"):
        return EXIT["cannot"]
    return EXIT["over"] if word == "cannot" and answer["outcome"]["treated_as_over"] else EXIT[word]


def _print(answer: dict[str, Any], record: Any, as_json: bool) -> None:
    if as_json:
        told = {k: v for k, v in answer.items() if k not in ("drawings", "picks")}
        print(json.dumps(told, indent=1, ensure_ascii=False))
    else:
        print("\n".join(sheet(answer, record)))


def sheet(answer: dict[str, Any], record: dict[str, Any]) -> list[str]:
    """The readable sheet, line by line."""
    outcome, place = answer["outcome"], record["place"]
    lines = [f"{place['member'] or 'Beam'} - {place['site'] or 'site not named'}",
             f"{place['drawing'] or 'no drawing named'} rev {place['revision'] or '-'}; {outcome['as_found']}", "",
             outcome["lines"][0].upper(), *outcome["lines"][1:]]
    lines += [f"  - {reason}" for reason in outcome["reasons"]]
    lines += [f"  missing: {gap['text']} (from {gap['who']})" for gap in outcome["missing"]]
    lines += [f"  wrong: {error['message']} [{error['field']}]" for error in answer["errors"]]
    if answer["reactions"]:
        lines += ["", "Reactions (up positive)       unfactored    least    largest"]
        lines += [f"  {r['support']:<26}{r['unfactored']:>12}{r['low']:>12}{r['high']:>12}" for r in answer["reactions"]]
    if answer["criteria"]:
        lines += ["", "Governing places"]
    for c in answer["criteria"]:
        lines += [f"  {c['title']}: {c['state']}, {c['place']}", f"    unfactored {c['unfactored']}, factored {c['factored']}, "
                  f"worst {c['high']}, limit {c['limit']}: {c['ratio']}" + (f" to {c['ratio_high']}" if c["ratio_high"] else ""),
                  f"    {c['combination']}; {c['document']}" + (f"; {c['note']}" if c["note"] else "")]
    lines += ["", "Not compared: " + ", ".join(answer["not_compared"]) + "."]
    lines += [answer["equilibrium"]] if answer["equilibrium"] else []
    lines += answer["notes"] + [""] + answer["cautions"]
    lines += ["Signs: reactions up, shear positive when the left part is pushed up, moment positive sagging."]
    return [*lines, "asfound {asfound}, Python {python}, numpy {numpy}".format(**answer["versions"])]


def _link(chosen: argparse.Namespace) -> int:
    print(_ask({"call": "link", "record": _record(chosen.file), "app_url": chosen.app_url})["link"])
    return 0


def _open(chosen: argparse.Namespace) -> int:
    told = _ask({"call": "open", "fragment": chosen.link, "now": _now()})
    if chosen.json:
        print(json.dumps(told, indent=1, ensure_ascii=False))
    else:
        print(told["agreement"]["shown"])
        print("\n".join(["", *sheet(told["result"], told["record"])]))
    return DIFFERS if told["agreement"]["equal"] is False else _exit_code(told["result"])


def _demo(chosen: argparse.Namespace) -> int:
    print(json.dumps(demo(), indent=1, ensure_ascii=False))
    return 0
