// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/map_picture.h"

#include <array>

namespace planewright {

namespace {

constexpr int leastMark =
    2; ///< pixels of the window; patterns below repeat so that each mark shows some of them
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

} // namespace

std::shared_ptr<const MapPicture> mapPicture(MapOrder order, const GoesOn& goesOn) {
  const FieldExtent& extent = *order.field->extent;
  const int size = markSize(extent, order.view, leastMark * order.unit, greatestMark * order.unit);
  auto pixels =
      fieldMapPixels(order.field->reading.field, order.field->results, *order.rows, order.view, size, goesOn);
  if (!pixels)
    return nullptr;
  QImage image(pixels->width, pixels->height, QImage::Format_RGB32);
  const Colours colours(order.look, order.unit);
  std::size_t pixel = 0;
  for (int y = 0; y < image.height(); ++y) {
    auto* line = reinterpret_cast<QRgb*>(image.scanLine(y));
    for (int x = 0; x < image.width(); ++x)
      line[x] = colours.at(pixels->classes[pixel++], x, y);
  }
  return std::make_shared<const MapPicture>(
      MapPicture{std::move(order), *std::move(pixels), std::move(image)});
}

QImage mapPatch(MapClass mapClass, QSize size, int unit, const Look& look) {
  QImage image(size * unit, QImage::Format_RGB32);
  const Colours colours(look, unit);
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      image.setPixel(x, y, colours.at(mapClass, x, y));
  image.setDevicePixelRatio(unit);
  return image;
}

} // namespace planewright
