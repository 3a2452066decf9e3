// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_arrows.h"

#include <cmath>

namespace planewright {

namespace {

constexpr double headLength = 0.085;
constexpr double headHalfWidth = 0.032;
constexpr double halfHeadLength = 0.07;
constexpr double barbWidth = 0.032;

void drawNormal(Picture& picture, const ElementFrame& frame, Angle face, double length, const Pen& pen,
                ArrowHead head) {
  const double inner = part::arrowFrom;
  const double outer = part::arrowFrom + std::abs(length);
  const double tip = length > 0 ? outer : inner;
  const double tail = length > 0 ? inner : outer;
  const double base = tip - std::copysign(headLength, length);
  const std::vector<Vec> barbs = {frame.in(face, base, headHalfWidth), frame.at(face, tip),
                                  frame.in(face, base, -headHalfWidth)};
  const bool filled = head == ArrowHead::filled;
  // The shaft of a filled head ends inside the head, so that its stroke does not blunt the tip.
  picture.parts.push_back(Path{{frame.at(face, tail), frame.at(face, filled ? base : tip)}, false, pen, {}});
  if (filled)
    picture.parts.push_back(Path{barbs, true, {}, pen.role});
  else
    picture.parts.push_back(Path{barbs, false, pen, {}});
}

void drawShear(Picture& picture, const ElementFrame& frame, Angle face, double length, const Pen& pen,
               ArrowHead head) {
  const double tip = length / 2;
  const double base = tip - std::copysign(halfHeadLength, length);
  const Vec end = frame.in(face, part::shear, tip);
  const Vec barb = frame.in(face, part::shear + barbWidth, base);
  picture.parts.push_back(Path{{frame.in(face, part::shear, -tip), end}, false, pen, {}});
  if (head == ArrowHead::filled)
    picture.parts.push_back(Path{{end, barb, frame.in(face, part::shear, base)}, true, {}, pen.role});
  else
    picture.parts.push_back(Path{{end, barb}, false, pen, {}});
}

} // namespace

void drawArrows(Picture& picture, const ElementFrame& frame, const ElementArrows& arrows, const Pen& pen,
                ArrowHead head) {
  for (int quarter = 0; quarter < 4; ++quarter) {
    const Angle face = arrows.first + Angle::fromDegrees(90.0 * quarter);
    const FaceArrows& acts = arrows.faces[static_cast<std::size_t>(quarter % 2)];
    if (acts.normal != 0)
      drawNormal(picture, frame, face, acts.normal, pen, head);
    if (acts.shear != 0)
      drawShear(picture, frame, face, acts.shear, pen, head);
  }
}

double normalEnd(const FaceArrows& face) {
  return part::arrowFrom + std::abs(face.normal);
}

} // namespace planewright
