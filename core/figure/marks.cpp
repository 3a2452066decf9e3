// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/marks.h"

#include "core/study/stress_form.h"

namespace planewright {

Sign signOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return Sign::filledRound;
  case PlaneKind::x:
    return Sign::filledSquare;
  case PlaneKind::y:
    return Sign::hollowSquare;
  case PlaneKind::s1:
  case PlaneKind::s2:
    return Sign::uprightTick;
  case PlaneKind::shearMax:
  case PlaneKind::shearMin:
    return Sign::levelTick;
  case PlaneKind::crossing:
    return Sign::filledLozenge;
  case PlaneKind::following:
    return Sign::hollowLozenge;
  case PlaneKind::watched:
    break;
  }
  return Sign::hollowRound;
}

Role roleOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return Role::reading;
  case PlaneKind::crossing:
  case PlaneKind::following:
    return Role::line;
  case PlaneKind::watched:
    return Role::soft;
  default:
    return Role::state;
  }
}

namespace {

/// Greater numbers go short first: n, sigma_1, sigma_2, along, across, tau, x, y, watched.
int priorityOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return 0;
  case PlaneKind::s1:
    return 1;
  case PlaneKind::s2:
    return 2;
  case PlaneKind::crossing:
    return 3;
  case PlaneKind::following:
    return 4;
  case PlaneKind::shearMax:
  case PlaneKind::shearMin:
    return 5;
  case PlaneKind::x:
    return 6;
  case PlaneKind::y:
    return 7;
  case PlaneKind::watched:
    break;
  }
  return 8;
}

Text shortFormOf(const PlaneReading& plane, bool manyLines) {
  switch (plane.kind) {
  case PlaneKind::reading:
    return symbol("n");
  case PlaneKind::x:
    return symbol("x");
  case PlaneKind::y:
    return symbol("y");
  case PlaneKind::s1:
    return symbol("σ_{1}");
  case PlaneKind::s2:
    return symbol("σ_{2}");
  case PlaneKind::shearMax:
  case PlaneKind::shearMin:
    return symbol("τ");
  case PlaneKind::crossing:
    return manyLines ? PW_TEXT("Mark", "along %1").with(plane.name) : PW_TEXT("Mark", "along");
  case PlaneKind::following:
    return manyLines ? PW_TEXT("Mark", "across %1").with(plane.name) : PW_TEXT("Mark", "across");
  case PlaneKind::watched:
    break;
  }
  return verbatim(plane.name);
}

Text longFormOf(const StressForm& stresses, const PlaneReading& plane, const Text& shortForm) {
  const std::string sn = stresses.shown(plane.traction.sn);
  const std::string tnt = stresses.shown(plane.traction.tnt);
  switch (plane.kind) {
  case PlaneKind::reading:
    return PW_TEXT("Mark", "%1 %2 | %3").with(shortForm).with(sn).with(tnt);
  case PlaneKind::shearMax:
  case PlaneKind::shearMin:
    return PW_TEXT("Mark", "%1 %2").with(shortForm).with(tnt);
  case PlaneKind::s1:
  case PlaneKind::s2:
  case PlaneKind::crossing:
  case PlaneKind::following:
    return PW_TEXT("Mark", "%1 %2").with(shortForm).with(sn);
  case PlaneKind::x:
  case PlaneKind::y:
  case PlaneKind::watched:
    break;
  }
  return shortForm;
}

} // namespace

std::vector<Mark> marksOf(const Study& study, const Readout& readout) {
  const StateReading& state = readout.state();
  const StressForm stresses = stressFormOf(study, state);
  std::vector<Mark> marks;
  for (const PlaneReading& plane : planesOf(readout, state)) {
    if (!plane.normal) // every direction is principal
      continue;
    const Text shortForm = shortFormOf(plane, readout.lines.size() > 1);
    marks.push_back({plane.kind, plane.name, plane.traction, longFormOf(stresses, plane, shortForm),
                     shortForm, priorityOf(plane.kind)});
  }
  return marks;
}

SignShape shapeOf(Sign sign, double size) {
  const double half = size / 2;
  const auto rectangle = [](double halfAcross, double halfDown) {
    return std::vector<Vec>{
        {-halfAcross, -halfDown}, {halfAcross, -halfDown}, {halfAcross, halfDown}, {-halfAcross, halfDown}};
  };
  const auto lozenge = [](double reach) {
    return std::vector<Vec>{{0, -reach}, {reach, 0}, {0, reach}, {-reach, 0}};
  };
  // Signs that look equally large: a square is smaller across than a round, a lozenge reaches further.
  constexpr double square = 0.9;
  constexpr double lozengeReach = 1.22;
  constexpr double tickReach = 1.15;
  constexpr double tickWidth = 0.42; // stands out from the circle that it lies along
  switch (sign) {
  case Sign::filledRound:
    return {{}, true, true};
  case Sign::hollowRound:
    break;
  case Sign::filledSquare:
    return {rectangle(square * half, square * half), false, true};
  case Sign::hollowSquare:
    return {rectangle(square * half, square * half), false, false};
  case Sign::uprightTick:
    return {rectangle(tickWidth * half, tickReach * half), false, true};
  case Sign::levelTick:
    return {rectangle(tickReach * half, tickWidth * half), false, true};
  case Sign::filledLozenge:
    return {lozenge(lozengeReach * half), false, true};
  case Sign::hollowLozenge:
    return {lozenge(lozengeReach * half), false, false};
  }
  return {{}, true, false};
}

} // namespace planewright
