// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"

namespace planewright {

/// The picture as an SVG document in true mm: whole labels in one text element, equal bytes everywhere.
/// Coordinates are rounded to 0.001 mm. Characters that XML does not allow are left out; bytes that are not
/// UTF-8 become U+FFFD.
std::string svgOf(const Picture& picture, Palette palette);

} // namespace planewright
