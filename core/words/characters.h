// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>
#include <vector>

namespace planewright {

/// One character of a UTF-8 text: its code point and the bytes it stands in.
struct Character {
  char32_t code = 0;
  std::string_view bytes;
};

/// The characters of a UTF-8 text. A byte that does not belong to a well-formed sequence comes out as U+FFFD.
std::vector<Character> charactersOf(std::string_view text);

} // namespace planewright
