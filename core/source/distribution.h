// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section_forces.h"

#include <functional>

namespace planewright {

/// A value along the second axis of a view: at a height y seen from the side, at a place z seen from the top.
struct CurvePoint {
  double at = 0;
  double value = 0;
};
using Curve = std::vector<CurvePoint>;

/// How sx and txy run through the section along the second axis of a fibre's view, the fibre's other place
/// kept.
struct Distribution {
  std::vector<Curve> sx;  ///< one line for each stretch of material
  std::vector<Curve> txy; ///< both sides of each junction; none where theory gives no shear
};
/// For drawings: sx exact, txy exact at each point. A Problem with tabled values, which have no shape, and
/// where the line meets no material.
Result<Distribution> distributionThrough(const SectionModel& model, const SectionForces& forces,
                                         const Fibre& fibre, ShearRule rule);

/// What a state is judged by: the greater, the worse.
using Measure = std::function<double(const PlaneStress&)>;

struct WorstFibre {
  Fibre fibre;
  FibreStress stress;
  double measure = 0;
  bool isPartial = false; ///< over some of the depth theory gives no stress: that was not judged
};
/// The worst fibre along the second axis of a fibre's view. Judged are the extremes, junctions and the axis,
/// and a fine scan whose best place is narrowed down to 1e-9 of the depth: exact where the measure rises and
/// falls no more often than the scan sees. Of equals the one highest up (or furthest to the right).
Result<WorstFibre> worstFibre(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                              ShearRule rule, const Measure& measure);

} // namespace planewright
