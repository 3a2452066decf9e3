// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/distribution.h"
#include "core/study/readout.h"

namespace planewright {

/// The section forces of one state of a point with its section, and what else acts there: that part is taken
/// as the same at every fibre.
struct LoadedSection {
  SectionModel model;
  Fibre fibre;
  ShearRule rule = ShearRule::upward;
  SectionForces forces;
  PlaneStress rest; ///< tension positive
  double sense = 1; ///< of the study: -1 where compression counts positive
};
/// None for a point without a fibre.
std::optional<LoadedSection> loadedSectionOf(const Study& study, const Readout& readout,
                                             const StateReading& state);

/// The worst fibres over the depth, along the second axis of the fibre's view.
struct WorstFibres {
  WorstFibre principal; ///< of the greatest s1, tension positive
  WorstFibre shear;     ///< of the greatest shear in the plane
};
Result<WorstFibres> worstFibresOf(const LoadedSection& section);

/// The place with three decimals of a millimetre, or what is as fine in the study's unit of length, where
/// that still lies in the material; else the place itself.
Fibre readablePlace(const Study& study, const LoadedSection& section, const Fibre& fibre);

} // namespace planewright
