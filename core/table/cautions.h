// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// What a user of these results must know, each sentence once: a name that says other factors than the state
/// has, the cases that it counts as zero because the point does not list them, those that the point lists but
/// no judged state has, and where the theory of the sources of its cases ends.
std::vector<Text> cautionsOf(const Readout& readout, const StateReading& state);
/// Those of all judged states of a point, each once.
std::vector<Text> cautionsOf(const Readout& readout);

/// What must stand beside least and greatest values over all judged states: whose zeros are among them only
/// because the point lists none of their cases. Empty where fewer than two states are judged.
std::vector<Text> cautionsOfEnvelope(const Readout& readout);

/// That a combination's name says other factors than it has.
Text misnamed(const std::string& name, const std::string& factors);

} // namespace planewright
