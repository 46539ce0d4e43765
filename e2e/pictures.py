"""A photo to attach, made here: a PNG of stripes that no other file equals."""

import struct
import zlib
from pathlib import Path


def chunk(kind: bytes, data: bytes) -> bytes:
    return struct.pack(">I", len(data)) + kind + data + struct.pack(">I", zlib.crc32(kind + data))


def write_picture(file: Path, *, width: int = 320, height: int = 240, shade: int = 90) -> Path:
    """Write the picture (PNG, ISO/IEC 15948: 8 bit grey) and return its path."""
    rows = b"".join(b"\0" + bytes((shade + 7 * (x // 16) + y) % 256 for x in range(width)) for y in range(height))
    header = struct.pack(">IIBBBBB", width, height, 8, 0, 0, 0, 0)
    file.write_bytes(b"\x89PNG\r\n\x1a\n" + chunk(b"IHDR", header) + chunk(b"IDAT", zlib.compress(rows)) + chunk(b"IEND", b""))
    return file
