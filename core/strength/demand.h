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

/// The share of bending in sx. Only the parts that pull as the whole of sx does count, so that parts that
/// cancel never raise a strength; what is neither axial nor bending counts as axial.
double bendingShareOf(double sx, double axial, double bending);

/// The share of bending in what acts along a line, for the strength along it of the mix: 1/X = (1 -
/// w)/f_axial + w/f_bending, the trade's sum of ratios (common practice, no source). sy and the shear count
/// as axial: w = bendingShare |sx|/(|sx| + |sy| + 2 |txy|), one share for all directions, so that the worst
/// of a band stays exact. It is never more than the share of bending in the stress along a line within 45 deg
/// of x; beyond, sx bears little on that stress.
double bendingShareAlong(const Demand& demand);
/// Whether the strength along the line in tension (`pulls`) or compression is that of the mix: only that of
/// the sign that sx has.
bool mixesBending(const Demand& demand, bool pulls);

} // namespace planewright
