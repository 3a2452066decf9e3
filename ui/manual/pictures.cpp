// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/pictures.h"

#include "core/figure/svg.h"
#include "ui/manual/drawings.h"
#include "ui/paint/painter.h"

#include <QFile>
#include <QImageReader>
#include <QPainter>

namespace planewright {

namespace {

QString nameIn(const QString& name) {
  return name.section(QLatin1Char(':'), 1);
}

QString pathOf(const QString& name) {
  return QStringLiteral(":/planewright/manual/pictures/%1.png").arg(nameIn(name));
}

} // namespace

bool isDrawn(const QString& name) {
  return name.startsWith(QLatin1String("drawn:"));
}

bool isPicture(const QString& name) {
  return isDrawn(name) ? drawingNames().contains(nameIn(name))
                       : name.startsWith(QLatin1String("window:")) && QFile::exists(pathOf(name));
}

QSize pictureSize(const QString& name) {
  if (!isPicture(name))
    return {};
  if (!isDrawn(name))
    return QImageReader(pathOf(name)).size();
  const Picture picture = drawing(nameIn(name));
  return {qRound(picture.width), qRound(picture.height)};
}

QImage pictureImage(const QString& name, const Look& look, int width) {
  if (!isPicture(name))
    return {};
  if (!isDrawn(name))
    return QImage(pathOf(name)) // scaled among its few colours it would be dithered
        .convertToFormat(QImage::Format_RGB32)
        .scaledToWidth(width, Qt::SmoothTransformation);
  const Picture picture = drawing(nameIn(name));
  const double scale = width / picture.width;
  QImage image(width, qRound(picture.height * scale), QImage::Format_RGB32);
  image.fill(look.colour(Role::canvas));
  QPainter painter(&image);
  painter.scale(scale, scale);
  paintPicture(painter, picture, look.palette);
  return image;
}

QByteArray pictureFile(const QString& name) {
  if (isDrawn(name))
    return QByteArray::fromStdString(svgOf(drawing(nameIn(name)), Palette::paper));
  QFile file(pathOf(name));
  return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
}

} // namespace planewright
