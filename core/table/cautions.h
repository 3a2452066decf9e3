// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// What a user of these results must know: one sentence for each case that a state counts as zero because
/// the point does not list it.
std::vector<Text> cautionsOf(const StateReading& state);
/// Those of all states of a point, each once.
std::vector<Text> cautionsOf(const Readout& readout);

} // namespace planewright
