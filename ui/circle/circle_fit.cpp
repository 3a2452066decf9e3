// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_fit.h"

#include "core/figure/marks.h"
#include "core/figure/metrics.h"
#include "core/table/table.h"
#include "ui/circle/circle_labels.h"
#include "ui/circle/round.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// Above and below the circle: the ear on its stem.
constexpr double rowGap = circle_size::stem + 8;
/// Between other circles, or the origin, and the edge of the plot.
constexpr double edgeGap = 8;
/// Width of the reading plane's label at its longest on any plane of the state.
double readingWidth(const Study& study, const StateReading& state) {
  const Circle& circle = state.circle;
  double widest = 0;
  for (const double sn : {circle.s1, circle.s2}) {
    const std::string words =
        "n " + shownStress(study, state, sn) + " | " + shownStress(study, state, -circle.radius);
    widest = std::max(widest, textWidth({{words}}, circle_size::text, true));
  }
  return widest;
}

struct Needs {
  std::vector<Need> x;
  std::vector<Need> y;
};

void addCircle(Needs& needs, const Study& study, const Circle& circle, const LabelRoom& room, double gap) {
  const double low = inStressUnit(study, circle.s2);
  const double high = inStressUnit(study, circle.s1);
  const double radius = inStressUnit(study, circle.radius);
  needs.x.push_back({low, high, room.left, room.right});
  needs.y.push_back({-radius, radius, gap, gap});
}

double scaleFor(const Needs& needs, const QRectF& plot) {
  return std::min(greatestScale(needs.x, plot.width()), greatestScale(needs.y, plot.height()));
}

/// The least multiple of the shown loads that brings a checked plane to its limit, so far as a circle of it
/// can still be told from the shown one.
std::optional<double> multiplierToLimit(const Readout& readout) {
  constexpr double most = 20;
  std::optional<double> least;
  const StateReading& state = readout.state();
  for (std::size_t i = 0; i < state.checks.size(); ++i)
    if (!readout.checks[i].plane.empty() && !state.checks[i].problem)
      if (const std::optional<double> one = state.checks[i].leastMultiplier();
          one && *one > 0 && *one < most && (!least || *one < *least))
        least = one;
  return least;
}

Circle scaled(Circle circle, double factor) {
  circle.s1 *= factor;
  circle.s2 *= factor;
  circle.radius *= factor;
  return circle;
}

bool isZero(const Circle& circle) {
  return circle.radius == 0 && circle.mean == 0;
}

} // namespace

std::vector<const StateReading*> othersOf(const Readout& readout) {
  std::vector<const StateReading*> others;
  for (const StateReading& state : readout.states)
    if (state.judged && &state != &readout.state())
      others.push_back(&state);
  return others;
}

LabelRoom labelRoom(const Study& study, const Readout& readout, double plotWidth, double diameter) {
  const StateReading& state = readout.state();
  LabelRoom room{readingWidth(study, state), readingWidth(study, state)};
  for (const Mark& mark : marksOf(study, readout)) {
    double& side = mark.at.sn < state.circle.mean ? room.left : room.right;
    const LabelWish wish = wishOf(mark, {});
    if (mark.kind != PlaneKind::reading)
      side = std::max(side, textWidth(wish.longForm, circle_size::text, wish.bold));
  }
  const double gaps = 2 * circle_size::labelGap;
  const double overhangs = circle_size::overhang + circle_size::leftOverhang;
  const double most = (plotWidth + overhangs - gaps - diameter) / 2;
  return {circle_size::labelGap - circle_size::leftOverhang + std::clamp(room.left, 0.0, std::max(0.0, most)),
          circle_size::labelGap - circle_size::overhang + std::clamp(room.right, 0.0, std::max(0.0, most))};
}

double leastDiameter(const QSizeF& panel) {
  constexpr double share = 0.405;
  return share * std::min(panel.width(), panel.height());
}

EqualScale fittedCircle(const Study& study, const Readout& readout, Fit fit, const QRectF& plot,
                        const QSizeF& panel) {
  const double least = leastDiameter(panel);
  const Circle& circle = readout.state().circle;
  Needs needs;
  addCircle(needs, study, circle, labelRoom(study, readout, plot.width(), least), rowGap);
  const std::vector<const StateReading*> others = othersOf(readout);
  if (fit == Fit::allCombinations || isZero(circle))
    for (const StateReading* other : others)
      addCircle(needs, study, other->circle, {edgeGap, edgeGap}, edgeGap);

  if (fit == Fit::withLimit)
    if (const std::optional<double> multiplier = multiplierToLimit(readout))
      addCircle(needs, study, scaled(circle, *multiplier), {edgeGap, edgeGap}, edgeGap);

  Needs withOrigin = needs;
  withOrigin.x.push_back({0, 0, edgeGap, edgeGap});
  double scale = scaleFor(needs, plot);
  const double originScale = scaleFor(withOrigin, plot);
  const double diameter = 2 * inStressUnit(study, circle.radius) * originScale;
  const bool cheap = originScale >= scale / 2 && (diameter >= least || originScale >= scale);
  if (cheap || !std::isfinite(scale)) {
    needs = withOrigin;
    scale = originScale;
  }
  if (!std::isfinite(scale)) {
    needs.x.push_back({-1, 1, edgeGap, edgeGap});
    scale = scaleFor(needs, plot);
  }
  const bool down = study.convention.shearAxis == ShearAxis::tensorDown;
  return {plot, {middleOf(needs.x, scale), 0}, scale, down};
}

} // namespace planewright
