// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/page_strips.h"

namespace planewright {

/// A table as strips, a row each, its head repeated on every page. Columns are as wide as what they hold;
/// where that is wider than the page, the letters get smaller (to 6.5 pt), words are broken into lines, and
/// what is still too wide goes into further tables that repeat the first column.
std::vector<PageStrip> tableStrips(const SheetTable& table, double width, const Translate& translate);

} // namespace planewright
