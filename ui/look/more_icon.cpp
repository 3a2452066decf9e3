// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/more_icon.h"

#include <QApplication>
#include <QIconEngine>
#include <QPainter>
#include <QPalette>

#include <algorithm>

namespace planewright {

namespace {

class Chevrons : public QIconEngine {
public:
  QIconEngine* clone() const override { return new Chevrons(*this); }

  void paint(QPainter* painter, const QRect& rect, QIcon::Mode mode, QIcon::State) override {
    const auto group = mode == QIcon::Disabled ? QPalette::Disabled : QPalette::Active;
    painter->save();
    painter->setRenderHint(QPainter::Antialiasing);
    painter->setPen(QPen(QApplication::palette().color(group, QPalette::ButtonText), 1.5));
    const QPointF middle = QRectF(rect).center();
    const double size = std::min(rect.width(), rect.height()) / 5.0;
    for (const double at : {-size, size / 2}) {
      const QPointF tip = middle + QPointF(at + size, 0);
      painter->drawPolyline(QPolygonF{tip - QPointF(size, size), tip, tip - QPointF(size, -size)});
    }
    painter->restore();
  }
};

} // namespace

QIcon moreIcon() {
  return QIcon(new Chevrons);
}

} // namespace planewright
