// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/unit.h"
#include "core/study/readout.h"

namespace planewright {

/// Decimals of every angle in tables, texts and working.
inline constexpr int angleDecimals = 2;

/// The unit in which a study's stresses are reported.
Unit stressUnitOf(const Study& study);

/// How the stresses of one state are written, wherever they stand: in the study's unit, with the decimals
/// that give the study's count of significant digits to the greatest |stress| of any plane (and to σz), so
/// that they do not change while a plane turns. The unit's text is read once for all of them.
struct StressForm {
  Unit unit;
  int decimals = 0;

  /// A stress of the base in the unit.
  double inUnit(double stress) const { return unit.fromBase(stress); }
  std::string shown(double stress) const;
  std::string withUnit(double stress) const { return shown(stress) + " " + unit.name; }
};
StressForm stressFormOf(const Study& study, const StateReading& state);
/// The same for values of all judged states beside each other.
StressForm stressFormOf(const Study& study, const Readout& readout);

/// One stress of a state, written so.
std::string shownStress(const Study& study, const StateReading& state, double stress);
/// A stress of the base in the study's unit.
double inStressUnit(const Study& study, double stress);

} // namespace planewright
