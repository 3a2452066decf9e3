// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/appearance.h"

#include "ui/look/font.h"
#include "ui/look/look.h"
#include "ui/look/ring_style.h"

#include <QApplication>
#include <QScreen>
#include <QSettings>

#include <array>

namespace planewright {

namespace {

constexpr std::array words{"system", "light", "dark"};
QString key() {
  return QStringLiteral("appearance");
}

/// The system's own palette shows through when the application sets none.
bool systemIsDark() {
  QApplication::setPalette(QPalette());
  return QApplication::palette().color(QPalette::Window).lightnessF() < 0.5F;
}

/// 13 px where a text of 100 % has 96 px to the inch; systems enlarge their texts by that number.
double textPixels() {
  const QScreen* screen = QApplication::primaryScreen();
  return 13 * (screen ? screen->logicalDotsPerInchY() / 96 : 1);
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

void dressApplication() {
  QApplication::setStyle(new RingStyle);
  QApplication::setFont(programFont(textPixels()));
  const Appearance appearance = chosenAppearance();
  const bool dark = appearance == Appearance::dark || (appearance == Appearance::system && systemIsDark());
  QApplication::setPalette(paletteFor(Look{dark ? Palette::dark : Palette::light}));
}

} // namespace planewright
