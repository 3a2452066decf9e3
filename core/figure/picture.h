// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <optional>
#include <string>
#include <variant>
#include <vector>

namespace planewright {

/// What a part of a drawing stands for; a Look gives each role its colour.
enum class Role {
  ink,
  soft,
  state,
  reading,
  line,
  limit,
  other,
  hush,
  grain,
  grid,
  rule,
  band,
  canvas,
  // grounds and states of the window only
  window,
  field,
  wrong,
  wrongGround,
  focus,
  selection,
  safeGround,
  safeEdge,
  // classes of utilisation in a map of a field, one hue in even steps of lightness; what exceeds is `limit`
  utilised50,
  utilised80,
  utilised95,
  utilised100
};

/// Kinds of stroke, equal in colour and mono.
enum class Dash { solid, shortDash, longDashDot, dotted };
/// Its strokes and gaps in turn, in widths of the pen; none for a solid line. Ends are flat.
std::vector<double> dashLengths(Dash dash);

/// A place on the sheet in mm (in the window: in pixels), x to the right, y down.
struct Vec {
  double x = 0;
  double y = 0;
  bool operator==(const Vec&) const = default;
};
constexpr Vec operator+(Vec a, Vec b) {
  return {a.x + b.x, a.y + b.y};
}
constexpr Vec operator-(Vec a, Vec b) {
  return {a.x - b.x, a.y - b.y};
}
constexpr Vec operator*(double factor, Vec a) {
  return {factor * a.x, factor * a.y};
}

struct Pen {
  Role role = Role::ink;
  double width = 0.25;
  Dash dash = Dash::solid;
  bool operator==(const Pen&) const = default;
};

/// A line through points, closed or open, filled or not; without a pen only the fill is seen.
struct Path {
  std::vector<Vec> points;
  bool closed = false;
  std::optional<Pen> pen;
  std::optional<Role> fill;
  bool operator==(const Path&) const = default;
};

/// An arc of a circle from `start` by `sweep` degrees, counter-clockwise as seen (y up); 360 is the circle.
struct Arc {
  Vec centre;
  double radius = 0;
  double start = 0;
  double sweep = 360;
  std::optional<Pen> pen;
  std::optional<Role> fill; ///< of a whole circle
  bool operator==(const Arc&) const = default;
};

enum class Align { start, middle, end };

/// A text on its base line. `size` is the height of the font's em in the Picture's unit; lowered runs are set
/// at 0.7 of it, 0.22 em down. With `ground` an opaque canvas rectangle lies under its box.
struct Label {
  Vec at;
  Runs runs;
  double size = 0;
  Align align = Align::start;
  Role role = Role::ink;
  bool bold = false;
  bool ground = false;
  std::string key; ///< names the label for tests and hover; not drawn
  bool operator==(const Label&) const = default;
};

/// A drawing: its parts in the order of painting.
struct Picture {
  double width = 0;
  double height = 0;
  std::vector<std::variant<Path, Arc, Label>> parts;
  std::string title;                  ///< for the file's own title
  std::string description;            ///< in words, for those who cannot see it
  std::vector<std::string> shortened; ///< labels that found no room for their values: "σ1"
  bool operator==(const Picture&) const = default;
};

} // namespace planewright
