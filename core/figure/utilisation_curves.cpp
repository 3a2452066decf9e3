// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/utilisation_curves.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr int stepsOfHalfTurn = 180;

/// -90 to 90 by whole degrees, with the turning points of all judges between.
std::vector<double> directionsOf(const std::vector<Judge>& judges) {
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

UtilisationCurve curveOf(const Judge& judge, const std::vector<double>& directions) {
  UtilisationCurve curve;
  curve.reserve(directions.size());
  for (const double degrees : directions)
    curve.push_back({degrees, std::min(judge.utilisation(Angle::fromDegrees(degrees)), beyondEveryLimit)});
  return curve;
}

void raise(UtilisationCurve& greatest, const UtilisationCurve& curve) {
  if (greatest.empty())
    greatest = curve;
  for (std::size_t i = 0; i < curve.size(); ++i)
    greatest[i].y = std::max(greatest[i].y, curve[i].y);
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
  const std::vector<double> directions = directionsOf(judges);
  const bool few = judges.size() <= mostOtherCurves + 1;
  for (std::size_t i = 0; i < judges.size(); ++i) {
    UtilisationCurve curve = curveOf(judges[i], directions);
    if (judges.size() > 1)
      raise(curves.greatest, curve);
    for (const Vec point : curve)
      if (point.y < beyondEveryLimit)
        curves.highest = std::max(curves.highest, point.y);
    if (i == shown)
      curves.shown = std::move(curve);
    else if (few)
      curves.others.push_back(std::move(curve));
  }
  return curves;
}

} // namespace planewright
