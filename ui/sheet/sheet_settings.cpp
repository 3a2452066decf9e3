// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_settings.h"

#include <QSettings>

namespace planewright {

namespace {

const QString depthKey = QStringLiteral("sheet/depth");
const QString paperKey = QStringLiteral("sheet/paper");
const QString figuresKey = QStringLiteral("sheet/figures");
const QString studyKey = QStringLiteral("sheet/study");

template <class Enum>
Enum wordIn(const QSettings& settings, const QString& key, Enum usual) {
  return fromWord<Enum>(settings.value(key).toString().toStdString()).value_or(usual);
}

template <class Enum>
QString written(Enum value) {
  const std::string_view word = wordOf(value);
  return QString::fromUtf8(word.data(), static_cast<qsizetype>(word.size()));
}

} // namespace

SheetSettings rememberedSheet(const QSettings& settings) {
  SheetSettings sheet;
  sheet.depth = wordIn(settings, depthKey, sheet.depth);
  sheet.paper = wordIn(settings, paperKey, sheet.paper);
  sheet.figures = settings.value(figuresKey, true).toBool();
  sheet.carriesStudy = settings.value(studyKey, true).toBool();
  return sheet;
}

void rememberSheet(QSettings& settings, const SheetSettings& sheet) {
  settings.setValue(depthKey, written(sheet.depth));
  settings.setValue(paperKey, written(sheet.paper));
  settings.setValue(figuresKey, sheet.figures);
  settings.setValue(studyKey, sheet.carriesStudy);
}

} // namespace planewright
