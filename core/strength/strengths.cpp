// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/strengths.h"

namespace planewright {

Strengths operator*(double factor, Strengths strengths) {
  for (std::size_t i = 0; i < strengthKeys; ++i)
    if (strengths.values[i] && rowOf(static_cast<StrengthKey>(i)).isScaled)
      *strengths.values[i] *= factor;
  return strengths;
}

} // namespace planewright
