// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/tick_item.h"

#include "core/figure/metrics.h"
#include "ui/look/font.h"

#include <QFontMetricsF>
#include <QPainter>

#include <algorithm>

namespace planewright {

namespace {

constexpr double labelSize = 12;
/// Below the series, above the grid.
constexpr double depth = 3;
/// Pixels between neighbouring ticks, at least.
constexpr double leastBetween = 44;
/// Pixels that a label of the level axis keeps free to the next.
constexpr double leastGap = 14;

/// No label of the upright axis stands this near below the top of the plot, where the axis has its title.
constexpr double titleClear = 18;

} // namespace

double widthOfTickLabels(const std::vector<std::string>& labels) {
  double width = 0;
  for (const std::string& label : labels)
    width = std::max(width, textWidth({{label}}, labelSize, false));
  return width;
}

TickMarks::TickMarks(const EqualScale& shown) : scale(shown) {
  const QRectF range = scale.range();
  // A coarser step has shorter labels, so this ends after a turn or two.
  for (double between = leastBetween, turns = 0; turns < 4; ++turns) {
    step = tickStep(between / scale.pixelsPerUnit());
    x = ticksBetween(range.left(), range.right(), step);
    y = ticksBetween(range.top(), range.bottom(), step);
    xLabels = tickLabels(x, step);
    yLabels = tickLabels(y, step);
    between = widthOfTickLabels(xLabels) + leastGap;
    if (step * scale.pixelsPerUnit() >= between)
      break;
  }
}

TickItem::TickItem(QGraphicsItem* parent) : QGraphicsItem(parent) {
  setZValue(depth);
}

void TickItem::show(TickMarks marks) {
  prepareGeometryChange();
  m_marks = std::move(marks);
  update();
}

void TickItem::wear(const Look& look) {
  m_look = look;
  update();
}

QRectF TickItem::boundingRect() const {
  const double left = widthOfTickLabels(m_marks.yLabels) + tickGap;
  const double side = widthOfTickLabels(m_marks.xLabels);
  return m_marks.scale.plot().adjusted(-std::max(left, side), -labelSize, side, labelSize + 2 * tickGap);
}

void TickItem::paint(QPainter* painter, const QStyleOptionGraphicsItem*, QWidget*) {
  paintAxes(*painter);
  paintLabels(*painter);
}

void TickItem::paintAxes(QPainter& painter) const {
  const QRectF plot = m_marks.scale.plot();
  const QPointF origin = m_marks.scale.pixelOf({0, 0});
  painter.setRenderHint(QPainter::Antialiasing, false);
  painter.setPen(QPen(m_look.colour(Role::soft), 1));
  if (origin.x() >= plot.left() && origin.x() <= plot.right())
    painter.drawLine(QPointF(origin.x(), plot.top()), QPointF(origin.x(), plot.bottom()));
  if (origin.y() >= plot.top() && origin.y() <= plot.bottom())
    painter.drawLine(QPointF(plot.left(), origin.y()), QPointF(plot.right(), origin.y()));
}

void TickItem::paintLabels(QPainter& painter) const {
  const QFont font = programFont(labelSize);
  const QFontMetricsF metrics(font);
  const QRectF plot = m_marks.scale.plot();
  painter.setFont(font);
  painter.setPen(m_look.colour(Role::soft));
  for (std::size_t i = 0; i < m_marks.x.size(); ++i) {
    const QString label = fromUtf8(m_marks.xLabels[i]);
    const double x = m_marks.scale.pixelOf({m_marks.x[i], 0}).x();
    painter.drawText(
        QPointF(x - metrics.horizontalAdvance(label) / 2, plot.bottom() + tickGap / 2 + metrics.ascent()),
        label);
  }
  for (std::size_t i = 0; i < m_marks.y.size(); ++i) {
    const QString label = fromUtf8(m_marks.yLabels[i]);
    const double y = m_marks.scale.pixelOf({0, m_marks.y[i]}).y();
    if (y < plot.top() + titleClear)
      continue;
    painter.drawText(
        QPointF(plot.left() - tickGap - metrics.horizontalAdvance(label), y + metrics.capHeight() / 2),
        label);
  }
}

} // namespace planewright
