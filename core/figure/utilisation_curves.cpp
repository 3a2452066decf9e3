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
  return utilisationCurvesOf(readout, check, judgesOf(readout, check));
}

UtilisationCurves utilisationCurvesOf(const Readout& readout, std::size_t check,
                                      const JudgesOfCheck& judges) {
  UtilisationCurves curves;
  if (!readout.checks[check].band)
    return curves;
  const std::vector<Judge>& all = judges.all;
  const bool few = all.size() <= mostOtherCurves + 1;
  const auto own = [&](std::size_t i) { return Judges(&all[i], 1); };
  // The turning points of all in all curves would cost with the square of their number.
  const std::vector<double> directions = directionsOf(few            ? Judges(all)
                                                      : judges.shown ? own(*judges.shown)
                                                                     : Judges());
  if (judges.shown)
    curves.shown = curveOf(own(*judges.shown), directions);
  if (all.size() > 1)
    curves.greatest = curveOf(all, directions);
  for (std::size_t i = 0; few && i < all.size(); ++i)
    if (i != judges.shown)
      curves.others.push_back(curveOf(own(i), directionsOf(own(i))));
  look(curves.highest, curves.shown);
  look(curves.highest, curves.greatest);
  for (const UtilisationCurve& curve : curves.others)
    look(curves.highest, curve);
  return curves;
}

} // namespace planewright
