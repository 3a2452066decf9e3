// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <QFont>
#include <QRectF>

class QPainter;

namespace planewright {

/// Width of runs in a font of the window; lowered runs are set smaller, as in the figure.
qreal runsWidth(const Runs& runs, const QFont& font);

/// Draws runs in the painter's font and pen, centred in the height of `box`, at its left or right end.
void drawRuns(QPainter& painter, const QRectF& box, const Runs& runs, Qt::Alignment align);

} // namespace planewright
