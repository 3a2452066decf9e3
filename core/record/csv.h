// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// The fields of one row of comma separated values (RFC 4180, without line breaks inside quotes). A quote
/// that is not closed ends with the row.
std::vector<std::string> csvFields(std::string_view row);

/// A field as it is written: in quotes, with inner quotes doubled, where it holds a comma, quote or line
/// break.
std::string csvField(std::string_view text);

/// One row with its line feed.
std::string csvRow(const std::vector<std::string>& fields);

} // namespace planewright
