// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_names.h"

#include "ui/look/look.h"

#include <QFileInfo>
#include <QRegularExpression>
#include <QSet>
#include <QStandardPaths>
#include <QStringList>

namespace planewright {

namespace {

QString inFileName(const std::string& words) {
  static const QRegularExpression blanks(QStringLiteral("\\s*\\+\\s*"));
  static const QRegularExpression unwanted(QStringLiteral("[\\s/\\\\:*?\"<>|\\x00-\\x1f]+"));
  QString name = fromUtf8(words).replace(blanks, QStringLiteral("+"));
  name.replace(unwanted, QStringLiteral("-"));
  while (name.startsWith(QLatin1Char('.')) || name.startsWith(QLatin1Char('-')))
    name.remove(0, 1);
  constexpr int longest = 60;
  constexpr int mostBytes = 72; // three such names, a number and the ending stay within 255
  name.truncate(longest);
  while (name.toUtf8().size() > mostBytes || (!name.isEmpty() && name.back().isHighSurrogate()))
    name.chop(1);
  return name;
}

} // namespace

QString joinedName(const std::vector<std::string>& names) {
  QStringList parts;
  for (const std::string& one : names)
    if (const QString part = inFileName(one); !part.isEmpty())
      parts << part;
  return parts.join(QLatin1Char('-'));
}

std::vector<QString> distinctNames(std::vector<QString> names) {
  QSet<QString> taken;
  for (QString& name : names) {
    const QString wanted = name;
    for (int number = 2; taken.contains(name.toCaseFolded()); ++number)
      name = wanted + QLatin1Char('-') + QString::number(number);
    taken.insert(name.toCaseFolded());
  }
  return names;
}

QString folderOf(const QString& path) {
  return path.isEmpty() ? QStandardPaths::writableLocation(QStandardPaths::DocumentsLocation)
                        : QFileInfo(path).absolutePath();
}

} // namespace planewright
