// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/circle_panel.h"

#include "core/figure/circle_axes.h"
#include "core/figure/failure_drawing.h"
#include "core/figure/signs.h"
#include "core/figure/strokes.h"
#include "core/figure/text_lines.h"
#include "core/quantity/shown_count.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double leastShare = 0.4;        // of the panel's shorter side, for the circle
constexpr double doubleAngleRadius = 0.3; // of the circle's
constexpr double bandGap = 0.3;           // in ems, between circle and band

struct CircleDrawing {
  Picture& picture;
  const Setting& setting;
  const CircleFit& fit;
  std::vector<Mark> marks;

  const StateReading& state() const { return setting.readout.state(); }
  /// The angle on the drawing at which the point of a plane stands.
  double drawnAngle(Angle normal) const { return fit.drawnTurn(normal - state().circle.theta1->value); }
  Vec polar(double radius, double degrees) const {
    const CosSin d = cosSin(Angle::fromDegrees(degrees));
    return fit.centre + radius * Vec{d.cos, -d.sin};
  }
  const Mark* find(PlaneKind kind) const {
    for (const Mark& mark : marks)
      if (mark.kind == kind)
        return &mark;
    return nullptr;
  }
};

/// Wishes of the marks' labels, for a fit with their places relative to the centre, then with their own.
std::vector<LabelWish> wishesOf(const Setting& setting, const std::vector<Mark>& marks,
                                const std::vector<TouchLabel>& touches) {
  std::vector<LabelWish> wishes;
  for (const Mark& mark : marks) {
    const Role role = roleOf(mark.kind) == Role::soft ? Role::ink : roleOf(mark.kind);
    const bool bold =
        mark.kind == PlaneKind::reading || mark.kind == PlaneKind::s1 || mark.kind == PlaneKind::s2;
    // Names are free texts: they never take more than a fifth of the width.
    const Runs shortForm =
        elided(setting.runsOf(mark.shortForm), 0.2 * setting.order.width, setting.text, bold);
    wishes.push_back({{mark.at.sn - setting.readout.state().circle.mean, 0},
                      mark.longForm == mark.shortForm ? shortForm : setting.runsOf(mark.longForm),
                      shortForm,
                      role,
                      bold,
                      mark.priority,
                      "mark " + shownCount(wishes.size())});
  }
  for (const TouchLabel& touch : touches)
    wishes.push_back({{touch.at.sn - setting.readout.state().circle.mean, 0},
                      setting.runsOf(touch.longForm),
                      elided(setting.runsOf(touch.shortForm), 0.2 * setting.order.width, setting.text, false),
                      touch.role,
                      false,
                      touchPriority,
                      touch.key});
  return wishes;
}

/// Puts a wish at its mark. A free text that is too long even in its short form is cut to its column.
void place(LabelWish& wish, Vec mark, const LabelColumns& columns) {
  constexpr double rounding = 1e-6;
  const double width =
      mark.x < columns.centre ? columns.leftEnd - columns.leftStart : columns.rightEnd - columns.rightStart;
  wish.mark = mark;
  wish.shortForm = elided(wish.shortForm, width + rounding, columns.size, wish.bold);
}

/// The tolerance of the line as thick arcs outside the circle, so that the circle stays whole.
void drawBand(const CircleDrawing& drawing) {
  for (const LineReading& line : drawing.setting.readout.lines) {
    const double half = std::min(2 * line.tolerance.degrees(), 90.0);
    if (half <= 0)
      continue;
    const double radius = drawing.fit.radius + bandGap * drawing.setting.text + drawing.setting.wide;
    for (const Angle end : {line.angle.value, line.angle.value + Angle::fromDegrees(90)})
      drawing.picture.parts.push_back(Arc{drawing.fit.centre,
                                          radius,
                                          drawing.drawnAngle(end) - half,
                                          2 * half,
                                          Pen{Role::line, 2 * drawing.setting.wide, Dash::solid},
                                          {}});
  }
}

/// A line through the centre from a mark to the one opposite.
void drawDiameter(const CircleDrawing& drawing, const Mark& mark, const Pen& pen) {
  const Vec at = drawing.fit.at(mark.at);
  setLine(drawing.picture, at, 2 * drawing.fit.centre - at, pen);
}

void drawDiameters(const CircleDrawing& drawing) {
  const Setting& setting = drawing.setting;
  for (const Mark& mark : drawing.marks) {
    if (mark.kind == PlaneKind::crossing)
      drawDiameter(drawing, mark, {Role::line, setting.narrow, Dash::longDashDot});
    if (mark.kind == PlaneKind::x)
      drawDiameter(drawing, mark, {Role::state, setting.narrow, Dash::solid});
  }
  const Vec reading = drawing.fit.at(drawing.find(PlaneKind::reading)->at);
  setLine(drawing.picture, drawing.fit.centre, reading, {Role::reading, setting.medium, Dash::solid});
}

/// The arc of 2 theta from the radius of x to that of the reading plane, with a head where there is room.
void drawDoubleAngle(const CircleDrawing& drawing) {
  const Setting& setting = drawing.setting;
  const Angle theta = drawing.setting.readout.reading.value;
  const double sweep = drawing.fit.drawnTurn(theta);
  const double radius = doubleAngleRadius * drawing.fit.radius;
  const double headLength = 0.55 * setting.text;
  const double headHalfWidth = 0.2 * setting.text;
  const double headSweep = std::copysign(Angle::fromRadians(headLength / radius).degrees(), sweep);
  const bool headed = std::abs(sweep) > 1.4 * std::abs(headSweep);
  const double start = drawing.drawnAngle(Angle());
  drawing.picture.parts.push_back(Arc{drawing.fit.centre,
                                      radius,
                                      start,
                                      headed ? sweep - 0.7 * headSweep : sweep,
                                      Pen{Role::reading, setting.medium, Dash::solid},
                                      {}});
  if (!headed)
    return;
  const double base = start + sweep - headSweep;
  drawing.picture.parts.push_back(
      Path{{drawing.polar(radius - headHalfWidth, base), drawing.polar(radius, start + sweep),
            drawing.polar(radius + headHalfWidth, base)},
           true,
           {},
           Role::reading});
}

/// "2θ" inside the circle, where it covers the least of what is drawn: outside its arc and within it first.
void labelDoubleAngle(const CircleDrawing& drawing) {
  const double sweep = drawing.fit.drawnTurn(drawing.setting.readout.reading.value);
  const double text = drawing.setting.text;
  const double arc = doubleAngleRadius * drawing.fit.radius;
  Label best;
  double least = 1e9;
  for (const double away : {1.0, 1.4, 1.9, 2.5, -1.0})
    for (const double part : {0.5, 0.6, 0.4, 0.7, 0.3, 0.8, 0.2, 0.9, 0.1, 1.3, -0.3, 1.8, -0.8}) {
      const bool outside = part < 0 || part > 1;
      const double angle = outside ? sweep * (part > 0 ? 1 : 0) +
                                         std::copysign(60 * (part > 0 ? part - 1 : part), sweep * part)
                                   : sweep * part;
      const Vec at = drawing.polar(arc + away * text, drawing.drawnAngle(Angle()) + angle);
      const Label label{at + Vec{0, capHeight / 2 * text},
                        {{"2θ", false}},
                        text,
                        Align::middle,
                        Role::reading,
                        false,
                        true,
                        "double angle"};
      const double cost = strokesUnder(drawing.picture, boxOf(label)) + std::abs(part - 0.5) +
                          std::abs(away - 1) + (outside ? 0.5 : 0);
      if (cost < least) {
        least = cost;
        best = label;
      }
    }
  drawing.picture.parts.push_back(best);
}

void drawCentre(const CircleDrawing& drawing) {
  const double reach = 0.35 * drawing.setting.text;
  const Pen pen{Role::state, drawing.setting.narrow, Dash::solid};
  const Vec centre = drawing.fit.centre;
  setLine(drawing.picture, centre - Vec{reach, 0}, centre + Vec{reach, 0}, pen);
  setLine(drawing.picture, centre - Vec{0, reach}, centre + Vec{0, reach}, pen);
}

/// Which signs lie over which: the reading plane over all.
int layerOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return 7;
  case PlaneKind::x:
    return 6;
  case PlaneKind::crossing:
    return 5;
  case PlaneKind::y:
    return 4;
  case PlaneKind::following:
    return 3;
  case PlaneKind::watched:
    return 2;
  default:
    return 0;
  }
}

void drawSigns(const CircleDrawing& drawing) {
  const Setting& setting = drawing.setting;
  std::vector<Mark> marks = drawing.marks;
  std::stable_sort(marks.begin(), marks.end(),
                   [](const Mark& a, const Mark& b) { return layerOf(a.kind) < layerOf(b.kind); });
  std::vector<PlacedSign> signs;
  if (drawing.fit.radius > 0) { // the other face of the reading plane's element, opposite on the circle
    const Vec reading = drawing.fit.at(drawing.find(PlaneKind::reading)->at);
    signs.push_back(
        {Sign::hollowRound, Role::reading, 2 * drawing.fit.centre - reading, setting.mark, setting.medium});
  }
  for (const Mark& mark : marks)
    signs.push_back({signOf(mark.kind), roleOf(mark.kind), drawing.fit.at(mark.at), setting.mark,
                     mark.kind == PlaneKind::watched ? setting.hair : setting.medium});
  showHidden(signs);
  for (const PlacedSign& sign : signs)
    drawSign(drawing.picture, sign);
}

void drawRound(const CircleDrawing& drawing) {
  const Setting& setting = drawing.setting;
  drawBand(drawing);
  drawDiameters(drawing);
  if (setting.readout.reading.value != Angle())
    drawDoubleAngle(drawing);
  drawing.picture.parts.push_back(
      Arc{drawing.fit.centre, drawing.fit.radius, 0, 360, Pen{Role::state, setting.wide, Dash::solid}, {}});
  drawCentre(drawing);
}

/// The strengths of checked planes, under marks and labels.
void drawFailure(Picture& picture, const Setting& setting, const CircleFit& fit) {
  const double reach = (fit.frame.right - fit.frame.left) / fit.scale + std::abs(fit.mean);
  const FailureFrame frame{[&fit](const Traction& at) { return fit.at(at); }, fit.frame, setting.narrow};
  const Picture failure = failureDrawing(frame, failureLinesOf(setting.readout, reach));
  picture.parts.insert(picture.parts.end(), failure.parts.begin(), failure.parts.end());
}

/// Labels are left out from the least wanted on: first touches and watched planes first.
CircleLabels outcomeOf(const PlacedLabels& placed, const std::vector<Mark>& marks, std::size_t wishes) {
  const std::size_t without = wishes - placed.labels.size();
  const auto watched = std::count_if(marks.begin(), marks.end(),
                                     [](const Mark& mark) { return mark.kind == PlaneKind::watched; });
  return {without <= static_cast<std::size_t>(watched) + (wishes - marks.size()), without};
}

} // namespace

CircleLabels drawCirclePanel(Picture& picture, const Setting& setting, const Box& area) {
  const double text = setting.text;
  const std::vector<Mark> marks = marksOf(setting.study, setting.readout);
  const std::vector<TouchLabel> touches = touchLabelsOf(setting.readout);
  std::vector<LabelWish> wishes = wishesOf(setting, marks, touches);
  Box plot = area;
  if (!setting.isNarrow) {
    setWords(picture, {area.left, area.top + boxOver * text},
             setting.runsOf(PW_TEXT("Figure", "Circle of the state")), text, Align::start, Role::soft);
    plot.top += 1.5 * text;
  }
  plot.top += tauTitleHeight * text;
  const CircleFit fit = circleFitOf(setting, wishes, plot,
                                    leastShare * std::min(area.right - area.left, area.bottom - area.top));
  for (std::size_t i = 0; i < wishes.size(); ++i) {
    const Traction& at = i < marks.size() ? marks[i].at : touches[i - marks.size()].at;
    place(wishes[i], fit.at(at), fit.columns);
  }
  const PlacedLabels placed = placeLabels(wishes, fit.columns);
  drawCircleAxes(picture, setting, fit);
  drawFailure(picture, setting, fit);
  picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
  const CircleDrawing drawing{picture, setting, fit, marks};
  if (fit.radius > 0)
    drawRound(drawing);
  drawSigns(drawing);
  if (fit.radius > 0 && setting.readout.reading.value != Angle())
    labelDoubleAngle(drawing);
  picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
  noteShortened(picture, placed);
  return outcomeOf(placed, marks, wishes.size());
}

} // namespace planewright
