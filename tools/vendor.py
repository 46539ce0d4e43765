"""Third-party ES modules: which file of which npm package lies where in the site, with every import made relative.

There is no bundler, and an inline import map is blocked by the site's own security policy; so the bare names by which
these modules import each other are rewritten here, from one table, and a bare name left over stops the assembly.
"""

import posixpath
import re
from pathlib import Path

from tools.paths import NODE_MODULES
from tools.progress import ToolError

# Bare specifier -> (file in node_modules, name in the site's vendor/ folder).
MODULES = {
    "preact": ("preact/dist/preact.mjs", "preact.js"),
    "preact/hooks": ("preact/hooks/dist/hooks.mjs", "preact-hooks.js"),
    "htm": ("htm/dist/htm.module.js", "htm.js"),
    "htm/preact": ("htm/preact/index.module.js", "htm-preact.js"),
    "@preact/signals-core": ("@preact/signals-core/dist/signals-core.mjs", "signals-core.js"),
    "@preact/signals": ("@preact/signals/dist/signals.mjs", "signals.js"),
    "idb": ("idb/build/index.js", "idb.js"),
    "fflate": ("fflate/esm/browser.js", "fflate.js"),
    "uqr": ("uqr/dist/index.mjs", "uqr.js"),
}
PACKAGES = ("preact", "htm", "@preact/signals-core", "@preact/signals", "idb", "fflate", "uqr", "pyodide")

# `from"x"`, `import"x"`, `import("x")`, as written by people and by minifiers.
SPECIFIER = re.compile(r"""(?P<before>(?<![\w.$])(?:from|import)\s*\(?\s*)(?P<quote>["'])(?P<name>[^"'\n]+)(?P=quote)""")
COMMENT = re.compile(r"/\*.*?\*/|^\s*//[^\n]*$", re.S | re.M)


def is_bare(name: str) -> bool:
    """Whether a browser could not resolve this import by itself."""
    return not name.startswith(("./", "../", "/")) and "://" not in name


def with_relative_imports(source: str) -> str:
    """The source of a vendor module with every bare import replaced by the neighbouring file."""

    def replace(match: re.Match[str]) -> str:
        known = MODULES.get(match["name"])
        target = f"./{known[1]}" if known else match["name"]
        return f"{match['before']}{match['quote']}{target}{match['quote']}"

    # A source map would be looked for beside the file, where it does not lie.
    return re.sub(r"^//# sourceMappingURL=.*$\n?", "", SPECIFIER.sub(replace, source), flags=re.M)


def copy_vendor_modules(dist: Path) -> None:
    """Write `vendor/` of the site."""
    (dist / "vendor").mkdir()
    for origin, name in MODULES.values():
        source = (NODE_MODULES / origin).read_text(encoding="utf-8")
        (dist / "vendor" / name).write_text(with_relative_imports(source), encoding="utf-8")


def check_imports(dist: Path) -> None:
    """Every import of every module of the site leads to a file of the site.

    Raises:
        ToolError: an import is bare, or names a file that is not there; the message names both files.
    """
    for module in sorted([*dist.glob("*.js"), *dist.glob("vendor/**/*.js"), *dist.glob("ui/**/*.js")]):
        folder = module.relative_to(dist).parent.as_posix()
        for match in SPECIFIER.finditer(COMMENT.sub("", module.read_text(encoding="utf-8"))):
            name, where = match["name"], module.relative_to(dist)
            if is_bare(name):
                raise ToolError(f"{where} imports '{name}' by a bare name: import './vendor/...' or add it to tools/vendor.py.")
            target = posixpath.normpath(posixpath.join(folder, name))
            if not (dist / target).is_file():
                raise ToolError(f"{where} imports '{name}', but the site has no {target}: correct the path or add the file.")
