// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QPointF>
#include <QRectF>

#include <string>
#include <vector>

namespace planewright {

/// What must be seen along one axis: the values low..high, and pixels kept free beyond each end of them.
struct Need {
  double low = 0;
  double high = 0;
  double padLow = 0;
  double padHigh = 0;
};

/// Pixels per unit at which all needs just fit into `pixels`; infinity when they have no extent.
double greatestScale(const std::vector<Need>& needs, double pixels);
/// The value in the middle of the axis when the slack is shared by both ends.
double middleOf(const std::vector<Need>& needs, double scale);

/// One scale for both axes of a plot: where a pair of values lies in pixels, and back.
class EqualScale {
public:
  EqualScale() = default;
  /// `centre` holds the values in the middle of the plot. With `yDown` the second value grows downwards.
  EqualScale(QRectF plot, QPointF centre, double pixelsPerUnit, bool yDown);

  const QRectF& plot() const { return m_plot; }
  double pixelsPerUnit() const { return m_pixelsPerUnit; }
  bool yDown() const { return m_yDown; }

  QPointF pixelOf(QPointF values) const;
  QPointF valuesAt(QPointF pixel) const;
  /// Lowest values of both axes in the point, extents in the size.
  QRectF range() const;

  /// Exact, unlike the comparison of Qt's points.
  bool operator==(const EqualScale& other) const;

private:
  QRectF m_plot{0, 0, 1, 1};
  QPointF m_centre;
  double m_pixelsPerUnit = 1;
  bool m_yDown = false;
};

/// The least of 1, 2 or 5 times a power of ten that is at least `least`, which is greater than 0.
double tickStep(double least);
/// The whole multiples of `step` from low to high, both included; 0 is one of them when it lies between.
std::vector<double> ticksBetween(double low, double high, double step);

/// The labels of ticks, with U+2212 for minus: "−0.5", and "2e−7" where decimals would not do.
std::vector<std::string> tickLabels(const std::vector<double>& ticks, double step);

} // namespace planewright
