// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/aligned_rows.h"

#include "core/words/utf8.h"

#include <algorithm>

namespace planewright {

namespace {

std::string filledUp(const std::string& cell, std::size_t width, ColumnSide side) {
  const std::string blanks(width - std::min(width, codePointsIn(cell)), ' ');
  return side == ColumnSide::left ? cell + blanks : blanks + cell;
}

} // namespace

std::string alignedRows(const std::vector<std::vector<std::string>>& rows, std::string_view indent,
                        const std::vector<ColumnSide>& sides) {
  std::vector<std::size_t> widths(rows.front().size());
  for (const std::vector<std::string>& row : rows)
    for (std::size_t i = 0; i < row.size(); ++i)
      widths[i] = std::max(widths[i], codePointsIn(row[i]));
  const auto sideOf = [&](std::size_t column) {
    return !sides.empty() ? sides[column] : column == 0 ? ColumnSide::left : ColumnSide::right;
  };
  std::string lines;
  for (const std::vector<std::string>& row : rows) {
    std::string line(indent);
    for (std::size_t i = 0; i < row.size(); ++i)
      line += (i == 0 ? "" : "  ") + filledUp(row[i], widths[i], sideOf(i));
    lines += line.substr(0, line.find_last_not_of(' ') + 1) + '\n';
  }
  return lines;
}

} // namespace planewright
