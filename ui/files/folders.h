// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

namespace planewright {

/// Folders that the user chose for files of a kind, kept in the settings; empty where none was.
enum class Folder { studies, outputs };
QString chosenFolder(Folder folder);
void chooseFolder(Folder folder, const QString& path);

/// Where figures and sheets are offered to go: the chosen folder, else that of the study, else that of
/// documents.
QString outputFolder(const QString& studyFile);

} // namespace planewright
