// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/nearest.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr int otherCase = 1;
constexpr int missing = 3;
constexpr int wrong = 4;
/// For each letter: at this distance a name is no longer proposed.
constexpr int tooFar = 2;
/// A longer word is nobody's mistyped name; bounds the work.
constexpr std::size_t longest = 64;

char lower(char letter) {
  return letter >= 'A' && letter <= 'Z' ? static_cast<char>(letter + 32) : letter;
}

int costOf(char a, char b) {
  if (a == b)
    return 0;
  return lower(a) == lower(b) ? otherCase : wrong;
}

int distance(std::string_view from, std::string_view to) {
  std::vector<int> row(to.size() + 1);
  for (std::size_t j = 0; j < row.size(); ++j)
    row[j] = static_cast<int>(j) * missing;
  for (const char letter : from) {
    int diagonal = row[0];
    row[0] += missing;
    for (std::size_t j = 1; j < row.size(); ++j) {
      const int replaced = diagonal + costOf(letter, to[j - 1]);
      diagonal = row[j];
      row[j] = std::min({replaced, row[j] + missing, row[j - 1] + missing});
    }
  }
  return row.back();
}

} // namespace

std::string_view nearestOf(const std::vector<std::string_view>& names, std::string_view word) {
  std::string_view nearest;
  word = word.substr(0, longest);
  int least = tooFar * static_cast<int>(word.size());
  for (const std::string_view name : names) {
    const int cost = distance(word, name);
    if (cost < least) {
      least = cost;
      nearest = name;
    }
  }
  return nearest;
}

} // namespace planewright
