// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_layers.h"

#include "ui/circle/circle_fit.h"
#include "ui/circle/signs.h"
#include "ui/look/look.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double hair = 1;
constexpr double spoke = 1.5;
constexpr double bandWidth = 4;
/// Clear space between the circle's own stroke and the band, so that the circle stays whole.
constexpr double bandGap = 3;
constexpr double circleStroke = 2;
/// Radius of the arc of the double angle, as part of the circle's.
constexpr double doubleAngleRadius = 0.30;

NormalAngle oppositeOf(NormalAngle normal) {
  return {folded(normal.value + Angle::fromDegrees(90))};
}

QPointF placeOf(const Stage& stage, NormalAngle normal) {
  return stage.pixelOf(planeAt(stage.readout.state(), normal).traction);
}

void drawBand(Picture& picture, const Stage& stage, const LineReading& line) {
  if (line.tolerance.degrees() <= 0)
    return;
  const Round round = stage.round();
  const double radius = round.radius + circleStroke / 2 + bandGap + bandWidth / 2;
  const double half = std::min(180.0, 2 * line.tolerance.degrees());
  for (const NormalAngle normal : {crossing(line.angle), following(line.angle)}) {
    const Angle middle = round.seenAt(placeOf(stage, normal));
    picture.parts.push_back(Arc{vecOf(round.centre), radius, middle.degrees() - half, 2 * half,
                                Pen{Role::line, bandWidth, Dash::solid}, std::nullopt});
  }
}

void drawDiameters(Picture& picture, const Stage& stage) {
  const auto place = [&](NormalAngle normal) { return vecOf(placeOf(stage, normal)); };
  const NormalAngle x{Angle()};
  drawStroke(picture, place(x), place(oppositeOf(x)), {Role::state, hair, Dash::solid});
  for (const LineReading& line : stage.readout.lines)
    drawStroke(picture, place(crossing(line.angle)), place(following(line.angle)),
               {Role::line, hair, Dash::longDashDot});
}

void drawCentre(Picture& picture, Vec centre) {
  constexpr double arm = 4;
  const Pen pen{Role::state, hair, Dash::solid};
  drawStroke(picture, centre - Vec{arm, 0}, centre + Vec{arm, 0}, pen);
  drawStroke(picture, centre - Vec{0, arm}, centre + Vec{0, arm}, pen);
}

/// Between the two spokes where they are far enough apart; a turn too small for it has none.
void drawDoubleAngleLabel(Picture& picture, const Round& round, Angle from, Angle turn) {
  const double half = std::abs(turn.degrees()) / 2;
  const double clear = 13 / cosSin(Angle::fromDegrees(std::min(half, 90.0))).sin;
  const double distance = std::max(doubleAngleRadius * round.radius + 14, clear);
  if (half == 0 || distance > 0.75 * round.radius)
    return;
  const QPointF at = round.at(from + Angle::fromDegrees(turn.degrees() / 2), distance);
  Label label{vecOf(at + QPointF(0, 4)),
              runs(symbol("2θ"), translation()),
              circle_size::text,
              Align::middle,
              Role::reading,
              false,
              true,
              "2θ"};
  picture.parts.push_back(label);
}

void drawDoubleAngle(Picture& picture, const Stage& stage) {
  const Round round = stage.round();
  const double radius = doubleAngleRadius * round.radius;
  const Angle from = round.seenAt(xMarkAt(stage));
  const Angle turn = round.seenTurn(stage.readout.reading.value);
  const double length = radius * std::abs(turn.radians());
  constexpr double head = 7;
  if (length < 2)
    return;
  const double sense = turn.degrees() > 0 ? 1 : -1;
  picture.parts.push_back(Arc{vecOf(round.centre), radius, from.degrees(), turn.degrees(),
                              Pen{Role::reading, spoke, Dash::solid}, std::nullopt});
  // The head lies along its own chord, else it would stand off the arc.
  const Angle tilt = Angle::fromRadians(std::min(1.0, head / radius / 2));
  const Angle tangent = from + turn + Angle::fromDegrees(sense * (90 - tilt.degrees()));
  if (length > 2 * head)
    drawHead(picture, vecOf(round.at(from + turn, radius)), tangent, head, Role::reading);
  drawDoubleAngleLabel(picture, round, from, turn);
}

} // namespace

QPointF readingAt(const Stage& stage) {
  return stage.pixelOf(stage.readout.state().reading);
}

QPointF xMarkAt(const Stage& stage) {
  return placeOf(stage, {Angle()});
}

std::optional<QPointF> earAt(const Stage& stage) {
  if (!draggableCase(stage.study, stage.readout))
    return std::nullopt;
  const Round round = stage.round();
  const QPointF mark = xMarkAt(stage);
  // Below a state without a circle, where no label stands.
  const Angle seen = round.radius > 0 ? round.seenAt(mark) : Angle::fromDegrees(-90);
  return round.at(seen, round.radius + circle_size::stem);
}

Picture stillLayer(const Stage& stage) {
  Picture picture;
  const bool isRound = stage.readout.state().circle.radius > 0;
  if (isRound) {
    for (const LineReading& line : stage.readout.lines)
      drawBand(picture, stage, line);
    drawDiameters(picture, stage);
    drawCentre(picture, vecOf(stage.round().centre));
  }
  const std::vector<Mark> marks = marksOf(stage.study, stage.readout);
  // The first named lie on top.
  for (auto mark = marks.rbegin(); mark != marks.rend(); ++mark)
    if (mark->kind != PlaneKind::reading)
      drawSign(picture, mark->kind, vecOf(stage.pixelOf(mark->at)));
  return picture;
}

Picture readingLayer(const Stage& stage, bool snapped) {
  Picture picture;
  const Round round = stage.round();
  const Vec at = vecOf(readingAt(stage));
  if (round.radius > 0) {
    drawDoubleAngle(picture, stage);
    drawStroke(picture, vecOf(round.centre), at, {Role::reading, spoke, Dash::solid});
    const Vec opposite = vecOf(placeOf(stage, oppositeOf(stage.readout.reading)));
    drawSign(picture, Sign::hollowRound, Role::reading, opposite, 9, 1.5);
  }
  if (snapped)
    picture.parts.push_back(Arc{at, 10.5, 0, 360, Pen{Role::reading, 1.5, Dash::solid}, std::nullopt});
  drawSign(picture, PlaneKind::reading, at);
  return picture;
}

Picture earLayer(const Stage& stage) {
  Picture picture;
  if (const std::optional<QPointF> ear = earAt(stage)) {
    drawStroke(picture, vecOf(xMarkAt(stage)), vecOf(*ear), {Role::state, 1.5, Dash::solid});
    drawSign(picture, Sign::hollowSquare, Role::state, vecOf(*ear), 9, 1.5);
  }
  return picture;
}

Picture focusLayer(const Stage& stage, Handle handle) {
  Picture picture;
  const std::optional<QPointF> at = handle == Handle::ear ? earAt(stage) : readingAt(stage);
  if (at)
    picture.parts.push_back(Arc{vecOf(*at), 12, 0, 360, Pen{Role::focus, 2, Dash::solid}, std::nullopt});
  return picture;
}

} // namespace planewright
