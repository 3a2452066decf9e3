// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/recent_files.h"

#include <QFileInfo>
#include <QSettings>

namespace planewright {

namespace {

constexpr int most = 10;
QString key() {
  return QStringLiteral("recentFiles");
}

} // namespace

QStringList recentFiles() {
  QStringList files = QSettings().value(key()).toStringList();
  files.removeIf([](const QString& file) { return !QFileInfo::exists(file); });
  return files.mid(0, most);
}

void rememberFile(const QString& path) {
  QStringList files = recentFiles();
  files.removeAll(path);
  files.prepend(path);
  QSettings().setValue(key(), files.mid(0, most));
}

void forgetFiles() {
  QSettings().remove(key());
}

} // namespace planewright
