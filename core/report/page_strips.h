// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet.h"

#include <memory>

namespace planewright {

using PicturePart = std::variant<Path, Arc, Label>;

/// A strip of a page as wide as its text, that no page break cuts: parts from its upper left corner, mm.
struct PageStrip {
  double before = 0; ///< gap above; none at the top of a page
  double height = 0;
  bool keepsWithNext = false;
  std::vector<PicturePart> parts;
  /// What is repeated above this strip where it is the first of a page: the head of its table.
  std::shared_ptr<const PageStrip> head = nullptr;
};

/// The blocks of a sheet set in strips of this width.
std::vector<PageStrip> stripsOf(const Sheet& sheet, double width, const Translate& translate);

/// A part moved by an offset.
PicturePart moved(PicturePart part, Vec offset);

/// A label with its base line at a place.
Label lettering(Runs runs, double size, Vec at, Role role = Role::ink, bool bold = false,
                Align align = Align::start);

/// Points of type in mm.
constexpr double points(double size) {
  return size * 25.4 / 72;
}

} // namespace planewright
