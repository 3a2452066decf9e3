#!/usr/bin/env python3
# SPDX-License-Identifier: GPL-3.0-or-later
"""Writes the advance widths of Liberation Sans, regular and bold, as core's metrics need them.

    python3 advances.py LiberationSans-Regular.ttf LiberationSans-Bold.ttf > advances.txt

One row a character that both fonts map: code point in hexadecimal, regular, bold; widths in units of the em.
Tables head, hhea, hmtx and cmap (format 4) after the OpenType specification.
"""
import struct
import sys


class Font:
    def __init__(self, path):
        with open(path, "rb") as file:
            self.data = file.read()
        (count,) = self.read(">H", 4)
        self.tables = {}
        for i in range(count):
            tag, _, offset, _ = self.read(">4sIII", 12 + 16 * i)
            self.tables[tag.decode()] = offset
        (self.em,) = self.read(">H", self.tables["head"] + 18)
        (fixed,) = self.read(">I", self.tables["head"] + 4)
        self.revision = f"{fixed / 65536:.2f}"
        (self.full_rows,) = self.read(">H", self.tables["hhea"] + 34)

    def read(self, form, offset):
        return struct.unpack_from(form, self.data, offset)

    def advance(self, glyph):
        row = min(glyph, self.full_rows - 1)
        return self.read(">H", self.tables["hmtx"] + 4 * row)[0]

    def glyphs(self):
        """{code point: glyph} of the Unicode subtable of the Basic Multilingual Plane."""
        cmap = self.tables["cmap"]
        (count,) = self.read(">H", cmap + 2)
        for i in range(count):
            platform, encoding, offset = self.read(">HHI", cmap + 4 + 8 * i)
            if (platform, encoding) == (3, 1):
                return self.segments(cmap + offset)
        raise SystemExit("the font has no Unicode map")

    def segments(self, start):
        form, _, _, doubled = self.read(">HHHH", start)
        if form != 4:
            raise SystemExit("the Unicode map is not of format 4")
        count = doubled // 2
        ends = self.read(f">{count}H", start + 14)
        starts = self.read(f">{count}H", start + 16 + doubled)
        deltas = self.read(f">{count}H", start + 16 + 2 * doubled)
        offsets_at = start + 16 + 3 * doubled
        offsets = self.read(f">{count}H", offsets_at)
        result = {}
        for i in range(count):
            for code in range(starts[i], min(ends[i], 0xFFFE) + 1):
                glyph = code
                if offsets[i]:
                    (glyph,) = self.read(">H", offsets_at + 2 * i + offsets[i] + 2 * (code - starts[i]))
                if glyph or not offsets[i]:
                    glyph = (glyph + deltas[i]) % 65536
                if glyph:
                    result[code] = glyph
        return result


# Blocks that names, symbols and sentences of the outputs are made of.
BLOCKS = [
    (0x0020, 0x007E),  # ASCII
    (0x00A0, 0x017F),  # Latin-1, Latin Extended-A
    (0x0300, 0x036F),  # combining accents
    (0x0370, 0x03FF),  # Greek
    (0x0400, 0x045F),  # Cyrillic
    (0x2000, 0x20BF),  # punctuation, raised and lowered figures, currencies
    (0x2100, 0x218F),  # letterlike, number forms
    (0x2190, 0x22FF),  # arrows, operators
    (0x25A0, 0x25FF),  # geometric shapes
]


def main():
    regular, bold = (Font(path) for path in sys.argv[1:3])
    if regular.em != bold.em:
        raise SystemExit("the fonts differ in their em")
    maps = regular.glyphs(), bold.glyphs()
    print(f"# Liberation Sans {regular.revision}, em {regular.em}; made by advances.py")
    for first, last in BLOCKS:
        for code in range(first, last + 1):
            if code in maps[0] and code in maps[1]:
                print(f"{code:04X} {regular.advance(maps[0][code])} {bold.advance(maps[1][code])}")


main()
