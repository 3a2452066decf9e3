// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "core/working/step.h"

namespace planewright {

/// The working of a state, in the study's stress unit: mean, radius, principal values and their angle, the
/// plane of the greatest shear, the greatest shear of all; sn and tnt on the reading plane and on each
/// watched plane; along, across and shear of each line. A degenerate state has no steps for the two angles.
/// Numbers put in carry one decimal more than results.
std::vector<Step> workingOf(const Study& study, const Readout& readout, const StateReading& state);

} // namespace planewright
