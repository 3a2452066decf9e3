// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

#include <cstddef>

namespace planewright {

/// How the labels of a circle came out.
struct CircleLabels {
  bool fit = true;         ///< false: a label that must stand found no room
  std::size_t unnamed = 0; ///< watched planes that have their mark, but no room for their name
};

/// Draws Mohr's circle of the shown state with axes, marks and labels in an area of the sheet.
CircleLabels drawCirclePanel(Picture& picture, const Setting& setting, const Box& area);

} // namespace planewright
