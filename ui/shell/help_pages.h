// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/look/look.h"

#include <QImage>

namespace planewright {

/// The pages of Help, in their order.
enum class HelpPage { entries, conventions, strength, screening, keys, cautions };
inline constexpr int helpPageCount = 6;

QString titleOf(HelpPage page);
/// The page as HTML; its pictures are named "picture:given" and "picture:turned".
QString htmlOf(HelpPage page, const Look& look);
/// The picture of such a name, `scale` device pixels to one of its own.
QImage helpPicture(const QString& name, const Look& look, double scale);

} // namespace planewright
