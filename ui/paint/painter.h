// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"

class QPainter;

namespace planewright {

/// Paints a Picture with one unit of the picture as one unit of the painter, its origin at the painter's.
/// The same routine serves the window, PNG, PDF and printer.
void paintPicture(QPainter& painter, const Picture& picture, Palette palette);

} // namespace planewright
