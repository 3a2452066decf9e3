// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// What a user of these results must know, each sentence once: which cases a state counts as zero because the
/// point does not list them, and where the theory of the sources of its cases ends.
std::vector<Text> cautionsOf(const Readout& readout, const StateReading& state);
/// Those of all states of a point, each once.
std::vector<Text> cautionsOf(const Readout& readout);

} // namespace planewright
