// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/sense_picture.h"

#include <QPainter>
#include <QPolygonF>

#include <cmath>

namespace planewright {

namespace {

constexpr qreal headLength = 0.09;
constexpr qreal headWidth = 0.035;

enum class Barbs { both, left, right };

/// An arrow; shear is drawn with one barb, left or right as seen along the arrow.
void arrow(QPainter& painter, QPointF from, QPointF to, qreal size, Barbs barbs) {
  painter.drawLine(from, to);
  const QPointF way = to - from;
  const QPointF along = way / std::hypot(way.x(), way.y()) * size;
  const QPointF back = to - headLength * along;
  const QPointF left = headWidth * QPointF(along.y(), -along.x());
  if (barbs == Barbs::both)
    painter.drawPolygon(QPolygonF{to, back + left, back - left});
  else
    painter.drawPolygon(QPolygonF{to, back + (barbs == Barbs::left ? 1.5 : -1.5) * left, back});
}

} // namespace

void paintSense(QPainter& painter, const QRectF& box, Positive positive, const Look& look) {
  const qreal size = qMin(box.width(), box.height());
  const qreal half = 0.19 * size;
  const bool outward = positive == Positive::tension;
  const QColor colour = look.colour(Role::state);
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.translate(box.center());
  painter.setPen(QPen(colour, 1.5));
  painter.setBrush(look.colour(Role::canvas));
  painter.drawRect(QRectF(-half, -half, 2 * half, 2 * half));
  painter.setPen(QPen(colour, 1.2));
  painter.setBrush(colour);
  for (int face = 0; face < 4; ++face) { // each time the face at the right, y up by the turn of the painter
    const QPointF root(half + 0.09 * size, 0);
    const QPointF tip(half + 0.29 * size, 0);
    arrow(painter, outward ? root : tip, outward ? tip : root, size, Barbs::both);
    // On the faces x and -x a positive shear runs along +y and -y, on y and -y along +x and -x.
    const qreal run = (face % 2 == 0) == outward ? -1 : 1;
    const qreal beside = half + 0.05 * size;
    const QPointF foot(beside, -run * 0.8 * half);
    const QPointF end(beside, run * 0.8 * half);
    arrow(painter, foot, end, size, run > 0 ? Barbs::left : Barbs::right);
    painter.rotate(90);
  }
  painter.restore();
}

void paintShearAxis(QPainter& painter, const QRectF& box, ShearAxis axis, const Look& look) {
  const qreal size = qMin(box.width(), box.height());
  const qreal down = axis == ShearAxis::tensorDown ? 1 : -1;
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.translate(box.center());
  painter.setBrush(Qt::NoBrush);
  painter.setPen(QPen(look.colour(Role::soft), 1));
  painter.drawLine(QPointF(-0.46 * size, 0), QPointF(0.46 * size, 0));
  painter.setPen(QPen(look.colour(Role::state), 1.5));
  painter.drawEllipse(QPointF(0.1 * size, 0), 0.24 * size, 0.24 * size);
  painter.setPen(QPen(look.colour(Role::ink), 1.2));
  painter.setBrush(look.colour(Role::ink));
  const qreal axisX = -0.3 * size;
  arrow(painter, {axisX, -down * 0.4 * size}, {axisX, down * 0.4 * size}, size, Barbs::both);
  // The reading turns counter-clockwise on the body; on the circle with its axis upwards it turns clockwise.
  const QColor reading = look.colour(Role::reading);
  painter.setPen(QPen(reading, 1.5));
  painter.setBrush(Qt::NoBrush);
  const QRectF arc(QPointF(-0.25 * size, -0.35 * size), QSizeF(0.7 * size, 0.7 * size));
  painter.drawArc(arc, static_cast<int>(5 * 16 * down), static_cast<int>(50 * 16 * down));
  const qreal angle = 60 * 3.14159265358979 / 180;
  const QPointF tip(0.1 * size + 0.35 * size * std::cos(angle), -down * 0.35 * size * std::sin(angle));
  const QPointF back = tip + QPointF(std::sin(angle), down * std::cos(angle)) * (0.05 * size);
  painter.setBrush(reading);
  arrow(painter, back, tip + (tip - back), size, Barbs::both);
  painter.restore();
}

} // namespace planewright
