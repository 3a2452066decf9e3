// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/quiet_button.h"

#include "ui/look/look.h"

#include <QPainter>
#include <QPolygonF>

namespace planewright {

namespace {

constexpr int margin = 4;
constexpr int triangleRoom = 13;

} // namespace

QuietButton::QuietButton(const QString& words, Role role, QWidget* parent)
    : QToolButton(parent), m_role(role) {
  setText(words);
  setPopupMode(QToolButton::InstantPopup);
  setFocusPolicy(Qt::TabFocus);
  setCursor(Qt::PointingHandCursor);
}

void QuietButton::setText(const QString& words) {
  QToolButton::setText(words);
  if (!accessibleName().isEmpty() && accessibleName() != words)
    setAccessibleDescription(words);
}

QFont QuietButton::ownFont() const {
  QFont result = font();
  result.setBold(menu() != nullptr);
  return result;
}

QSize QuietButton::sizeHint() const {
  const QFontMetrics metrics(ownFont());
  return {2 * margin + metrics.horizontalAdvance(text()) + (menu() ? triangleRoom : 0), metrics.height() + 6};
}

void QuietButton::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  const QColor colour = look.colour(m_role);
  QFont face = ownFont();
  face.setUnderline(underMouse());
  painter.setFont(face);
  painter.setPen(colour);
  painter.drawText(rect().adjusted(margin, 0, -margin, 0), Qt::AlignLeft | Qt::AlignVCenter, text());
  if (menu()) {
    const QPointF centre(width() - margin - 4, height() / 2.0);
    painter.setPen(Qt::NoPen);
    painter.setBrush(colour);
    painter.drawPolygon(
        QPolygonF{{centre + QPointF(-4, -2), centre + QPointF(4, -2), centre + QPointF(0, 3)}});
  }
  if (hasFocus()) {
    painter.setPen(QPen(look.colour(Role::focus), 2));
    painter.setBrush(Qt::NoBrush);
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 3, 3);
  }
}

} // namespace planewright
