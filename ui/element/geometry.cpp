// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/geometry.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

constexpr double halfTarget = 12; ///< half of the least width of a target
constexpr double rim = 1;         ///< by which a target is larger than what is drawn
constexpr double letterRoom = 16; ///< of x and y outside the ring
constexpr double sideRoom = 76;   ///< of a column of labels
constexpr double compactRoom = 24;
constexpr double largest = 450;
constexpr double smallest = 40;

Vec fromCentre(const ElementFrame& frame, QPointF at) {
  return Vec{at.x(), at.y()} - frame.centre;
}

double halfTurned(double degrees) {
  const double turned = std::remainder(degrees, 360.0);
  return turned == -180 ? 180 : turned;
}

bool onBar(const ElementFrame& frame, QPointF at, Angle end) {
  const CosSin d = cosSin(frame.axes + end);
  const Vec v = fromCentre(frame, at);
  const double along = v.x * d.cos - v.y * d.sin;
  const double across = v.x * d.sin + v.y * d.cos;
  const double half = std::max(halfTarget, (part::barTo - part::barFrom) / 2 * frame.outer + rim);
  return std::abs(along - (part::barFrom + part::barTo) / 2 * frame.outer) <= half &&
         std::abs(across) <= std::max(halfTarget, part::barHalfWidth * frame.outer + rim);
}

bool onKnob(const ElementFrame& frame, QPointF at, Angle knob) {
  const Vec off = Vec{at.x(), at.y()} - frame.at(knob, part::knob);
  return std::hypot(off.x, off.y) <= std::max(halfTarget, part::knobRadius * frame.outer + rim);
}

} // namespace

std::optional<Angle> ElementGeometry::directionOf(QPointF at) const {
  constexpr double blind = 6;
  const Vec v = fromCentre(frame, at);
  if (std::hypot(v.x, v.y) < blind)
    return std::nullopt;
  const Angle seen = Angle::fromRadians(std::atan2(-v.y, v.x));
  return Angle::fromDegrees(halfTurned((seen - frame.axes).degrees()));
}

std::optional<Angle> ElementGeometry::motion(QPointF from, QPointF to) const {
  const std::optional<Angle> start = directionOf(from);
  const std::optional<Angle> end = directionOf(to);
  if (!start || !end)
    return std::nullopt;
  return Angle::fromDegrees(halfTurned((*end - *start).degrees()));
}

ElementHandle ElementGeometry::handleAt(QPointF at, Angle knob, std::optional<Angle> line) const {
  const bool knobHit = onKnob(frame, at, knob);
  const bool barHit = line && (onBar(frame, at, *line) || onBar(frame, at, *line + Angle::fromDegrees(180)));
  if (knobHit && barHit) {
    const Vec v = fromCentre(frame, at);
    return std::hypot(v.x, v.y) > part::parting * frame.outer ? ElementHandle::reading : ElementHandle::line;
  }
  return knobHit ? ElementHandle::reading : barHit ? ElementHandle::line : ElementHandle::none;
}

Angle ElementGeometry::arcOf(double pixels, ElementHandle handle) const {
  const double radius = handle == ElementHandle::line ? part::lineEnd : part::knob;
  return Angle::fromRadians(pixels / (radius * frame.outer));
}

ElementGeometry fittedElement(QSizeF size, Angle axes) {
  ElementGeometry geometry;
  geometry.compact = size.width() < compactBelow;
  const double top = headingHeight + letterRoom;
  const double bottom = size.height() - captionHeight - (axes == Angle() ? 0 : letterRoom);
  const double side = geometry.compact ? compactRoom : sideRoom;
  const double outer = std::min(size.width() / 2 - side, (bottom - top) / 2);
  geometry.frame = {{size.width() / 2, (top + bottom) / 2}, std::clamp(outer, smallest, largest), axes};
  return geometry;
}

} // namespace planewright
