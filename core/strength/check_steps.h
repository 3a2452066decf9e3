// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/written_units.h"

namespace planewright {

/// One line of the working of a check, before units and digits: MPa, degrees and plain numbers.
struct CheckLine {
  Text name;
  std::string symbol;
  Formula formula;
  double result = 0;
  Dimension dimension;
  Text source;
};

/// The direction that steps of the working of a check are for.
enum class StepsAt {
  nominal,
  worst, ///< of the greatest utilisation in the band
  first  ///< that growing loads bring to its limit first
};

/// Collects the steps of the working of a check. A symbol that was put stands for its number in all lines
/// that follow, until another number takes its place.
class CheckSteps {
public:
  /// `stressDecimals`: of the stresses of the state, in the unit for stresses.
  CheckSteps(WrittenUnits units, int stressDecimals);

  /// The symbol, with its number from here on.
  Formula put(const std::string& symbol, double value, Dimension dimension);
  /// Of a stress of the state, in MPa: what is next to nothing beside the others needs no digits of its own.
  Formula putStress(const std::string& symbol, double value);
  bool knows(const std::string& symbol) const;

  /// Adds a step and puts its symbol. What has no finite number makes no step. Strengths stand before all
  /// else, stresses have the decimals of the state, everything else four significant digits.
  Formula addStrength(const CheckLine& line);
  Formula addStress(CheckLine line);
  Formula add(CheckLine line);

  /// From here on names say which direction is meant, where it is not the nominal one.
  void turnTo(StepsAt at) { m_at = at; }

  std::vector<Step> steps() const;

private:
  Step stepOf(const CheckLine& line) const;
  Text named(const Text& name) const;

  WrittenUnits m_units;
  int m_stressDecimals;
  StepsAt m_at = StepsAt::nominal;
  NumbersPutIn m_numbers;
  std::vector<Step> m_strengths;
  std::vector<Step> m_rest;
};

} // namespace planewright
