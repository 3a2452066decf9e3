// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/turning.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// How far the handle turns, counter-clockwise, before it meets the direction: in (0, 180].
double wayTo(Angle direction, Angle from) {
  double way = std::fmod(direction.degrees() - from.degrees(), 180.0);
  if (way <= coinciding.degrees())
    way += 180;
  return way <= coinciding.degrees() ? way + 180 : way;
}

std::optional<Angle> nextNamed(Angle now, bool forward, const std::vector<NamedDirection>& directions) {
  std::optional<Angle> found;
  double least = 360;
  for (const NamedDirection& direction : directions) {
    const double way = forward ? wayTo(direction.angle, now) : wayTo(-direction.angle, -now);
    if (direction.byName && way < least) {
      least = way;
      found = direction.angle;
    }
  }
  return found;
}

double stepOf(Qt::KeyboardModifiers held) {
  if (held & Qt::ShiftModifier)
    return 0.1;
  return held & Qt::ControlModifier ? 15 : 1;
}

/// A step from a place on its own grid stays on it, so that ten tenths make a whole degree.
Angle stepped(Angle now, double step) {
  return folded(Angle::fromDegrees(roundedTo(now.degrees() + step, 1e-10)));
}

} // namespace

void Turn::move(Angle by, Qt::KeyboardModifiers held) {
  const double part = held & Qt::ShiftModifier ? 0.1 : 1.0;
  m_now = m_now + Angle::fromDegrees(part * by.degrees());
}

Rest restOf(const Turn& turn, const std::vector<NamedDirection>& directions, Angle reach, Angle pixel,
            Qt::KeyboardModifiers held) {
  Rest rest;
  const bool fine = held & Qt::ShiftModifier;
  const double decade = decadeBelow(std::clamp(pixel.degrees(), 1e-6, 10.0)) / (fine ? 10 : 1);
  rest.angle = folded(Angle::fromDegrees(roundedTo(turn.now().degrees(), decade)));
  if (fine || held & Qt::ControlModifier || directions.empty())
    return rest;
  const auto nearest = std::ranges::min_element(
      directions, {}, [&](const NamedDirection& direction) { return apart(direction.angle, turn.now()); });
  if (apart(nearest->angle, turn.now()) > reach)
    return rest;
  rest.angle = nearest->angle;
  for (const NamedDirection& direction : directions)
    if (coincide(direction.angle, rest.angle))
      rest.on.push_back(direction.name);
  return rest;
}

std::optional<Angle> keyedTurn(Angle now, int key, Qt::KeyboardModifiers held,
                               const std::vector<NamedDirection>& directions) {
  switch (key) {
  case Qt::Key_Left:
  case Qt::Key_Down:
    return stepped(now, -stepOf(held));
  case Qt::Key_Right:
  case Qt::Key_Up:
    return stepped(now, stepOf(held));
  case Qt::Key_PageUp:
    return nextNamed(now, true, directions);
  case Qt::Key_PageDown:
    return nextNamed(now, false, directions);
  case Qt::Key_Home:
    return Angle();
  default:
    return std::nullopt;
  }
}

double decadeBelow(double size) {
  return std::pow(10.0, std::floor(std::log10(size)));
}

double roundedTo(double value, double decade) {
  // Dividing by a whole power of ten gives the nearest double to the decimal number; multiplying by 0.1
  // would not.
  const double perUnit = std::round(1 / decade);
  const double rounded =
      decade < 1 ? std::round(value * perUnit) / perUnit : std::round(value / decade) * decade;
  return std::isfinite(rounded) ? rounded + 0.0 : value;
}

} // namespace planewright
