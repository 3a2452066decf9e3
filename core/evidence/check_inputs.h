// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <optional>
#include <string_view>
#include <vector>

namespace planewright {

/// A finite number that is the whole text.
std::optional<double> numberIn(std::string_view text);

/// The inputs of a check: pieces "name=value" between semicolons; a piece without "=" is a remark.
class CheckInputs {
public:
  explicit CheckInputs(std::string_view pieces) : m_pieces(pieces) {}

  /// What stands behind "name="; none where the name is missing.
  std::optional<std::string_view> word(std::string_view name) const;
  /// The same as a number; none where it is none.
  std::optional<double> number(std::string_view name) const;
  /// Every name in the order of the pieces.
  std::vector<std::string_view> names() const;

private:
  std::string_view m_pieces;
};

} // namespace planewright
