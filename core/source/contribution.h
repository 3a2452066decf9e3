// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/plane_stress.h"
#include "core/working/step.h"

namespace planewright {

/// What one source adds to the stress of a case at a point, MPa, tension positive, in the axes of the point,
/// with the working that a checker follows.
struct Contribution {
  PlaneStress stress;
  double axial = 0;   ///< axial part of sx, of a normal force or of closed ends: its strength is not that of
                      ///< bending
  double bending = 0; ///< part of sx from bending moments; what is measured is in neither
  std::vector<Step> steps;
  std::vector<Text> signRules; ///< what the signs of the typed values mean
  std::vector<Text> cautions;  ///< where the theory ends
};

} // namespace planewright
