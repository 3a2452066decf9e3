// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <span>

namespace planewright {

/// An option that a command knows.
struct OptionRow {
  std::string_view name; ///< "--sx", "-o"
  enum class Takes { nothing, oneValue, manyValues } takes = Takes::oneValue;
};

/// An option as it was given; `value` is empty for one that takes none.
struct GivenOption {
  std::string name;
  std::string value;
};

/// The words of a command line, sorted out. Options stand in the order in which they were given.
struct Arguments {
  std::vector<std::string> operands;
  std::vector<GivenOption> options;
  bool helpAsked = false;

  bool has(std::string_view name) const { return valueOf(name) != nullptr; }
  /// The value of an option that was given, else null.
  const std::string* valueOf(std::string_view name) const;
};

/// Sorts out the words behind a command. `--sx -30` and `--sx=-30` give the same; a value never begins with
/// "--"; "-" is an operand; behind "--" every word is one; "--help" is known to every command. An unknown
/// option, a missing value, a value too many, an option given twice that takes one value and more than
/// `mostOperands` operands are Problems.
Result<Arguments> argumentsOf(std::span<const std::string> words, std::span<const OptionRow> known,
                              std::size_t mostOperands);

} // namespace planewright
