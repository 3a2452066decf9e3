// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/kinds.h"

#include <optional>
#include <string>
#include <vector>

namespace planewright {

/// The stresses of one case at a point, each a typed text with its unit ("1.5*12 kN/(90 mm*240 mm)").
struct CaseStress {
  std::string caseId;
  std::string sx = "0 MPa";
  std::string sy = "0 MPa";
  std::string txy = "0 MPa";
  std::string sz = "0 MPa";
  bool operator==(const CaseStress&) const = default;
};

/// A physical direction in the plane of stress. `angle` and `tolerance` are typed texts ("1 in 12", "3 deg");
/// an empty tolerance means none.
struct Line {
  std::string name = "grain";
  LineKind kind = LineKind::grain;
  std::string angle = "0 deg";
  std::string tolerance;
  bool operator==(const Line&) const = default;
};

/// A plane that the user keeps an eye on; `name` is its key. `tolerance` may be empty.
struct WatchedPlane {
  std::string name;
  std::string normal = "0 deg";
  std::string tolerance;
  bool operator==(const WatchedPlane&) const = default;
};

/// One place in a member. A case that `stress` does not list counts as zero, and outputs say so.
struct Point {
  std::string name;
  std::string note;
  std::string axes = "0 deg"; ///< inclination of the member; turns only the drawing
  std::vector<CaseStress> stress;
  std::optional<Line> line;
  std::vector<WatchedPlane> planes;
  std::string reading = "0 deg";
  bool operator==(const Point&) const = default;
};

const CaseStress* findStress(const Point& point, std::string_view caseId);
const WatchedPlane* findPlane(const Point& point, std::string_view name);

} // namespace planewright
