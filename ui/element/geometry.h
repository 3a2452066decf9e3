// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element_frame.h"

#include <QPointF>
#include <QSizeF>

#include <optional>

namespace planewright {

/// What can be taken hold of on the element.
enum class ElementHandle { none, reading, line };

/// Pixels and angles of the element in a window of a given size: a value, tested without a window.
struct ElementGeometry {
  ElementFrame frame;
  bool compact = false; ///< too narrow for labels at the sides

  Vec pixel(Angle direction, double radius) const { return frame.at(direction, radius); }
  /// The direction of a pixel from the x axis, in (-180, 180]; none near the centre, where it means nothing.
  std::optional<Angle> directionOf(QPointF at) const;
  /// The motion round the centre from one pixel to another, in (-180, 180]; none near the centre.
  std::optional<Angle> motion(QPointF from, QPointF to) const;
  /// The handle under a pixel: targets are at least 24 px wide. Where the targets of knob and bar meet, the
  /// radius decides. `knob` is the knob's direction; without a line there are no bars.
  ElementHandle handleAt(QPointF at, Angle knob, std::optional<Angle> line) const;
  /// The turn that makes this many pixels of arc at a handle.
  Angle arcOf(double pixels, ElementHandle handle) const;
};

/// The largest element that leaves room for heading, letters, side labels and caption. A drawing inclined by
/// `axes` keeps more room below, where a letter may come to stand.
ElementGeometry fittedElement(QSizeF size, Angle axes);

/// Heights of the heading above and of the caption below the drawing, in pixels.
inline constexpr double headingHeight = 32;
inline constexpr double captionHeight = 42;
/// A narrower element has no labels at its sides.
inline constexpr double compactBelow = 400;

} // namespace planewright
