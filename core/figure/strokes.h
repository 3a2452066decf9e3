// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/metrics.h"

namespace planewright {

/// How many strokes and fills of the picture meet the inside of a box; each straight piece of a path counts.
int strokesUnder(const Picture& picture, const Box& box);

} // namespace planewright
