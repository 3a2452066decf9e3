// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <string>
#include <string_view>

namespace planewright {

/// Tells decimal commas from commas that part thousands, by all the numbers of a table. A point or comma with
/// three digits behind it and one to three before ("1,234") can be either: it is read only where the other
/// numbers of the table, or its semicolons, say which.
class DecimalMarks {
public:
  /// Semicolons part cells where the comma is the decimal sign; between commas none is.
  explicit DecimalMarks(char separator) : m_separator(separator) {}

  /// Looks at a cell of the table.
  void see(std::string_view cell);
  /// The cell with a decimal point where a comma was meant; whatever is no plain number with one sign stays
  /// as it is. A Problem for a number that can be meant in two ways.
  Result<std::string> pointed(std::string_view cell) const;

private:
  char m_separator;
  bool m_hasDecimalComma = false;
  bool m_hasDecimalPoint = false;
};

} // namespace planewright
