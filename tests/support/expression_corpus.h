// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"

#include <array>
#include <optional>
#include <string_view>
#include <vector>

namespace planewright {

/// A kind of field by the name that the corpus of expressions gives it; none for any other word.
inline std::optional<EntryKind> fieldOf(std::string_view name) {
  struct Row {
    std::string_view name;
    Dimension dimension;
    std::string_view unit;
    Slopes slopes;
  };
  static constexpr std::array<Row, 9> rows = {{{"stress", dimension::stress, "MPa", Slopes::none},
                                               {"psi", dimension::stress, "psi", Slopes::none},
                                               {"force", dimension::force, "kN", Slopes::none},
                                               {"length", dimension::length, "mm", Slopes::none},
                                               {"moment", dimension::moment, "kN*m", Slopes::none},
                                               {"number", dimension::none, "", Slopes::none},
                                               {"angle", dimension::angle, "deg", Slopes::none},
                                               {"line", dimension::angle, "deg", Slopes::line},
                                               {"tolerance", dimension::angle, "deg", Slopes::tolerance}}};
  for (const Row& row : rows)
    if (row.name == name)
      return EntryKind{row.dimension, row.unit.empty() ? Unit{} : readUnit(row.unit, row.dimension).value(),
                       row.slopes};
  return std::nullopt;
}

/// The parts of a text between signs of one kind.
inline std::vector<std::string_view> parts(std::string_view text, char sign) {
  std::vector<std::string_view> result;
  for (std::size_t start = 0;;) {
    const std::size_t end = text.find(sign, start);
    result.push_back(text.substr(start, end - start));
    if (end == std::string_view::npos)
      return result;
    start = end + 1;
  }
}

} // namespace planewright
