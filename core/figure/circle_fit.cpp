// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/circle_fit.h"

#include "core/quantity/format.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

// In ems of the text.
constexpr double leaderRoom = 1.5;  ///< between circle and labels, where band arcs and leaders run
constexpr double aboveCircle = 1.3; ///< and below it, inside the frame
constexpr double axisGap = 0.5;     ///< between tick labels and frame
constexpr double underFrame = 3.1;  ///< tick labels and title of the sigma axis
constexpr double edgeRoom = 0.6;    ///< between the tau axis and the frame's side

constexpr double originShare = 2.0 / 3;

/// What the two columns of labels take.
struct Columns {
  double left = 0;
  double right = 0;
};

/// The widest label of a column when those wider than `most` go short.
double columnWidth(const Setting& setting, const std::vector<LabelWish>& wishes, bool isLeft, double most) {
  double width = 0;
  for (const LabelWish& wish : wishes)
    if ((wish.mark.x < 0) == isLeft) {
      const double longWidth = setting.widthOf(wish.longForm, setting.text, wish.bold);
      const double shortWidth = setting.widthOf(wish.shortForm, setting.text, wish.bold);
      width = std::max(width, longWidth <= most ? longWidth : std::min(shortWidth, most));
    }
  return width;
}

/// Column widths that leave `room` for both. A side that needs less than half leaves the rest to the other.
Columns columnsIn(const Setting& setting, const std::vector<LabelWish>& wishes, double room) {
  const double left = columnWidth(setting, wishes, true, 1e9);
  const double right = columnWidth(setting, wishes, false, 1e9);
  if (left + right <= room)
    return {left, right};
  const double half = room / 2;
  const double mostLeft = right <= half ? room - right : half;
  const double mostRight = left <= half ? room - left : half;
  return {columnWidth(setting, wishes, true, mostLeft), columnWidth(setting, wishes, false, mostRight)};
}

/// How the circle may lie across: its diameter, and the places for its centre.
struct Across {
  double diameter = 0;
  double from = 0;
  double to = 0;
};

/// Moves the centre, and where that is not enough shrinks the circle, until the origin is inside the frame.
/// `ratio` is mean / radius: the origin lies that many radii left of the centre.
Vec placedAcross(Across across, const Box& frame, double ratio, double leastDiameter, double edge) {
  const double middle = (across.from + across.to) / 2;
  const double least = std::max(leastDiameter, originShare * across.diameter);
  for (double diameter = across.diameter; diameter >= least * (1 - 1e-9); diameter *= 0.98) {
    const double gained = (across.diameter - diameter) / 2;
    const double offset = ratio * diameter / 2;
    const double from = std::max(across.from - gained, frame.left + edge + offset);
    const double to = std::min(across.to + gained, frame.right - edge + offset);
    if (from <= to)
      return {std::clamp(middle, from, to), diameter};
  }
  return {middle, across.diameter};
}

/// A state without a radius: the origin at one side, its point at the other; zero stress in the middle.
void fitPoint(CircleFit& fit, const Setting& setting, double mean) {
  const double width = fit.frame.right - fit.frame.left;
  const double height = fit.frame.bottom - fit.frame.top;
  const double middle = (fit.frame.left + fit.frame.right) / 2;
  constexpr double span = 0.3;
  if (mean == 0) {
    fit.scale = span * std::min(width, height) * setting.stresses.inUnit(1);
    fit.centre.x = middle;
  } else {
    fit.scale = span * width / std::abs(mean);
    fit.centre.x = middle + (mean > 0 ? 0.1 : -0.3) * width;
  }
}

void fitCircle(CircleFit& fit, const Setting& setting, const std::vector<LabelWish>& wishes,
               double leastDiameter) {
  const Circle& circle = setting.readout.state().circle;
  const double text = setting.text;
  const double high = fit.frame.bottom - fit.frame.top - 2 * aboveCircle * text;
  const double wide = fit.frame.right - fit.frame.left - 2 * (leaderRoom + boxSide) * text;
  const Columns columns = columnsIn(setting, wishes, wide - std::min(leastDiameter, high));
  Across across;
  across.diameter = std::min(high, wide - columns.left - columns.right);
  across.from = fit.frame.left + boxSide * text + columns.left + leaderRoom * text + across.diameter / 2;
  across.to = fit.frame.right - boxSide * text - columns.right - leaderRoom * text - across.diameter / 2;
  const Vec placed =
      placedAcross(across, fit.frame, circle.mean / circle.radius, leastDiameter, edgeRoom * text);
  fit.centre.x = placed.x;
  fit.radius = placed.y / 2;
  fit.scale = fit.radius / circle.radius;
}

LabelColumns columnsBeside(const CircleFit& fit, const Setting& setting) {
  const double text = setting.text;
  const double reach = fit.radius + leaderRoom * text;
  LabelColumns columns;
  columns.centre = fit.centre.x;
  columns.leftEnd = fit.centre.x - reach;
  columns.rightStart = fit.centre.x + reach;
  columns.top = fit.frame.top;
  columns.bottom = fit.frame.bottom;
  columns.size = text;
  columns.leaderWidth = setting.hair;
  columns.leftStart = fit.frame.left + boxSide * text;
  columns.rightEnd = fit.frame.right - boxSide * text;
  return columns;
}

/// The width of the label of the last tick up to `reach`.
double tickWidth(const Setting& setting, const Steps& steps, double reach) {
  const double last = steps.step * std::floor(reach / steps.step);
  return setting.widthOf({{tickWords(-last, steps), false}}, setting.text);
}

double unitsIn(const CircleFit& fit, const Setting& setting, double mm) {
  return mm / fit.scale * setting.stresses.inUnit(1);
}

void fitSteps(CircleFit& fit, const Setting& setting) {
  const double text = setting.text;
  const double reach =
      std::abs(setting.stresses.inUnit(fit.mean)) + unitsIn(fit, setting, fit.frame.right - fit.frame.left);
  fit.upright = roundSteps(unitsIn(fit, setting, 3.2 * text));
  fit.across = fit.upright;
  while (unitsIn(fit, setting, tickWidth(setting, fit.across, reach) + 1.2 * text) > fit.across.step)
    fit.across = roundSteps(1.5 * fit.across.step);
}

} // namespace

Steps roundSteps(double least) {
  int power = static_cast<int>(std::floor(std::log10(least))) - 1;
  for (;; ++power)
    for (const double digit : {1.0, 2.0, 5.0}) {
      const double step = power < 0 ? digit / std::pow(10.0, -power) : digit * std::pow(10.0, power);
      if (step >= least * (1 - 1e-12))
        return {step, std::max(0, -power)};
    }
}

std::string tickWords(double value, const Steps& steps) {
  return shownNumber(value, value == 0 ? 0 : steps.decimals);
}

Vec CircleFit::at(const Traction& traction) const {
  return {centre.x + scale * (traction.sn - mean), centre.y + (down ? scale : -scale) * traction.tnt};
}

bool CircleFit::showsZero() const {
  return zeroAcross() >= frame.left && zeroAcross() <= frame.right;
}

CircleFit circleFitOf(const Setting& setting, const std::vector<LabelWish>& wishes, const Box& area,
                      double leastDiameter) {
  const Circle& circle = setting.readout.state().circle;
  CircleFit fit;
  fit.mean = circle.mean;
  fit.down = setting.study.convention.shearAxis == ShearAxis::tensorDown;
  double ticks = 0;
  // The width of the tick labels depends on the scale, which depends on the width they leave.
  for (int round = 0; round < 4; ++round) {
    fit.frame = {area.left + ticks + axisGap * setting.text, area.top, area.right,
                 area.bottom - underFrame * setting.text};
    fit.centre.y = (fit.frame.top + fit.frame.bottom) / 2;
    if (circle.radius > 0)
      fitCircle(fit, setting, wishes, leastDiameter);
    else
      fitPoint(fit, setting, circle.mean);
    fitSteps(fit, setting);
    const double reach = unitsIn(fit, setting, (fit.frame.bottom - fit.frame.top) / 2);
    ticks = std::max(ticks, tickWidth(setting, fit.upright, reach));
  }
  fit.columns = columnsBeside(fit, setting);
  return fit;
}

} // namespace planewright
