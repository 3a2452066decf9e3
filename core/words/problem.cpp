// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/problem.h"

#include <algorithm>
#include <array>
#include <charconv>

namespace planewright {

namespace {

std::string digits(int number) {
  std::array<char, 12> buffer{};
  const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), number).ptr;
  return {buffer.data(), end};
}

Text position(const Problem& problem) {
  const std::string line = digits(problem.line);
  const std::string column = digits(problem.column);
  if (problem.line > 0 && problem.column > 0)
    return PW_TEXT("Problem", "line %1, column %2").with(line).with(column);
  if (problem.line > 0)
    return PW_TEXT("Problem", "line %1").with(line);
  if (problem.column > 0)
    return PW_TEXT("Problem", "column %1").with(column);
  return {};
}

} // namespace

std::string plain(const Problem& problem, const Translate& translate) {
  std::string result = problem.place;
  if (const Text where = position(problem); !where.empty())
    result += (result.empty() ? "" : ", ") + plain(where, translate);
  if (!result.empty())
    result += ": ";
  result += plain(problem.what, translate);
  if (!problem.mend.empty())
    result += " " + plain(problem.mend, translate);
  // What is quoted may come from anywhere: it must neither break the line nor steer a terminal.
  std::ranges::replace_if(
      result, [](unsigned char c) { return c < 0x20 || c == 0x7F; }, ' ');
  return result;
}

} // namespace planewright
