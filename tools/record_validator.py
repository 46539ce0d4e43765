"""Turns pysolver/record.schema.json into pysolver/record_validator.py, so that no phone compiles the schema at start.

Run as `.venv/bin/python -m tools.record_validator` after a change of the schema; a test fails while the two differ.
"""

import json
from pathlib import Path

PACKAGE = Path(__file__).resolve().parent.parent / "pysolver"
IMPORT = "from fastjsonschema import JsonSchemaValueException, JsonSchemaValuesException\n"
HEADER = '''"""Generated from record.schema.json by fastjsonschema and tools/record_validator.py. Do not edit."""


class JsonSchemaValueException(ValueError):
    """What a document breaks; here so that fastjsonschema itself need not travel to a phone."""

    def __init__(self, message):
        super().__init__(message)
        self.message = message


'''


def code() -> str:
    """The validator's source."""
    import fastjsonschema  # only here: tools/ itself runs before anything is installed

    schema = json.loads((PACKAGE / "record.schema.json").read_text("utf-8"))
    made: str = fastjsonschema.compile_to_code(schema, detailed_exceptions=False)
    if IMPORT not in made or "JsonSchemaValuesException(" in made:
        raise SystemExit("fastjsonschema writes another form of code than this script knows: adapt it.")
    return HEADER + made.replace(IMPORT, "")


if __name__ == "__main__":
    (PACKAGE / "record_validator.py").write_text(code(), "utf-8")
