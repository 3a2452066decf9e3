// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/all_round.h"

namespace planewright {

void AllRound::follow(const Readout& readout, std::size_t check) {
  JudgesOfCheck judges = judgesOf(readout, check);
  const CheckSetup& setup = readout.checks[check];
  if (judges != m_judges || m_directions.has_value() != isJudgedAllRound(readout, check)) {
    m_curves = utilisationCurvesOf(readout, check, judges);
    m_directions = directionsOf(readout, check, judges.all);
    m_judges = std::move(judges);
  } else if (m_directions)
    lookFrom(setup.band->nominal, judges.all, *m_directions);
}

} // namespace planewright
