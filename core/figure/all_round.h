// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/utilisation_curves.h"
#include "core/table/check_words.h"

namespace planewright {

/// What one check says of every direction. It hangs on the judges alone, not on the direction that the line
/// has now: while that turns, only what is seen from it is worked out anew.
class AllRound {
public:
  void follow(const Readout& readout, std::size_t check);

  const UtilisationCurves& curves() const { return m_curves; }
  /// None for a check without a direction, or where a combination could not be judged.
  const std::optional<DirectionsOfCheck>& directions() const { return m_directions; }

private:
  std::optional<JudgesOfCheck> m_judges; ///< of what is worked out; none before the first
  UtilisationCurves m_curves;
  std::optional<DirectionsOfCheck> m_directions;
};

} // namespace planewright
