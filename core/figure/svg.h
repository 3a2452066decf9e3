// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"

namespace planewright {

/// The picture as an SVG document in true mm: whole labels in one text element, equal bytes everywhere.
std::string svgOf(const Picture& picture, Palette palette);

} // namespace planewright
