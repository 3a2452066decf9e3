// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/decimal_sign.h"
#include "ui/sheet/sheet_settings.h"
#include "ui/shell/appearance.h"

namespace planewright {

/// What the user prefers, kept in the settings. A default-constructed one is the program as it comes.
struct Preferences {
  QString language; ///< its code; empty: that of the system
  Appearance appearance = Appearance::system;
  int textPercent = 100;
  Units units;           ///< of new studies
  Convention convention; ///< of new studies
  Title title;           ///< of new studies: project, prepared and purpose count
  Paper paper = Paper::a4;
  DecimalSign decimal = DecimalSign::point; ///< of figures and sheets
  QString studiesFolder;                    ///< empty: that of the newest file
  QString outputsFolder;                    ///< empty: that of the study
  bool operator==(const Preferences&) const = default;
};

Preferences preferences();
/// Keeps them; the window wears the appearance at once, the language counts from the next start.
void prefer(const Preferences& preferences);

/// A new study as the user wants it: its zeros stand in the preferred unit.
Study preferredStudy();

} // namespace planewright
