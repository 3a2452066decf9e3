// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet.h"

namespace planewright {

/// The sheet as one self-contained HTML file: formulas as MathML Core, figures as SVG, nothing loaded from
/// elsewhere. It prints well and needs no script.
std::string sheetHtml(const Sheet& sheet, const Translate& translate = {});

} // namespace planewright
