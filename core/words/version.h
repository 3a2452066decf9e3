// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>

namespace planewright {

/// The version of the program, "0.1.0": that of the project in CMake.
std::string_view programVersion();

} // namespace planewright
