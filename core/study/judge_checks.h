// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// Reads the checks of a point and judges every judged state of its Readout. Strength belongs to the
/// combination: its factor is that of the shortest duration among the acting cases over the partial factor.
void judgeChecks(Readout& readout, const Study& study, const Point& point);

/// The judge by a criterion of the strengths of a check, times the factor of a combination.
Result<Judge> judgeBy(Criterion criterion, const CheckSetup& setup, const Parameters& parameters,
                      double factor, const Demand& demand);

/// The judge of one check and state: for what a check says of other directions.
Result<Judge> judgeOf(const Readout& readout, const StateReading& state, std::size_t check);
/// Those of all judged states that can be judged, for one check.
struct JudgesOfCheck {
  std::vector<Judge> all;
  std::optional<std::size_t> shown; ///< which of them is that of the shown state
  bool operator==(const JudgesOfCheck&) const = default;
};
JudgesOfCheck judgesOf(const Readout& readout, std::size_t check);

/// What a state asks of strengths, with tension positive.
Demand demandOf(const Readout& readout, const StateReading& state);

} // namespace planewright
