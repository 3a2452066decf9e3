// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section.h"

#include <rapidcheck.h>

namespace planewright {

inline Section rectangleSection(double b, double h) {
  return {SectionShape::rectangle, {{"b", b}, {"h", h}}};
}
inline Section circleSection(double d) {
  return {SectionShape::circle, {{"d", d}}};
}
inline Section tubeSection(double d, double t) {
  return {SectionShape::tube, {{"d", d}, {"t", t}}};
}
inline Section boxSection(double b, double h, double web, double flange) {
  return {SectionShape::box, {{"b", b}, {"h", h}, {"t_w", web}, {"t_f", flange}}};
}
inline Section iSection(double h, double web, double bTop, double tTop, double bBottom, double tBottom,
                        double r) {
  return {SectionShape::i,
          {{"h", h},
           {"t_w", web},
           {"b_top", bTop},
           {"t_top", tTop},
           {"b_bottom", bBottom},
           {"t_bottom", tBottom},
           {"r", r}}};
}
inline Section tSection(double h, double b, double web, double flange) {
  return {SectionShape::t, {{"h", h}, {"b", b}, {"t_w", web}, {"t_f", flange}}};
}
inline Section channelSection(double h, double b, double web, double flange) {
  return {SectionShape::channel, {{"h", h}, {"b", b}, {"t_w", web}, {"t_f", flange}}};
}
inline Section builtSection(const std::vector<Block>& blocks) {
  Section section{SectionShape::built, {}};
  int n = 0;
  for (const Block& block : blocks) {
    ++n;
    section.sizes[blockKey(n, "b")] = block.b;
    section.sizes[blockKey(n, "h")] = block.h;
    section.sizes[blockKey(n, "y")] = block.y;
    section.sizes[blockKey(n, "z")] = block.z;
    section.sizes[blockKey(n, "turn")] = block.turn.degrees();
  }
  return section;
}

/// A composed section with sharp corners, built of rectangles.
inline Section rebuilt(const Section& s) {
  const auto at = [&](const char* key) { return s.size(key); };
  switch (s.shape) {
  case SectionShape::rectangle:
    return builtSection({{at("b"), at("h"), 17, -3, {}}});
  case SectionShape::box:
    return builtSection({{at("b"), at("t_f"), at("h") - at("t_f") / 2, 0, {}},
                         {at("t_w"), at("h") - 2 * at("t_f"), at("h") / 2, at("b") / 2 - at("t_w") / 2, {}},
                         {at("t_w"), at("h") - 2 * at("t_f"), at("h") / 2, at("t_w") / 2 - at("b") / 2, {}},
                         {at("b"), at("t_f"), at("t_f") / 2, 0, {}}});
  case SectionShape::i:
    return builtSection({{at("b_top"), at("t_top"), at("h") - at("t_top") / 2, 0, {}},
                         {at("t_w"),
                          at("h") - at("t_top") - at("t_bottom"),
                          (at("h") - at("t_top") + at("t_bottom")) / 2,
                          0,
                          {}},
                         {at("b_bottom"), at("t_bottom"), at("t_bottom") / 2, 0, {}}});
  case SectionShape::t:
    return builtSection({{at("b"), at("t_f"), at("h") - at("t_f") / 2, 0, {}},
                         {at("t_w"), at("h") - at("t_f"), (at("h") - at("t_f")) / 2, 0, {}}});
  case SectionShape::channel:
    return builtSection({{at("b"), at("t_f"), at("h") - at("t_f") / 2, at("b") / 2, {}},
                         {at("t_w"), at("h") - 2 * at("t_f"), at("h") / 2, at("t_w") / 2, {}},
                         {at("b"), at("t_f"), at("t_f") / 2, at("b") / 2, {}}});
  default:
    return s;
  }
}

/// Tenths of a millimetre between the limits.
inline double anyLength(double least, double greatest) {
  return *rc::gen::inRange(static_cast<int>(least * 10), static_cast<int>(greatest * 10) + 1) / 10.0;
}

inline Section anySectionOf(SectionShape shape) {
  const double h = anyLength(60, 900);
  const double b = anyLength(40, 400);
  const double web = anyLength(3, 15);
  const double flange = anyLength(3, 25);
  switch (shape) {
  case SectionShape::circle:
    return circleSection(h);
  case SectionShape::tube:
    return tubeSection(h, anyLength(2, 25));
  case SectionShape::box:
    return boxSection(b, h, web, flange);
  case SectionShape::i:
    return iSection(h, web, b, flange, anyLength(40, 400), anyLength(3, 25), 0);
  case SectionShape::t:
    return tSection(h, b, web, flange);
  case SectionShape::channel:
    return channelSection(h, b, web, flange);
  default:
    return rectangleSection(b, h);
  }
}

inline Section anySharpSection() {
  return anySectionOf(*rc::gen::element(SectionShape::rectangle, SectionShape::box, SectionShape::i,
                                        SectionShape::t, SectionShape::channel));
}

/// Every shape that can be drawn but built ones, I with root fillets among them.
inline Section anySection() {
  Section section = anySectionOf(*rc::gen::element(SectionShape::rectangle, SectionShape::circle,
                                                   SectionShape::tube, SectionShape::box, SectionShape::i,
                                                   SectionShape::t, SectionShape::channel));
  if (section.shape == SectionShape::i)
    section.sizes["r"] = anyLength(0, 4);
  return section;
}

} // namespace planewright
