// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/free_edge.h"
#include "core/stress/circle.h"
#include "core/study/check_reading.h"

namespace planewright {

/// What a row of the table of planes is.
enum class PlaneKind { reading, x, y, s1, s2, shearMax, shearMin, crossing, following, watched };

/// One plane of a state. A degenerate state has no angle for s1, s2, shearMax and shearMin: `normal` is none
/// and `traction` holds what every direction has.
struct PlaneReading {
  PlaneKind kind = PlaneKind::reading;
  std::string name; ///< of a watched plane; of the line for crossing and following
  std::optional<NormalAngle> normal;
  Traction traction;
  std::optional<LineAngle> cut() const;
  bool operator==(const PlaneReading&) const = default;
};

/// A line with its angle and tolerance evaluated.
struct LineReading {
  std::string name;
  LineKind kind = LineKind::grain;
  std::string typed; ///< the angle as typed
  LineAngle angle;   ///< folded
  Angle tolerance;   ///< 0 without one
  bool operator==(const LineReading&) const = default;
};

/// A watched plane with its normal evaluated.
struct WatchedReading {
  std::string name;
  NormalAngle normal;
  Angle tolerance;
  bool operator==(const WatchedReading&) const = default;
};

/// One case at a point, evaluated; stresses in N/mm2, in the study's sign convention.
struct CaseReading {
  std::string id;
  Duration duration = Duration::permanent;
  PlaneStress stress;
  double sz = 0;
  double typed = 0;           ///< part of sx that is typed as it is
  double axial = 0;           ///< part of sx from normal forces and the closed ends of vessels
  double bending = 0;         ///< part of sx from bending moments
  double measured = 0;        ///< part of sx from measured strains, which tell neither of the two
  double scale = 0;           ///< sum of the greatest |component| of each part, before parts cancel
  bool isListed = false;      ///< false: the point does not list the case, which counts as zero
  bool isDirect = true;       ///< all of it is typed as stresses
  std::vector<Text> cautions; ///< where the theory of its sources ends
  bool operator==(const CaseReading&) const = default;
};

/// A case that acts in a state, with its factor, which is not 0.
struct ActingCase {
  std::size_t index = 0; ///< in the cases of the Readout
  double factor = 1;
  bool operator==(const ActingCase&) const = default;
};

/// What follows from one combination (or from a single case) at a point. Stresses in N/mm2, in the study's
/// sign convention.
struct StateReading {
  std::string combination;
  std::string factors; ///< where the combination's name says others: those it has, "1.35 G + 1.5 Q"
  bool judged = true;
  PlaneStress stress;
  double sz = 0;
  double typed = 0; ///< the parts of sx as in CaseReading
  double axial = 0;
  double bending = 0;
  double measured = 0;
  double scale = 0; ///< sum |factor_i| max |component_i|, before cancellation
  Circle circle;
  std::vector<LineStress> lines; ///< one for each line of the Readout
  std::vector<Traction> watched; ///< one for each watched plane of the Readout
  Traction reading;
  std::optional<FreeEdge> edge; ///< where the point has a free edge
  std::vector<ActingCase> acting;
  Basis basis = Basis::characteristic; ///< of the combination; a single case is not factored
  std::vector<CheckReading> checks;    ///< one for each check of the Readout, where the state is judged
  bool operator==(const StateReading&) const = default;
};

/// What follows from a study for one point over all combinations. Computed, never stored, never edited.
struct Readout {
  std::string point;
  Positive positive = Positive::tension;
  NormalAngle reading; ///< folded
  Angle axes;
  std::vector<LineReading> lines;
  std::vector<WatchedReading> watched;
  std::optional<LineAngle> edge; ///< direction of a free edge, folded
  std::vector<CheckSetup> checks;
  std::vector<CaseReading> cases;   ///< all cases of the study
  std::vector<StateReading> states; ///< combinations in their order, then the single cases
  std::size_t shown = 0;            ///< the state that is shown
  const StateReading& state() const { return states[shown]; }
  bool operator==(const Readout&) const = default;
};

/// Lines and planes asked for besides those of the point.
struct Extras {
  std::vector<Line> lines;
  std::vector<WatchedPlane> planes;
};

/// Evaluates the shown point of a valid study. Without combinations each case is a combination of factor 1;
/// with combinations only they are judged and the single cases follow with `judged` false.
Readout evaluate(const Study& study);
/// The same for the point with this name.
Readout evaluate(const Study& study, std::string_view point, const Extras& extras = {});

/// All planes of a state in the fixed order of the table: reading; x, y; s1, s2; greatest shear + and -;
/// crossing and following for each line; watched.
std::vector<PlaneReading> planesOf(const Readout& readout, const StateReading& state);
/// The parts of the stress along a line that normal forces and bending moments make: those of sx times cos^2
/// of the line's angle.
struct AlongParts {
  double axial = 0;
  double bending = 0;
};
AlongParts alongPartsOf(const StateReading& state, LineAngle line);

/// The ids of the cases that act in a state though the point does not list them.
std::vector<std::string> missingCases(const Readout& readout, const StateReading& state);

/// Any other plane, for a sweep.
PlaneReading planeAt(const StateReading& state, NormalAngle normal);

/// The case that an x-face drag may change: the shown state is one case with factor 1 whose stresses are
/// typed directly. None otherwise.
std::optional<std::string> draggableCase(const Study& study, const Readout& readout);

} // namespace planewright
