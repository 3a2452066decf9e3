// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_sharing.h"

#include "core/figure/svg.h"
#include "core/record/embedded_study.h"
#include "ui/files/file_names.h"
#include "ui/look/look.h"
#include "ui/look/printed_numbers.h"
#include "ui/paint/export.h"

#include <QClipboard>
#include <QCoreApplication>
#include <QFileInfo>
#include <QGuiApplication>
#include <QImage>
#include <QMimeData>
#include <QPrintDialog>
#include <QPrinter>
#include <QSettings>

#include <cmath>

namespace planewright {

namespace {

FigureOrder orderOf(const FigureSettings& settings, const QString& studyFile, const QString& caption) {
  FigureOrder order;
  order.width = settings.width;
  order.textPoints = settings.textPoints;
  order.mono = settings.mono;
  order.arrangement = settings.arrangement;
  order.blocks = settings.blocks;
  order.parts = settings.parts;
  order.caption = verbatim(caption.trimmed().toStdString());
  order.studyName = QFileInfo(studyFile).completeBaseName().toStdString();
  order.decimal = chosenDecimalSign();
  order.translate = translation();
  return order;
}

Palette paletteOf(const FigureSettings& settings) {
  return settings.mono ? Palette::mono : Palette::paper;
}

} // namespace

Result<Picture> figureFor(const Study& study, const Readout& readout, const FigureSettings& settings,
                          const QString& studyFile, const QString& caption) {
  return figureOf(study, readout, orderOf(settings, studyFile, caption));
}

Result<Picture> figureFor(const Desk& desk, const FigureSettings& settings, const QString& studyFile,
                          const QString& caption) {
  return figureFor(desk.study(), desk.readout(), settings, studyFile, caption);
}

Result<QByteArray> fileBytes(const Picture& picture, const FigureSettings& settings, const Study& study,
                             const Readout& readout) {
  const std::string carried = settings.carriesStudy ? studyOfFigure(study, readout) : std::string();
  switch (settings.format) {
  case FigureFormat::pdf:
    return pdfOf(picture, paletteOf(settings), carried);
  case FigureFormat::png:
    return pngOf(picture, paletteOf(settings), settings.dpi, carried);
  case FigureFormat::svg:
    break;
  }
  std::string svg = svgOf(picture, paletteOf(settings));
  if (carried.empty())
    return QByteArray::fromStdString(svg);
  return svgWithStudy(std::move(svg), carried).map(&QByteArray::fromStdString);
}

Result<std::unique_ptr<QMimeData>> mimeOf(const Picture& picture, const FigureSettings& settings) {
  const Palette palette = paletteOf(settings);
  const Result<QByteArray> pdf = pdfOf(picture, palette);
  const Result<QByteArray> png = pngOf(picture, palette, settings.dpi);
  if (!pdf || !png)
    return tl::unexpected(pdf ? png.error() : pdf.error());
  auto mime = std::make_unique<QMimeData>();
  mime->setData(QStringLiteral("image/svg+xml"), QByteArray::fromStdString(svgOf(picture, palette)));
  mime->setData(QStringLiteral("application/pdf"), *pdf);
  mime->setImageData(QImage::fromData(*png, "PNG"));
  return mime;
}

QString figureName(const Readout& readout, const QString& studyFile) {
  const QString study = QFileInfo(studyFile).completeBaseName();
  return joinedName({study.isEmpty() ? std::string("figure") : study.toStdString(), readout.point,
                     readout.state().combination});
}

Result<void> copyFigure(const Desk& desk, const QString& studyFile) {
  const FigureSettings settings = rememberedFigure(QSettings());
  const Result<Picture> picture = figureFor(desk, settings, studyFile);
  if (!picture)
    return tl::unexpected(picture.error());
  Result<std::unique_ptr<QMimeData>> mime = mimeOf(*picture, settings);
  if (!mime)
    return tl::unexpected(std::move(mime).error());
  QGuiApplication::clipboard()->setMimeData(mime->release());
  return {};
}

QString printedWords(double part) {
  if (part >= 1)
    return QCoreApplication::translate("Figure", "The figure is printed at its true size.");
  return QCoreApplication::translate(
             "Figure", "The paper does not hold the figure: it is printed at %1 % of its true size.")
      .arg(static_cast<int>(std::floor(100 * part)));
}

Result<QString> printAsked(const Picture& picture, const FigureSettings& settings, QWidget* parent) {
  QPrinter printer(QPrinter::HighResolution);
  printer.setDocName(fromUtf8(picture.title));
  QPrintDialog dialog(&printer, parent);
  if (dialog.exec() != QDialog::Accepted)
    return QString();
  return printPicture(printer, picture, paletteOf(settings)).map(printedWords);
}

Result<QString> printFigure(const Desk& desk, const QString& studyFile, QWidget* parent) {
  const FigureSettings settings = rememberedFigure(QSettings());
  const Result<Picture> picture = figureFor(desk, settings, studyFile);
  if (!picture)
    return tl::unexpected(picture.error());
  return printAsked(*picture, settings, parent);
}

} // namespace planewright
