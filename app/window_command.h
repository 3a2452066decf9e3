// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/outcome.h"

#include <span>
#include <string>

namespace planewright {

/// True where the words ask for the window: none at all, or first a file that exists.
bool asksForWindow(std::span<const std::string> words);

/// Opens the window, with the study that the words name, and runs it until it is closed; its exit status.
Outcome<int> shownWindow(int& argc, char** argv, std::span<const std::string> words);

} // namespace planewright
