// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/round.h"

#include <optional>

namespace planewright {

/// The two things on the circle that can be taken hold of.
enum class Handle { reading, ear };

/// Where the reading mark and the ear stand, in pixels. The ear, a hollow square on a stem outside the x
/// mark, exists only where one case gives the shown state.
QPointF readingAt(const Stage& stage);
std::optional<QPointF> earAt(const Stage& stage);
QPointF xMarkAt(const Stage& stage);

/// Band of the line, diameters, centre and every mark but the reading plane's.
Picture stillLayer(const Stage& stage);
/// The reading plane: spoke, opposite face, double angle. `snapped` draws the second ring.
Picture readingLayer(const Stage& stage, bool snapped);
/// The ear on its stem.
Picture earLayer(const Stage& stage);
/// The ring round the handle that the keyboard turns.
Picture focusLayer(const Stage& stage, Handle handle);

} // namespace planewright
