// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/region.h"
#include "core/source/written_units.h"
#include "core/working/step.h"

namespace planewright {

/// What bending and normal force need of a section, about axes through its centroid: y up, z to the right as
/// seen in the direction of +x. mm and its powers. Exact up to rounding (closed forms by Green's theorem; the
/// root fillets as quarter circles), where tables round and may leave fillets out.
struct SectionProperties {
  double A = 0;
  double Iz = 0;                ///< of y^2 dA
  double Iy = 0;                ///< of z^2 dA
  double Iyz = 0;               ///< of y z dA; exactly 0 where it is below rounding
  double yTop = 0, yBottom = 0; ///< heights of the extreme fibres, above and below the centroid
  double zRight = 0, zLeft = 0; ///< of the extreme fibres to the right and to the left

  double centroidFromBottom() const { return -yBottom; }
  double centroidFromLeft() const { return -zLeft; }
  /// Section moduli of the extreme fibres, I / distance. For bending about one axis only, with Iyz = 0.
  double WzTop() const { return Iz / yTop; }
  double WzBottom() const { return Iz / -yBottom; }
  double WyRight() const { return Iy / zRight; }
  double WyLeft() const { return Iy / -zLeft; }
};

/// Of a section that is not tabled.
SectionProperties propertiesOf(const Region& region);

/// The working of A, centroid, Iz, Iy, and Iyz where it is not 0 or else W, of a section that is not tabled,
/// with its sizes put in. Composed sections by the theorem of parallel axes.
std::vector<Step> propertySteps(const Section& section, const WrittenUnits& units = {});

} // namespace planewright
