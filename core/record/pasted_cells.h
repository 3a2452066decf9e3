// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// Bounds of a table that is read from text.
inline constexpr std::size_t greatestTable = 10'000'000; ///< bytes
inline constexpr std::size_t mostTableRows = 100'000;
inline constexpr std::size_t mostTableColumns = 40;

/// One row of a table in text: the line on which it begins and its cells, without quotes, blanks kept.
struct CellRow {
  int line = 0;
  std::vector<std::string> cells;
  bool operator==(const CellRow&) const = default;
};

/// The rows of a table in text, without those that are blank.
struct CellTable {
  char separator = '\t';
  std::vector<CellRow> rows;
  bool operator==(const CellTable&) const = default;
};

/// Cuts text into cells: at tabs, where there is none at semicolons, else at commas, the same for the whole
/// table. A cell that begins with a quote ends with one (RFC 4180); line breaks inside become line feeds. A
/// byte order mark is passed over. A Problem with line and column of the table for a quote that is not
/// closed, for text that is not UTF-8 and beyond the bounds.
Result<CellTable> cellsIn(std::string_view text);

/// A cell as it is written between such separators: in quotes where it has to be.
std::string writtenCell(std::string_view cell, char separator);

} // namespace planewright
