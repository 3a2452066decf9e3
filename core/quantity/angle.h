// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <compare>

namespace planewright {

/// Cosine and sine of one angle. Exact at multiples of 90 deg, and equal to sqrt(1/2) at odd multiples of
/// 45 deg; elsewhere within one or two units in the last place.
struct CosSin {
  double cos;
  double sin;
};

/// An angle in degrees, counter-clockwise positive as seen from +z.
class Angle {
public:
  constexpr Angle() = default;
  static constexpr Angle fromDegrees(double degrees) { return Angle(degrees); }
  /// Nearest double to radians * 180 / pi.
  static Angle fromRadians(double radians);

  constexpr double degrees() const { return m_degrees; }
  double radians() const;

  constexpr Angle operator+(Angle other) const { return Angle(m_degrees + other.m_degrees); }
  constexpr Angle operator-(Angle other) const { return Angle(m_degrees - other.m_degrees); }
  constexpr Angle operator-() const { return Angle(-m_degrees); }
  constexpr auto operator<=>(const Angle&) const = default;

private:
  constexpr explicit Angle(double degrees) : m_degrees(degrees) {}
  double m_degrees = 0;
};

CosSin cosSin(Angle angle);
/// cos 2a and sin 2a: what the transformation of stress needs; exact at multiples of 45 deg.
CosSin cosSinOfDouble(Angle angle);

/// The same direction modulo 180 deg in (-90, 90]; -90 becomes 90 and -0 becomes 0.
Angle folded(Angle angle);
/// Distance of two directions modulo 180 deg, in [0, 90].
Angle apart(Angle a, Angle b);
/// Two directions nearer to each other than this are one: what snaps, steps or names tells no more apart.
inline constexpr Angle coinciding = Angle::fromDegrees(1e-9);
bool coincide(Angle a, Angle b);

/// Angle phi of a physical line (grain, fibre, weld, bond) from +x. Modulo 180 deg.
struct LineAngle {
  Angle value;
  auto operator<=>(const LineAngle&) const = default;
};

/// Angle theta of the normal of a plane from +x. Modulo 180 deg.
struct NormalAngle {
  Angle value;
  auto operator<=>(const NormalAngle&) const = default;
};

/// Normal of the cut that crosses the line: theta = phi, folded.
NormalAngle crossing(LineAngle line);
/// Normal of the cut that follows the line: theta = phi + 90 deg, folded.
NormalAngle following(LineAngle line);
/// Direction in which the plane itself runs: theta + 90 deg, folded.
LineAngle cutOf(NormalAngle normal);
/// Normal of the plane that runs in this direction: phi - 90 deg, folded.
NormalAngle normalOf(LineAngle cut);

} // namespace planewright
