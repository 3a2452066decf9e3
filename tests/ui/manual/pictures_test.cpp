// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/extent.h"
#include "manual_places.h"
#include "ui/manual/drawings.h"
#include "ui/manual/manual.h"
#include "ui/manual/pictures.h"

#include <QSet>

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(ManualPictures, areDrawnInTheColoursOfTheWindow) {
  for (const QString& name : drawingNames()) {
    const QString picture = QStringLiteral("drawn:") + name;
    const int width = pictureSize(picture).width();
    const QImage light = pictureImage(picture, Look{}, width);
    const QImage dark = pictureImage(picture, Look{Palette::dark}, width);
    EXPECT_NE(light, dark) << name.toStdString();
    EXPECT_EQ(QColor(dark.pixel(0, 0)), Look{Palette::dark}.colour(Role::canvas)) << name.toStdString();
    EXPECT_EQ(pictureImage(picture, Look{}, 2 * width).height(), 2 * light.height()) << name.toStdString();
  }
}

TEST(ManualPictures, keepEverythingInTheirFrame) {
  for (const QString& name : drawingNames()) {
    const Picture picture = drawing(name);
    const Box box = extentOf(picture);
    EXPECT_GE(box.left, 0) << name.toStdString();
    EXPECT_GE(box.top, 0) << name.toStdString();
    EXPECT_LE(box.right, picture.width) << name.toStdString();
    EXPECT_LE(box.bottom, picture.height) << name.toStdString();
  }
}

TEST(ManualPictures, areAllShown) {
  QStringList shown;
  for (const QString& page : manualPages())
    shown += allOf(manualSource(page, QStringLiteral("en")), "<img src=\"drawn:([^\"]*)\"");
  const QStringList drawn = drawingNames();
  EXPECT_EQ(QSet<QString>(shown.begin(), shown.end()), QSet<QString>(drawn.begin(), drawn.end()));
}

TEST(ManualPictures, haveFilesOfTheirKind) {
  EXPECT_TRUE(pictureFile(QStringLiteral("drawn:given")).contains("<svg"));
  EXPECT_TRUE(pictureFile(QStringLiteral("window:whole")).startsWith("\x89PNG"));
  EXPECT_TRUE(pictureFile(QStringLiteral("window:nothing")).isEmpty());
  EXPECT_FALSE(isPicture(QStringLiteral("drawn:nothing")));
}

} // namespace
} // namespace planewright
