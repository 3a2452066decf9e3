// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <cstddef>
#include <optional>
#include <string_view>

namespace planewright {

/// One row of the name table of an enum: its value, its word in files and commands, its words on screen.
template <class Enum>
struct Named {
  Enum value;
  const char* word;
  Text label;
};

/// The name table of an enum; each enum that appears in files specialises it once.
template <class Enum>
const std::vector<Named<Enum>>& namesOf();

template <class Enum>
const Named<Enum>& nameRow(Enum value) {
  return namesOf<Enum>()[static_cast<std::size_t>(value)];
}

template <class Enum>
std::string_view wordOf(Enum value) {
  return nameRow(value).word;
}

template <class Enum>
const Text& labelOf(Enum value) {
  return nameRow(value).label;
}

/// The value of a word; none for every other word, also for one that differs by case or a space.
template <class Enum>
std::optional<Enum> fromWord(std::string_view word) {
  for (const Named<Enum>& row : namesOf<Enum>())
    if (word == row.word)
      return row.value;
  return std::nullopt;
}

} // namespace planewright
