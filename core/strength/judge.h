// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/branch.h"
#include "core/strength/criterion.h"
#include "core/strength/judgement.h"
#include "core/strength/strengths.h"
#include "core/words/problem.h"

namespace planewright {

/// What a check may add to a criterion.
struct Parameters {
  std::optional<double> n;    ///< exponent of Hankinson, 2 unless given
  std::optional<double> F12;  ///< 1/MPa^2, of Tsai and Wu; -0.5 sqrt(F11 F22) unless given
  std::optional<double> kc90; ///< EN 1995 compression at an angle; 1 unless given
  std::optional<Angle> edge;  ///< EN 1995 tapered edge: the direction of the edge
  bool operator==(const Parameters&) const = default;
};

/// The parameters beside strengths that are multiplied by a factor: F12, given for the strengths as they are
/// given, is divided by its square as F11 and F22 are.
Parameters forStrengthsTimes(double factor, Parameters parameters);

/// A criterion with its strengths, looking at the state of one combination: what it says of every direction
/// of the line (or of the normal of the plane).
class Judge {
public:
  /// The Problem where a strength is missing, the surface is not closed or the state is outside what the
  /// criterion was published for; its place is empty and it prints what was seen.
  static Result<Judge> of(Criterion criterion, const Strengths& strengths, const Parameters& parameters,
                          const Demand& demand);

  /// The greatest of the criterion's parts at a direction.
  double utilisation(Angle direction) const;
  Judgement at(Angle direction) const;
  /// False for criteria that know no direction.
  bool hasDirection() const { return m_hasDirection; }

  const std::vector<Branch>& branches() const { return m_branches; }
  const TurningState& state() const { return m_state; }

  bool operator==(const Judge&) const = default;

private:
  std::optional<Mode> modeAt(Angle direction, double utilisation) const;

  Criterion m_criterion = Criterion::sumOfSquares;
  Strengths m_strengths; ///< with the along strengths of the mix
  TurningState m_state;
  std::vector<Branch> m_branches;
  bool m_hasDirection = true;
  bool m_isUnstressed = false;
  std::optional<Mode> m_fixedMode;
};

/// Strengths of a body with a line as numbers, all that a criterion needs of them being given.
struct LineStrengths {
  double Xt = 0, Xc = 0, Yt = 0, Yc = 0, S = 0;
};

/// What stresses in the axes of a line at this utilisation would do: the greatest ratio to a strength where
/// it alone makes up 0.9 of the utilisation, else the interaction.
Mode lineModeOf(const LineStrengths& strengths, const LineStress& stresses, double utilisation);

} // namespace planewright
