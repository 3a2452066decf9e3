// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/font.h"

#include <QFontDatabase>
#include <QStringList>

#include <algorithm>

namespace planewright {

namespace {

constexpr auto family = "Liberation Sans";

bool load(const char* file) {
  const int id =
      QFontDatabase::addApplicationFont(QStringLiteral(":/planewright/fonts/") + QLatin1String(file));
  return id >= 0 && QFontDatabase::applicationFontFamilies(id).contains(QLatin1String(family));
}

} // namespace

bool loadProgramFont() {
  static const bool loaded = load("LiberationSans-Regular.ttf") && load("LiberationSans-Bold.ttf");
  return loaded;
}

QFont programFont(double pixels, bool bold) {
  QFont font{QString::fromLatin1(family)};
  font.setPixelSize(std::max(1, qRound(pixels)));
  font.setBold(bold);
  font.setKerning(false);
  font.setHintingPreference(QFont::PreferNoHinting);
  return font;
}

} // namespace planewright
