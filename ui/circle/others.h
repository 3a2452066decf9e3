// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/circle_fit.h"
#include "ui/circle/round.h"

#include <QPainterPath>

namespace planewright {

/// Up to this many other combinations are drawn as hairlines; more would go to fog.
inline constexpr std::size_t mostHairlines = 24;

/// How the other combinations are drawn: as hairlines, or above their greatest count as one flat shape, the
/// union of all discs, with the circles that hold the greatest s1 and the least s2.
struct OthersDrawing {
  QPainterPath hairlines;
  QPainterPath shape;
  QPainterPath extremes;
};
OthersDrawing drawingOfOthers(const Stage& stage);

/// The union, between two places, of discs whose centres lie on one level: at each place along it, half of
/// its height is the greatest of sqrt(r^2 - (s - c)^2). Exact at every half pixel.
QPainterPath unionOfDiscs(const std::vector<Round>& rounds, double from, double to);

/// The other state whose circle comes nearest to the pixel, within `reach`; among many only one that is
/// drawn.
const StateReading* nearestOther(const Stage& stage, QPointF pixel, double reach);

} // namespace planewright
