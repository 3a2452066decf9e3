// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/make_sheet.h"
#include "core/report/sheet_pages.h"

class QSettings;

namespace planewright {

/// How the user asks for sheets; remembered from one to the next. What goes into the title block is not: it
/// belongs to the study.
struct SheetSettings {
  Depth depth = Depth::governing;
  Paper paper = Paper::a4;
  bool figures = true;
  bool carriesStudy = true;
  bool operator==(const SheetSettings&) const = default;
};

/// What was remembered; what is missing or unknown is as in a new SheetSettings.
SheetSettings rememberedSheet(const QSettings& settings);
void rememberSheet(QSettings& settings, const SheetSettings& sheet);

} // namespace planewright
