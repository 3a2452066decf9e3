// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QStringList>

namespace planewright {

/// The newest files, newest first, that still exist; at most 10. Kept in the settings of the user.
QStringList recentFiles();
/// Puts a file at the front.
void rememberFile(const QString& path);
void forgetFiles();

} // namespace planewright
