// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "core/working/step.h"

namespace planewright {

/// From the cases to a state: sx, sy, txy (and sz where any case has it) as the sum of factor times stress
/// over the cases that act, in the study's stress unit.
std::vector<Step> workingOfSum(const Study& study, const Readout& readout, const StateReading& state);

} // namespace planewright
