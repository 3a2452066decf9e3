// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QByteArray>
#include <QString>

#include <vector>

namespace planewright {

/// A file of the written manual, by its name in the folder: "lines.html", "pictures/turned.svg".
struct ManualFile {
  QString name;
  QByteArray bytes;
};

/// The manual as files of HTML that link to one another and to nothing outside: a page of contents
/// ("index.html"), the pages, the pictures that they show and their style.
std::vector<ManualFile> webManual(const QString& language);

} // namespace planewright
