// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/utilisation_curves.h"

#include "core/strength/over_angles.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr int stepsOfHalfTurn = 180;

/// -90 to 90 by whole degrees, with the turning points of these judges between.
std::vector<double> directionsOf(Judges judges) {
  std::vector<double> directions;
  for (int i = 0; i <= stepsOfHalfTurn; ++i)
    directions.push_back(i - stepsOfHalfTurn / 2.0);
  for (const Judge& judge : judges)
    for (const Branch& branch : judge.branches())
      for (const Angle turning : turningPointsOf(branch, judge.state()))
        directions.push_back(turning.degrees());
  std::ranges::sort(directions);
  const auto close = [](double a, double b) { return b - a < coinciding.degrees(); };
  directions.erase(std::unique(directions.begin(), directions.end(), close), directions.end());
  directions.back() = stepsOfHalfTurn / 2.0;
  return directions;
}

/// The greatest of these judges.
UtilisationCurve curveOf(Judges judges, const std::vector<double>& directions) {
  UtilisationCurve curve;
  curve.reserve(directions.size());
  for (const double degrees : directions)
    curve.push_back(
        {degrees, std::min(greatestUtilisation(judges, Angle::fromDegrees(degrees)), beyondEveryLimit)});
  return curve;
}

void look(double& highest, const UtilisationCurve& curve) {
  for (const Vec point : curve)
    if (point.y < beyondEveryLimit)
      highest = std::max(highest, point.y);
}

} // namespace

UtilisationCurves utilisationCurvesOf(const Readout& readout, std::size_t check) {
  UtilisationCurves curves;
  if (!readout.checks[check].band)
    return curves;
  std::vector<Judge> judges;
  std::optional<std::size_t> shown;
  for (std::size_t i = 0; i < readout.states.size(); ++i) {
    if (!readout.states[i].judged)
      continue;
    Result<Judge> judge = judgeOf(readout, readout.states[i], check);
    if (!judge)
      continue;
    if (i == readout.shown)
      shown = judges.size();
    judges.push_back(*std::move(judge));
  }
  const bool few = judges.size() <= mostOtherCurves + 1;
  const auto own = [&](std::size_t i) { return Judges(&judges[i], 1); };
  // The turning points of all in all curves would cost with the square of their number.
  const std::vector<double> directions = directionsOf(few ? Judges(judges) : shown ? own(*shown) : Judges());
  if (shown)
    curves.shown = curveOf(own(*shown), directions);
  if (judges.size() > 1)
    curves.greatest = curveOf(judges, directions);
  for (std::size_t i = 0; few && i < judges.size(); ++i)
    if (i != shown)
      curves.others.push_back(curveOf(own(i), directionsOf(own(i))));
  look(curves.highest, curves.shown);
  look(curves.highest, curves.greatest);
  for (const UtilisationCurve& curve : curves.others)
    look(curves.highest, curve);
  return curves;
}

} // namespace planewright
