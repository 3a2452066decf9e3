// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/metrics.h"

namespace planewright {

/// The least rectangle that holds every part of a picture, without the widths of pens. An empty picture has
/// the empty rectangle at the origin.
Box extentOf(const Picture& picture);

} // namespace planewright
