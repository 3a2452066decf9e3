// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/arguments.h"
#include "core/screen/field_columns.h"

namespace planewright {

/// What `screen` is asked for.
struct ScreenOrder {
  std::string table; ///< "-" is standard input
  std::string study;
  std::string output;
  std::string point; ///< empty for the one that the study shows
  std::vector<std::string> checks;
  std::vector<MappedHeading> headings;
  std::vector<std::string> except; ///< names of points and regions, or beginnings of them
  std::string exceptList;          ///< a file of names of points; empty without one
  std::size_t top = 0;             ///< only so many of the worst points; 0 for all
  bool leavesOut = false;          ///< faulty rows
  bool hasPrincipals = false;
};

/// The order that stands on the command line; `help` was not asked for.
Result<ScreenOrder> screenOrderOf(const Arguments& arguments);

/// The words of `screen` sorted out.
Result<Arguments> screenArgumentsOf(std::span<const std::string> words);

} // namespace planewright
