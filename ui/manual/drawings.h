// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

#include <QStringList>

namespace planewright {

/// The names of the pictures that the manual draws itself: "given", "turned", ...
QStringList drawingNames();
/// Such a picture in pixels of the window, from figures of core that are the window's and the sheet's too.
Picture drawing(const QString& name);

} // namespace planewright
