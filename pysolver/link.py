"""How does a record travel as the fragment of a URL, and how is a damaged or hostile one refused?

    r1.<base64url of raw deflate of canonical JSON>.<first 12 characters of base64url SHA-256 of canonical JSON>

- Canonical JSON: keys sorted, no spaces, no escapes that UTF-8 does not need, no NaN (as RFC 8785, except for the way
  floats are written: the shortest text that reads back as the same float, as Python's repr).
- Raw deflate: RFC 1951, with the preset dictionary of version r1 (link_dictionary.py). base64url: RFC 4648, section 5,
  without padding.
- The checksum (72 bits) notices damage. It proves nothing about who made the link.

Links come from strangers: every size is capped before it is used, and nothing is inflated past the cap.
The record's own form is checked by record.py.
"""

from __future__ import annotations

import base64
import binascii
import hashlib
import json
import re
import zlib
from collections.abc import Mapping
from typing import Any

from pysolver.errors import InputError
from pysolver.json_text import loads
from pysolver.link_dictionary import DICTIONARY_R1

VERSION = "r1"
MAX_FRAGMENT = 200_000  # characters
MAX_INFLATED = 2_000_000  # bytes
CHECKSUM_LENGTH = 12

_BASE64URL = re.compile(r"[A-Za-z0-9_-]+")
_AROUND = " \t\r\n<>()\"'.,;"  # what mail programs and sentences leave around a link; none of it ends a fragment


def encode(payload: Mapping[str, Any]) -> str:
    """The fragment (without '#') that decode() turns back into an equal dict. InputError if it cannot be a link."""
    raw = _canonical(payload)
    if len(raw) > MAX_INFLATED:
        raise _too_large()
    _parse(raw)
    packer = zlib.compressobj(9, zlib.DEFLATED, -15, 9, zlib.Z_DEFAULT_STRATEGY, DICTIONARY_R1)
    fragment = f"{VERSION}.{_to_base64(packer.compress(raw) + packer.flush())}.{_checksum(raw)}"
    if len(fragment) > MAX_FRAGMENT:
        raise _too_large()
    return fragment


def decode(fragment: str) -> dict[str, Any]:
    """The payload of a fragment, of '#' and a fragment, or of a whole URL. Every fault is an InputError."""
    if len(fragment) > MAX_FRAGMENT:
        raise _too_large()
    version, dot, rest = "".join(fragment.rpartition("#")[2].strip(_AROUND).split()).partition(".")
    if not dot or not re.fullmatch(r"r[0-9]{1,4}", version):
        raise InputError(code="not_a_link", message="This is not a link to a record: it has no record behind its #. "
                         "Copy the whole link and paste it again, or ask for the record file.")
    if version != VERSION:
        raise InputError(code="version", message=f"This link has form {version}, and this app reads {VERSION}. "
                         "Open it with the app that made it, or update this one.")
    packed, _, checksum = rest.partition(".")
    raw = _inflate(_from_base64(packed))
    if checksum != _checksum(raw):
        raise _damaged()
    return _parse(raw)


def _canonical(payload: Mapping[str, Any]) -> bytes:
    try:
        text = json.dumps(payload, sort_keys=True, separators=(",", ":"), ensure_ascii=False, allow_nan=False)
        return text.encode()
    except (ValueError, RecursionError):  # NaN, infinity, half a surrogate pair, nested without end
        raise _not_a_record() from None


def _parse(raw: bytes) -> dict[str, Any]:
    """Read canonical JSON; anything else (doubled keys, NaN, 1e999, other spacing) does not survive the way back."""
    try:
        payload = loads(raw.decode())
    except (ValueError, InputError):
        raise _not_a_record() from None
    if not isinstance(payload, dict) or _canonical(payload) != raw:
        raise _not_a_record()
    return payload


def _inflate(packed: bytes) -> bytes:
    unpacker = zlib.decompressobj(-15, DICTIONARY_R1)
    try:
        raw = unpacker.decompress(packed, MAX_INFLATED + 1)
    except zlib.error:
        raise _damaged() from None
    if len(raw) > MAX_INFLATED:
        raise _too_large()
    if not unpacker.eof or unpacker.unused_data:
        raise _damaged()
    return raw


def _to_base64(data: bytes) -> str:
    return base64.urlsafe_b64encode(data).rstrip(b"=").decode()


def _from_base64(text: str) -> bytes:
    if not _BASE64URL.fullmatch(text):
        raise _damaged()
    try:
        data = base64.urlsafe_b64decode(text + "=" * (-len(text) % 4))
    except binascii.Error:
        raise _damaged() from None
    if _to_base64(data) != text:  # bits beyond the last byte
        raise _damaged()
    return data


def _checksum(raw: bytes) -> str:
    return _to_base64(hashlib.sha256(raw).digest())[:CHECKSUM_LENGTH]


def _damaged() -> InputError:
    return InputError(code="damaged", message="This link is cut short or changed: what arrived is not what was sent. "
                      "Ask for it again, or ask for the record file.")


def _too_large() -> InputError:
    return InputError(code="too_large", message=f"This record is too large for a link (the most is {MAX_FRAGMENT} "
                      f"characters, {MAX_INFLATED} bytes unpacked). Send the record file instead.")


def _not_a_record() -> InputError:
    return InputError(code="not_a_record", message="This link is whole, but it does not hold a record of this app. "
                      "Ask for the record file from whoever sent it.")
