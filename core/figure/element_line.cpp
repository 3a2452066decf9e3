// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_line.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr Angle halfTurn = Angle::fromDegrees(180);

void drawBandEnd(Picture& picture, const ElementFrame& frame, Angle end, double tolerance,
                 const ElementOrder& order) {
  constexpr double edgeFrom = 0.55;
  const double start = (frame.axes + end).degrees() - tolerance;
  picture.parts.push_back(Arc{frame.centre,
                              part::lineEnd * frame.outer,
                              start,
                              2 * tolerance,
                              Pen{Role::line, 2 * order.wide, Dash::solid},
                              {}});
  for (const double side : {-tolerance, tolerance}) {
    const Angle edge = end + Angle::fromDegrees(side);
    picture.parts.push_back(Path{{frame.at(edge, edgeFrom), frame.at(edge, part::lineEnd)},
                                 false,
                                 Pen{Role::line, order.hair, Dash::solid},
                                 {}});
  }
}

} // namespace

void drawLine(Picture& picture, const ElementFrame& frame, const LineReading& line,
              const ElementOrder& order) {
  const Angle phi = line.angle.value;
  const double tolerance = line.tolerance.degrees();
  if (tolerance >= 90)
    picture.parts.push_back(Arc{
        frame.centre, part::lineEnd * frame.outer, 0, 360, Pen{Role::line, 2 * order.wide, Dash::solid}, {}});
  else if (tolerance > 0)
    for (const Angle end : {phi, phi + halfTurn})
      drawBandEnd(picture, frame, end, tolerance, order);
  picture.parts.push_back(Path{{frame.at(phi + halfTurn, part::lineEnd), frame.at(phi, part::lineEnd)},
                               false,
                               Pen{Role::line, order.medium, Dash::longDashDot},
                               {}});
}

void drawBars(Picture& picture, const ElementFrame& frame, Angle line, const ElementOrder& order) {
  for (const Angle end : {line, line + halfTurn}) {
    const double half = part::barHalfWidth;
    picture.parts.push_back(Path{{frame.in(end, part::barFrom, half), frame.in(end, part::barTo, half),
                                  frame.in(end, part::barTo, -half), frame.in(end, part::barFrom, -half)},
                                 true,
                                 Pen{Role::line, order.medium, Dash::solid},
                                 Role::canvas});
  }
}

void drawRing(Picture& picture, const ElementFrame& frame, const ElementOrder& order) {
  constexpr double tickFrom = 0.97;
  const Pen pen{Role::hush, order.narrow, Dash::solid};
  picture.parts.push_back(Arc{frame.centre, frame.outer, 0, 360, pen, {}});
  for (double tick = 0; tick < 360; tick += 15) {
    const Angle direction = Angle::fromDegrees(tick);
    picture.parts.push_back(Path{{frame.at(direction, tickFrom), frame.at(direction, 1)}, false, pen, {}});
  }
}

void drawKnob(Picture& picture, const ElementFrame& frame, Angle normal, const ElementOrder& order) {
  constexpr double halfOfSmallLetter = 0.26; // of the em, in the program's font
  const Vec centre = frame.at(normal, part::knob);
  const double radius = part::knobRadius * frame.outer;
  const double size = std::min(order.textSize, 1.5 * radius);
  picture.parts.push_back(Arc{centre, radius, 0, 360, {}, Role::reading});
  picture.parts.push_back(Label{centre + Vec{0, halfOfSmallLetter * size},
                                {{"n", false}},
                                size,
                                Align::middle,
                                Role::canvas,
                                true,
                                false,
                                "knob"});
}

void drawAngle(Picture& picture, const ElementFrame& frame, Angle to, double radius, double before,
               const Pen& pen) {
  constexpr double headLength = 0.075;
  constexpr double headHalfWidth = 0.028;
  const double sweep = to.degrees() - std::copysign(before, to.degrees());
  if (std::abs(to.degrees()) <= before)
    return;
  const double headSweep = Angle::fromRadians(headLength / radius).degrees();
  const bool headed = std::abs(sweep) > 1.3 * headSweep;
  const double shaft = headed ? sweep - std::copysign(0.8 * headSweep, sweep) : sweep;
  picture.parts.push_back(Arc{frame.centre, radius * frame.outer, frame.axes.degrees(), shaft, pen, {}});
  if (!headed)
    return;
  const Angle base = Angle::fromDegrees(sweep - std::copysign(headSweep, sweep));
  picture.parts.push_back(
      Path{{frame.at(base, radius + headHalfWidth), frame.at(Angle::fromDegrees(sweep), radius),
            frame.at(base, radius - headHalfWidth)},
           true,
           {},
           pen.role});
}

} // namespace planewright
