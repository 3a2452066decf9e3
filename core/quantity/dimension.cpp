// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/unit.h"

#include <array>
#include <charconv>

namespace planewright {

namespace {

struct NamedDimension {
  Dimension dimension;
  Text name;
};

const std::vector<NamedDimension>& namedDimensions() {
  static const std::vector<NamedDimension> names = {
      {dimension::none, PW_TEXT("Dimension", "a plain number")},
      {dimension::force, PW_TEXT("Dimension", "a force")},
      {dimension::length, PW_TEXT("Dimension", "a length")},
      {dimension::angle, PW_TEXT("Dimension", "an angle")},
      {dimension::stress, PW_TEXT("Dimension", "a stress")},
      {dimension::moment, PW_TEXT("Dimension", "a moment")},
      {{0, 2, 0}, PW_TEXT("Dimension", "an area")},
      {{0, 3, 0}, PW_TEXT("Dimension", "a volume")},
      {{1, -1, 0}, PW_TEXT("Dimension", "a force per length")},
  };
  return names;
}

std::string digits(int number) {
  std::array<char, 12> buffer{};
  return {buffer.data(), std::to_chars(buffer.data(), buffer.data() + buffer.size(), number).ptr};
}

/// "force^2 * length" so far, and one factor more.
Text withFactor(const Text& sofar, const Text& name, int exponent) {
  if (exponent == 0)
    return sofar;
  const Text factor = exponent == 1 ? name : PW_TEXT("Dimension", "%1^%2").with(name).with(digits(exponent));
  return sofar.empty() ? factor : PW_TEXT("Dimension", "%1 * %2").with(sofar).with(factor);
}

} // namespace

Text nameOf(Dimension dimension) {
  for (const NamedDimension& row : namedDimensions())
    if (row.dimension == dimension)
      return row.name;
  Text result;
  result = withFactor(result, PW_TEXT("Dimension", "force"), dimension.force);
  result = withFactor(result, PW_TEXT("Dimension", "length"), dimension.length);
  return withFactor(result, PW_TEXT("Dimension", "angle"), dimension.angle);
}

} // namespace planewright
