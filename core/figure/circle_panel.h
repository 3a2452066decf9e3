// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

namespace planewright {

/// Draws Mohr's circle of the shown state with axes, marks and labels in an area of the sheet; false when
/// labels find no room.
bool drawCirclePanel(Picture& picture, const Setting& setting, const Box& area);

} // namespace planewright
