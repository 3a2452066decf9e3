// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QRegularExpression>
#include <QStringList>

namespace planewright {

/// What the first group of a pattern finds in HTML.
inline QStringList allOf(const QString& html, const char* pattern) {
  QStringList found;
  for (const QRegularExpressionMatch& match :
       QRegularExpression(QString::fromUtf8(pattern)).globalMatch(html))
    found += match.captured(1);
  return found;
}

} // namespace planewright
