// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_map.h"
#include "ui/look/look.h"
#include "ui/screen/screened_field.h"

#include <QImage>

namespace planewright {

/// What a map is made of. Pixels are those of the device.
struct MapOrder {
  std::shared_ptr<const ScreenedField> field;
  FieldRows rows; ///< the points that are wanted
  MapView view;
  int unit = 1; ///< pixels of the device for one of the window
  Look look;
  bool operator==(const MapOrder&) const = default;
};

/// A map of a field, made beside the window.
struct MapPicture {
  MapOrder order;
  FieldMapPixels pixels;
  QImage image;
};

/// Pixels of a widget's device for one of the window, as patterns are made of whole ones.
int patternUnit(const QPaintDevice& device);

/// Draws a map; none where it was ended. The order has a field with an extent.
std::shared_ptr<const MapPicture> mapPicture(MapOrder order, const GoesOn& goesOn);

/// A patch of a class as it looks in a map. What exceeds, what is not judged and what a filter keeps back
/// have patterns, so that greys tell them apart too.
QImage mapPatch(MapClass mapClass, QSize size, int unit, const Look& look);

} // namespace planewright
