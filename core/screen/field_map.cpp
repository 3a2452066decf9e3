// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_map.h"

#include "core/strength/judgement.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr std::size_t betweenLooks = 1 << 16; // points

/// The pixels from `from` on that a mark covers along one axis, cut to the picture.
struct Reach {
  int from = 0, to = 0;
};

Reach reachOf(double pixel, int size, int pixels) {
  // Far outside, numbers would not fit an int.
  const double from = std::clamp(std::round(pixel - size / 2.0), -1.0 * size, 1.0 * pixels);
  return {std::max(static_cast<int>(from), 0), std::min(static_cast<int>(from) + size, pixels)};
}

/// Marks into pixels, where one that stands worse covers the others.
class Marks {
public:
  Marks(const FieldResults& results, const MapView& view, int size)
      : m_utilisations(results.utilisations()), m_view(view), m_size(size) {
    const std::size_t pixels = static_cast<std::size_t>(std::max(view.width, 0)) *
                               static_cast<std::size_t>(std::max(view.height, 0));
    m_pixels.width = view.width;
    m_pixels.height = view.height;
    m_pixels.points.assign(pixels, FieldMapPixels::noPoint);
    m_pixels.classes.assign(pixels, MapClass::empty);
  }

  void put(std::uint32_t point, MapClass mapClass, Vec at) {
    const Reach across = reachOf(at.x, m_size, m_view.width);
    const Reach down = reachOf(at.y, m_size, m_view.height);
    for (int y = down.from; y < down.to; ++y)
      for (int x = across.from; x < across.to; ++x)
        put(point, mapClass, m_pixels.indexOf(x, y));
  }

  FieldMapPixels taken() && { return std::move(m_pixels); }

private:
  void put(std::uint32_t point, MapClass mapClass, std::size_t pixel) {
    MapClass& there = m_pixels.classes[pixel];
    std::uint32_t& seen = m_pixels.points[pixel];
    if (mapClass < there || (mapClass == there && (mapClass <= MapClass::notJudged ||
                                                   m_utilisations[point] <= m_utilisations[seen])))
      return;
    there = mapClass;
    seen = point;
  }

  const WideVector<double>& m_utilisations;
  const MapView& m_view;
  int m_size;
  FieldMapPixels m_pixels;
};

} // namespace

MapClass mapClassOf(double utilisation) {
  if (std::isnan(utilisation))
    return MapClass::notJudged;
  if (exceedsLimit(utilisation))
    return MapClass::exceeding;
  const auto end = std::ranges::lower_bound(mapClassEnds.begin(), mapClassEnds.end() - 1, utilisation);
  return static_cast<MapClass>(static_cast<int>(MapClass::upTo50) + (end - mapClassEnds.begin()));
}

bool isPlaced(const Field& field, std::size_t point) {
  return !std::isnan(field.xOf(point)) && !std::isnan(field.yOf(point));
}

std::optional<std::uint32_t> neighbourOf(const Field& field, const std::vector<std::uint32_t>& among,
                                         double x, double y, MapWay way) {
  const bool isAcross = way == MapWay::left || way == MapWay::right;
  const double sign = way == MapWay::right || way == MapWay::up ? 1 : -1;
  std::optional<std::uint32_t> nearest;
  double least = HUGE_VAL;
  for (const std::uint32_t point : among) {
    const double byX = field.xOf(point) - x;
    const double byY = field.yOf(point) - y;
    const double ahead = sign * (isAcross ? byX : byY);
    const double aside = std::abs(isAcross ? byY : byX);
    // A place that is not known is NaN and compares false.
    if (ahead > 0 && aside <= ahead && std::hypot(ahead, aside) < least) {
      least = std::hypot(ahead, aside);
      nearest = point;
    }
  }
  return nearest;
}

std::optional<FieldExtent> extentOf(const Field& field) {
  std::optional<FieldExtent> extent;
  for (std::size_t point = 0; point < field.size(); ++point) {
    if (!isPlaced(field, point))
      continue;
    const double x = field.xOf(point);
    const double y = field.yOf(point);
    if (!extent)
      extent = FieldExtent{x, y, x, y, 0};
    extent->lowX = std::min(extent->lowX, x);
    extent->lowY = std::min(extent->lowY, y);
    extent->highX = std::max(extent->highX, x);
    extent->highY = std::max(extent->highY, y);
    ++extent->points;
  }
  return extent;
}

Vec MapView::pixelOf(double x, double y) const {
  return {width / 2.0 + (x - centreX) * scale, height / 2.0 - (y - centreY) * scale};
}

Vec MapView::placeAt(Vec pixel) const {
  return {centreX + (pixel.x - width / 2.0) / scale, centreY - (pixel.y - height / 2.0) / scale};
}

MapView wholeOf(const FieldExtent& extent, int width, int height, int margin) {
  MapView view;
  view.width = width;
  view.height = height;
  // Halves first: the sum of two great places has no number.
  view.centreX = extent.lowX / 2 + extent.highX / 2;
  view.centreY = extent.lowY / 2 + extent.highY / 2;
  const auto scaleOf = [margin](int pixels, double length) {
    return length > 0 ? std::max(pixels - 2 * margin, 1) / length : HUGE_VAL;
  };
  const double scale =
      std::min(scaleOf(width, extent.highX - extent.lowX), scaleOf(height, extent.highY - extent.lowY));
  if (std::isfinite(scale) && scale > 0)
    view.scale = scale;
  return view;
}

int markSize(const FieldExtent& extent, const MapView& view, int least, int most) {
  const double across = (extent.highX - extent.lowX) * view.scale;
  const double down = (extent.highY - extent.lowY) * view.scale;
  const auto points = static_cast<double>(std::max<std::size_t>(extent.points, 1));
  // On a line there is a row of marks; a little more than the distance closes the gaps of a regular mesh.
  const double apart = std::max(std::sqrt(across * down / points), std::max(across, down) / points);
  return static_cast<int>(
      std::clamp(std::ceil(apart), static_cast<double>(least), static_cast<double>(most)));
}

std::optional<std::uint32_t> FieldMapPixels::pointNear(int x, int y, int reach) const {
  std::optional<std::uint32_t> nearest;
  int least = reach * reach + 1;
  for (int row = std::max(y - reach, 0); row <= std::min(y + reach, height - 1); ++row)
    for (int column = std::max(x - reach, 0); column <= std::min(x + reach, width - 1); ++column) {
      const std::uint32_t point = points[indexOf(column, row)];
      const int distance = (row - y) * (row - y) + (column - x) * (column - x);
      if (point == noPoint || distance >= least)
        continue;
      least = distance;
      nearest = point;
    }
  return nearest;
}

std::optional<FieldMapPixels> fieldMapPixels(const Field& field, const FieldResults& results,
                                             const std::vector<std::uint32_t>& wanted, const MapView& view,
                                             int markSize, const GoesOn& goesOn) {
  std::vector<std::uint8_t> isWanted(field.size(), 0);
  for (const std::uint32_t point : wanted)
    isWanted[point] = 1;
  Marks marks(results, view, markSize);
  for (std::size_t point = 0; point < field.size(); ++point) {
    if (point % betweenLooks == 0 && !goesOn())
      return std::nullopt;
    if (isPlaced(field, point))
      marks.put(static_cast<std::uint32_t>(point),
                isWanted[point] ? mapClassOf(results.utilisations()[point]) : MapClass::notWanted,
                view.pixelOf(field.xOf(point), field.yOf(point)));
  }
  return std::move(marks).taken();
}

} // namespace planewright
