"""Which errors can pysolver raise, and whose fault is each?

    Exception
    ├── InputError      something a person wrote, picked, opened or left out; they can put it right
    └── InternalError   a mistake in this program; nobody on site can put it right

Both cross to the page as objects (code, field, message). An InputError's message is a whole sentence in plain words:
what is wrong, what was read, and what to write instead.
"""

from __future__ import annotations


class InputError(Exception):
    """Something the user can put right.

    code: short lower-case word for programs ("ambiguous", "wrong_dimension"), never shown.
    field: JSON pointer into the record ("/spans/0/length"), or "" while the field is not known.
    message: what is wrong, the value read, what to do; also str(error).
    """

    def __init__(self, *, code: str, message: str, field: str = "") -> None:
        super().__init__(message)
        self.code = code
        self.field = field
        self.message = message

    def at(self, field: str) -> InputError:
        """The same error with its field set; a field that is already known is kept."""
        return InputError(code=self.code, message=self.message, field=self.field or field)

    def moved(self, field: str) -> InputError:
        """The same error at another field, for a part whose errors name fields of its own."""
        return InputError(code=self.code, message=self.message, field=field)


class InternalError(Exception):
    """A broken promise inside this program. code, field, message as above; the message is for whoever mends it."""

    def __init__(self, *, code: str, message: str, field: str = "") -> None:
        super().__init__(message)
        self.code = code
        self.field = field
        self.message = message
