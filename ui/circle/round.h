// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/readout.h"
#include "ui/chart/equal_scale.h"

namespace planewright {

/// The shown circle in pixels. Angles on it are as seen: counter-clockwise from the right.
struct Round {
  QPointF centre;
  double radius = 0;      ///< 0 for a degenerate state
  bool turnsAlong = true; ///< the circle turns the way the element turns: shear drawn tensor-down

  Angle seenAt(QPointF pixel) const;
  QPointF at(Angle seen, double distance) const;
  /// How far a normal turns while its mark goes from one ray to another, the shorter way.
  Angle turnBetween(QPointF from, QPointF to) const;
  /// How far a normal turns while its mark goes `pixels` along the circle.
  Angle turnAlong(double pixels) const;
  /// What a turn of the normal looks like: twice as much, and the other way round in tensor-up.
  Angle seenTurn(Angle turn) const;
};

/// Everything that the drawing of the circle follows from.
struct Stage {
  const Study& study;
  const Readout& readout;
  const EqualScale& scale;

  /// Stresses of the base, in pixels.
  QPointF pixelOf(const Traction& traction) const;
  Round round() const { return roundOf(readout.state()); }
  Round roundOf(const StateReading& state) const;
};

/// Stresses of the base in the study's unit: what the axes of the circle count.
QPointF plotted(const Study& study, const Traction& traction);

inline Vec vecOf(QPointF point) {
  return {point.x(), point.y()};
}
inline QPointF pointOf(Vec vec) {
  return {vec.x, vec.y};
}

} // namespace planewright
