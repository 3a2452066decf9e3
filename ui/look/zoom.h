// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QSizeF>
#include <QWidget>

namespace planewright {

/// The text of the window at 100 %, in pixels; drawings are laid out for it.
inline constexpr double plainText = 13;

/// How much larger than laid out a drawing stands in its widget: as the widget's text is to the plain one, as
/// far as there is room for `least` of the drawing's own pixels; at least 1.
double zoomOf(const QWidget& widget, QSizeF least);

} // namespace planewright
