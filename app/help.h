// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>

namespace planewright {

/// What `--help` and `--version` print, and `--help` behind a command.
std::string programHelp();
std::string programVersionLines();
std::string resolveHelp();
std::string figureHelp();
std::string sheetHelp();
std::string compareHelp();
std::string validateHelp();
std::string manualHelp();
std::string screenHelp();

} // namespace planewright
