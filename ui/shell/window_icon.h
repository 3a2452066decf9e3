// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QIcon>

namespace planewright {

/// The program's sign: a square element, the cut through it and the cut's normal.
QIcon windowIcon();

} // namespace planewright
