// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

namespace planewright {

/// The point with its note or the study's subject, and the combination: for the file's own title.
std::string figureTitle(const Setting& setting);
/// The shown state in words, for those who cannot see the figure.
std::string figureDescription(const Setting& setting);

/// Draws the title from the top down and returns where it ends; nothing when the title is left out.
double drawTitle(Picture& picture, const Setting& setting, double left, double right);
/// Draws the conventions, version and study name at the end of their last row, and the caption from `top`
/// down; returns where they end. `unnamed` watched planes have a mark on the circle without a label.
double drawClosing(Picture& picture, const Setting& setting, double left, double right, double top,
                   std::size_t unnamed);

} // namespace planewright
