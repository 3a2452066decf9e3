// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// `planewright-readout` version 1: everything that follows from the study for these points, as JSON with 15
/// significant digits, stresses in the study's unit.
std::string readoutJson(const Study& study, const std::vector<Readout>& points);
/// The same as csv: one row a plane, line or check of each state, with the state's own numbers in each; a
/// state that has none stands in a row of its own. `row` is "plane", "line", "check" or "state", other
/// columns go by the keys of the JSON; `stress_unit` and `positive` are the study's, `cautions` those of the
/// state.
std::string readoutCsv(const Study& study, const std::vector<Readout>& points);
/// The same for people, with the working of each state and of each check in the combination that governs it,
/// in English or another language.
std::string readoutText(const Study& study, const std::vector<Readout>& points,
                        const Translate& translate = {});

/// How the shown state of a point comes about, for people: where the stresses of its cases come from, with
/// the signs and limits of each source, the working of the state, and that of its checks.
std::string workingText(const Study& study, const Readout& readout, const Translate& translate = {});

} // namespace planewright
