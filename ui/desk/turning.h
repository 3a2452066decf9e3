// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/named_directions.h"

#include <Qt>

#include <optional>
#include <vector>

namespace planewright {

/// The turn of a handle during one drag, equal on the element and on the circle: the motions of the pointer
/// add up from where the handle stood, so that a press beside its middle does not make it jump.
class Turn {
public:
  explicit Turn(Angle start) : m_start(start), m_now(start) {}

  /// One more motion of the pointer. With Shift held a tenth of it counts.
  void move(Angle by, Qt::KeyboardModifiers held);
  Angle start() const { return m_start; }
  Angle now() const { return m_now; } ///< not folded

private:
  Angle m_start;
  Angle m_now;
};

/// Where a turned handle comes to rest.
struct Rest {
  Angle angle;          ///< folded
  std::vector<Text> on; ///< the named directions it snapped to; several when they coincide
  bool snapped() const { return !on.empty(); }
};

/// The nearest direction within `reach` of the turn, else the turn rounded to the power of ten of a degree
/// that is next below `pixel` (the turn that one pixel makes). With Shift or Ctrl held nothing snaps; Shift
/// rounds ten times finer.
Rest restOf(const Turn& turn, const std::vector<NamedDirection>& directions, Angle reach, Angle pixel,
            Qt::KeyboardModifiers held);

/// Where a key brings a handle: Left, Down / Right, Up by 1 deg, with Shift 0.1, with Ctrl 15; PageUp and
/// PageDown to the next and the previous named direction; Home to 0. None for every other key.
std::optional<Angle> keyedTurn(Angle now, int key, Qt::KeyboardModifiers held,
                               const std::vector<NamedDirection>& directions);

/// The power of ten next below `size`, which is greater than 0: 0.286 gives 0.1.
double decadeBelow(double size);
/// `value` rounded to a whole multiple of a power of ten; the nearest double to that decimal number.
double roundedTo(double value, double decade);

} // namespace planewright
