// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/paint/picture_item.h"

#include "core/figure/metrics.h"
#include "ui/paint/painter.h"

namespace planewright {

namespace {

/// For the softened edge of a stroke.
constexpr double softness = 1;

double reachOf(const std::optional<Pen>& pen) {
  return softness + (pen ? pen->width : 0);
}

struct Bounds {
  QRectF operator()(const Path& path) const {
    if (path.points.empty())
      return {};
    double left = path.points.front().x, right = left;
    double top = path.points.front().y, bottom = top;
    for (const Vec point : path.points) {
      left = std::min(left, point.x);
      right = std::max(right, point.x);
      top = std::min(top, point.y);
      bottom = std::max(bottom, point.y);
    }
    const double reach = reachOf(path.pen);
    return QRectF(left, top, right - left, bottom - top).adjusted(-reach, -reach, reach, reach);
  }
  QRectF operator()(const Arc& arc) const {
    const double reach = arc.radius + reachOf(arc.pen);
    return {arc.centre.x - reach, arc.centre.y - reach, 2 * reach, 2 * reach};
  }
  QRectF operator()(const Label& label) const {
    const Box box = boxOf(label);
    const double high = (ascent - boxOver) * label.size + softness;
    return QRectF(box.left, box.top, box.right - box.left, box.bottom - box.top)
        .adjusted(-softness, -high, softness, softness);
  }
};

} // namespace

QRectF boundsOf(const Picture& picture) {
  QRectF bounds;
  for (const auto& part : picture.parts)
    bounds |= std::visit(Bounds{}, part);
  return bounds;
}

PictureItem::PictureItem(QGraphicsItem* parent, double depth) : QGraphicsItem(parent) {
  setZValue(depth);
}

void PictureItem::show(Picture picture, const Look& look) {
  if (picture == m_picture && look == m_look)
    return;
  prepareGeometryChange();
  m_picture = std::move(picture);
  m_look = look;
  m_bounds = boundsOf(m_picture);
  update();
}

void PictureItem::paint(QPainter* painter, const QStyleOptionGraphicsItem*, QWidget*) {
  paintPicture(*painter, m_picture, m_look.palette);
}

} // namespace planewright
