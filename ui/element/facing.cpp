// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/facing.h"

#include <cmath>

namespace planewright {

Angle Facing::shown(Angle folded) const {
  return isOther(folded) ? folded + Angle::fromDegrees(180) : folded;
}

void Facing::keepNear(Angle wanted, Angle folded) {
  const double off = std::remainder(wanted.degrees() - folded.degrees(), 360.0);
  m_otherAt = std::abs(off) > 90 ? std::optional(folded) : std::nullopt;
}

} // namespace planewright
