// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/advances.h"
#include "core/figure/picture.h"
#include "ui/look/font.h"
#include "ui/paint/painter.h"

#include <QFontInfo>
#include <QFontMetricsF>
#include <QImage>
#include <QPainter>

#include <gtest/gtest.h>

namespace planewright {
namespace {

/// Not painted inside a line, so Qt gives it no width; the table's is on the safe side.
constexpr uint softHyphen = 0xAD;

TEST(ProgramFont, IsTheEmbeddedOne) {
  for (const bool bold : {false, true}) {
    const QFontInfo info(programFont(13, bold));
    EXPECT_EQ(info.family(), QStringLiteral("Liberation Sans"));
    EXPECT_EQ(info.bold(), bold);
    EXPECT_EQ(info.pixelSize(), 13);
  }
}

TEST(ProgramFont, HasEveryCharacterOfTheTableOfWidthsAtItsWidth) {
  for (const bool bold : {false, true}) {
    QFont alone = programFont(unitsPerEm, bold);
    alone.setStyleStrategy(QFont::NoFontMerging);
    const QFontMetricsF metrics(alone);
    for (const Advance& row : advanceTable()) {
      const auto code = static_cast<uint>(row.code);
      EXPECT_TRUE(metrics.inFontUcs4(code)) << code;
      if (code == softHyphen)
        continue;
      EXPECT_NEAR(metrics.horizontalAdvance(QString::fromUcs4(&row.code, 1)), bold ? row.bold : row.regular,
                  1e-3 * unitsPerEm)
          << code;
    }
  }
}

TEST(ProgramFont, DoesNotKern) {
  const QFontMetricsF metrics(programFont(2048));
  EXPECT_DOUBLE_EQ(metrics.horizontalAdvance(QStringLiteral("AV")),
                   metrics.horizontalAdvance(QChar('A')) + metrics.horizontalAdvance(QChar('V')));
}

Label labelOf(Vec at, const Runs& runs, double size, Align align = Align::start) {
  return {at, runs, size, align, Role::ink, false, false, "label"};
}

/// The box of everything that is not white.
QRect inked(const QImage& image) {
  QRect box;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      if (qGray(image.pixel(x, y)) < 128)
        box |= QRect(x, y, 1, 1);
  return box;
}

QRect inkedBy(const Label& label, int scale) {
  QImage image(100 * scale, 20 * scale, QImage::Format_RGB32);
  image.fill(Qt::white);
  QPainter painter(&image);
  painter.scale(scale, scale);
  paintPicture(painter, Picture{100, 20, {label}, "", "", {}}, Palette::mono);
  return inked(image);
}

TEST(PaintedLabel, StandsOnItsBaseLineAtItsSizeWhateverTheScale) {
  const Label label = labelOf({10, 10}, {{"HHH", false}}, 2.8);
  for (const int scale : {4, 12, 40}) {
    const QRect box = inkedBy(label, scale);
    EXPECT_NEAR(box.bottom() + 1, 10 * scale, 1.01) << scale;
    // Capitals of this font are 1409 of 2048 units high.
    EXPECT_NEAR(box.height(), 2.8 * 1409 / 2048 * scale, 1.51) << scale;
  }
}

TEST(PaintedLabel, AlignsByItsWholeWidth) {
  const Runs runs{{"HH", false}, {"H", true}};
  const double width = (2 + 0.7) * 1479 / 2048 * 4;
  for (const auto& [align, left] :
       {std::pair{Align::start, 50.0}, {Align::middle, 50 - width / 2}, {Align::end, 50 - width}}) {
    const QRect box = inkedBy(labelOf({50, 10}, runs, 4, align), 20);
    // The stem of an H starts 168 units into its cell.
    EXPECT_NEAR(box.left(), (left + 4 * 168 / 2048.0) * 20, 1.5);
    EXPECT_NEAR(box.bottom() + 1, (10 + 0.22 * 4) * 20, 1.5) << "the index hangs below the base line";
  }
}

TEST(PaintedLabel, GivesOneEmToACharacterThatTheFontLacks) {
  const Runs without{{"HH", false}};
  const Runs with{{"H界H", false}};
  const QRect longer = inkedBy(labelOf({10, 10}, with, 4), 20);
  const QRect shorter = inkedBy(labelOf({10, 10}, without, 4), 20);
  EXPECT_NEAR(longer.right() - shorter.right(), 4 * 20, 1.5);
}

} // namespace
} // namespace planewright
