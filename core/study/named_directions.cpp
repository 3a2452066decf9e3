// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/named_directions.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <algorithm>

namespace planewright {

namespace {

using Directions = std::vector<NamedDirection>;

void add(Directions& directions, Angle angle, Text name) {
  directions.push_back({folded(angle), std::move(name), true});
}

void addPrincipal(Directions& directions, const Circle& circle) {
  if (!circle.theta1)
    return;
  add(directions, circle.theta1->value, symbol("σ_{1}"));
  add(directions, circle.theta2()->value, symbol("σ_{2}"));
}

void addShear(Directions& directions, const Circle& circle) {
  if (!circle.theta1)
    return;
  add(directions, circle.thetaTauMax->value, PW_TEXT("Direction", "greatest shear +"));
  add(directions, circle.thetaTauMin()->value, PW_TEXT("Direction", "greatest shear −"));
}

/// Multiples of 15 deg, but for those that already stand under a name.
void addMultiples(Directions& directions) {
  const Directions named = directions;
  for (int degrees = -75; degrees <= 90; degrees += 15) {
    const Angle angle = Angle::fromDegrees(degrees);
    const bool stands = std::ranges::any_of(
        named, [&](const NamedDirection& direction) { return coincide(direction.angle, angle); });
    if (!stands)
      directions.push_back({angle, numberText(shownDegrees(angle, 0)), false});
  }
}

Directions sorted(Directions directions) {
  std::ranges::stable_sort(directions, {}, &NamedDirection::angle);
  return directions;
}

} // namespace

Directions directionsForNormal(const Readout& readout) {
  Directions directions;
  const Circle& circle = readout.state().circle;
  addPrincipal(directions, circle);
  addShear(directions, circle);
  for (const LineReading& line : readout.lines) {
    add(directions, crossing(line.angle).value, PW_TEXT("Direction", "crossing the %1").with(line.name));
    add(directions, following(line.angle).value, PW_TEXT("Direction", "following the %1").with(line.name));
  }
  add(directions, Angle::fromDegrees(0), symbol("x"));
  add(directions, Angle::fromDegrees(90), symbol("y"));
  addMultiples(directions);
  return sorted(std::move(directions));
}

Directions directionsForLine(const Readout& readout) {
  Directions directions;
  addPrincipal(directions, readout.state().circle);
  add(directions, Angle::fromDegrees(0), symbol("x"));
  add(directions, Angle::fromDegrees(90), symbol("y"));
  addMultiples(directions);
  return sorted(std::move(directions));
}

} // namespace planewright
