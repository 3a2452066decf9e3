// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"
#include "core/words/problem.h"

#include <QByteArray>

class QPrinter;

namespace planewright {

inline constexpr int leastDpi = 50;
inline constexpr int greatestDpi = 2400;

/// The picture, in mm, as a PNG on white with exactly this resolution stated; a Problem for a resolution out
/// of range or a picture of more than 120 million pixels. It carries the study whose bytes are given, none
/// when they are empty.
Result<QByteArray> pngOf(const Picture& picture, Palette palette, int dpi, std::string_view study = {});

/// The picture, in mm, as a PDF of one page of exactly its size, with real text in the embedded font. It
/// carries a study likewise, in its metadata.
Result<QByteArray> pdfOf(const Picture& picture, Palette palette, std::string_view study = {});

/// Pages of one size, at least one, as one PDF; it carries a study likewise.
Result<QByteArray> pdfOfPages(const std::vector<Picture>& pages, Palette palette,
                              std::string_view study = {});

/// Prints the picture at true size at the top left of the printable page, made smaller only when it does not
/// fit: gives the part of its true size, 1 or less. A Problem when the printer does not start.
Result<double> printPicture(QPrinter& printer, const Picture& picture, Palette palette);

/// Prints whole pages with their own margins, each on a sheet of paper, made smaller only where the printer
/// cannot print to their size.
Result<void> printPages(QPrinter& printer, const std::vector<Picture>& pages, Palette palette);

} // namespace planewright
