// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QIcon>

namespace planewright {

/// Two chevrons that point to where more is, drawn in the ink of the palette when they are needed: the
/// standard icon is loaded with each menu bar, and every plugin for images with it.
QIcon moreIcon();

} // namespace planewright
