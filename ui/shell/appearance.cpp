// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/appearance.h"

#include "ui/look/font.h"
#include "ui/look/look.h"
#include "ui/look/press_access.h"
#include "ui/look/ring_style.h"
#include "ui/look/zoom.h"

#include <QApplication>
#include <QScreen>
#include <QSettings>

#include <algorithm>
#include <array>

namespace planewright {

namespace {

constexpr std::array words{"system", "light", "dark", "contrast"};
QString key() {
  return QStringLiteral("appearance");
}

QString textKey() {
  return QStringLiteral("textPercent");
}

/// Of the system's own palette, which shows through when the application sets none. One of much contrast has
/// light words on black, or nearly.
Palette systemPalette() {
  QApplication::setPalette(QPalette());
  const QPalette palette = QApplication::palette();
  const float ground = palette.color(QPalette::Window).lightnessF();
  const float ink = palette.color(QPalette::WindowText).lightnessF();
  if (ground < 0.02F && ink > 0.98F)
    return Palette::contrast;
  return ground < 0.5F ? Palette::dark : Palette::light;
}

Palette paletteOf(Appearance appearance) {
  switch (appearance) {
  case Appearance::light:
    return Palette::light;
  case Appearance::dark:
    return Palette::dark;
  case Appearance::contrast:
    return Palette::contrast;
  case Appearance::system:
    break;
  }
  return systemPalette();
}

/// The plain size where a text of 100 % has 96 px to the inch; systems enlarge their texts by that number.
double textPixels() {
  const QScreen* screen = QApplication::primaryScreen();
  return plainText * (screen ? screen->logicalDotsPerInchY() / 96 : 1) * chosenTextPercent() / 100.0;
}

} // namespace

Appearance chosenAppearance() {
  const QString word = QSettings().value(key()).toString();
  for (std::size_t i = 0; i < words.size(); ++i)
    if (word == QLatin1String(words[i]))
      return static_cast<Appearance>(i);
  return Appearance::system;
}

void chooseAppearance(Appearance appearance) {
  QSettings().setValue(key(), QString::fromLatin1(words[static_cast<std::size_t>(appearance)]));
  dressApplication();
}

int chosenTextPercent() {
  const int percent = QSettings().value(textKey()).toInt();
  return std::ranges::find(textPercents, percent) != textPercents.end() ? percent : textPercents.front();
}

void chooseTextPercent(int percent) {
  QSettings().setValue(textKey(), percent);
  dressApplication();
}

void dressApplication() {
  installPressAccess();
  QApplication::setStyle(new RingStyle);
  QApplication::setFont(programFont(textPixels()));
  QApplication::setPalette(paletteFor(Look{paletteOf(chosenAppearance())}));
}

} // namespace planewright
