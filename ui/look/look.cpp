// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/look.h"

#include <QWidget>

namespace planewright {

QColor Look::colour(Role role) const {
  return QColor::fromRgb(colourOf(role, palette).rgb);
}

Look lookOf(const QWidget& widget) {
  const QColor window = widget.palette().color(QPalette::Window);
  if (window == Look{Palette::contrast}.colour(Role::window))
    return {Palette::contrast};
  return {window.lightnessF() < 0.5F ? Palette::dark : Palette::light};
}

QPalette paletteFor(const Look& look) {
  QPalette palette;
  const QColor ink = look.colour(Role::ink);
  const QColor soft = look.colour(Role::soft);
  const auto all = {QPalette::Active, QPalette::Inactive, QPalette::Disabled};
  for (const QPalette::ColorGroup group : all) {
    const QColor text = group == QPalette::Disabled ? look.colour(Role::other) : ink;
    palette.setColor(group, QPalette::Window, look.colour(Role::window));
    palette.setColor(group, QPalette::WindowText, text);
    palette.setColor(group, QPalette::Base, look.colour(Role::field));
    palette.setColor(group, QPalette::AlternateBase, look.colour(Role::canvas));
    palette.setColor(group, QPalette::Text, text);
    palette.setColor(group, QPalette::Button, look.colour(Role::window));
    palette.setColor(group, QPalette::ButtonText, text);
    palette.setColor(group, QPalette::BrightText, look.colour(Role::wrong));
    palette.setColor(group, QPalette::PlaceholderText, soft);
    palette.setColor(group, QPalette::Highlight, look.colour(Role::selection));
    palette.setColor(group, QPalette::HighlightedText, text);
    palette.setColor(group, QPalette::ToolTipBase, look.colour(Role::canvas));
    palette.setColor(group, QPalette::ToolTipText, text);
    palette.setColor(group, QPalette::Link, look.colour(Role::focus));
    palette.setColor(group, QPalette::LinkVisited, look.colour(Role::focus));
    palette.setColor(group, QPalette::Light, look.colour(Role::canvas));
    palette.setColor(group, QPalette::Midlight, look.colour(Role::grid));
    palette.setColor(group, QPalette::Mid, look.colour(Role::rule));
    palette.setColor(group, QPalette::Dark, look.colour(Role::other));
    palette.setColor(group, QPalette::Shadow, look.colour(Role::soft));
  }
  return palette;
}

QString shown(const Text& text) {
  return QString::fromStdString(plain(text, translation()));
}

QString shownRich(const Text& text) {
  return richText(runs(text, translation()));
}

QString richText(const Runs& runs) {
  QString result;
  for (const Run& run : runs) {
    const QString words = QString::fromStdString(run.text).toHtmlEscaped();
    result += run.lowered ? QStringLiteral("<sub>%1</sub>").arg(words) : words;
  }
  return result;
}

QString shown(const Problem& problem) {
  return QString::fromStdString(plain(problem, translation()));
}

QString nameForMenu(QString name) {
  return name.replace(QLatin1Char('&'), QStringLiteral("&&"));
}

} // namespace planewright
