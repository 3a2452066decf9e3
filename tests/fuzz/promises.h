// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <cstdlib>
#include <string_view>

namespace planewright {

/// What a fuzzer finds is found by stopping.
inline void require(bool condition) {
  if (!condition)
    std::abort();
}

/// A Problem says something, in one line of valid UTF-8 whatever bytes it quotes.
inline void requireWords(const Problem& problem) {
  require(!problem.what.empty());
  const std::string words = plain(problem);
  require(isUtf8(words));
  require(std::none_of(words.begin(), words.end(), [](unsigned char c) { return c < 0x20 || c == 0x7F; }));
}

/// What is refused is refused with a bounded number of Problems that point into the input.
inline void requireWithin(const Problems& problems, std::string_view bytes) {
  require(!problems.empty() && problems.size() <= 100);
  const auto lines = static_cast<int>(std::count(bytes.begin(), bytes.end(), '\n')) + 1;
  for (const Problem& problem : problems) {
    require(problem.line >= 1 && problem.line <= lines && problem.column >= 1);
    requireWords(problem);
  }
}

} // namespace planewright
