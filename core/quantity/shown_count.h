// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/format.h"

namespace planewright {

/// A count as it is written.
inline std::string shownCount(std::size_t count) {
  return exactNumber(static_cast<double>(count));
}

} // namespace planewright
