// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/branch.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <span>

namespace planewright {

namespace {

constexpr double infinity = std::numeric_limits<double>::infinity();

double quadraticOf(const Interaction& f, const LineStress& s) {
  return f.a11 * s.along * s.along + f.a12 * s.along * s.across + f.a22 * s.across * s.across +
         f.a66 * s.shear * s.shear;
}

double linearOf(const Interaction& f, const LineStress& s) {
  return f.b1 * s.along + f.b2 * s.across + f.b6 * std::abs(s.shear);
}

const Interaction& pieceOf(const SignedForm& form, const LineStress& s) {
  return form.pieces[s.along < 0 ? 1 : 0][s.across < 0 ? 1 : 0];
}

/// The roots of A x^2 + 2 H x + C whose discriminant H^2 - A C is given, as it may be known without the
/// cancellation.
void rootsOf(double A, double H, double C, double discriminant, std::vector<double>& roots) {
  if (!(discriminant >= 0))
    return;
  const double q = -(H + std::copysign(std::sqrt(discriminant), H));
  if (A != 0)
    roots.push_back(q / A);
  if (q != 0)
    roots.push_back(C / q);
}

/// Where the utilisation of one sign piece stands still, as X, without regard to the piece's ends. With
/// a = a2 X^2 + a1 X + a0 and b = b0 + k X: u = -a'/k put into u^2 - b u - a = 0.
void stationaryOf(const Interaction& f, double mean, double radius, std::vector<double>& at) {
  const double k = f.b1 - f.b2;
  if (f.b6 != 0) {
    at.push_back(k * radius / std::hypot(k, f.b6));
    return;
  }
  const double a2 = f.a11 - f.a12 + f.a22 - f.a66;
  const double a1 = 2 * mean * (f.a11 - f.a22);
  if (k == 0) {
    if (a2 != 0)
      at.push_back(-a1 / (2 * a2));
    return;
  }
  const double a0 = mean * mean * (f.a11 + f.a12 + f.a22) + f.a66 * radius * radius;
  const double b0 = mean * (f.b1 + f.b2);
  const double A = a2 * (4 * a2 + k * k);
  const double H = a2 * (2 * a1 + b0 * k);
  const double C = a1 * a1 + a1 * b0 * k - a0 * k * k;
  const double inner = a2 * b0 * b0 + 4 * a2 * a0 - a1 * a1 - a1 * b0 * k + a0 * k * k;
  rootsOf(A, H, C, k * k * a2 * inner, at);
}

struct Utilise {
  const TurningState& state;
  Angle direction;

  double operator()(const SignedForm& form) const {
    const LoadTerms terms = termsOf(form, state.at(direction));
    return utilisationOfQuadratic(terms.a, terms.b);
  }
  double operator()(const PowerOfAngle& power) const {
    const CosSin turn = cosSin(direction - power.axis);
    return power.size * (std::pow(std::abs(turn.sin), power.n) / power.Q +
                         std::pow(std::abs(turn.cos), power.n) / power.P);
  }
  double operator()(const Mobilised& plane) const {
    const LineStress s = state.at(direction);
    if (s.shear == 0 && s.along == 0)
      return plane.cohesion > 0 || state.scale == 0 ? 0 : infinity;
    const double resists = resistanceOf(plane, state, direction);
    return resists > 0 ? std::abs(s.shear) / resists : infinity;
  }
  double operator()(const CutOff& cutOff) const {
    const double pull = state.at(direction).along;
    if (pull <= 0)
      return 0;
    return cutOff.limit > 0 ? pull / cutOff.limit : infinity;
  }
  double operator()(const Fixed& fixed) const { return fixed.utilisation; }
};

std::optional<double> inverseOf(double utilisation) {
  return utilisation > 0 ? std::optional(1 / utilisation) : std::nullopt;
}

struct Multiply {
  const TurningState& state;
  Angle direction;

  std::optional<double> operator()(const SignedForm& form) const {
    return inverseOf(Utilise{state, direction}(form));
  }
  std::optional<double> operator()(const PowerOfAngle& power) const {
    return inverseOf(Utilise{state, direction}(power));
  }
  /// |t| R = cohesion - s1 R tan(phi): clamping grows with the load too.
  std::optional<double> operator()(const Mobilised& plane) const {
    const LineStress s = state.at(direction);
    const double grows = std::abs(s.shear) + s.along * plane.tanPhi;
    return grows > 0 ? std::optional(plane.cohesion / grows) : std::nullopt;
  }
  std::optional<double> operator()(const CutOff& cutOff) const {
    const double pull = state.at(direction).along;
    return pull > 0 ? std::optional(cutOff.limit / pull) : std::nullopt;
  }
  std::optional<double> operator()(const Fixed& fixed) const { return fixed.multiplier; }
};

struct TurningPoints {
  const TurningState& state;
  std::vector<double> at{};

  void operator()(const SignedForm& form) { addTurnsOf(form, state.circle.mean, state.circle.radius, at); }
  void operator()(const PowerOfAngle&) {}
  void operator()(const Mobilised& plane) {
    const double radius = state.circle.radius;
    const double clamped = plane.cohesion - state.circle.mean * plane.tanPhi;
    if (clamped != 0)
      at.push_back(radius * radius * plane.tanPhi / clamped);
    if (plane.tanPhi != 0)
      at.push_back(clamped / plane.tanPhi);
  }
  void operator()(const CutOff&) { at.push_back(-state.circle.mean); }
  void operator()(const Fixed&) {}
};

void addTurningPoints(const PowerOfAngle& power, std::vector<Angle>& directions) {
  std::vector<double> turns = {0, 90};
  if (power.n != 2) {
    const double steep =
        Angle::fromRadians(std::atan(std::pow(power.Q / power.P, 1 / (power.n - 2)))).degrees();
    turns.insert(turns.end(), {steep, -steep});
  }
  for (const double turn : turns)
    directions.push_back(folded(power.axis + Angle::fromDegrees(turn)));
}

} // namespace

void addTurnsOf(const SignedForm& form, double mean, double radius, std::vector<double>& at) {
  at.insert(at.end(), {-mean, mean});
  std::array<const Interaction*, 4> seen{};
  std::size_t count = 0;
  for (const auto& row : form.pieces)
    for (const Interaction& piece : row)
      if (std::ranges::none_of(std::span(seen.data(), count),
                               [&](const Interaction* other) { return *other == piece; })) {
        seen[count++] = &piece;
        stationaryOf(piece, mean, radius, at);
      }
}

LoadTerms termsOf(const SignedForm& form, const LineStress& stresses) {
  const Interaction& piece = pieceOf(form, stresses);
  return {quadraticOf(piece, stresses), linearOf(piece, stresses)};
}

double resistanceOf(const Mobilised& plane, const TurningState& state, Angle direction) {
  const double friction = state.at(direction).along * plane.tanPhi;
  return withoutRounding(plane.cohesion - friction, std::max(plane.cohesion, state.scale * plane.tanPhi));
}

double utilisationOfQuadratic(double a, double b) {
  a = std::max(a, 0.0); // a closed surface has none below 0 but for rounding
  if (a == 0)
    return std::max(b, 0.0);
  const double root = std::hypot(b, 2 * std::sqrt(a));
  return b >= 0 ? (b + root) / 2 : 2 * a / (root - b);
}

LineStress TurningState::at(Angle direction) const {
  LineStress s = inAxesOf(stress, LineAngle{direction});
  s.along = withoutRounding(s.along, scale);
  s.across = withoutRounding(s.across, scale);
  s.shear = withoutRounding(s.shear, scale);
  return s;
}

void TurningState::directionsOf(double X, std::vector<Angle>& directions) const {
  if (!circle.theta1 || !(std::abs(X) <= circle.radius))
    return;
  const Angle turn = Angle::fromDegrees(Angle::fromRadians(std::acos(X / circle.radius)).degrees() / 2);
  directions.push_back(folded(circle.theta1->value + turn));
  directions.push_back(folded(circle.theta1->value - turn));
}

double utilisationOf(const Branch& branch, const TurningState& state, Angle direction) {
  const double utilisation = std::visit(Utilise{state, direction}, branch);
  // Of what overflows nothing reassuring may be said.
  return std::isnan(utilisation) ? infinity : utilisation;
}

std::optional<double> multiplierOf(const Branch& branch, const TurningState& state, Angle direction) {
  return std::visit(Multiply{state, direction}, branch);
}

std::vector<Angle> turningPointsOf(const Branch& branch, const TurningState& state) {
  std::vector<Angle> directions;
  if (std::holds_alternative<Fixed>(branch))
    return directions;
  if (const auto* power = std::get_if<PowerOfAngle>(&branch)) {
    addTurningPoints(*power, directions);
    return directions;
  }
  TurningPoints points{state, {-state.circle.radius, state.circle.radius}};
  std::visit(points, branch);
  for (const double X : points.at)
    state.directionsOf(X, directions);
  return directions;
}

std::vector<Angle> firstTouchesOf(const Branch& branch, const TurningState& state) {
  std::vector<Angle> directions = turningPointsOf(branch, state);
  if (const auto* plane = std::get_if<Mobilised>(&branch))
    state.directionsOf(state.circle.radius * plane->tanPhi / std::hypot(1, plane->tanPhi), directions);
  return directions;
}

} // namespace planewright
