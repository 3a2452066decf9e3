// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/map_picture.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

// Pixels of the window. The patterns below repeat so that the least mark shows some of them.
constexpr int leastMark = 2;
constexpr int greatestMark = 14;

/// The colours of the classes, pixel for pixel.
class Colours {
public:
  Colours(const Look& look, int unit) : m_unit(unit), m_canvas(look.colour(Role::canvas).rgb()) {
    using enum Role;
    constexpr std::array roles = {canvas,     hush,       other,       utilised50,
                                  utilised80, utilised95, utilised100, limit};
    for (std::size_t i = 0; i < roles.size(); ++i)
      m_colours[i] = look.colour(roles[i]).rgb();
  }

  QRgb at(MapClass mapClass, int x, int y) const {
    return isCovered(mapClass, x / m_unit, y / m_unit) ? m_colours[static_cast<std::size_t>(mapClass)]
                                                       : m_canvas;
  }

private:
  static bool isCovered(MapClass mapClass, int x, int y) {
    switch (mapClass) {
    case MapClass::notWanted:
      return x % 2 == 0 && y % 2 == 0;
    case MapClass::notJudged:
      return (x + 2 * y) % 3 == 0;
    case MapClass::exceeding:
      return (x + y) % 4 != 0;
    default:
      return true;
    }
  }

  int m_unit;
  QRgb m_canvas;
  std::array<QRgb, 8> m_colours{};
};

/// An image whose pixels have the classes that `classAt` gives.
template <class ClassAt>
QImage drawn(int width, int height, const Colours& colours, ClassAt classAt) {
  QImage image(width, height, QImage::Format_RGB32);
  for (int y = 0; y < height; ++y) {
    auto* line = reinterpret_cast<QRgb*>(image.scanLine(y));
    for (int x = 0; x < width; ++x)
      line[x] = colours.at(classAt(x, y), x, y);
  }
  return image;
}

} // namespace

int patternUnit(const QPaintDevice& device) {
  return std::max(static_cast<int>(std::lround(device.devicePixelRatioF())), 1);
}

std::shared_ptr<const MapPicture> mapPicture(MapOrder order, const GoesOn& goesOn) {
  const FieldExtent& extent = *order.field->extent;
  const int size = markSize(extent, order.view, leastMark * order.unit, greatestMark * order.unit);
  auto pixels =
      fieldMapPixels(order.field->reading.field, order.field->results, *order.rows, order.view, size, goesOn);
  if (!pixels)
    return nullptr;
  QImage image = drawn(pixels->width, pixels->height, Colours(order.look, order.unit),
                       [&](int x, int y) { return pixels->classes[pixels->indexOf(x, y)]; });
  return std::make_shared<const MapPicture>(
      MapPicture{std::move(order), *std::move(pixels), std::move(image)});
}

QImage mapPatch(MapClass mapClass, QSize size, int unit, const Look& look) {
  QImage image = drawn(size.width() * unit, size.height() * unit, Colours(look, unit),
                       [mapClass](int, int) { return mapClass; });
  image.setDevicePixelRatio(unit);
  return image;
}

} // namespace planewright
