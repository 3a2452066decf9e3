// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/paint/export.h"

#include "core/record/embedded_study.h"
#include "core/words/version.h"
#include "ui/look/look.h"
#include "ui/paint/painter.h"

#include <QBuffer>
#include <QCoreApplication>
#include <QImage>
#include <QPainter>
#include <QPdfWriter>
#include <QPrinter>

#include <cmath>

namespace planewright {

namespace {

constexpr double mmPerInch = 25.4;
constexpr double mostPixels = 120e6;
constexpr int pdfResolution = 1200;
constexpr double pointsPerMm = 72 / mmPerInch;

QString creator() {
  return QStringLiteral("Planewright ") + fromUtf8(std::string(programVersion()));
}

Problem resolutionProblem(int dpi) {
  return {"dpi",
          0,
          0,
          std::to_string(dpi),
          PW_TEXT("Export", "A resolution of %1 dpi is out of range.").with(std::to_string(dpi)),
          PW_TEXT("Export", "Take a whole number from %1 to %2.")
              .with(std::to_string(leastDpi))
              .with(std::to_string(greatestDpi))};
}

Problem sizeProblem(int dpi) {
  return {"dpi",
          0,
          0,
          std::to_string(dpi),
          PW_TEXT("Export", "At %1 dpi the picture has too many pixels.").with(std::to_string(dpi)),
          PW_TEXT("Export", "Take a smaller resolution or a narrower figure.")};
}

Problem paintProblem() {
  return {"", 0, 0, "", PW_TEXT("Export", "The figure could not be painted."), {}};
}

/// The smallest page of whole points, which are all that Qt knows, that holds the picture.
QSize pageOf(const Picture& picture) {
  return {static_cast<int>(std::ceil(picture.width * pointsPerMm)),
          static_cast<int>(std::ceil(picture.height * pointsPerMm))};
}

/// Gives each page its true size, the top left corner unmoved, in as many bytes as before: no offset in the
/// file moves. All pages have the size of the picture.
void trimPages(QByteArray& pdf, const Picture& picture) {
  const QByteArray key = "/MediaBox [";
  const int top = pageOf(picture).height();
  const QByteArray box = "0 " + QByteArray::number(top - picture.height * pointsPerMm, 'f', 4) + ' ' +
                         QByteArray::number(picture.width * pointsPerMm, 'f', 4) + ' ' +
                         QByteArray::number(top);
  for (qsizetype at = pdf.indexOf(key); at >= 0; at = pdf.indexOf(key, at)) {
    at += key.size();
    const qsizetype length = pdf.indexOf(']', at) - at;
    if (box.size() <= length)
      pdf.replace(at, length, box.leftJustified(length));
  }
}

} // namespace

Result<QByteArray> pngOf(const Picture& picture, Palette palette, int dpi, std::string_view study) {
  if (dpi < leastDpi || dpi > greatestDpi)
    return tl::unexpected(resolutionProblem(dpi));
  const double scale = dpi / mmPerInch;
  const double across = std::ceil(picture.width * scale - 0.5);
  const double down = std::ceil(picture.height * scale - 0.5);
  if (!(across * down <= mostPixels))
    return tl::unexpected(sizeProblem(dpi));
  QImage image(static_cast<int>(across), static_cast<int>(down), QImage::Format_RGB32);
  if (image.isNull())
    return tl::unexpected(sizeProblem(dpi));
  image.fill(Qt::white);
  const int perMetre = qRound(dpi * 1000 / mmPerInch);
  {
    QPainter painter(&image);
    painter.scale(scale, scale);
    paintPicture(painter, picture, palette);
  }
  image.setDotsPerMeterX(perMetre);
  image.setDotsPerMeterY(perMetre);
  image.setText(QStringLiteral("Title"), fromUtf8(picture.title));
  image.setText(QStringLiteral("Description"), fromUtf8(picture.description));
  image.setText(QStringLiteral("Software"), creator());
  QByteArray bytes;
  QBuffer buffer(&bytes);
  if (!buffer.open(QIODevice::WriteOnly) || !image.save(&buffer, "PNG"))
    return tl::unexpected(paintProblem());
  if (study.empty())
    return bytes;
  return pngWithStudy(bytes.toStdString(), study).map(&QByteArray::fromStdString);
}

Result<QByteArray> pdfOf(const Picture& picture, Palette palette, std::string_view study) {
  return pdfOfPages({picture}, palette, study);
}

Result<QByteArray> pdfOfPages(const std::vector<Picture>& pages, Palette palette, std::string_view study) {
  const Result<std::string> metadata = study.empty() ? std::string() : xmpWithStudy(study);
  if (!metadata)
    return tl::unexpected(metadata.error());
  const Picture& first = pages.front();
  QByteArray bytes;
  QBuffer buffer(&bytes);
  if (!buffer.open(QIODevice::WriteOnly))
    return tl::unexpected(paintProblem());
  {
    QPdfWriter writer(&buffer);
    writer.setTitle(fromUtf8(first.title));
    writer.setCreator(creator());
    writer.setDocumentXmpMetadata(QByteArray::fromStdString(*metadata));
    writer.setResolution(pdfResolution);
    const QPageSize page(pageOf(first), QString(), QPageSize::ExactMatch);
    writer.setPageLayout(QPageLayout(page, QPageLayout::Portrait, QMarginsF()));
    QPainter painter;
    if (!painter.begin(&writer))
      return tl::unexpected(paintProblem());
    painter.scale(pdfResolution / mmPerInch, pdfResolution / mmPerInch);
    for (const Picture& one : pages) {
      if (&one != &first && !writer.newPage())
        return tl::unexpected(paintProblem());
      paintPicture(painter, one, palette);
    }
  }
  trimPages(bytes, first);
  return bytes;
}

namespace {

Problem printerProblem(const QPrinter& printer) {
  return {
      printer.printerName().toStdString(),         0, 0, "", PW_TEXT("Export", "The printer did not start."),
      PW_TEXT("Export", "Choose another printer.")};
}

} // namespace

Result<double> printPicture(QPrinter& printer, const Picture& picture, Palette palette) {
  QPainter painter;
  if (!painter.begin(&printer))
    return tl::unexpected(printerProblem(printer));
  const QSizeF room = printer.pageLayout().paintRect(QPageLayout::Millimeter).size();
  const double fit = std::min({1.0, room.width() / picture.width, room.height() / picture.height});
  painter.scale(fit * printer.logicalDpiX() / mmPerInch, fit * printer.logicalDpiY() / mmPerInch);
  paintPicture(painter, picture, palette);
  return fit;
}

Result<void> printPages(QPrinter& printer, const std::vector<Picture>& pages, Palette palette) {
  printer.setFullPage(true);
  QPainter painter;
  if (!painter.begin(&printer))
    return tl::unexpected(printerProblem(printer));
  const QSizeF paper = printer.pageLayout().fullRect(QPageLayout::Millimeter).size();
  for (const Picture& page : pages) {
    if (&page != &pages.front() && !printer.newPage())
      return tl::unexpected(printerProblem(printer));
    const double fit = std::min({1.0, paper.width() / page.width, paper.height() / page.height});
    painter.save();
    painter.scale(fit * printer.logicalDpiX() / mmPerInch, fit * printer.logicalDpiY() / mmPerInch);
    paintPicture(painter, page, palette);
    painter.restore();
  }
  return {};
}

} // namespace planewright
