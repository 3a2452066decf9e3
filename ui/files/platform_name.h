// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>

namespace planewright {

/// System and processor that the program runs on: "Debian GNU/Linux 12 (bookworm), x86_64".
std::string platformName();

} // namespace planewright
