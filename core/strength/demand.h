// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/circle.h"

namespace planewright {

/// What strengths are asked to carry: the state of one combination, tension positive whatever the study
/// counts positive, in MPa.
struct Demand {
  PlaneStress stress;
  double sz = 0;
  double scale = 0;        ///< size of the terms before cancellation, as for circleOf
  double bendingShare = 0; ///< part of sx that comes from bending moments, 0 to 1
};

/// The share of bending in sx, for the strength along the line of the mix: 1/X = (1 - w)/f_axial +
/// w/f_bending, the trade's sum of ratios (common practice, no source). Only the parts that pull as the whole
/// of sx does count, so that parts that cancel never raise a strength; what is neither axial nor bending
/// counts as axial.
double bendingShareOf(double sx, double axial, double bending);

} // namespace planewright
