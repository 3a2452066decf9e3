// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/metrics.h"

#include <algorithm>
#include <cmath>
#include <numbers>
#include <string>
#include <vector>

namespace planewright {

struct Segment {
  Vec from;
  Vec to;
  double width;
};

/// Every stroke of a part as straight pieces; an arc in pieces of at most 2 deg.
inline std::vector<Segment> segmentsOf(const Path& path) {
  std::vector<Segment> result;
  const double width = path.pen ? path.pen->width : 0;
  for (std::size_t i = 1; i < path.points.size(); ++i)
    result.push_back({path.points[i - 1], path.points[i], width});
  if (path.closed)
    result.push_back({path.points.back(), path.points.front(), width});
  return result;
}
inline std::vector<Segment> segmentsOf(const Arc& arc) {
  std::vector<Segment> result;
  const double width = arc.pen ? arc.pen->width : 0;
  const auto at = [&](int i) {
    const double angle = (arc.start + arc.sweep * i / 180) * std::numbers::pi / 180;
    return Vec{arc.centre.x + arc.radius * std::cos(angle), arc.centre.y - arc.radius * std::sin(angle)};
  };
  for (int i = 0; i < 180; ++i)
    result.push_back({at(i), at(i + 1), width});
  return result;
}
inline std::vector<Segment> segmentsOf(const Label&) {
  return {};
}

inline bool inside(Vec at, const Box& box) {
  return at.x > box.left && at.x < box.right && at.y > box.top && at.y < box.bottom;
}

/// Whether a piece meets a box, by halving it until it lies outside or is shorter than a hundredth of a mm.
inline bool meets(Vec from, Vec to, const Box& box) {
  if (std::max(from.x, to.x) <= box.left || std::min(from.x, to.x) >= box.right ||
      std::max(from.y, to.y) <= box.top || std::min(from.y, to.y) >= box.bottom)
    return false;
  if (inside(from, box) || inside(to, box))
    return true;
  if (std::hypot(to.x - from.x, to.y - from.y) < 0.01)
    return false;
  const Vec middle{(from.x + to.x) / 2, (from.y + to.y) / 2};
  return meets(from, middle, box) || meets(middle, to, box);
}

/// What the pieces of one part take, a hair more so that a straight one has an inside.
inline Box extentOf(const std::vector<Segment>& pieces) {
  constexpr double hair = 0.001;
  Box box{1e9, 1e9, -1e9, -1e9};
  for (const Segment& piece : pieces)
    for (const Vec at : {piece.from, piece.to})
      box = {std::min(box.left, at.x - hair), std::min(box.top, at.y - hair),
             std::max(box.right, at.x + hair), std::max(box.bottom, at.y + hair)};
  return box;
}

/// The box of a label's letters alone.
inline Box lettersOf(const Label& label) {
  const Box box = boxOf(label);
  const double side = boxSide * label.size;
  return {box.left + side, box.top, box.right - side, box.bottom};
}

/// A label with its boxes, measured once.
struct Measured {
  const Label* label;
  std::size_t index; ///< among the parts of the picture
  Box box;
  Box letters;
};

inline std::vector<Measured> labelsIn(const Picture& picture) {
  std::vector<Measured> labels;
  for (std::size_t i = 0; i < picture.parts.size(); ++i)
    if (const Label* label = std::get_if<Label>(&picture.parts[i]))
      labels.push_back({label, i, boxOf(*label), lettersOf(*label)});
  return labels;
}

/// What is wrong with how labels stand in a picture, in words; empty when nothing is.
inline std::string labelFault(const Picture& picture) {
  const std::vector<Measured> labels = labelsIn(picture);
  for (const Measured& one : labels) {
    const std::string words = plain(one.label->runs);
    if (one.box.left < 0 || one.box.top < 0 || one.box.right > picture.width ||
        one.box.bottom > picture.height)
      return words + " leaves the frame";
    for (const Measured& other : labels)
      if (&one != &other && overlap(one.label->ground ? one.box : one.letters, other.letters))
        return words + " meets " + plain(other.label->runs);
  }
  for (std::size_t i = 0; i < picture.parts.size(); ++i) {
    const auto pieces = std::visit([](const auto& part) { return segmentsOf(part); }, picture.parts[i]);
    const Box extent = extentOf(pieces);
    for (const Measured& one : labels)
      if ((i > one.index || !one.label->ground) && overlap(extent, one.letters))
        for (const Segment& piece : pieces)
          if (meets(piece.from, piece.to, one.letters))
            return plain(one.label->runs) + " has a stroke in it";
  }
  return {};
}

/// The first stroke that leaves the picture, in words; empty when none does.
inline std::string strokeFault(const Picture& picture) {
  for (const auto& part : picture.parts)
    for (const Segment& piece : std::visit([](const auto& shape) { return segmentsOf(shape); }, part))
      for (const Vec at : {piece.from, piece.to})
        if (at.x < 0 || at.y < 0 || at.x > picture.width || at.y > picture.height)
          return "a stroke leaves the picture at " + std::to_string(at.x) + ", " + std::to_string(at.y);
  return {};
}

/// Diameter of the greatest whole circle drawn in the role of the state; 0 without one.
inline double circleDiameter(const Picture& picture) {
  double diameter = 0;
  for (const auto& part : picture.parts)
    if (const Arc* arc = std::get_if<Arc>(&part);
        arc && arc->sweep == 360 && arc->pen && arc->pen->role == Role::state)
      diameter = std::max(diameter, 2 * arc->radius);
  return diameter;
}

/// All words of a picture, one label a line.
inline std::string wordsOf(const Picture& picture) {
  std::string words;
  for (const auto& part : picture.parts)
    if (const Label* label = std::get_if<Label>(&part))
      words += plain(label->runs) + "\n";
  return words;
}

} // namespace planewright
