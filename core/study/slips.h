// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "core/words/names.h"
#include "core/words/problem.h"

namespace planewright {

/// What somebody else's number is meant to be.
enum class Asked {
  sn,     ///< on the reading plane
  tnt,    ///< on the reading plane
  along,  ///< the line
  across, ///< the line
  shear,  ///< in the axes of the line
  s1,
  s2,
  tauMax ///< greatest shear in the plane
};
template <>
const std::vector<Named<Asked>>& namesOf<Asked>();

/// One known slip and the number that it makes, in N/mm2.
struct Slip {
  Text words; ///< "the angle of the cut taken for that of its normal"
  double value = 0;
};

/// Every known slip for this question whose number differs from the right one. See resources/checks and
/// README: line taken for normal, 2 theta for theta and theta for 2 theta, signs, degrees for a slope,
/// radians, axes exchanged, terms forgotten. Each is common practice of checking, no source.
std::vector<Slip> slipsFor(Asked asked, const Readout& readout);

/// The right number, N/mm2; none for a question on a line where the point has none.
std::optional<double> answerTo(Asked asked, const Readout& readout);

/// How somebody else's number compares.
struct Comparison {
  double ours = 0;         ///< N/mm2
  bool agrees = false;     ///< to the last digit that was typed
  std::vector<Text> slips; ///< those that make the typed number, to its last digit
};

/// A Problem when the text does not read, or the point has no line and the question is on one.
Result<Comparison> compared(const Study& study, const Readout& readout, Asked asked, std::string_view typed);

} // namespace planewright
