// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

#include <string>
#include <vector>

namespace planewright {

/// Names of a study joined to the name of a file, without an ending: "roof-P1-1.35-G+1.5-S". Every file
/// system takes it: no separators, no blanks, no leading dot, none longer than 60 letters.
QString joinedName(const std::vector<std::string>& names);

/// The names, in their order, so that no two are one file where case is not told apart: the second "p1"
/// becomes "p1-2".
std::vector<QString> distinctNames(std::vector<QString> names);

/// The folder of a file; that of documents where the path is empty.
QString folderOf(const QString& path);

} // namespace planewright
