// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/window_icon.h"

#include "ui/look/look.h"

#include <QPainter>
#include <QPixmap>

namespace planewright {

namespace {

/// Drawn on a square of 64, whatever the size of the pixmap.
void paintSign(QPainter& painter) {
  const Look look{Palette::light};
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setPen(QPen(look.colour(Role::state), 4));
  painter.setBrush(look.colour(Role::canvas));
  painter.drawRoundedRect(QRectF(6, 6, 52, 52), 6, 6);
  painter.setPen(QPen(look.colour(Role::line), 3, Qt::DashLine, Qt::FlatCap));
  painter.drawLine(QPointF(12, 40), QPointF(52, 31));
  painter.setPen(QPen(look.colour(Role::reading), 7, Qt::SolidLine, Qt::FlatCap));
  painter.drawLine(QPointF(22, 10), QPointF(45, 54));
  painter.setPen(QPen(look.colour(Role::reading), 3));
  painter.drawLine(QPointF(33.5, 32), QPointF(48, 24.4));
  painter.setBrush(look.colour(Role::reading));
  painter.drawEllipse(QPointF(49, 24), 4, 4);
}

} // namespace

QIcon windowIcon() {
  QIcon icon;
  for (const int size : {16, 24, 32, 48, 64, 128, 256}) {
    QPixmap pixmap(size, size);
    pixmap.fill(Qt::transparent);
    QPainter painter(&pixmap);
    painter.scale(size / 64.0, size / 64.0);
    paintSign(painter);
    icon.addPixmap(pixmap);
  }
  return icon;
}

} // namespace planewright
