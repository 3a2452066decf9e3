// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_settings.h"

#include "ui/look/look.h"
#include "ui/paint/export.h"

#include <QSettings>

#include <array>

namespace planewright {

namespace {

constexpr std::array formats = {FigureFormat::svg, FigureFormat::pdf, FigureFormat::png};

struct PartKey {
  const char* key;
  bool FigureParts::*part;
};
constexpr std::array partKeys = {PartKey{"figure/title", &FigureParts::title},
                                 PartKey{"figure/given", &FigureParts::givenElement},
                                 PartKey{"figure/turned", &FigureParts::turnedElement},
                                 PartKey{"figure/circle", &FigureParts::circle},
                                 PartKey{"figure/planes", &FigureParts::planes},
                                 PartKey{"figure/check", &FigureParts::check},
                                 PartKey{"figure/utilisation", &FigureParts::utilisation}};

QString keyOf(const char* key) {
  return QString::fromLatin1(key);
}

/// The remembered number, or `usual` when there is none within least and greatest.
double numberIn(const QSettings& settings, const char* key, double usual, double least, double greatest) {
  bool reads = false;
  const double value = settings.value(keyOf(key)).toDouble(&reads);
  return reads && value >= least && value <= greatest ? value : usual;
}

bool switchIn(const QSettings& settings, const char* key, bool usual) {
  return settings.value(keyOf(key), usual).toBool();
}

std::string wordIn(const QSettings& settings, const char* key) {
  return settings.value(keyOf(key)).toString().toStdString();
}

} // namespace

const char* endingOf(FigureFormat format) {
  switch (format) {
  case FigureFormat::pdf:
    return "pdf";
  case FigureFormat::png:
    return "png";
  case FigureFormat::svg:
    break;
  }
  return "svg";
}

FigureSettings rememberedFigure(const QSettings& settings) {
  FigureSettings figure;
  for (const PartKey& row : partKeys)
    figure.parts.*row.part = switchIn(settings, row.key, true);
  figure.width = numberIn(settings, "figure/width", figure.width, leastFigureWidth, greatestFigureWidth);
  figure.textPoints =
      numberIn(settings, "figure/text", figure.textPoints, leastFigureText, greatestFigureText);
  figure.mono = switchIn(settings, "figure/mono", false);
  figure.arrangement =
      fromWord<Arrangement>(wordIn(settings, "figure/arrangement")).value_or(figure.arrangement);
  figure.blocks = blocksIn(wordIn(settings, "figure/order")).value_or(figure.blocks);
  for (const FigureFormat format : formats)
    if (settings.value(keyOf("figure/format")).toString() == QLatin1String(endingOf(format)))
      figure.format = format;
  figure.dpi = static_cast<int>(numberIn(settings, "figure/dpi", figure.dpi, leastDpi, greatestDpi));
  figure.carriesStudy = switchIn(settings, "figure/study", true);
  return figure;
}

void rememberFigure(QSettings& settings, const FigureSettings& figure) {
  for (const PartKey& row : partKeys)
    settings.setValue(keyOf(row.key), figure.parts.*row.part);
  settings.setValue(keyOf("figure/width"), figure.width);
  settings.setValue(keyOf("figure/text"), figure.textPoints);
  settings.setValue(keyOf("figure/mono"), figure.mono);
  settings.setValue(keyOf("figure/arrangement"), fromUtf8(std::string(wordOf(figure.arrangement))));
  settings.setValue(keyOf("figure/order"), fromUtf8(listOf(figure.blocks)));
  settings.setValue(keyOf("figure/format"), QString::fromLatin1(endingOf(figure.format)));
  settings.setValue(keyOf("figure/dpi"), figure.dpi);
  settings.setValue(keyOf("figure/study"), figure.carriesStudy);
}

} // namespace planewright
