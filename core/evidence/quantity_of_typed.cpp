// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/quantity.h"

#include "core/quantity/expression.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

/// What a typed text is read as; its value is in the base.
struct Word {
  std::string_view word;
  EntryKind kind;
};

const auto& words() {
  static const std::array words = {Word{"stress", {dimension::stress, {}, Slopes::none}},
                                   Word{"force", {dimension::force, {}, Slopes::none}},
                                   Word{"length", {dimension::length, {}, Slopes::none}},
                                   Word{"moment", {dimension::moment, {}, Slopes::none}},
                                   Word{"angle", {dimension::angle, degreeUnit(), Slopes::line}}};
  return words;
}

} // namespace

Result<Quantity> quantityOfTyped(const CheckInputs& inputs, std::string_view word) {
  const auto at = std::ranges::find(words(), word, &Word::word);
  if (at == words().end())
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  std::string(word),
                                  PW_TEXT("Check", "This quantity does not follow from these inputs."),
                                  {}});
  return readEntry(inputs.word("typed").value_or(""), at->kind).map([&](const Entry& entry) {
    return Quantity{entry.value, at->kind.slopes == Slopes::line, std::abs(entry.value)};
  });
}

} // namespace planewright
