#!/usr/bin/python3
"""Writes math_font.cpp: the part of STIX Math that reports use, as WOFF2 in base64.

Needs Debian's fonts-stix, python3-fonttools and python3-brotli; the build does not need it. The font is
renamed, as the SIL Open Font License asks of changed versions, and given line metrics of ordinary size.
"""
import base64
import io
import pathlib

from fontTools import subset

SOURCE = "/usr/share/fonts/opentype/stix-word/STIXMath-Regular.otf"
FAMILY = "Gainsay Math"
ASCENT, DESCENT = 762, -238  # of 1000; the original's 2566 leave empty bands between lines

LATIN = range(0x20, 0x7F)
GREEK = [*range(0x391, 0x3A2), *range(0x3A3, 0x3AA), *range(0x3B1, 0x3CA)]
ITALIC = [*range(0x1D434, 0x1D468), 0x210E, *range(0x1D6E2, 0x1D71C)]
SIGNS = map(ord, "\u00a0°±·×¬µ′∂∆∑∏√∞−∕∗⋅≠≤≥∧∨→⇌←↔\u2009\u202fϕϵϑ…|‖⎧⎨⎩⎪")


def main() -> None:
    options = subset.Options()
    options.layout_features = []
    options.name_IDs = [0]
    options.notdef_outline = True
    options.hinting = False
    options.drop_tables += ["DSIG", "FFTM", "GDEF", "GPOS", "GSUB"]
    font = subset.load_font(SOURCE, options)
    subsetter = subset.Subsetter(options)
    subsetter.populate(unicodes=[*LATIN, *GREEK, *ITALIC, *SIGNS])
    subsetter.subset(font)
    rename(font)
    for table, names in (("hhea", ("ascent", "descent", "lineGap")),
                         ("OS/2", ("sTypoAscender", "sTypoDescender", "sTypoLineGap"))):
        for name, value in zip(names, (ASCENT, DESCENT, 0)):
            setattr(font[table], name, value)
    font["OS/2"].usWinAscent, font["OS/2"].usWinDescent = ASCENT, -DESCENT
    font["head"].modified = font["head"].created  # equal runs give equal bytes
    font.recalcTimestamp = False
    font.flavor = "woff2"
    out = io.BytesIO()
    font.save(out)
    write(base64.b64encode(out.getvalue()).decode())


def rename(font) -> None:
    compact = FAMILY.replace(" ", "")
    names = {1: FAMILY, 2: "Regular", 3: compact + " 1", 4: FAMILY, 6: compact,
             13: "SIL Open Font License, Version 1.1", 14: "https://openfontlicense.org"}
    for number, words in names.items():
        font["name"].setName(words, number, 3, 1, 0x409)
    cff = font["CFF "].cff
    cff.fontNames = [compact]
    cff.topDictIndex[0].FullName = cff.topDictIndex[0].FamilyName = FAMILY


def write(text: str) -> None:
    lines = [f'    "{text[i:i + 92]}"' for i in range(0, len(text), 92)]
    source = ('#include "gainsay/cli/math_font.h"\n\nnamespace gainsay::cli {\nnamespace {\n\n'
              "// Written by math_font.py.\nconstexpr std::string_view kMathFont =\n" + "\n".join(lines) +
              ";\n\n}  // namespace\n\nstd::string_view math_font() { return kMathFont; }\n\n"
              "}  // namespace gainsay::cli\n")
    pathlib.Path(__file__).with_name("math_font.cpp").write_text(source)


if __name__ == "__main__":
    main()
