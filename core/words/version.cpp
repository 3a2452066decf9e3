// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/version.h"

namespace planewright {

std::string_view programVersion() {
  return PLANEWRIGHT_VERSION;
}

} // namespace planewright
