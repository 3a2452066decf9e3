// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/tick_item.h"

#include "core/figure/metrics.h"
#include "ui/look/font.h"

#include <QFontMetricsF>
#include <QPainter>
#include <QStyleOptionGraphicsItem>

#include <algorithm>

namespace planewright {

namespace {

constexpr double labelSize = 12;
/// Below the series.
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
  setFlag(ItemUsesExtendedStyleOption); // to be told what is exposed
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

/// A drag inside the plot leaves the labels round it alone.
void TickItem::paint(QPainter* painter, const QStyleOptionGraphicsItem* option, QWidget*) {
  const QRectF plot = m_marks.scale.plot();
  paintLines(*painter);
  painter->setFont(programFont(labelSize));
  painter->setPen(m_look.colour(Role::soft));
  if (option->exposedRect.bottom() > plot.bottom())
    paintXLabels(*painter);
  if (option->exposedRect.left() < plot.left())
    paintYLabels(*painter);
}

void TickItem::paintLines(QPainter& painter) const {
  const EqualScale& scale = m_marks.scale;
  const QRectF plot = scale.plot();
  const auto upright = [&](double value) {
    const double x = scale.pixelOf({value, 0}).x();
    painter.drawLine(QPointF(x, plot.top()), QPointF(x, plot.bottom()));
  };
  const auto level = [&](double value) {
    const double y = scale.pixelOf({0, value}).y();
    painter.drawLine(QPointF(plot.left(), y), QPointF(plot.right(), y));
  };
  painter.setRenderHint(QPainter::Antialiasing, false);
  painter.setPen(QPen(m_look.colour(Role::grid), 1));
  std::ranges::for_each(m_marks.x, upright);
  std::ranges::for_each(m_marks.y, level);
  painter.setPen(QPen(m_look.colour(Role::soft), 1));
  if (std::ranges::count(m_marks.x, 0.0) > 0)
    upright(0);
  if (std::ranges::count(m_marks.y, 0.0) > 0)
    level(0);
}

void TickItem::paintXLabels(QPainter& painter) const {
  const QFontMetricsF metrics(painter.font());
  const double base = m_marks.scale.plot().bottom() + tickGap / 2 + metrics.ascent();
  for (std::size_t i = 0; i < m_marks.x.size(); ++i) {
    const double x = m_marks.scale.pixelOf({m_marks.x[i], 0}).x();
    const double width = widthOfTickLabels({m_marks.xLabels[i]});
    painter.drawText(QPointF(x - width / 2, base), fromUtf8(m_marks.xLabels[i]));
  }
}

void TickItem::paintYLabels(QPainter& painter) const {
  const QFontMetricsF metrics(painter.font());
  const QRectF plot = m_marks.scale.plot();
  for (std::size_t i = 0; i < m_marks.y.size(); ++i) {
    const double y = m_marks.scale.pixelOf({0, m_marks.y[i]}).y();
    if (y < plot.top() + titleClear)
      continue;
    const double width = widthOfTickLabels({m_marks.yLabels[i]});
    painter.drawText(QPointF(plot.left() - tickGap - width, y + metrics.capHeight() / 2),
                     fromUtf8(m_marks.yLabels[i]));
  }
}

} // namespace planewright
