// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/arguments.h"
#include "app/outcome.h"

namespace planewright {

/// What a command hands over: all of its bytes at once, for a file or ("-") for standard output.
struct Delivery {
  std::string bytes;
  std::string file = "-";
  Exit exit = Exit::done;       ///< once it is delivered
  std::vector<Text> facts = {}; ///< what is said on standard error beside it
  std::string said = {};        ///< lines of text that stand there below the facts
};

/// Where -o sends the output: "-" without it. A Problem when that is the study that is read.
Result<std::string> outputOf(const Arguments& arguments);

/// Writes a delivery; nothing is left half done in a file.
Outcome<void> delivered(const Delivery& delivery);

} // namespace planewright
