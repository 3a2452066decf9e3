// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>
#include <vector>

namespace planewright {

/// The one of `names` that a mistyped `word` most likely means, by an edit distance in which another case
/// counts 1, a missing or surplus letter 3 and a wrong one 4. The earlier name wins a tie. Empty when every
/// name is 2 or farther for each letter of the word: with about half of them amiss it is another word.
std::string_view nearestOf(const std::vector<std::string_view>& names, std::string_view word);

} // namespace planewright
