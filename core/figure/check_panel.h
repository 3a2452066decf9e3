// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

namespace planewright {

/// Draws what the checks of the point come to over all combinations, from `top` down between two edges, and
/// returns where it ends: the verdict of the governing check with its sentences and cautions, and beside them
/// (in a narrow figure below) utilisation over the angle. `top` where the point has no checks.
double drawCheck(Picture& picture, const Setting& setting, double left, double right, double top);

} // namespace planewright
