// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// The parts of one kind in a picture.
template <class Part>
std::vector<Part> partsOf(const Picture& picture) {
  std::vector<Part> parts;
  for (const auto& part : picture.parts)
    if (const Part* found = std::get_if<Part>(&part))
      parts.push_back(*found);
  return parts;
}

/// The words of the label with this key; empty without one.
inline std::string labelOf(const Picture& picture, std::string_view key) {
  for (const Label& label : partsOf<Label>(picture))
    if (label.key == key)
      return plain(label.runs);
  return {};
}

} // namespace planewright
