// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "core/working/step.h"

namespace planewright {

/// The working of one check of a judged state, in the study's stress unit: the factor of the strengths, the
/// strengths as they count, the stresses that the criterion looks at, the utilisation "u" at the nominal
/// direction and, where it is another, at the worst of the band, and the multiplier on all loads "R" of the
/// worst. Stresses are tension positive whatever the study counts positive; those along and across a line and
/// on a watched plane at the nominal direction stand in workingOf already and are repeated only where their
/// sign is another. Without a finite utilisation there is what shows why; a check that could not be judged
/// has no steps.
std::vector<Step> workingOfCheck(const Study& study, const Readout& readout, const StateReading& state,
                                 std::size_t check);

} // namespace planewright
