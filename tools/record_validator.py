"""Turns pysolver/record.schema.json into pysolver/record_validator.py, so that no phone compiles the schema at start.

Run as `.venv/bin/python -m tools.record_validator` after a change of the schema; a test fails while the two differ.
"""

import json
from pathlib import Path

PACKAGE = Path(__file__).resolve().parent.parent / "pysolver"
HEADER = '"""Generated from record.schema.json by tools/record_validator.py. Do not edit."""\n\n'


def code() -> str:
    """The validator's source."""
    import fastjsonschema  # only here: tools/ itself runs before anything is installed

    schema = json.loads((PACKAGE / "record.schema.json").read_text("utf-8"))
    made: str = fastjsonschema.compile_to_code(schema, detailed_exceptions=False)
    return HEADER + made


if __name__ == "__main__":
    (PACKAGE / "record_validator.py").write_text(code(), "utf-8")
