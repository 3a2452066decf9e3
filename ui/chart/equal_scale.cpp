// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/equal_scale.h"

#include "core/quantity/format.h"

#include <algorithm>
#include <charconv>
#include <cmath>
#include <limits>
#include <tuple>

namespace planewright {

double greatestScale(const std::vector<Need>& needs, double pixels) {
  double scale = std::numeric_limits<double>::infinity();
  for (const Need& left : needs)
    for (const Need& right : needs) {
      const double extent = right.high - left.low;
      if (extent > 0)
        scale = std::min(scale, std::max(1.0, pixels - left.padLow - right.padHigh) / extent);
    }
  return scale;
}

double middleOf(const std::vector<Need>& needs, double scale) {
  double low = std::numeric_limits<double>::infinity();
  double high = -low;
  for (const Need& need : needs) {
    low = std::min(low, need.low - need.padLow / scale);
    high = std::max(high, need.high + need.padHigh / scale);
  }
  return low + (high - low) / 2;
}

EqualScale::EqualScale(QRectF plot, QPointF centre, double pixelsPerUnit, bool yDown)
    : m_plot(plot), m_centre(centre), m_pixelsPerUnit(pixelsPerUnit), m_yDown(yDown) {}

QPointF EqualScale::pixelOf(QPointF values) const {
  const QPointF away = (values - m_centre) * m_pixelsPerUnit;
  return m_plot.center() + QPointF(away.x(), m_yDown ? away.y() : -away.y());
}

QPointF EqualScale::valuesAt(QPointF pixel) const {
  const QPointF away = pixel - m_plot.center();
  return m_centre + QPointF(away.x(), m_yDown ? away.y() : -away.y()) / m_pixelsPerUnit;
}

QRectF EqualScale::range() const {
  const QSizeF extent = m_plot.size() / m_pixelsPerUnit;
  return {m_centre - QPointF(extent.width(), extent.height()) / 2, extent};
}

bool EqualScale::operator==(const EqualScale& other) const {
  const auto numbers = [](const EqualScale& scale) {
    const QRectF& plot = scale.m_plot;
    return std::tuple(plot.x(), plot.y(), plot.width(), plot.height(), scale.m_centre.x(), scale.m_centre.y(),
                      scale.m_pixelsPerUnit, scale.m_yDown);
  };
  return numbers(*this) == numbers(other);
}

double tickStep(double least) {
  const double decade = std::pow(10.0, std::floor(std::log10(least)));
  for (const double times : {1.0, 2.0, 5.0})
    if (times * decade >= least * (1 - 1e-12))
      return times * decade;
  return 10 * decade;
}

std::vector<double> ticksBetween(double low, double high, double step) {
  constexpr double most = 1000;
  std::vector<double> ticks;
  const double first = std::ceil(low / step - 1e-9);
  const double last = std::floor(high / step + 1e-9);
  for (double i = first; i <= last && i - first < most; ++i)
    ticks.push_back(i * step + 0.0);
  return ticks;
}

namespace {

/// Scientific form with just the digits that tell neighbouring ticks apart.
std::string scientific(double value, int digits) {
  char buffer[64];
  const auto end =
      std::to_chars(buffer, buffer + sizeof buffer, value, std::chars_format::scientific, digits);
  std::string text(buffer, end.ptr);
  const std::size_t e = text.find('e');
  int exponent = 0;
  std::from_chars(text.data() + e + (text[e + 1] == '+' ? 2 : 1), text.data() + text.size(), exponent);
  text = text.substr(0, e) + "e" + std::to_string(exponent);
  std::string shown;
  for (const char character : text)
    shown += character == '-' ? "\u2212" : std::string(1, character);
  return shown;
}

} // namespace

std::vector<std::string> tickLabels(const std::vector<double>& ticks, double step) {
  constexpr int mostPlaces = 6;
  double largest = step;
  for (const double tick : ticks)
    largest = std::max(largest, std::abs(tick));
  const int stepPlace = static_cast<int>(std::floor(std::log10(step) + 1e-9));
  const int topPlace = static_cast<int>(std::floor(std::log10(largest) + 1e-9));
  std::vector<std::string> labels;
  for (const double tick : ticks) {
    const bool plainForm = stepPlace >= -mostPlaces && topPlace < mostPlaces;
    labels.push_back(tick == 0   ? "0"
                     : plainForm ? shownNumber(tick, std::max(0, -stepPlace))
                                 : scientific(tick, std::clamp(topPlace - stepPlace, 0, 15)));
  }
  return labels;
}

} // namespace planewright
