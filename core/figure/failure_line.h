// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/judge_checks.h"

namespace planewright {

/// What the strengths of a plane look like on the circle, in N/mm2 and the sense of signs of the study.
struct FailureLine {
  std::string check;           ///< its id
  std::string material;        ///< whose strengths it shows
  bool leads = false;          ///< of the check with the greatest utilisation in the shown state
  std::vector<Traction> upper; ///< from the side of compression to that of tension, tnt >= 0
  /// The plane of the shown state that its limit meets first when all loads grow (or shrink) together, and
  /// its stresses now. None where no multiple of them does, or where the plane takes nothing however small
  /// they are.
  std::optional<NormalAngle> touch;
  Traction touchAt;
  /// From the checked plane to its limit: at the same sn for a Coulomb plane, whose clamping resists, else
  /// along the ray on which all loads grow. None where no multiple reaches the limit.
  std::optional<Traction> marginEnd;
  Traction planeAt; ///< the checked plane, at its nominal normal
};

/// Those of the checks on planes that the shown state is judged by; `reach` is how far from 0 the line is
/// wanted, N/mm2, on the side of compression.
std::vector<FailureLine> failureLinesOf(const Readout& readout, double reach);

/// What is written at the plane that a limit meets first; several lines say whose they are.
struct TouchLabel {
  Traction at;
  Text longForm;
  Text shortForm;
  Role role = Role::limit;
  std::string key;
};
std::vector<TouchLabel> touchLabelsOf(const Readout& readout);
/// The role of a failure line and of all that belongs to it.
Role roleOf(const FailureLine& line);
/// As the priority of a Mark: it goes short first.
inline constexpr int touchPriority = 9;

} // namespace planewright
