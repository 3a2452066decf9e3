// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/view.h"
#include "core/strength/criterion.h"
#include "core/study/kinds.h"

#include <optional>
#include <string>
#include <vector>

namespace planewright {

/// Section forces on the +x face of the section that the fibre of the point names, each a typed text. Signs
/// as in SectionForces.
struct ForceTexts {
  std::string N = "0 kN";
  std::string Vy = "0 kN";
  std::string Vz = "0 kN";
  std::string T = "0 kN*m";
  std::string My = "0 kN*m";
  std::string Mz = "0 kN*m";
  bool operator==(const ForceTexts&) const = default;
};

/// Pressure in a thin-walled cylinder with its axis along x: pressure, inner radius, thickness.
struct PressureTexts {
  std::string p = "0 MPa";
  std::string r = "500 mm";
  std::string t = "10 mm";
  Ends ends = Ends::closed;
  bool operator==(const PressureTexts&) const = default;
};

/// Three gauges on the surface and the material under them. Of an isotropic material E and nu count, of an
/// orthotropic one the others, along and across the first line of the point.
struct RosetteTexts {
  std::string angleA = "0 deg";
  std::string angleB = "45 deg";
  std::string angleC = "90 deg";
  std::string strainA = "0 ustrain";
  std::string strainB = "0 ustrain";
  std::string strainC = "0 ustrain";
  Elasticity material = Elasticity::isotropic;
  std::string E = "210 GPa";
  std::string nu = "0.3";
  std::string along = "11 GPa";
  std::string across = "0.37 GPa";
  std::string nu12 = "0.4";
  std::string G = "0.69 GPa";
  bool operator==(const RosetteTexts&) const = default;
};

/// What makes the stresses of one case at a point: stresses typed with their unit ("1.5*12 kN/(90 mm*240
/// mm)") and what section forces, pressure and measured strains add to them.
struct CaseStress {
  std::string caseId;
  std::string sx = "0 MPa";
  std::string sy = "0 MPa";
  std::string txy = "0 MPa";
  std::string sz = "0 MPa";
  std::optional<ForceTexts> forces = std::nullopt;
  std::optional<PressureTexts> pressure = std::nullopt;
  std::optional<RosetteTexts> rosette = std::nullopt;

  /// Whether all of it is typed as stresses.
  bool isDirect() const { return !forces && !pressure && !rosette; }
  bool operator==(const CaseStress&) const = default;
};

/// Where in which section a point lies; y and z are typed texts from the centroid.
struct FibreTexts {
  std::string section;
  std::string y = "0 mm";
  std::string z = "0 mm";
  View view = View::side;
  bool operator==(const FibreTexts&) const = default;
};

/// A physical direction in the plane of stress; `name` is its key. `angle` and `tolerance` are typed texts
/// ("1 in 12", "3 deg"); an empty tolerance means none.
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

/// What a check adds to its criterion, typed texts that may be empty: exponent of Hankinson, product
/// coefficient of Tsai and Wu, factor across the grain, direction of a tapered edge.
struct ParameterTexts {
  std::string n;
  std::string F12;
  std::string kc90;
  std::string edge;
  bool operator==(const ParameterTexts&) const = default;
};

/// A question about the point: is a line or a watched plane within the strengths of a material? `id` is its
/// key. Criteria that know no direction have neither line nor plane.
struct Check {
  std::string id;
  std::string material;
  Criterion criterion = Criterion::sumOfSquares;
  std::string line;
  std::string plane;
  ParameterTexts parameters;
  bool operator==(const Check&) const = default;
};

/// One place in a member. A case that `stress` does not list counts as zero, and outputs say so.
struct Point {
  std::string name;
  std::string note;
  std::string axes = "0 deg"; ///< inclination of the member; turns only the drawing
  std::optional<FibreTexts> fibre;
  std::string freeEdge; ///< direction of an edge that carries nothing; may be empty
  std::vector<CaseStress> stress;
  std::vector<Line> lines; ///< the first is the one that drawings turn
  std::vector<WatchedPlane> planes;
  std::vector<Check> checks;
  std::string reading = "0 deg";
  bool operator==(const Point&) const = default;
};

const CaseStress* findStress(const Point& point, std::string_view caseId);
const Line* findLine(const Point& point, std::string_view name);
const WatchedPlane* findPlane(const Point& point, std::string_view name);
const Check* findCheck(const Point& point, std::string_view id);

} // namespace planewright
