// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/figure.h"

class QSettings;

namespace planewright {

enum class FigureFormat { svg, pdf, png };

/// How the user arranges figures; remembered from one to the next.
struct FigureSettings {
  FigureParts parts;
  double width = 160; ///< mm
  double textPoints = 8;
  bool mono = false;
  Arrangement arrangement = Arrangement::byWidth;
  FigureBlocks blocks = usualBlocks;
  FigureFormat format = FigureFormat::svg;
  int dpi = 300; ///< of a PNG
  bool carriesStudy = true;
  bool operator==(const FigureSettings&) const = default;
};

/// What was remembered; what is missing or out of range is as in a new FigureSettings.
FigureSettings rememberedFigure(const QSettings& settings);
void rememberFigure(QSettings& settings, const FigureSettings& figure);

/// "svg", "pdf", "png": the ending of such a file's name.
const char* endingOf(FigureFormat format);

} // namespace planewright
