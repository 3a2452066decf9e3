// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <tl/expected.hpp>

namespace planewright {

/// Something outside the program that is wrong: a typed text, a file, an argument.
/// It names the place, quotes the offending piece and proposes the mend.
struct Problem {
  std::string place;  ///< path of the spot in the study, name of a file or option; may be empty
  int line = 0;       ///< 1-based line in a file; 0 where there is none
  int column = 0;     ///< 1-based column in code points, in the typed text or the file's line; 0: none
  std::string quoted; ///< the offending piece as it stands there; may be empty
  Text what;          ///< one plain sentence: what is wrong
  Text mend;          ///< one plain sentence: what to do; may be empty
  bool operator==(const Problem&) const = default;
};
using Problems = std::vector<Problem>;

template <class T>
using Result = tl::expected<T, Problem>;
template <class T>
using Results = tl::expected<T, Problems>;

/// "place, line 3, column 5: what. mend." on one line; control characters become blanks.
std::string plain(const Problem& problem, const Translate& translate = {});

} // namespace planewright
