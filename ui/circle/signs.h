// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/marks.h"

namespace planewright {

/// Draws the sign of a kind of plane.
void drawSign(Picture& picture, PlaneKind kind, Vec at);
/// Draws a sign of a given role and size.
void drawSign(Picture& picture, Sign sign, Role role, Vec at, double size, double stroke);
/// A straight stroke.
void drawStroke(Picture& picture, Vec from, Vec to, const Pen& pen);
/// A filled arrow head with its tip at `tip`, pointing in the seen direction.
void drawHead(Picture& picture, Vec tip, Angle direction, double length, Role role);

} // namespace planewright
