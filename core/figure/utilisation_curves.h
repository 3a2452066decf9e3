// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/judge_checks.h"

namespace planewright {

/// A curve of utilisation over direction: x in deg from -90 to 90, y the utilisation. Where no finite number
/// exists y is beyond every limit (1e9).
using UtilisationCurve = std::vector<Vec>;
inline constexpr double beyondEveryLimit = 1e9;

/// Up to this many other combinations are drawn as lines of their own.
inline constexpr std::size_t mostOtherCurves = 24;

/// What one check says of every direction. Points stand at each degree and, so that no corner is cut, at the
/// turning points between: for few combinations in the greatest those of all, for many those of the shown
/// one.
struct UtilisationCurves {
  UtilisationCurve shown;               ///< the shown combination; empty where it is not judged
  UtilisationCurve greatest;            ///< of all judged combinations; empty where there is only one
  std::vector<UtilisationCurve> others; ///< the other judged combinations, where they are few enough
  double highest = 0;                   ///< the greatest finite utilisation of these curves
  bool operator==(const UtilisationCurves&) const = default;
};

/// Empty curves for a check without a direction.
UtilisationCurves utilisationCurvesOf(const Readout& readout, std::size_t check);
/// By the judges of the check.
UtilisationCurves utilisationCurvesOf(const Readout& readout, std::size_t check, const JudgesOfCheck& judges);

} // namespace planewright
