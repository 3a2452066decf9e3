// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/font.h"

#include <QFontDatabase>
#include <QResource>
#include <QStringList>

#include <algorithm>

namespace planewright {

namespace {

bool load(const char* file) {
  // Built in as it is, so that it is used where it lies.
  const QResource font(QStringLiteral(":/planewright/fonts/") + QLatin1String(file));
  const int id = QFontDatabase::addApplicationFontFromData(
      QByteArray::fromRawData(reinterpret_cast<const char*>(font.data()), font.size()));
  return id >= 0 && QFontDatabase::applicationFontFamilies(id).contains(QLatin1String(programFamily));
}

} // namespace

bool loadProgramFont() {
  static const bool loaded = load("LiberationSans-Regular.ttf") && load("LiberationSans-Bold.ttf");
  return loaded;
}

QFont programFont(double pixels, bool bold) {
  QFont font{QString::fromLatin1(programFamily)};
  font.setPixelSize(std::max(1, qRound(pixels)));
  font.setBold(bold);
  font.setKerning(false);
  font.setHintingPreference(QFont::PreferNoHinting);
  return font;
}

} // namespace planewright
