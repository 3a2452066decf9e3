// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/standing_mark.h"

#include <QPainter>

namespace planewright {

namespace {

constexpr double stroke = 1.8;

void paintSign(QPainter& painter, const QRectF& box, const QString& sign) {
  QFont font = painter.font();
  font.setBold(true);
  painter.setFont(font);
  painter.drawText(box, Qt::AlignCenter, sign);
}

} // namespace

void paintStandingMark(QPainter& painter, const QRectF& box, Standing standing, const Look& look) {
  painter.save();
  const QColor ink = look.colour(standing == Standing::exceeds ? Role::limit : Role::ink);
  painter.setPen(QPen(ink, stroke));
  switch (standing) {
  case Standing::within:
    painter.drawEllipse(box.adjusted(stroke, stroke, -stroke, -stroke));
    break;
  case Standing::exceeds:
    painter.setBrush(ink);
    painter.setPen(Qt::NoPen);
    painter.drawPolygon(QPolygonF{{box.center().x(), box.top()}, box.bottomRight(), box.bottomLeft()});
    break;
  case Standing::unjudged:
    paintSign(painter, box, QStringLiteral("!"));
    break;
  case Standing::notChecked:
    paintSign(painter, box, QStringLiteral("?"));
    break;
  }
  painter.restore();
}

} // namespace planewright
