// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet.h"
#include "core/study/readout.h"
#include "core/words/decimal_sign.h"
#include "core/words/problem.h"

namespace planewright {

/// How much of the calculation a sheet shows.
enum class Depth {
  results,   ///< inputs and results alone
  governing, ///< the working of the governing combination of each point, tables for the others
  all        ///< the working of every judged combination
};
template <>
const std::vector<Named<Depth>>& namesOf<Depth>();

/// How a sheet is asked for.
struct SheetOrder {
  std::vector<std::string> points; ///< names, in the order of the study; empty: all
  Depth depth = Depth::governing;
  bool figures = true;
  std::string studyName;        ///< the file's name; may be empty
  std::optional<Study> earlier; ///< the revision with which the study is compared
  std::string earlierName;      ///< its file's name
  DecimalSign decimal = DecimalSign::point;
  Translate translate; ///< for the figures
};

/// The readouts of the points with these names, in the order of the study; of all without names.
std::vector<Readout> readoutsOf(const Study& study, const std::vector<std::string>& names);

/// The calculation sheet of a valid study: what governs; purpose, method and conventions; everything typed
/// with its value; for each point where its stresses come from, the working, the checks, all combinations;
/// the second route; conclusion, cautions, what is not covered; lines to sign; sources of the formulas.
Sheet sheetOf(const Study& study, const SheetOrder& order);
/// The same where the readouts of its points are at hand.
Sheet sheetOf(const Study& study, const std::vector<Readout>& points, const SheetOrder& order);

} // namespace planewright
