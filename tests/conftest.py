"""How are the tests run? Which of them are skipped where, and how hypothesis searches."""

import os
import sys

import hypothesis
import pytest

hypothesis.settings.register_profile("default", deadline=None, max_examples=60, database=None)
hypothesis.settings.register_profile("ci", deadline=None, max_examples=60, database=None, derandomize=True)
hypothesis.settings.load_profile("ci" if os.environ.get("CI") else "default")


def pytest_configure(config: pytest.Config) -> None:
    config.addinivalue_line("markers", "cpython_only: needs a package or a process that Pyodide does not have")


def pytest_collection_modifyitems(items: list[pytest.Item]) -> None:
    if sys.platform != "emscripten":
        return
    for item in items:
        if item.get_closest_marker("cpython_only"):
            item.add_marker(pytest.mark.skip(reason="needs a package or a process that Pyodide does not have"))
