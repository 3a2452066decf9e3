// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"

namespace planewright {

/// One point of a field by the core's way for a point: every combination and check by its Judge and the worst
/// of its band. Microseconds each; the kernels are held against it, and what they do not bear goes by it.
PointResult judgedByCore(const ScreenPlan& plan, const Field& field, std::size_t point);

/// The line of a check at a point, folded, in the x axis in which lines are given: the point's own or the
/// study's.
Angle lineAt(const ScreenedCheck& check, const Field& field, std::size_t point);

/// The state of one combination in the axes of a line, tension positive, and the size of its terms before
/// they cancelled.
struct StateOfLine {
  double mean = 0;
  double half = 0; ///< half of along less across
  double shear = 0;
  double scale = 0;
};

/// What one check says of one combination, once that is known to govern: the worst in the band within
/// `tolerance`, by the same turns and the same rule for equals as the core.
struct WorstOfState {
  double utilisation = 0;
  Angle offset; ///< from the line's nominal angle
  std::optional<Mode> mode;
};
class WorstFinder {
public:
  explicit WorstFinder(const ScreenedCheck& check);
  WorstOfState worstOf(const ScreenedForms& forms, const StateOfLine& state);

private:
  struct Candidate {
    double X, shear, utilisation;
    double offset; ///< degrees; NaN where it follows from X
  };
  void add(const ScreenedForms& forms, const StateOfLine& state, double X, double shear, double offset);
  double offsetOf(const StateOfLine& state, double radius, double X) const;

  double m_tolerance = 0; ///< degrees
  CosSin m_twice;         ///< of twice the tolerance
  std::vector<double> m_turns;
  std::vector<Candidate> m_candidates;
};

} // namespace planewright
