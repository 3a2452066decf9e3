// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/circle_fit.h"

namespace planewright {

/// Grid, axes through zero, ticks and titles of a circle's plot. The title of the tau axis stands in its own
/// band above the frame, that of the sigma axis between the words for its two sides, under the ticks.
void drawCircleAxes(Picture& picture, const Setting& setting, const CircleFit& fit);

/// Height of the band of the tau axis' title, in ems.
inline constexpr double tauTitleHeight = 1.6;

} // namespace planewright
