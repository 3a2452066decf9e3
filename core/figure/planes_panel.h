// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

namespace planewright {

/// Draws the table of planes from `top` down between two edges and returns where it ends. A narrow figure
/// leaves out the column of the cut.
double drawPlanes(Picture& picture, const Setting& setting, double left, double right, double top);

} // namespace planewright
