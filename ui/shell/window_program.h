// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

namespace planewright {

/// Runs the program with its window until it is closed, with a study where `path` is not empty. The exit
/// status is that of the program: 3 when the embedded font does not load.
int runWindow(int& argc, char** argv, const QString& path);

} // namespace planewright
