// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/verdict.h"
#include "ui/look/look.h"

class QPainter;

namespace planewright {

/// The sign that stands with a verdict, so that it never rests on colour alone: a ring for within, a filled
/// triangle for exceeds, "!" for not judged, "?" for not checked.
void paintStandingMark(QPainter& painter, const QRectF& box, Standing standing, const Look& look);

} // namespace planewright
