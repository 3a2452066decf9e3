// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/aligned_rows.h"

#include "core/words/utf8.h"

#include <algorithm>

namespace planewright {

namespace {

std::string blanks(std::size_t width, const std::string& beside) {
  return std::string(width - std::min(width, codePointsIn(beside)), ' ');
}

} // namespace

std::string alignedRows(const std::vector<std::vector<std::string>>& rows, std::string_view indent) {
  std::vector<std::size_t> widths(rows.front().size());
  for (const std::vector<std::string>& row : rows)
    for (std::size_t i = 0; i < row.size(); ++i)
      widths[i] = std::max(widths[i], codePointsIn(row[i]));
  std::string lines;
  for (const std::vector<std::string>& row : rows) {
    lines += std::string(indent) + row[0] + blanks(widths[0], row[0]);
    for (std::size_t i = 1; i < row.size(); ++i)
      lines += "  " + blanks(widths[i], row[i]) + row[i];
    lines += '\n';
  }
  return lines;
}

} // namespace planewright
