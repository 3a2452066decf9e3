// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"
#include "core/working/formula.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <numbers>

namespace planewright {

/// The value of a formula, and how far the rounding of its numbers and operations can take it to first order:
/// what two honest ways to the same number may differ by.
struct Rounded {
  double value = 0;
  double error = 0;
};

inline Rounded roundedValue(const Formula& formula, const NumbersPutIn& numbers) {
  using Operation = Formula::Operation;
  constexpr double eps = std::numeric_limits<double>::epsilon();
  constexpr double radian = std::numbers::pi / 180;
  const double value = formula.valueWith(numbers);
  double error = eps * std::abs(value);
  std::vector<Rounded> parts;
  for (const Formula& part : formula.parts())
    parts.push_back(roundedValue(part, numbers));
  const auto e = [&](std::size_t i) { return parts[i].error; };
  const auto v = [&](std::size_t i) { return std::abs(parts[i].value); };
  switch (formula.operation()) {
  case Operation::product:
    error += v(0) * e(1) + v(1) * e(0);
    break;
  case Operation::quotient:
    error += e(0) / v(1) + v(0) * e(1) / (v(1) * v(1));
    break;
  case Operation::power: {
    const double exponent = formula.parts()[1].valueWith(numbers);
    const double base = v(0) + e(0); // of a base that is nothing but rounding too
    error += std::abs(exponent) * std::pow(base, exponent - 1) * e(0);
    break;
  }
  case Operation::root:
    error += e(0) / (std::sqrt(std::max(v(0), e(0))) + std::numeric_limits<double>::min());
    break;
  case Operation::cosine:
  case Operation::sine:
    error += (e(0) + eps * v(0)) * radian;
    break;
  case Operation::tangent:
    error += (e(0) + eps * v(0)) * radian * (1 + value * value);
    break;
  case Operation::arcTangent:
    error += (v(0) * e(1) + v(1) * e(0)) / (v(0) * v(0) + v(1) * v(1)) / radian;
    break;
  default: // sums, sizes, the greatest of several
    for (const Rounded& part : parts)
      error += part.error;
  }
  return {value, error};
}

} // namespace planewright
