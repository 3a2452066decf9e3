// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// Where the cells of a column stand in it.
enum class ColumnSide : bool { left, right };

/// Rows of equally many cells as lines of text in columns, each behind `indent`. Without `sides` the first
/// column stands to the left, the others, mostly numbers, to the right.
std::string alignedRows(const std::vector<std::vector<std::string>>& rows, std::string_view indent,
                        const std::vector<ColumnSide>& sides = {});

} // namespace planewright
