// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// One result by both routes.
struct RouteRow {
  std::string point;
  std::string combination;
  Text quantity;     ///< "σ_{1}"
  std::string unit;  ///< "MPa"; empty of a plain number
  double first = 0;  ///< as reported
  double second = 0; ///< by the second route
  double scale = 1;  ///< what the difference is measured against: the size of the terms of the state
  double difference() const;
  bool operator==(const RouteRow&) const = default;
};

/// Differences of the two routes beyond this part of the size of the terms are a disagreement.
inline constexpr double routesAgreeWithin = 1e-11;

/// All results of a state by another route through this program: the stresses of the combination as a sum of
/// matrices; principal values by an eigenvalue solver (Eigen, SelfAdjointEigenSolver) and their directions by
/// rotating the matrix into them; tractions and stresses in the axes of lines as R^T S R; the invariants
/// trace and determinant; a utilisation by loading the state with its multiplier, which must bring it to 1;
/// the worst of a band by a scan of 2001 directions, none of which may be worse. No substitute for a checking
/// person: both routes read the same study.
std::vector<RouteRow> secondRouteOf(const Readout& readout, const StateReading& state);

/// What the comparison of all judged states of some points comes to.
struct RouteComparison {
  double greatest = 0;            ///< the greatest difference
  std::vector<RouteRow> disagree; ///< the rows beyond the bound, at most 20
  std::size_t compared = 0;       ///< how many results
  bool agrees() const { return disagree.empty(); }
};
RouteComparison comparedRoutes(const std::vector<Readout>& points);

} // namespace planewright
