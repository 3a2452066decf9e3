// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/chart/equal_scale.h"
#include "ui/look/look.h"

#include <QGraphicsItem>

namespace planewright {

/// Pixels between the plot and its tick labels.
inline constexpr double tickGap = 6;

/// The ticks of both axes at one step, with their labels.
struct TickMarks {
  TickMarks() = default;
  explicit TickMarks(const EqualScale& shown);

  EqualScale scale;
  double step = 1;
  std::vector<double> x;
  std::vector<double> y;
  std::vector<std::string> xLabels;
  std::vector<std::string> yLabels;
};

/// Pixels that the widest of the labels takes.
double widthOfTickLabels(const std::vector<std::string>& labels);

/// Grid, axes through 0 and tick labels: the chart's own labels have no true minus.
class TickItem : public QGraphicsItem {
public:
  explicit TickItem(QGraphicsItem* parent);

  void show(TickMarks marks);
  void wear(const Look& look);

  QRectF boundingRect() const override;
  void paint(QPainter* painter, const QStyleOptionGraphicsItem* option, QWidget* widget) override;

private:
  void paintLines(QPainter& painter) const;
  void paintXLabels(QPainter& painter) const;
  void paintYLabels(QPainter& painter) const;

  TickMarks m_marks;
  Look m_look;
};

} // namespace planewright
