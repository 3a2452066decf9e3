// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// Rows of equally many cells as lines of text in columns, each behind `indent`: the first column to the
/// left, the others, mostly numbers, to the right.
std::string alignedRows(const std::vector<std::vector<std::string>>& rows, std::string_view indent);

} // namespace planewright
