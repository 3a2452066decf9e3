// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element.h"

namespace planewright {

/// The line through the centre, dash-dotted, and its band: thick arcs over phi +- d at both ends.
void drawLine(Picture& picture, const ElementFrame& frame, const LineReading& line,
              const ElementOrder& order);

/// The bars that turn the line: hollow, lying along it, at both ends.
void drawBars(Picture& picture, const ElementFrame& frame, Angle line, const ElementOrder& order);

/// The ring with a tick at every 15 deg.
void drawRing(Picture& picture, const ElementFrame& frame, const ElementOrder& order);

/// The knob "n" that turns the reading plane.
void drawKnob(Picture& picture, const ElementFrame& frame, Angle normal, const ElementOrder& order);

/// An arc from +x to `to` at `radius`, with a head where it is long enough to carry one. It stops `before`
/// short of its end (deg).
void drawAngle(Picture& picture, const ElementFrame& frame, Angle to, double radius, double before,
               const Pen& pen);

} // namespace planewright
