// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"
#include "core/words/problem.h"

#include <QColor>
#include <QPalette>
#include <QString>

class QWidget;

namespace planewright {

/// Colours of the window: a small value that a view takes from its own palette, so that nothing is shared.
struct Look {
  Palette palette = Palette::light;
  QColor colour(Role role) const;
  bool operator==(const Look&) const = default;
};

/// Light, dark or of much contrast, by the widget's window colour. Views call it when they paint.
Look lookOf(const QWidget& widget);
/// The palette that makes the standard widgets wear a Look.
QPalette paletteFor(const Look& look);

/// A core text in the language of the program, without and with lowered indices (as rich text).
QString shown(const Text& text);
QString shownRich(const Text& text);
/// Runs as rich text, what is lowered as indices.
QString richText(const Runs& runs);
QString shown(const Problem& problem);
/// The translation that core's figures and outputs take.
Translate translation();

/// A name for a menu or a standard button, in which a single & marks a key: "R&D" is written "R&&D".
QString nameForMenu(QString name);

inline QString fromUtf8(const std::string& words) {
  return QString::fromStdString(words);
}

} // namespace planewright
