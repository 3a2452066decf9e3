// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element.h"
#include "ui/element/facing.h"
#include "ui/element/side_labels.h"

namespace planewright {

/// What the window adds to a study for its element: how it is looked at, never what it says.
struct ElementGlance {
  QSizeF size;
  bool snapping = true;
  bool givenArrows = false;
  Facing knob; ///< the face that carries the knob
  Facing end;  ///< the end of the line that carries no label of phi
  ElementHandle focused = ElementHandle::none;
  ElementHandle held = ElementHandle::none; ///< in a drag
  bool onSnap = false;                      ///< the held handle rests on a named direction
  std::optional<Sides> sides;               ///< of the labels when the drag was last painted
};

/// The whole panel as one picture in pixels.
struct ElementScene {
  Picture picture;
  Sides sides;
};
ElementScene elementScene(const Study& study, const Readout& readout, const ElementGlance& glance,
                          const Translate& translate);

/// Stroke widths in pixels and the size of texts.
inline constexpr double elementText = 12;

} // namespace planewright
