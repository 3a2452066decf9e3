// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/chart/equal_scale.h"
#include "ui/look/look.h"

#include <QChartView>

class QValueAxis;
class QXYSeries;

namespace planewright {

class TickItem;

/// The frame of a drawing whose two axes have one scale at every shape of the window: plot area, grid, axes
/// through 0, ticks and their labels, in the colours of the widget's own palette. What stands in it, and
/// which values must be seen, is said by the class that derives from it.
///
/// The plot area is set by hand and the ranges follow from it: ranges that are fitted when the chart reports
/// a new plot area do not come to rest at one scale.
class EqualScaleFrame : public QChartView {
  Q_OBJECT

public:
  explicit EqualScaleFrame(QWidget* parent);

  const EqualScale& scale() const { return m_scale; }
  /// The values between two neighbouring ticks.
  double tick() const { return m_tick; }
  Look look() const { return lookOf(*this); }
  /// How much larger than its own pixels the drawing stands in the widget, which follows the size of text.
  double zoom() const;

protected:
  /// The scale that shows what must be seen in a plot of this place and size.
  virtual EqualScale fittedTo(const QRectF& plot) const = 0;
  /// Called after the scale or the colours have changed: everything inside is to be drawn anew.
  virtual void arrange() = 0;

  /// The size of the drawing, and a place of the widget in it.
  QSizeF extent() const { return QSizeF(size()) / zoom(); }
  QPointF inDrawing(QPointF widget) const { return widget / zoom(); }
  /// Fits the scale to the size of the widget, draws the frame and arranges.
  void refit();
  /// Binds a series to the axes; its points are those of `chartPoint`.
  void attach(QXYSeries* series);
  /// Where a pair of values lies in the numbers of the chart's own axes, which count ticks from the tick in
  /// the middle: the chart itself cannot tell ranges below 1e-12 apart and counts ticks in an int.
  QPointF chartPoint(QPointF values) const;

  void resizeEvent(QResizeEvent* event) override;
  void changeEvent(QEvent* event) override;

private:
  void showScale(const EqualScale& scale);
  void putColours();
  QRectF plotFor(double tickWidth) const;

  EqualScale m_scale;
  double m_tick = 1;
  QPointF m_middle;
  QValueAxis* m_x;
  QValueAxis* m_y;
  TickItem* m_ticks;
};

} // namespace planewright
