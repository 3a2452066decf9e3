// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/page_strips.h"

namespace planewright {

/// Strips laid on pages whose text is `height` high: the parts of each page from the upper left corner of its
/// text. What keeps together stays on one page where a page holds it.
std::vector<std::vector<PicturePart>> flowed(const std::vector<PageStrip>& strips, double height);

} // namespace planewright
