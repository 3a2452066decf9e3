// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/look/look.h"

#include <QByteArray>
#include <QImage>
#include <QStringList>

namespace planewright {

/// The pictures of the manual: "drawn:turned" is drawn by the program in the colours that it wears,
/// "window:element" is a picture of the window that the program carries.
bool isDrawn(const QString& name);
/// Whether there is such a picture.
bool isPicture(const QString& name);
/// In pixels of the window; empty for a name that is none.
QSize pictureSize(const QString& name);
/// The picture so many pixels wide.
QImage pictureImage(const QString& name, const Look& look, int width);
/// The bytes of its file in the written manual: SVG of what is drawn, else PNG.
QByteArray pictureFile(const QString& name);

} // namespace planewright
