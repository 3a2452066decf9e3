// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/unit.h"
#include "core/working/step.h"

namespace planewright {

/// Powers of a length: area, first and second moment of area; of a stress.
namespace dimension {
inline constexpr Dimension area{0, 2, 0};
inline constexpr Dimension firstMoment{0, 3, 0};
inline constexpr Dimension secondMoment{0, 4, 0};
inline constexpr Dimension inverseSquareStress = -2 * stress;
} // namespace dimension

/// The units in which a working is written; it is evaluated in N, mm and MPa.
struct WrittenUnits {
  Unit stress{"MPa", dimension::stress};
  Unit force{"kN", dimension::force, 1e3};
  Unit length{"mm", dimension::length};
  Unit moment{"kN*m", dimension::moment, 1e6};

  /// A number put in, with up to five significant digits.
  NumberPutIn put(std::string_view symbol, double value, Dimension dimension) const;
  /// A number without a unit.
  static NumberPutIn plainNumber(std::string_view symbol, double value);
  static NumberPutIn angle(std::string_view symbol, double degrees);
  static NumberPutIn pi();

  /// A step with its result in the unit of the dimension, four significant digits; of the numbers those that
  /// it names.
  Step step(Text name, std::string_view symbol, Formula formula, NumbersPutIn numbers, double result,
            Dimension dimension, Text source) const;

  /// "120.0 mm": for a sentence.
  std::string shown(double value, Dimension dimension) const;
};

} // namespace planewright
