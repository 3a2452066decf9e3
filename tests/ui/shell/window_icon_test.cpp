// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/window_icon.h"

#include <QImage>
#include <QProcess>

#include <gtest/gtest.h>

#include <algorithm>
#include <cstdlib>

namespace planewright {
namespace {

/// The greatest difference of a channel, in 256ths, as the mean over a picture's pixels.
double meanDifference(const QImage& one, const QImage& other) {
  const QImage a = one.convertToFormat(QImage::Format_ARGB32_Premultiplied);
  const QImage b = other.convertToFormat(QImage::Format_ARGB32_Premultiplied);
  double sum = 0;
  for (int y = 0; y < a.height(); ++y)
    for (int x = 0; x < a.width(); ++x) {
      const QRgb p = a.pixel(x, y);
      const QRgb q = b.pixel(x, y);
      sum += std::max({std::abs(qRed(p) - qRed(q)), std::abs(qGreen(p) - qGreen(q)),
                       std::abs(qBlue(p) - qBlue(q)), std::abs(qAlpha(p) - qAlpha(q))});
    }
  return sum / (double(a.width()) * a.height());
}

/// The icons that are installed, as files.
class InstalledIcon : public testing::TestWithParam<int> {
protected:
  const int size = GetParam();
  const QString folder = QStringLiteral(PLANEWRIGHT_TESTS_DIR "/../resources/desktop/icons/");

  QImage kept(const QString& name) const {
    return QImage(folder + QString::number(size) + QLatin1Char('/') + name + QStringLiteral(".png"));
  }
  QImage drawn(const QString& name) const {
    const QString side = QString::number(size);
    QProcess process;
    process.start(QStringLiteral("rsvg-convert"), {QStringLiteral("-w"), side, QStringLiteral("-h"), side,
                                                   folder + name + QStringLiteral(".svg")});
    EXPECT_TRUE(process.waitForFinished());
    return QImage::fromData(process.readAllStandardOutput());
  }
};

// A desktop shows either, the one in its menu and the other for a window of no desktop entry.
TEST_P(InstalledIcon, ShowsWhatTheWindowsIconShows) {
  const QImage icon = windowIcon().pixmap(size).toImage();
  const QImage file = kept(QStringLiteral("planewright"));
  ASSERT_EQ(file.size(), QSize(size, size));
  ASSERT_EQ(icon.size(), file.size());
  // Edges are drawn a little differently; they are the fewer of the pixels the larger it is.
  EXPECT_LT(meanDifference(icon, file), 100.0 / size);
}

// draw-icons in their folder draws them anew.
TEST_P(InstalledIcon, IsDrawnFromItsSvg) {
  for (const char* name : {"planewright", "application-x-planewright-study"}) {
    const QImage file = kept(QLatin1String(name));
    const QImage svg = drawn(QLatin1String(name));
    ASSERT_EQ(file.size(), QSize(size, size)) << name;
    ASSERT_EQ(svg.size(), file.size()) << name;
    EXPECT_LT(meanDifference(svg, file), 1) << name;
  }
}

INSTANTIATE_TEST_SUITE_P(OfEachSize, InstalledIcon, testing::Values(16, 24, 32, 48, 64, 128));

} // namespace
} // namespace planewright
