// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"
#include "core/working/formula.h"

namespace planewright {

/// One line of a calculation that a checker can follow.
struct Step {
  Text name;   ///< "mean stress"
  Text symbol; ///< "σ_{m}"
  Formula formula;
  NumbersPutIn putIn; ///< for every symbol of the formula, in the step's units
  double result = 0;  ///< of the program's own code, which the formula confirms
  int decimals = 3;   ///< of the result
  std::string unit;   ///< "MPa", "°"
  Text source;        ///< where the formula is from
  double scale = 1;   ///< of one `unit`, in the unit of `result`
};

/// A result and the unit that stands behind it: "12.34" and "MPa"; "−22.50°" and nothing.
struct ShownValue {
  std::string number;
  std::string unit;
};
ShownValue shownValue(const Step& step);
/// Both in one: "12.34 MPa", "−22.50°".
std::string shownResult(const Step& step);
/// "σ_{m} = (σ_{x} + σ_{y})/2 = (8.40 + (−0.60))/2 = 3.90 MPa".
Text written(const Step& step);

} // namespace planewright
