// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// What a reader of the shown state's drawings must know, one sentence each: positive sense, angles, sense of
/// tau_nt and of the circle, scale of arrows, third stress and greatest shear, the line as typed, cases that
/// count as zero, and the caution.
std::vector<Text> conventionsOf(const Study& study, const Readout& readout);

} // namespace planewright
