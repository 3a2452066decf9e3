// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"

#include <optional>

namespace planewright {

/// Which of its two ends a folded direction shows. A plane and a line have no direction, a handle under the
/// hand has: the knob stays on the side where it was dragged, and goes back to the folded side as soon as the
/// angle becomes another one by other means.
class Facing {
public:
  bool isOther(Angle folded) const { return m_otherAt == folded; }
  /// The end that is shown, in (-90, 270].
  Angle shown(Angle folded) const;
  /// Shows the end of `folded` that lies nearer to `wanted`.
  void keepNear(Angle wanted, Angle folded);
  bool operator==(const Facing&) const = default;

private:
  std::optional<Angle> m_otherAt;
};

} // namespace planewright
