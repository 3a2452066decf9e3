// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/round.h"

#include "core/table/table.h"

#include <cmath>

namespace planewright {

Angle Round::seenAt(QPointF pixel) const {
  return Angle::fromRadians(std::atan2(centre.y() - pixel.y(), pixel.x() - centre.x()));
}

QPointF Round::at(Angle seen, double distance) const {
  const CosSin direction = cosSin(seen);
  return centre + distance * QPointF(direction.cos, -direction.sin);
}

Angle Round::turnBetween(QPointF from, QPointF to) const {
  // The half of the seen turn, folded, is the shorter way round: the seen turn is meant modulo 360 deg.
  const double seen = seenAt(to).degrees() - seenAt(from).degrees();
  const Angle turn = folded(Angle::fromDegrees(seen / 2));
  return turnsAlong ? turn : -turn;
}

Angle Round::turnAlong(double pixels) const {
  return Angle::fromRadians(pixels / radius / 2);
}

Angle Round::seenTurn(Angle turn) const {
  return turnsAlong ? turn + turn : -(turn + turn);
}

QPointF Stage::pixelOf(const Traction& traction) const {
  return scale.pixelOf(plotted(study, traction));
}

Round Stage::roundOf(const StateReading& state) const {
  const Circle& circle = state.circle;
  return {pixelOf({circle.mean, 0}), scale.pixelsPerUnit() * inStressUnit(study, circle.radius),
          study.convention.shearAxis == ShearAxis::tensorDown};
}

QPointF plotted(const Study& study, const Traction& traction) {
  return {inStressUnit(study, traction.sn), inStressUnit(study, traction.tnt)};
}

} // namespace planewright
