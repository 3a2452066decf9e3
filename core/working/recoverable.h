// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/working/step.h"

namespace planewright {

/// Whether the printed result follows from the printed numbers: the formula evaluated with the numbers as
/// they are written differs from the step's result by at most half a unit of the result's last digit.
bool isRecoverable(const Step& step);

/// The step with as many decimals in the numbers put in as make its result recoverable, at least those that
/// it has, at most 15; where terms cancel that can be many. Numbers that are written whole get none. A step
/// whose result does not follow even then is given back as it was.
Step recoverable(Step step);

} // namespace planewright
