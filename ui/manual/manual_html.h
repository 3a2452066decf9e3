// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

namespace planewright {

/// Where a page is read: in the program, whose browser knows pages and pictures by their names, or in a file
/// beside those of other pages and pictures.
enum class ManualMedium { program, file };

/// The greatest width of a picture in the program.
inline constexpr int mostPictureWidth = 640;

/// A page with everything filled in: what the program knows of each criterion, pictures with their sizes,
/// links and pictures called as the medium calls them.
///
/// In the source `{{criterion ID}}` stands for heading, equation, materials, limits and source of a
/// criterion, the heading being the anchor ID; "drawn:NAME" is a picture that the program draws itself,
/// "window:NAME" one of the window.
QString manualHtml(const QString& page, const QString& language, ManualMedium medium);

/// The place of a picture in the folder of the written manual: "pictures/turned.svg".
QString fileOfPicture(const QString& name);

} // namespace planewright
