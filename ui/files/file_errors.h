// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

namespace planewright {

/// What an error of the system (errno) says of a file that was to be read.
Problem unread(const std::string& path, int error);
/// The same of one that was to be written.
Problem unwritten(const std::string& path, int error);

} // namespace planewright
