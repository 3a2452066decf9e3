// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/ring_style.h"

#include "ui/look/look.h"

#include <QAbstractButton>
#include <QPainter>
#include <QStyleOption>

namespace planewright {

RingStyle::RingStyle() : QProxyStyle(QStringLiteral("Fusion")) {}

void RingStyle::drawPrimitive(PrimitiveElement element, const QStyleOption* option, QPainter* painter,
                              const QWidget* widget) const {
  if (element != PE_FrameFocusRect || !qobject_cast<const QAbstractButton*>(widget))
    return QProxyStyle::drawPrimitive(element, option, painter, widget);
  painter->save();
  painter->setRenderHint(QPainter::Antialiasing);
  painter->setPen(QPen(lookOf(*widget).colour(Role::focus), 2));
  painter->setBrush(Qt::NoBrush);
  painter->drawRoundedRect(QRectF(option->rect).adjusted(1, 1, -1, -1), 3, 3);
  painter->restore();
}

} // namespace planewright
