// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_shape.h"

#include "core/quantity/format.h"
#include "core/source/written_units.h"

#include <algorithm>
#include <array>

namespace planewright {

template <>
const std::vector<Named<SectionShape>>& namesOf() {
  static const std::vector<Named<SectionShape>> names = {
      {SectionShape::rectangle, "rectangle", PW_TEXT("Source", "rectangle")},
      {SectionShape::circle, "circle", PW_TEXT("Source", "solid circle")},
      {SectionShape::tube, "tube", PW_TEXT("Source", "round tube")},
      {SectionShape::box, "box", PW_TEXT("Source", "rectangular hollow section")},
      {SectionShape::i, "i", PW_TEXT("Source", "I or H section")},
      {SectionShape::t, "t", PW_TEXT("Source", "T section, flange at the top")},
      {SectionShape::channel, "channel", PW_TEXT("Source", "channel, open towards +z")},
      {SectionShape::built, "built", PW_TEXT("Source", "built of rectangles")},
      {SectionShape::tabled, "tabled", PW_TEXT("Source", "tabled values")}};
  return names;
}

namespace {

using Sizes = std::vector<SizeKind>;
using dimension::area;
constexpr Dimension third = dimension::firstMoment;
constexpr Dimension fourth = dimension::secondMoment;

SizeKind length(std::string_view key, std::string_view shown, Text meaning,
                SizeRange range = SizeRange::positive) {
  return {key, symbol(shown), std::move(meaning), dimension::length, range};
}

SizeKind tabled(std::string_view key, std::string_view shown, Text meaning, Dimension dimension,
                SizeRange range = SizeRange::positive) {
  return {key, symbol(shown), std::move(meaning), dimension, range, true};
}

Sizes widthAndDepth() {
  return {length("b", "b", PW_TEXT("Source", "width")), length("h", "h", PW_TEXT("Source", "depth"))};
}

SizeKind web() {
  return length("t_w", "t_{w}", PW_TEXT("Source", "thickness of the web"));
}

Sizes ofI() {
  return {length("h", "h", PW_TEXT("Source", "depth")),
          web(),
          length("b_top", "b_{top}", PW_TEXT("Source", "width of the top flange")),
          length("t_top", "t_{top}", PW_TEXT("Source", "thickness of the top flange")),
          length("b_bottom", "b_{bot}", PW_TEXT("Source", "width of the bottom flange")),
          length("t_bottom", "t_{bot}", PW_TEXT("Source", "thickness of the bottom flange")),
          length("r", "r", PW_TEXT("Source", "radius of the root fillets"), SizeRange::zeroOrMore)};
}

Sizes withFlange() {
  return {length("h", "h", PW_TEXT("Source", "depth")),
          length("b", "b", PW_TEXT("Source", "width of the flange")), web(),
          length("t_f", "t_{f}", PW_TEXT("Source", "thickness of the flange"))};
}

Sizes ofBlock() {
  Sizes sizes = widthAndDepth();
  sizes.push_back(length("y", "y", PW_TEXT("Source", "height of the block's middle"), SizeRange::any));
  sizes.push_back(
      length("z", "z", PW_TEXT("Source", "place of the block's middle to the right"), SizeRange::any));
  sizes.push_back({"turn", symbol("ψ"), PW_TEXT("Source", "turn of the block, from +z towards +y"),
                   dimension::angle, SizeRange::any});
  return sizes;
}

Sizes ofTable() {
  return {
      tabled("A", "A", PW_TEXT("Source", "area"), area),
      tabled("I_z", "I_{z}", PW_TEXT("Source", "second moment about z"), fourth),
      tabled("I_y", "I_{y}", PW_TEXT("Source", "second moment about y"), fourth),
      tabled("W_z", "W_{z}", PW_TEXT("Source", "section modulus about z of the fibre"), third),
      tabled("W_y", "W_{y}", PW_TEXT("Source", "section modulus about y of the fibre"), third),
      tabled("S_z", "S_{z}", PW_TEXT("Source", "first moment about z of the part beyond the fibre"), third,
             SizeRange::zeroOrMore),
      tabled("b_y", "b_{y}", PW_TEXT("Source", "width of the cut at the fibre's height"), dimension::length),
      tabled("S_y", "S_{y}", PW_TEXT("Source", "first moment about y of the part beyond the fibre"), third,
             SizeRange::zeroOrMore),
      tabled("b_z", "b_{z}", PW_TEXT("Source", "depth of the upright cut at the fibre"), dimension::length),
      tabled("J", "J", PW_TEXT("Source", "torsion constant"), fourth)};
}

} // namespace

const std::vector<SizeKind>& sizesOf(SectionShape shape) {
  static const std::array<Sizes, 9> sizes = {
      widthAndDepth(),
      Sizes{length("d", "d", PW_TEXT("Source", "diameter"))},
      Sizes{length("d", "d", PW_TEXT("Source", "outer diameter")),
            length("t", "t", PW_TEXT("Source", "thickness of the wall"))},
      Sizes{length("b", "b", PW_TEXT("Source", "outer width")),
            length("h", "h", PW_TEXT("Source", "outer depth")),
            length("t_w", "t_{w}", PW_TEXT("Source", "thickness of the upright walls")),
            length("t_f", "t_{f}", PW_TEXT("Source", "thickness of the level walls"))},
      ofI(),
      withFlange(),
      withFlange(),
      ofBlock(),
      ofTable()};
  return sizes[static_cast<std::size_t>(shape)];
}

const SizeKind* sizeOfKey(SectionShape shape, std::string_view key) {
  if (shape == SectionShape::built) {
    const std::size_t digits = std::min(key.find_first_not_of("0123456789"), key.size());
    if (digits == 0 || key.substr(digits, 1) != ".")
      return nullptr;
    key.remove_prefix(digits + 1);
  }
  const Sizes& sizes = sizesOf(shape);
  const auto row = std::ranges::find(sizes, key, &SizeKind::key);
  return row == sizes.end() ? nullptr : &*row;
}

std::string blockKey(int number, std::string_view key) {
  return exactNumber(number) + "." + std::string(key);
}

} // namespace planewright
