// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/embedded_study.h"
#include "core/record/study_file.h"
#include "tests/ui/paint/sample.h"
#include "ui/paint/export.h"

#include <QFile>
#include <QImage>
#include <QPrinter>
#include <QProcess>
#include <QRegularExpression>
#include <QTemporaryDir>

#include <gtest/gtest.h>

namespace planewright {
namespace {

QString outputOf(const QString& program, const QStringList& arguments) {
  QProcess process;
  process.start(program, arguments);
  EXPECT_TRUE(process.waitForFinished()) << program.toStdString();
  EXPECT_EQ(process.exitCode(), 0) << process.readAllStandardError().toStdString();
  return QString::fromUtf8(process.readAllStandardOutput());
}

QString written(const QTemporaryDir& folder, const QString& name, const QByteArray& bytes) {
  QFile file(folder.filePath(name));
  EXPECT_TRUE(file.open(QIODevice::WriteOnly));
  file.write(bytes);
  return file.fileName();
}

TEST(Png, StatesTheAskedResolutionAndSize) {
  for (const int dpi : {96, 150, 300, 600}) {
    const auto bytes = pngOf(samplePicture(), Palette::paper, dpi);
    ASSERT_TRUE(bytes);
    const QImage image = QImage::fromData(*bytes, "PNG");
    EXPECT_EQ(qRound(image.dotsPerMeterX() * 0.0254), dpi);
    EXPECT_EQ(image.dotsPerMeterX(), image.dotsPerMeterY());
    EXPECT_NEAR(image.width() / (dpi / 25.4), 90, 0.51 * 25.4 / dpi);
    EXPECT_NEAR(image.height() / (dpi / 25.4), 60, 0.51 * 25.4 / dpi);
    EXPECT_FALSE(image.hasAlphaChannel());
    EXPECT_EQ(image.text(QStringLiteral("Title")), QStringLiteral("Chord & strut <invented>"));
  }
}

TEST(Png, RefusesAResolutionOutOfRangeAndTooManyPixels) {
  EXPECT_EQ(pngOf(samplePicture(), Palette::paper, 49).error().quoted, "49");
  EXPECT_EQ(pngOf(samplePicture(), Palette::paper, 2401).error().quoted, "2401");
  Picture large = samplePicture();
  large.width = large.height = 400;
  EXPECT_EQ(pngOf(large, Palette::paper, 2400).error().quoted, "2400");
  EXPECT_TRUE(pngOf(large, Palette::paper, 300));
}

TEST(Png, OfMonoHoldsNoColour) {
  const QImage image = QImage::fromData(*pngOf(samplePicture(), Palette::mono, 150), "PNG");
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x) {
      const QRgb pixel = image.pixel(x, y);
      ASSERT_TRUE(qRed(pixel) == qGreen(pixel) && qGreen(pixel) == qBlue(pixel)) << x << ' ' << y;
    }
}

TEST(Pdf, HasThePageInTrueMillimetres) {
  QTemporaryDir folder;
  const QString file = written(folder, QStringLiteral("a.pdf"), *pdfOf(samplePicture(), Palette::paper));
  const QString info = outputOf(QStringLiteral("pdfinfo"), {file});
  const auto match = QRegularExpression(QStringLiteral("Page size: +([0-9.]+) x ([0-9.]+) pts")).match(info);
  ASSERT_TRUE(match.hasMatch()) << info.toStdString();
  EXPECT_NEAR(match.captured(1).toDouble() / 72 * 25.4, 90, 0.002);
  EXPECT_NEAR(match.captured(2).toDouble() / 72 * 25.4, 60, 0.002);
  EXPECT_TRUE(info.contains(QStringLiteral("Chord & strut <invented>"))) << info.toStdString();
}

TEST(Pdf, HoldsEveryLabelWholeAsText) {
  QTemporaryDir folder;
  const QString file = written(folder, QStringLiteral("a.pdf"), *pdfOf(samplePicture(), Palette::paper));
  const QString text =
      outputOf(QStringLiteral("pdftotext"), {QStringLiteral("-layout"), file, QStringLiteral("-")});
  for (const auto& part : samplePicture().parts) {
    if (const auto* label = std::get_if<Label>(&part)) {
      const std::string words = plain(label->runs);
      EXPECT_TRUE(text.contains(QString::fromStdString(words))) << words << '\n' << text.toStdString();
    }
  }
}

TEST(Pdf, EmbedsItsFontAndNoPicture) {
  QTemporaryDir folder;
  const QString file = written(folder, QStringLiteral("a.pdf"), *pdfOf(samplePicture(), Palette::paper));
  const QString fonts = outputOf(QStringLiteral("pdffonts"), {file});
  const QStringList lines = fonts.split(QLatin1Char('\n'), Qt::SkipEmptyParts).mid(2);
  EXPECT_EQ(lines.size(), 2) << fonts.toStdString();
  for (const QString& line : lines)
    EXPECT_TRUE(line.contains(QStringLiteral("Liberation")) && line.contains(QStringLiteral(" yes ")))
        << line.toStdString();
  EXPECT_EQ(outputOf(QStringLiteral("pdfimages"), {QStringLiteral("-list"), file}).count(QLatin1Char('\n')),
            2);
}

TEST(Pdf, LooksLikeThePng) {
  QTemporaryDir folder;
  const QString file = written(folder, QStringLiteral("a.pdf"), *pdfOf(samplePicture(), Palette::paper));
  outputOf(QStringLiteral("pdftoppm"),
           {QStringLiteral("-r"), QStringLiteral("150"), QStringLiteral("-png"),
            QStringLiteral("-singlefile"), file, folder.filePath(QStringLiteral("a"))});
  const QImage pdf = QImage(folder.filePath(QStringLiteral("a.png"))).convertToFormat(QImage::Format_RGB32);
  const QImage png = QImage::fromData(*pngOf(samplePicture(), Palette::paper, 150), "PNG");
  ASSERT_NEAR(pdf.width(), png.width(), 1);
  ASSERT_NEAR(pdf.height(), png.height(), 1);
  int far = 0;
  for (int y = 0; y < std::min(pdf.height(), png.height()); ++y)
    for (int x = 0; x < std::min(pdf.width(), png.width()); ++x)
      far += std::abs(qGray(pdf.pixel(x, y)) - qGray(png.pixel(x, y))) > 100 ? 1 : 0;
  EXPECT_LT(far, png.width() * png.height() / 500);
}

TEST(Png, CarriesAStudyAndLooksTheSame) {
  const std::string study = writeStudy(newStudy());
  const QByteArray png = *pngOf(samplePicture(), Palette::paper, 150, study);
  EXPECT_EQ(carriedStudy(png.toStdString())->value(), study);
  const QByteArray without = *pngOf(samplePicture(), Palette::paper, 150);
  EXPECT_FALSE(*carriedStudy(without.toStdString()));
  EXPECT_EQ(QImage::fromData(png, "PNG"), QImage::fromData(without, "PNG"));
  EXPECT_EQ(QImage::fromData(png, "PNG").dotsPerMeterX(), QImage::fromData(without, "PNG").dotsPerMeterX());
}

TEST(Png, OpensAlsoWithAStudyThatReadersOfPicturesFindTooLong) {
  constexpr std::size_t longest = 8000000; // bytes of one chunk of text that libpng takes
  const QByteArray png = *pngOf(samplePicture(), Palette::paper, 96, std::string(longest, ' '));
  EXPECT_GT(QImage::fromData(png, "PNG").width(), 300);
  EXPECT_EQ(carriedStudy(png.toStdString())->value().size(), longest);
}

TEST(Pdf, CarriesAStudyInItsMetadataAndLooksTheSame) {
  QTemporaryDir folder;
  const std::string study = writeStudy(newStudy());
  const QByteArray pdf = *pdfOf(samplePicture(), Palette::paper, study);
  EXPECT_EQ(carriedStudy(pdf.toStdString())->value(), study);
  const QByteArray without = *pdfOf(samplePicture(), Palette::paper);
  EXPECT_FALSE(*carriedStudy(without.toStdString()));
  const QString file = written(folder, QStringLiteral("with.pdf"), pdf);
  const QString other = written(folder, QStringLiteral("without.pdf"), without);
  EXPECT_TRUE(outputOf(QStringLiteral("pdfinfo"), {QStringLiteral("-meta"), file})
                  .contains(QStringLiteral("planewright-study")));
  for (const QString& program : {QStringLiteral("pdftotext"), QStringLiteral("pdftoppm")}) {
    const auto seen = [&](const QString& name) {
      return program == QStringLiteral("pdftotext") ? outputOf(program, {name, QStringLiteral("-")})
                                                    : outputOf(program, {name});
    };
    EXPECT_EQ(seen(file), seen(other)) << program.toStdString();
    EXPECT_FALSE(seen(file).isEmpty());
  }
}

/// The width in mm of what is not white on the first page of a PDF.
double inkedWidth(const QTemporaryDir& folder, const QString& pdf) {
  outputOf(QStringLiteral("pdftoppm"),
           {QStringLiteral("-r"), QStringLiteral("127"), QStringLiteral("-png"),
            QStringLiteral("-singlefile"), pdf, folder.filePath(QStringLiteral("p"))});
  const QImage page(folder.filePath(QStringLiteral("p.png")));
  int left = page.width();
  int right = -1;
  for (int y = 0; y < page.height(); ++y)
    for (int x = 0; x < page.width(); ++x)
      if (qGray(page.pixel(x, y)) < 200) {
        left = std::min(left, x);
        right = std::max(right, x);
      }
  return (right + 1 - left) / 5.0; // 127 dpi are 5 pixels a mm
}

TEST(Print, IsOfTrueSizeWhereThePageHoldsIt) {
  QTemporaryDir folder;
  for (const auto& [width, expected] : {std::pair{90.0, 86.0}, {360.0, 356.0 * 190 / 360}}) {
    QPrinter printer(QPrinter::HighResolution);
    printer.setOutputFormat(QPrinter::PdfFormat);
    printer.setOutputFileName(folder.filePath(QStringLiteral("print.pdf")));
    printer.setPageSize(QPageSize(QPageSize::A4));
    printer.setPageMargins(QMarginsF(10, 10, 10, 10), QPageLayout::Millimeter);
    Picture picture = samplePicture();
    picture.width = width;
    picture.parts = {Path{{{2, 8}, {width - 2, 8}}, false, Pen{Role::ink, 0.5, Dash::solid}, {}}};
    const Result<double> part = printPicture(printer, picture, Palette::paper);
    ASSERT_TRUE(part);
    EXPECT_NEAR(*part, expected / (width - 4), 0.001) << width;
    EXPECT_NEAR(inkedWidth(folder, folder.filePath(QStringLiteral("print.pdf"))), expected, 0.5) << width;
  }
}

} // namespace
} // namespace planewright
