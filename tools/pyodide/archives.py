"""Run inside Pyodide: turn Python sources into archives of .pyc files, by Pyodide's own compiler.

A start from sources compiles all modules each time; from .pyc files it doesn't. The archives are stored, not deflated:
hosts compress on the way, the service worker keeps them as they are, and no time goes into inflating on the phone.
"""

import ast
import importlib
import importlib.metadata
import importlib.util
import marshal
import pkgutil
import re
import sys
import zipfile
from pathlib import Path

SITE = Path("/lib/python3.14/site-packages")
STDLIB = "/lib/python314.zip/"
SAME_DATE = (2026, 1, 1, 0, 0, 0)
# PEP 552: flag 1 = the pyc is named by a hash and never checked against a source file.
HEADER = importlib.util.MAGIC_NUMBER + (1).to_bytes(4, "little") + bytes(8)

# Parts of the standard library that no code in a browser worker can use, or that only developers do.
LEFT_OUT = re.compile(
    r"(unittest|_pyrepl|multiprocessing|xmlrpc|wsgiref|sqlite3|mailbox|imaplib|poplib|smtplib|ftplib|pdb|doctest|pydoc"
    r"|_sysconfigdata|cProfile|profile|pstats|trace\.|tabnanny|pyclbr|pickletools|optparse|webbrowser|antigravity|this\."
    r"|socketserver|xml/|ctypes/macholib|concurrent/interpreters|__phello|http/server|http/cookiejar|logging/handlers"
    r"|logging/config|asyncio/windows|asyncio/proactor|asyncio/__main__|tomllib|configparser|netrc|plistlib"
    r"|nturl2path|mimetypes|getopt|cmd\.|code\.|bdb|rlcompleter|sched|shelve|pty|tty|symtable|timeit|tracemalloc|zipapp"
    r"|compileall|py_compile|modulefinder|filecmp|fileinput)"
)
# numpy's C code imports some of these only when it reports an error, so the whole core is kept, seen in use or not.
NUMPY_KEPT = re.compile(r"numpy/(_core|linalg|_utils)/[a-z_]+\.py")
# Of an installed package: scripts, metadata, by-products and type stubs.
NOT_SHIPPED = re.compile(r"^\.\.|\.dist-info/|__pycache__|\.pyc$|\.pyi$|py\.typed$")
# What only developers of numpy import.
NUMPY_NEVER = r"numpy\.(testing|f2py|tests|distutils|_pytesttester|conftest|typing|_typing|random|fft|polynomial)\b"
# numpy.ma rewrites the docstrings of these and fails without them.
NUMPY_DOCUMENTED = re.compile(r"numpy/_core/(numeric|fromnumeric|multiarray)\.py")


def without_docstrings(tree: ast.Module) -> ast.Module:
    """The tree with the docstrings of modules, classes and functions taken out."""
    for node in ast.walk(tree):
        if isinstance(node, ast.Module | ast.ClassDef | ast.FunctionDef | ast.AsyncFunctionDef) and ast.get_docstring(
            node, False
        ):
            rest = node.body[1:]
            node.body = rest or ([] if isinstance(node, ast.Module) else [ast.copy_location(ast.Pass(), node.body[0])])
    return tree


def compiled(source: bytes, shown_path: str, keep_docstrings: bool) -> bytes:
    """A .pyc file for the source; `shown_path` is what tracebacks show."""
    tree = ast.parse(source, shown_path)
    code = compile(tree if keep_docstrings else without_docstrings(tree), shown_path, "exec", dont_inherit=True, optimize=0)
    # Twice through marshal: the first pass depends on which objects happen to be shared in memory.
    return HEADER + marshal.dumps(marshal.loads(marshal.dumps(code)))


def write_archive(path: str, members: dict[str, bytes]) -> None:
    """A stored zip with sorted members and one fixed date."""
    with zipfile.ZipFile(path, "w", zipfile.ZIP_STORED) as archive:
        for name in sorted(members):
            archive.writestr(zipfile.ZipInfo(name, SAME_DATE), members[name])


def standard_library(stock: str, out: str) -> int:
    """Write the standard library as .pyc files without docstrings; returns the number of modules."""
    with zipfile.ZipFile(stock) as archive:
        names = [name for name in archive.namelist() if name.endswith(".py") and not LEFT_OUT.match(name)]
        members = {name + "c": compiled(archive.read(name), STDLIB + name, False) for name in names}
    write_archive(out, members)
    return len(members)


def use_everything() -> int:
    """Import all of pysolver and answer its example requests, so that what they need is known; returns how many."""
    package = importlib.import_module("pysolver")
    for module in pkgutil.walk_packages(package.__path__, "pysolver."):
        if not module.name.endswith("__main__"):
            importlib.import_module(module.name)
    bridge = importlib.import_module("pysolver.bridge")
    examples = list(bridge.examples()) if hasattr(bridge, "examples") else []
    for request in examples:
        bridge.handle(request)
    return len(examples)


def files_in_use(folder: str) -> set[str]:
    """Files of imported modules below a folder of site-packages, relative to site-packages."""
    files = {Path(getattr(module, "__file__", None) or "/") for module in list(sys.modules.values())}
    return {str(file.relative_to(SITE)) for file in files if file.is_relative_to(SITE / folder)}


def imported_names(source: bytes, module: str) -> set[str]:
    """Full names of all modules a source may import, at once or later; `module` is its own name."""
    package = module.split(".")
    names: set[str] = set()
    for node in ast.walk(ast.parse(source)):
        if isinstance(node, ast.Import):
            names.update(alias.name for alias in node.names)
        elif isinstance(node, ast.ImportFrom):
            start = ".".join(package[: len(package) - node.level]) if node.level else ""
            base = ".".join(filter(None, (start, node.module)))
            names.add(base)
            names.update(f"{base}.{alias.name}" for alias in node.names)
    return names


def module_file(name: str) -> str | None:
    """File of a numpy module relative to site-packages, or None."""
    path = name.replace(".", "/")
    return next((file for file in (f"{path}.py", f"{path}/__init__.py") if (SITE / file).is_file()), None)


def with_late_imports(files: set[str]) -> set[str]:
    """The numpy files and all that they may still import inside functions.

    numpy/__init__.py is not followed: its functions name every subpackage, for whoever asks for `numpy.random`.
    """
    reached, waiting = set(files), [file for file in files if file != "numpy/__init__.py"]
    while waiting:
        file = waiting.pop()
        # An __init__ counts as a module of its own package, so that one level up is that package.
        found = imported_names((SITE / file).read_bytes(), file.removesuffix(".py").replace("/", "."))
        for name in found:
            new = module_file(name) if name.startswith("numpy.") and not re.match(NUMPY_NEVER, name) else None
            if new and new not in reached:
                reached.add(new)
                waiting.append(new)
    return reached


def numpy_archive(out: str) -> list[str]:
    """Write the part of numpy in use as .pyc files; returns its compiled libraries in use."""
    used = files_in_use("numpy")
    core = {str(file.relative_to(SITE)) for file in (SITE / "numpy").rglob("*.py")}
    wanted = with_late_imports(
        {name for name in used if name.endswith(".py")} | {name for name in core if NUMPY_KEPT.fullmatch(name)}
    )
    members = {
        name + "c": compiled((SITE / name).read_bytes(), f"{SITE}/{name}", bool(NUMPY_DOCUMENTED.fullmatch(name)))
        for name in wanted
    }
    write_archive(out, members)
    return sorted(name for name in used if name.endswith(".so"))


def check_imports(members: dict[str, bytes], numpy_members: set[str]) -> None:
    """Every module of the standard library and of numpy that the app's sources import, at once or later, ships.

    Raises:
        ModuleNotFoundError: one is left out; names the file and the module.
    """
    for file, source in members.items():
        if not file.endswith(".py"):
            continue
        for name in imported_names(source, file.removesuffix(".py").replace("/", ".")):
            if name.split(".")[0] in sys.stdlib_module_names and LEFT_OUT.match(name.replace(".", "/") + "."):
                raise ModuleNotFoundError(f"{file} imports {name}, which LEFT_OUT in tools/pyodide/archives.py leaves out")
            numpy_file = module_file(name) if name.split(".")[0] == "numpy" else None
            if numpy_file and numpy_file + "c" not in numpy_members:
                raise ModuleNotFoundError(f"{file} imports {name} late, so that it is not seen in use: import it at the top")


def app_archive(out: str, distributions: list[str], numpy_out: str) -> dict[str, int]:
    """Write pysolver and its dependencies as .pyc, with docstrings and data files; returns bytes by package."""
    sources: dict[str, bytes] = {}
    for file in (file for name in distributions for file in importlib.metadata.files(name) or []):
        name = file.as_posix()
        if not NOT_SHIPPED.search(name):
            sources[name] = Path(str(file.locate())).read_bytes()
    with zipfile.ZipFile(numpy_out) as archive:
        check_imports(sources, set(archive.namelist()))
    members = {
        (name + "c" if name.endswith(".py") else name): (
            compiled(content, f"{SITE}/{name}", True) if name.endswith(".py") else content
        )
        for name, content in sources.items()
    }
    write_archive(out, members)
    tops = sorted({name.split("/")[0] for name in members})
    return {top: sum(len(content) for name, content in members.items() if name.split("/")[0] == top) for top in tops}


def pure_distributions() -> list[str]:
    """Names of the installed packages that go into the app's archive: all but numpy and what installed them."""
    installed = {distribution.name for distribution in importlib.metadata.distributions()}
    return sorted(installed - {"numpy", "micropip", "packaging"})
