// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/demand.h"

#include <array>
#include <variant>
#include <vector>

namespace planewright {

/// The state of a demand as seen from a direction that turns: along = mean + X, across = mean - X, shear^2 =
/// r^2 - X^2 with X = r cos 2(angle - theta1).
struct TurningState {
  PlaneStress stress;
  Circle circle;
  double scale = 0;

  /// Components at a direction; what is only rounding of terms that cancel is 0.
  LineStress at(Angle direction) const;
  /// The directions, folded, where along - mean = X; none where |X| > r, or r is 0.
  void directionsOf(double X, std::vector<Angle>& directions) const;
  bool operator==(const TurningState&) const = default;
};

/// Coefficients of the polynomial of degree 2 in the load: a = a11 s1^2 + a12 s1 s2 + a22 s2^2 + a66 t^2,
/// b = b1 s1 + b2 s2 + b6 |t|.
struct Interaction {
  double a11 = 0, a12 = 0, a22 = 0, a66 = 0;
  double b1 = 0, b2 = 0, b6 = 0; ///< b6 only where all of a is 0
  bool operator==(const Interaction&) const = default;
};

/// A form with coefficients by the signs of s1 and s2: [s1 < 0][s2 < 0]. Its utilisation 1/R, where
/// a R^2 + b R = 1, is (b + sqrt(b^2 + 4a))/2: stable for b >= 0, and 2a/(sqrt(b^2 + 4a) - b) for b < 0.
struct SignedForm {
  std::array<std::array<Interaction, 2>, 2> pieces;
  bool operator==(const SignedForm&) const = default;
};

/// |s| (sin^n/Q + cos^n/P) of a uniaxial stress s at an angle to the line; s along `axis`.
struct PowerOfAngle {
  double size = 0;
  Angle axis;
  double P = 1, Q = 1, n = 2;
  bool operator==(const PowerOfAngle&) const = default;
};

/// |t| / (cohesion - s1 tan(phi)); infinite where the denominator is not positive. So it is, without
/// cohesion, on a plane of a stressed body that carries nothing itself: the least turn of it has no bound.
struct Mobilised {
  double cohesion = 0;
  double tanPhi = 0;
  bool operator==(const Mobilised&) const = default;
};

/// s1 / limit in tension, 0 in compression; infinite in any tension where the limit is 0.
struct CutOff {
  double limit = 0;
  bool operator==(const CutOff&) const = default;
};

/// The same in every direction.
struct Fixed {
  double utilisation = 0;
  std::optional<double> multiplier;
  bool operator==(const Fixed&) const = default;
};

/// One smooth part of a criterion; a criterion is the greatest of its parts.
using Branch = std::variant<SignedForm, PowerOfAngle, Mobilised, CutOff, Fixed>;

/// The polynomial of a form in the load at a direction: the quadratic sum a and the linear sum b.
struct LoadTerms {
  double a = 0, b = 0;
};
LoadTerms termsOf(const SignedForm& form, const LineStress& stresses);

/// cohesion - s1 tan(phi) at a direction; what is only rounding of the two is 0.
double resistanceOf(const Mobilised& plane, const TurningState& state, Angle direction);

/// Adds where the utilisation of a form turns, as X = along - mean, between principal directions at X = -r
/// and r: where a piece stands still, and at the corners, where a stress changes its sign.
void addTurnsOf(const SignedForm& form, double mean, double radius, std::vector<double>& at);

double utilisationOf(const Branch& branch, const TurningState& state, Angle direction);
/// The multiplier on all loads that takes this part to 1; none where none does.
std::optional<double> multiplierOf(const Branch& branch, const TurningState& state, Angle direction);
/// Directions, folded, between which the utilisation of the part is monotone.
std::vector<Angle> turningPointsOf(const Branch& branch, const TurningState& state);
/// Directions, folded, at one of which, or at an end of a range of directions, the multiplier of the part is
/// least: its turning points, and where |t| + s1 tan(phi) of a Coulomb plane is greatest, at X = r sin(phi).
std::vector<Angle> firstTouchesOf(const Branch& branch, const TurningState& state);

/// (b + sqrt(b^2 + 4a))/2 for a >= 0, by the form that loses no digits.
double utilisationOfQuadratic(double a, double b);

} // namespace planewright
