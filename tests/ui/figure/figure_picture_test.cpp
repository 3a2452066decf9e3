// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/figure.h"
#include "core/figure/svg.h"
#include "core/study/edit.h"
#include "ui/paint/export.h"

#include <QFile>
#include <QImage>
#include <QProcess>
#include <QTemporaryDir>

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study study() {
  const std::string point = "P1";
  const Edits edits = {Type{{Spot::sx, point, "G"}, "8.4 MPa"},
                       Type{{Spot::sy, point, "G"}, "-0.6 MPa"},
                       Type{{Spot::txy, point, "G"}, "2.1 MPa"},
                       Type{{Spot::lineAngle, point, "grain"}, "1 in 10"},
                       Type{{Spot::lineTolerance, point, "grain"}, "3 deg"},
                       Type{{Spot::pointNote, point, ""}, "chord & strut <invented>"},
                       Type{{Spot::reading, point, ""}, "30 deg"}};
  return *edited(newStudy(), edits);
}

Picture figure(double width, bool mono = false) {
  FigureOrder order;
  order.width = width;
  order.mono = mono;
  const Study shown = study();
  return *figureOf(shown, evaluate(shown), order);
}

/// The files of one picture, and what other programs make of them.
class FigurePicture : public testing::TestWithParam<double> {
protected:
  QString write(const char* name, const QByteArray& bytes) const {
    QFile file(m_folder.filePath(QString::fromLatin1(name)));
    EXPECT_TRUE(file.open(QIODevice::WriteOnly));
    file.write(bytes);
    return file.fileName();
  }
  QByteArray outputOf(const char* program, const QStringList& arguments) const {
    QProcess process;
    process.start(QString::fromLatin1(program), arguments);
    EXPECT_TRUE(process.waitForFinished()) << program;
    EXPECT_EQ(process.exitCode(), 0) << process.readAllStandardError().toStdString();
    return process.readAllStandardOutput();
  }
  QImage drawnBy(const char* program, const QStringList& arguments) const {
    return QImage::fromData(outputOf(program, arguments)).convertToFormat(QImage::Format_RGB32);
  }

private:
  QTemporaryDir m_folder;
};

/// Share of the pixels that are light in one picture and dark in the other, at half size so that edges count
/// little.
double farShare(const QImage& a, const QImage& b) {
  const QSize half(a.width() / 2, a.height() / 2);
  const QImage first = a.scaled(half, Qt::IgnoreAspectRatio, Qt::SmoothTransformation);
  const QImage second = b.scaled(half, Qt::IgnoreAspectRatio, Qt::SmoothTransformation);
  int far = 0;
  for (int y = 0; y < half.height(); ++y)
    for (int x = 0; x < half.width(); ++x)
      far += std::abs(qGray(first.pixel(x, y)) - qGray(second.pixel(x, y))) > 110 ? 1 : 0;
  return far / double(half.width() * half.height());
}

TEST_P(FigurePicture, LooksTheSameInAllThreeFormats) {
  const Picture picture = figure(GetParam());
  const QImage png = QImage::fromData(*pngOf(picture, Palette::paper, 150), "PNG");
  const QString pdf = write("a.pdf", *pdfOf(picture, Palette::paper));
  const QString svg = write("a.svg", QByteArray::fromStdString(svgOf(picture, Palette::paper)));
  const auto word = [](const char* text) { return QString::fromLatin1(text); };
  const QImage fromPdf = drawnBy("pdftoppm", {word("-r"), word("150"), word("-png"), pdf});
  const QImage fromSvg = drawnBy("rsvg-convert", {word("-d"), word("150"), word("-p"), word("150"), svg});
  for (const QImage& image : {fromPdf, fromSvg}) {
    ASSERT_NEAR(image.width(), png.width(), 1);
    ASSERT_NEAR(image.height(), png.height(), 1);
    EXPECT_LT(farShare(png, image), 0.002);
  }
}

TEST_P(FigurePicture, HasEveryLabelWholeInThePdf) {
  const Picture picture = figure(GetParam());
  const QString pdf = write("a.pdf", *pdfOf(picture, Palette::paper));
  const QString text = QString::fromUtf8(outputOf("pdftotext", {pdf, QStringLiteral("-")}));
  int labels = 0;
  for (const auto& part : picture.parts)
    if (const auto* label = std::get_if<Label>(&part)) {
      EXPECT_TRUE(text.contains(QString::fromStdString(plain(label->runs)))) << plain(label->runs);
      ++labels;
    }
  EXPECT_GT(labels, 40);
}

TEST_P(FigurePicture, IsSmallEnoughForADocument) {
  const Picture picture = figure(GetParam());
  EXPECT_LT(pdfOf(picture, Palette::paper)->size(), 100 * 1024);
  EXPECT_LT(svgOf(picture, Palette::paper).size(), 100U * 1024);
}

TEST_P(FigurePicture, InMonoHoldsNoColour) {
  const QImage image = QImage::fromData(*pngOf(figure(GetParam(), true), Palette::mono, 100), "PNG");
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x) {
      const QRgb pixel = image.pixel(x, y);
      ASSERT_TRUE(qRed(pixel) == qGreen(pixel) && qGreen(pixel) == qBlue(pixel)) << x << ' ' << y;
    }
}

INSTANTIATE_TEST_SUITE_P(Widths, FigurePicture, testing::Values(90, 160, 220));

} // namespace
} // namespace planewright
