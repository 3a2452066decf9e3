// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/unit.h"
#include "core/words/names.h"

namespace planewright {

/// The shapes of a cross section, y up, z to the right as seen in the direction of +x.
enum class SectionShape {
  rectangle,
  circle,  ///< solid
  tube,    ///< round and hollow
  box,     ///< rectangular and hollow, sharp corners
  i,       ///< I and H, equal flanges or not, with root fillets or without
  t,       ///< flange at the top
  channel, ///< web towards -z, open towards +z
  built,   ///< of rectangles that touch and do not overlap
  tabled   ///< its values typed in, no drawing
};

template <>
const std::vector<Named<SectionShape>>& namesOf<SectionShape>();

/// Which values a size can have.
enum class SizeRange { positive, zeroOrMore, any };

/// One size of a shape: a row of the table that fields, file and checks share.
struct SizeKind {
  std::string_view key; ///< in files: "t_w"
  Text symbol;          ///< "t_{w}"
  Text meaning;         ///< "thickness of the web"
  Dimension dimension;
  SizeRange range = SizeRange::positive;
  bool optional = false; ///< what is not given is a Problem only where it is needed
};

/// The sizes of a shape in the order of their fields; of `built` those of one of its blocks.
const std::vector<SizeKind>& sizesOf(SectionShape shape);

/// The row of a size by its key, of a block's size with the number in front; null where the shape has no
/// such.
const SizeKind* sizeOfKey(SectionShape shape, std::string_view key);

/// The key of a size of a block of a built section, numbered from 1: "2.turn".
std::string blockKey(int number, std::string_view key);

} // namespace planewright
