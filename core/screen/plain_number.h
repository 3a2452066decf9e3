// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>

#include <tl/expected.hpp>

namespace planewright {

enum class NumberFault { empty, noNumber, notFinite, tooGreat };

/// A plain number as tables of other programs write it: "12", "-1.5e+3", "+.5". No locale, no expression, no
/// unit; what is smaller than every number is 0.
tl::expected<double, NumberFault> plainNumber(std::string_view text);

/// The same at the start of `rest` where a cell begins; takes it off with the separator behind it. False, and
/// nothing taken, where it is anything but a plain finite number between blanks.
bool takeNumber(std::string_view& rest, char separator, double& value, bool& isLast);

} // namespace planewright
