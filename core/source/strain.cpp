// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/strain.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// sin(2a - 2b), without loss where the directions are near to each other.
double sinOfDouble(Angle a, Angle b) {
  return cosSinOfDouble(a - b).sin;
}

} // namespace

double strainAlong(const PlaneStrain& strain, Angle angle) {
  const CosSin two = cosSinOfDouble(angle);
  return (strain.ex + strain.ey) / 2 + (strain.ex - strain.ey) / 2 * two.cos + strain.gxy / 2 * two.sin;
}

PlaneStrain inTurnedAxes(const PlaneStrain& strain, Angle turn) {
  const CosSin two = cosSinOfDouble(turn);
  const double mean = (strain.ex + strain.ey) / 2;
  const double half = (strain.ex - strain.ey) / 2 * two.cos + strain.gxy / 2 * two.sin;
  return {mean + half, mean - half, -(strain.ex - strain.ey) * two.sin + strain.gxy * two.cos};
}

PrincipalStrains principalOf(const PlaneStrain& strain) {
  const double mean = (strain.ex + strain.ey) / 2;
  const double radius = std::hypot((strain.ex - strain.ey) / 2, strain.gxy / 2);
  PrincipalStrains result{mean + radius, mean - radius, std::nullopt};
  // A radius of the size of rounding has no direction.
  constexpr double rounding = 8 * 2.220446049250313e-16;
  if (radius > rounding * (std::abs(strain.ex) + std::abs(strain.ey) + std::abs(strain.gxy)))
    result.direction = folded(
        Angle::fromDegrees(Angle::fromRadians(std::atan2(strain.gxy, strain.ex - strain.ey)).degrees() / 2));
  return result;
}

// With mean m, half difference d and half shear g the equation of a gauge at a is
// e = m + d cos 2a + g sin 2a; the determinant of three is a sum of sines of differences.
Result<RosetteSolution> solved(const Rosette& rosette) {
  const auto& [a, b, c] = rosette;
  const double bc = sinOfDouble(c.direction, b.direction);
  const double ca = sinOfDouble(a.direction, c.direction);
  const double ab = sinOfDouble(b.direction, a.direction);
  // The sum of the three sines as a product, which does not cancel.
  const auto sine = [](Angle x, Angle y) { return cosSin(x - y).sin; };
  const double determinant =
      4 * sine(b.direction, a.direction) * sine(c.direction, b.direction) * sine(c.direction, a.direction);
  const auto cosine = [](const Gauge& gauge) { return cosSinOfDouble(gauge.direction).cos; };
  const auto sineOf = [](const Gauge& gauge) { return cosSinOfDouble(gauge.direction).sin; };
  const std::array<double, 3> mean = {bc, ca, ab};
  const std::array<double, 3> difference = {sineOf(b) - sineOf(c), sineOf(c) - sineOf(a),
                                            sineOf(a) - sineOf(b)};
  const std::array<double, 3> shear = {cosine(c) - cosine(b), cosine(a) - cosine(c), cosine(b) - cosine(a)};
  RosetteSolution result;
  std::array<double, 3> gains{};
  for (std::size_t i = 0; i < 3; ++i) {
    const double m = mean[i] / determinant;
    const double d = difference[i] / determinant;
    const double g = 2 * shear[i] / determinant;
    result.strain.ex += (m + d) * rosette[i].strain;
    result.strain.ey += (m - d) * rosette[i].strain;
    result.strain.gxy += g * rosette[i].strain;
    gains[0] += std::abs(m + d);
    gains[1] += std::abs(m - d);
    gains[2] += std::abs(g);
  }
  result.errorGain = std::ranges::max(gains);
  if (!(result.errorGain <= greatestErrorGain))
    return tl::unexpected(
        Problem{{},
                0,
                0,
                {},
                PW_TEXT("Source",
                        "The gauges at %1, %2 and %3 are too nearly parallel: an error of reading would grow "
                        "more than %4 times.")
                    .with(numberText(shownDegrees(a.direction, 2)))
                    .with(numberText(shownDegrees(b.direction, 2)))
                    .with(numberText(shownDegrees(c.direction, 2)))
                    .with(exactNumber(greatestErrorGain)),
                PW_TEXT("Source", "Give three directions that differ, such as 0, 45 and 90 deg.")});
  return result;
}

} // namespace planewright
