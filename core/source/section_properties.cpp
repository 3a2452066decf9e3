// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_properties.h"

#include <cmath>

namespace planewright {

SectionProperties propertiesOf(const Region& region) {
  const AreaMoments& moments = region.moments;
  SectionProperties properties{moments.area, moments.yy,  moments.zz,   moments.yz,
                               region.yHigh, region.yLow, region.zHigh, region.zLow};
  // What is left of cancelling terms is not a product of inertia.
  if (std::abs(properties.Iyz) <= 1e-11 * std::sqrt(moments.yy * moments.zz))
    properties.Iyz = 0;
  return properties;
}

} // namespace planewright
