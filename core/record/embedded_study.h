// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "core/words/problem.h"

namespace planewright {

/// Bytes of the largest file in which a study is looked for.
inline constexpr std::size_t greatestCarrier = 64u << 20;

/// The finished document with the bytes of a study inside: it looks as before, and carriedStudy gives the
/// same bytes back. The SVG and the PNG are whole, the HTML has a </body>. A Problem when the study is larger
/// than is read.
Result<std::string> svgWithStudy(std::string svg, std::string_view study);
Result<std::string> pngWithStudy(std::string png, std::string_view study);
Result<std::string> htmlWithStudy(std::string html, std::string_view study);
/// The XMP metadata of a PDF that carries the study, for its writer to store unpacked.
Result<std::string> xmpWithStudy(std::string_view study);

/// The bytes of the study that an SVG, PDF, PNG or HTML file carries; none when the bytes begin as none of
/// these. A scan of bytes: nothing is drawn, unpacked or laid out, and no more memory is taken than the file
/// has bytes. Copies of one study count as one; a file with two studies is refused, for which is meant
/// cannot be known, and so is one whose study was changed or cut off.
std::optional<Result<std::string>> carriedStudy(std::string_view bytes);

/// The bytes of the study that a figure of this readout carries: it opens on the figure's point and
/// combination.
std::string studyOfFigure(Study study, const Readout& readout);

/// A study that was read.
struct OpenedStudy {
  Study study;
  bool isRestored = false; ///< it was carried by a figure or a sheet
};

/// Reads a study file, or the study that another file carries. Problems of a carried study have no line and
/// column, for those of its own text mean nothing to anybody.
Results<OpenedStudy> openedStudy(std::string_view bytes);

} // namespace planewright
