// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/circle.h"

namespace planewright {

enum class Component { sn, tnt };

/// A target value standing for the interval [value - halfWidth, value + halfWidth].
struct Target {
  double value = 0;
  double halfWidth = 0;
};

/// The planes on which one component of the traction has a given value: inverse reading.
struct PlanesOfValue {
  enum class Kind {
    two,        ///< `first` and `second`
    touching,   ///< the target's interval holds an extreme value; `first` is its plane, within +- spread
    outOfReach, ///< no plane: the component runs only from `least` to `greatest`
    every       ///< a degenerate state whose every plane has the value
  };
  Kind kind = Kind::outOfReach;
  NormalAngle first;
  NormalAngle second;
  Angle spread;
  double least = 0;
  double greatest = 0;
  bool operator==(const PlanesOfValue&) const = default;
};

/// sn(theta) = mean + r cos 2(theta - theta1), tnt(theta) = -r sin 2(theta - theta1), solved for theta.
/// Angles are folded. Of two planes `first` is the one nearer to `near`; on a tie (within 1e-12 of 180 deg)
/// the smaller angle. Accuracy falls as the square root near an extreme value: hence `touching` and its
/// spread.
PlanesOfValue planesOf(const Circle& circle, Component component, const Target& target, NormalAngle near);

} // namespace planewright
