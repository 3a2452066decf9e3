// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/outcome.h"

#include <QByteArray>

#include <functional>

namespace planewright {

/// Paints with Qt without a display, in the program's own font, whatever the environment says. Neither Qt's
/// messages nor those of what it loads reach standard error. Called once in the life of a command.
Outcome<std::string> paintedOffscreen(const std::function<Result<QByteArray>()>& paint);

} // namespace planewright
