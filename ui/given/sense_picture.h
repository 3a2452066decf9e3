// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/kinds.h"
#include "ui/look/look.h"

#include <QRectF>

class QPainter;

namespace planewright {

/// A square with the arrows of positive sx, sy and txy as the body feels them.
void paintSense(QPainter& painter, const QRectF& box, Positive positive, const Look& look);

/// The shear axis of the circle with its positive half, and the way the circle then turns.
void paintShearAxis(QPainter& painter, const QRectF& box, ShearAxis axis, const Look& look);

} // namespace planewright
