// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/look/look.h"

#include <QGraphicsItem>

namespace planewright {

/// A Picture in pixels as one layer of a scene. It is painted anew only when the picture or the colours
/// differ from what stands.
class PictureItem : public QGraphicsItem {
public:
  PictureItem(QGraphicsItem* parent, double depth);

  void show(Picture picture, const Look& look);

  QRectF boundingRect() const override { return m_bounds; }
  void paint(QPainter* painter, const QStyleOptionGraphicsItem* option, QWidget* widget) override;

private:
  Picture m_picture;
  Look m_look;
  QRectF m_bounds;
};

/// The smallest rectangle that holds everything drawn.
QRectF boundsOf(const Picture& picture);

} // namespace planewright
