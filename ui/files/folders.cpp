// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/folders.h"

#include "ui/files/file_names.h"

#include <QFileInfo>
#include <QSettings>

namespace planewright {

namespace {

QString keyOf(Folder folder) {
  return folder == Folder::studies ? QStringLiteral("folders/studies") : QStringLiteral("folders/outputs");
}

} // namespace

QString chosenFolder(Folder folder) {
  const QString path = QSettings().value(keyOf(folder)).toString();
  return QFileInfo(path).isDir() ? path : QString();
}

void chooseFolder(Folder folder, const QString& path) {
  if (path.isEmpty())
    QSettings().remove(keyOf(folder));
  else
    QSettings().setValue(keyOf(folder), path);
}

QString outputFolder(const QString& studyFile) {
  const QString chosen = chosenFolder(Folder::outputs);
  return chosen.isEmpty() ? folderOf(studyFile) : chosen;
}

} // namespace planewright
