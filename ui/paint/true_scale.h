// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

class QWidget;

namespace planewright {

/// Pixels of one mm on the screen of a widget.
double truePixelsPerMm(const QWidget& widget);

} // namespace planewright
