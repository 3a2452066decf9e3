// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/strength_key.h"
#include "core/study/kinds.h"

#include <string>

namespace planewright {

/// Factors by the duration of the load, typed texts without a dimension; an empty one is not given.
struct DurationTexts {
  std::string permanent, longTerm, medium, shortTerm, instantaneous;
  bool operator==(const DurationTexts&) const = default;
};

/// A set of strengths; `name` is its key. Strengths are typed texts, empty where they are not given; which of
/// them a material may have goes by its kind.
struct Material {
  std::string name;
  MaterialKind kind = MaterialKind::timber;
  std::string source;  ///< the work that the strengths were taken from
  std::string edition; ///< of that work
  std::string trust;   ///< how the values were read: second-hand, from memory
  StrengthBasis basis = StrengthBasis::characteristic;
  std::string alongTension, alongCompression, alongBending, acrossTension, acrossCompression, shear;
  std::string tension, compression, cohesion, friction, cutoff;
  std::string fu, betaW, gammaM2;
  Seam seam = Seam::fillet; ///< of a throat
  std::string partialFactor;
  std::string factor; ///< replaces the quotient of duration factor and partial factor
  std::string serviceClass;
  DurationTexts durations;
  bool operator==(const Material&) const = default;
};

} // namespace planewright
