// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"
#include "core/words/problem.h"

#include <array>
#include <optional>

namespace planewright {

/// Strains in the plane of the surface as plain numbers (1e-6 for a microstrain), extension positive; gxy is
/// the engineering shear strain, positive when the right angle between +x and +y becomes smaller.
struct PlaneStrain {
  double ex = 0;
  double ey = 0;
  double gxy = 0;
  bool operator==(const PlaneStrain&) const = default;
};

/// The strain of a fibre in the direction `angle`: ex cos^2 + ey sin^2 + gxy sin cos.
double strainAlong(const PlaneStrain& strain, Angle angle);
/// The strains in axes turned by `turn` counter-clockwise.
PlaneStrain inTurnedAxes(const PlaneStrain& strain, Angle turn);

/// Greatest and least strain in the plane and the direction of the greatest, none where all are equal.
struct PrincipalStrains {
  double e1 = 0;
  double e2 = 0;
  std::optional<Angle> direction; ///< of e1, folded
};
PrincipalStrains principalOf(const PlaneStrain& strain);

/// One reading of a gauge.
struct Gauge {
  Angle direction;
  double strain = 0;
};
using Rosette = std::array<Gauge, 3>;

/// The three equations of a rosette, one for each gauge, solved.
struct RosetteSolution {
  PlaneStrain strain;
  /// By how much an error of the readings can grow in ex, ey or gxy: the greatest sum of |entries| in a row
  /// of the inverse. 3 for gauges at 0, 45 and 90 deg.
  double errorGain = 0;
};

/// The greatest gain with which a rosette is still solved: gauges nearer to parallel are a Problem.
inline constexpr double greatestErrorGain = 100;

/// The strains that three gauges in distinct directions have measured. A Problem for gauges so nearly
/// parallel that errors of reading would grow more than greatestErrorGain times.
Result<RosetteSolution> solved(const Rosette& rosette);

} // namespace planewright
