// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet.h"

namespace planewright {

/// The sheet as plain UTF-8 text: title, then every block in its order, tables with aligned columns, a figure
/// by its caption alone; caution and identity at the end. For reading on a terminal and comparing revisions
/// line by line.
std::string sheetText(const Sheet& sheet, const Translate& translate = {});

} // namespace planewright
