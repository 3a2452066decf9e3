// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/setting.h"

namespace planewright {

/// One element with its heading and labels in an area of the sheet.
struct ElementPanel {
  Box area;
  bool turned = false;
};

/// Draws the panels, which are equally wide, with one size for all and their centres at one place across;
/// false when labels find no room.
bool drawElementPanels(Picture& picture, const Setting& setting, const std::vector<ElementPanel>& panels);

} // namespace planewright
