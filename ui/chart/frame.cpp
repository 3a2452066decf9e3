// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/frame.h"

#include "ui/chart/tick_item.h"
#include "ui/chart/zoomed_chart.h"
#include "ui/look/zoom.h"

#include <QChart>
#include <QEvent>
#include <QResizeEvent>
#include <QValueAxis>
#include <QXYSeries>

#include <cmath>

namespace planewright {

namespace {

// Pixels round the plot: a row above for the title of the upright axis, one below for tick labels and one
// more for the title and the words of the level axis.
constexpr double rowAbove = 24;
constexpr double rowsBelow = 38;
constexpr double marginRight = 16;
constexpr double marginLeft = 8;
constexpr double leastExtent = 40;
constexpr QSize least = {240, 200};

/// An axis that only maps: grid, ticks and labels are the frame's own. Those of the chart cost it a layout of
/// every label at each new range, and its softened grid lines cost more than all else in the plot.
QValueAxis* newAxis() {
  auto* axis = new QValueAxis;
  axis->setTickCount(2);
  axis->setGridLineVisible(false);
  axis->setLabelsVisible(false);
  axis->setLineVisible(false);
  axis->setVisible(false);
  return axis;
}

} // namespace

EqualScaleFrame::EqualScaleFrame(QWidget* parent)
    : QChartView(parent), m_x(newAxis()), m_y(newAxis()), m_ticks(new TickItem(chart())) {
  chart()->addAxis(m_x, Qt::AlignBottom);
  chart()->addAxis(m_y, Qt::AlignLeft);
  chart()->legend()->hide();
  chart()->setMargins({});
  chart()->setBackgroundVisible(false);
  chart()->setAnimationOptions(QChart::NoAnimation);
  setViewportUpdateMode(QGraphicsView::BoundingRectViewportUpdate);
  setRenderHint(QPainter::Antialiasing);
  // The view fills its whole ground itself; once is enough.
  viewport()->setAttribute(Qt::WA_OpaquePaintEvent);
  viewport()->setAutoFillBackground(false);
  setFrameShape(QFrame::NoFrame);
  setMinimumSize(least);
  putColours();
}

double EqualScaleFrame::zoom() const {
  return zoomOf(*this, least);
}

void EqualScaleFrame::attach(QXYSeries* series) {
  chart()->addSeries(series);
  series->attachAxis(m_x);
  series->attachAxis(m_y);
}

QPointF EqualScaleFrame::chartPoint(QPointF values) const {
  return (values - m_middle) / m_tick;
}

QRectF EqualScaleFrame::plotFor(double tickWidth) const {
  const double left = marginLeft + tickWidth + tickGap;
  return {left, rowAbove, std::max(leastExtent, extent().width() - left - marginRight),
          std::max(leastExtent, extent().height() - rowAbove - rowsBelow)};
}

void EqualScaleFrame::refit() {
  zoomTo(*this, zoom());
  // Twice, because the width of the tick labels follows from the scale: first with a usual width.
  const EqualScale guess = fittedTo(plotFor(widthOfTickLabels({"\u221200"})));
  showScale(fittedTo(plotFor(widthOfTickLabels(TickMarks(guess).yLabels))));
  arrange();
}

void EqualScaleFrame::showScale(const EqualScale& scale) {
  if (scale == m_scale)
    return;
  m_scale = scale;
  m_tick = TickMarks(scale).step;
  const QRectF range = scale.range();
  m_middle = {std::round(range.center().x() / m_tick) * m_tick,
              std::round(range.center().y() / m_tick) * m_tick};
  const QPointF low = chartPoint(range.topLeft());
  const QPointF high = chartPoint(range.bottomRight());
  if (chart()->plotArea() != scale.plot())
    chart()->setPlotArea(scale.plot());
  if (m_y->isReverse() != scale.yDown())
    m_y->setReverse(scale.yDown());
  m_x->setRange(low.x(), high.x());
  m_y->setRange(low.y(), high.y());
  m_ticks->show(TickMarks(scale));
}

void EqualScaleFrame::putColours() {
  const Look now = look();
  setBackgroundBrush(now.colour(Role::canvas));
  m_ticks->wear(now);
}

void EqualScaleFrame::resizeEvent(QResizeEvent* event) {
  QChartView::resizeEvent(event);
  refit();
}

void EqualScaleFrame::changeEvent(QEvent* event) {
  QChartView::changeEvent(event);
  if (event->type() == QEvent::FontChange)
    return refit();
  if (event->type() != QEvent::PaletteChange)
    return;
  putColours();
  arrange();
}

} // namespace planewright
