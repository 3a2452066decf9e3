// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/ring_style.h"

#include "ui/look/look.h"

#include <QApplication>
#include <QImage>
#include <QLabel>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

int pixelsOf(const QImage& image, const QColor& colour) {
  int count = 0;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      if (image.pixelColor(x, y) == colour)
        ++count;
  return count;
}

TEST(RingStyleTest, aLinkThatHasTheKeysWearsTheRing) {
  QApplication::setStyle(new RingStyle);
  QLabel label(QStringLiteral("Go <a href=\"there\">there</a>"));
  label.setTextInteractionFlags(Qt::LinksAccessibleByMouse | Qt::LinksAccessibleByKeyboard);
  label.setContentsMargins(6, 6, 6, 6);
  label.show();
  label.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&label));
  const QColor ring = lookOf(label).colour(Role::focus);
  label.clearFocus();
  EXPECT_EQ(pixelsOf(label.grab().toImage(), ring), 0);
  label.setFocus();
  QTest::keyClick(&label, Qt::Key_Tab);
  EXPECT_GT(pixelsOf(label.grab().toImage(), ring), 60);
}

} // namespace
} // namespace planewright
