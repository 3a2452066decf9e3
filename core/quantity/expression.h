// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/unit.h"

namespace planewright {

/// Which forms of a slope ("1 in 12", "1:12", "8 %") a field reads besides expressions.
enum class Slopes {
  none,      ///< a Problem whose mend says that a plane's normal takes no slope
  tolerance, ///< n in m and n:m, not negative
  line       ///< n in m, n:m and p %
};

/// What a field takes: a dimension, the unit of a text that names none, and the slopes it reads.
struct EntryKind {
  Dimension dimension;
  Unit unit;
  Slopes slopes = Slopes::none;
};

/// A typed text that was read.
struct Entry {
  double value = 0; ///< in the base (N, mm, deg)
  std::string text; ///< the typed text, trimmed; a text without any unit is completed with the field's
  double halfWidth =
      0; ///< in the base: half the last digit of a plain number, 1e-12 |value| of an expression
  bool operator==(const Entry&) const = default;
};

/// Reads an expression with units: numbers, + - * / ^, parentheses, sqrt abs min max sin cos tan, pi.
/// At most 4096 characters and 200 levels. The result is finite and of the field's dimension, or a Problem
/// with column, quoted piece and mend (place is left empty).
Result<Entry> readEntry(std::string_view text, const EntryKind& kind);

} // namespace planewright
