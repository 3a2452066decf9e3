// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/round.h"

namespace planewright {

/// The strengths of checked planes: failure line of both signs with hatch on its failing side, the plane that
/// touches it first with its angle, and the margin of the checked plane. Only what lies in the plot.
Picture failureLayer(const Stage& stage);

} // namespace planewright
