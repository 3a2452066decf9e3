// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/figure.h"
#include "core/quantity/format.h"
#include "core/study/edit.h"
#include "core/study/readout.h"
#include "tests/core/figure/dice.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {

/// What a study for a figure is made from: stresses in MPa, angles in degrees.
struct Given {
  double sx = 0, sy = 0, txy = 0;
  double phi = 0, tolerance = 0, theta = 0;
  double axes = 0;
  bool line = true;
};

inline Study studyOf(const Given& given) {
  const auto stress = [](double value) { return exactNumber(value) + " MPa"; };
  const auto angle = [](double value) { return exactNumber(value) + " deg"; };
  Study study = newStudy();
  Point& point = study.points.front();
  point.note = "invented";
  point.stress = {{"G", stress(given.sx), stress(given.sy), stress(given.txy), "0 MPa"}};
  point.axes = angle(given.axes);
  point.reading = angle(given.theta);
  if (given.line)
    point.lines = {
        Line{"grain", LineKind::grain, angle(given.phi), given.tolerance > 0 ? angle(given.tolerance) : ""}};
  else
    point.lines.clear();
  for (const Problem& problem : problemsIn(study))
    ADD_FAILURE() << plain(problem);
  return study;
}

/// The states in which marks and labels pile up.
inline std::vector<Given> specialStates() {
  std::vector<Given> states;
  const double kinds[][3] = {{0, 0, 0},        {12, 0, 0},       {-12, 0, 0},    {0, 7, 0},
                             {0, 0, 1.875},    {0, 0, -1.875},   {5, 5, 0},      {-5, -5, 0},
                             {80, 20, -30},    {8.4, -0.6, 2.1}, {100, 99.9, 0}, {1e6, 1e6, 1},
                             {1e-9, -1e-9, 0}, {1e9, -3e8, 2e8}, {3, -3, 1e-6},  {-0.08, 4.36, 0.085}};
  for (const auto& kind : kinds) {
    const Circle circle = circleOf({kind[0], kind[1], kind[2]});
    const double theta1 = circle.theta1 ? circle.theta1->value.degrees() : 0;
    states.push_back({kind[0], kind[1], kind[2], 0, 0, 0, 0, true});
    states.push_back({kind[0], kind[1], kind[2], theta1, 3, theta1, 0, true});
    states.push_back({kind[0], kind[1], kind[2], theta1 + 45, 95, theta1 - 45, 20, true});
    states.push_back({kind[0], kind[1], kind[2], 90, 5, 90, 0, true});
    states.push_back({kind[0], kind[1], kind[2], 5.71, 0, -89.9, -35, false});
  }
  return states;
}

/// Any state: components over many powers of ten or whole and small, angles on or off the special ones.
inline Given someState(Dice& dice) {
  const auto component = [&](double scale) {
    return dice.below(4) == 0 ? 0.0 : scale * (dice.below(401) - 200) / 20;
  };
  const auto angle = [&] { return dice.flip() ? 15.0 * (dice.below(13) - 6) : dice.within(-90, 90); };
  const double scale = dice.flip() ? 1 : std::pow(10.0, dice.below(19) - 9);
  Given given{component(scale),  component(scale), component(scale), angle(), 0, angle(), 0,
              dice.below(5) != 0};
  if (dice.flip())
    given.tolerance = dice.within(0.1, 20);
  if (dice.below(3) == 0)
    given.axes = dice.within(-90, 90);
  return given;
}

/// A random study with its other choices made at random as well.
inline Study someStudy(Dice& dice) {
  Study study = studyOf(someState(dice));
  if (dice.below(4) == 0)
    study.convention.positive = Positive::compression;
  if (dice.below(4) == 0)
    study.convention.shearAxis = ShearAxis::tensorUp;
  if (dice.below(5) == 0)
    study.units.stress = "psi";
  for (int i = 0, count = dice.below(4) == 0 ? dice.below(12) : 0; i < count; ++i)
    study.points.front().planes.push_back(
        {"plane & <" + exactNumber(i) + ">", exactNumber(dice.below(180)) + " deg", ""});
  return study;
}

/// The figure of what a study shows.
inline Picture figure(const Study& study, const FigureOrder& order) {
  const Result<Picture> picture = figureOf(study, evaluate(study), order);
  if (!picture)
    ADD_FAILURE() << plain(picture.error());
  return picture ? *picture : Picture{};
}

} // namespace planewright
