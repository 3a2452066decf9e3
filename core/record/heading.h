// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <optional>
#include <string>
#include <string_view>

namespace planewright {

/// A cell without the blanks, tabs and line feeds at its ends.
std::string_view withoutBlanks(std::string_view text);

/// The heading of a column cut into its name and what stands in brackets behind it.
struct Heading {
  std::string_view name;
  std::optional<std::string_view> unit;
};

/// Cuts `sx [MPa]` and `N (kN)`; both parts point into the cell.
Heading headingOf(std::string_view cell);

/// Without blanks, index signs and capitals, Greek letters by name: "σ_{x}" gives "sigmax".
std::string plainHeading(std::string_view heading);

} // namespace planewright
