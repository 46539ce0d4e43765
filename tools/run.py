"""The commands of `python3 -m tools`."""

import argparse
import shutil
import sys
from collections.abc import Sequence

from tools import assemble, lock, serve, tests
from tools.paths import BUILD, DIST, NODE_MODULES, VENV
from tools.progress import ToolError
from tools.stamps import one_at_a_time


def parser() -> argparse.ArgumentParser:
    """The command line."""
    top = argparse.ArgumentParser(prog="python3 -m tools", description="Set up, assemble, serve and check Asfound.")
    commands = top.add_subparsers(dest="command", required=True, metavar="COMMAND")
    serving = commands.add_parser("serve", help="assemble the site and serve it on this computer")
    serving.add_argument("--port", type=int, help=f"port (usual: {serve.USUAL_PORT}, else a free one)")
    serving.add_argument("--prefix", default="/", help="serve below a sub-path, e.g. /sub/path/")
    testing = commands.add_parser("test", help="run every check, or the named steps")
    testing.add_argument("--list", action="store_true", help="list the steps and stop")
    testing.add_argument("steps", nargs="*", metavar="STEP")
    commands.add_parser("setup", help="install what assembly needs into .venv, tools/node_modules and the user's cache")
    assembling = commands.add_parser("assemble", help="make dist/, the site for any static host")
    assembling.add_argument("--anew", action="store_true", help="even if it is up to date")
    commands.add_parser("lock", help="write tools/requirements.txt anew (for who changes a pin)")
    commands.add_parser("clean", help="delete .venv, .build, dist and tools/node_modules; the user's cache stays")
    return top


def clean() -> None:
    """Delete all that the tools made in the clone."""
    for folder in (VENV, BUILD, DIST, NODE_MODULES):
        shutil.rmtree(folder, ignore_errors=True)


def run(wish: argparse.Namespace) -> int:
    """Do what was asked; returns the exit code."""
    if wish.command == "test":
        if wish.list:
            tests.list_checks()
            return 0
        return tests.run_checks(wish.steps)
    if wish.command == "clean":
        clean()
        return 0
    if wish.command == "lock":
        lock.write_requirements()
        return 0
    if wish.command == "setup":
        with one_at_a_time():
            assemble.set_up()
        return 0
    assemble.assemble(anew=getattr(wish, "anew", False))
    if wish.command == "serve":
        serve.serve_until_stopped(wish.port, wish.prefix)
    return 0


def main(arguments: Sequence[str] | None = None) -> int:
    """Parse, run, and turn what a person can act on into one sentence and exit code 1."""
    wish = parser().parse_args(arguments)
    try:
        return run(wish)
    except ToolError as error:
        print(f"asfound: {error}", file=sys.stderr)
    except OSError as error:
        print(f"asfound: {error}: check the path, the free disk space or the port, and try again.", file=sys.stderr)
    except KeyboardInterrupt:
        print("\nasfound: stopped.", file=sys.stderr)
    return 1
