// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// What cuts the cells of a table with such a header: tabs, where there is none semicolons, else commas.
char separatorOf(std::string_view header);

/// Takes the cell at the start of `rest` off it, with the separator behind it. A cell that begins with a
/// quote ends with one, inner quotes being doubled, and is put into `unquoted`; others point into the row.
/// False where a quote is not closed or followed by anything but blanks.
bool takeCell(std::string_view& rest, char separator, std::string_view& cell, std::string& unquoted,
              bool& isLast);

/// All cells of a row; false as for takeCell.
bool cutRow(std::string_view row, char separator, std::vector<std::string>& cells);

} // namespace planewright
