// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/recoverable.h"

#include <cmath>

namespace planewright {

namespace {

constexpr int mostDecimals = 15; ///< beyond it numbers are written with a power of ten
constexpr int significantWithPower = 4;

double roundedTo(double value, int decimals) {
  const double power = std::pow(10.0, decimals);
  const double scaled = value * power;
  return std::isfinite(scaled) ? std::round(scaled) / power : value;
}

/// A value as shownNumber writes it.
double asWritten(double value, int decimals) {
  if (decimals <= mostDecimals || value == 0)
    return roundedTo(value, decimals);
  const int exponent = static_cast<int>(std::floor(std::log10(std::abs(value))));
  return roundedTo(value, significantWithPower - 1 - exponent);
}

double asWritten(const NumberPutIn& number) {
  return asWritten(number.value / number.scale, number.decimals) * number.scale;
}

/// Half a unit of the last digit of the result.
double halfDigitOf(const Step& step) {
  const double shown = step.result / step.scale;
  if (step.decimals <= mostDecimals || shown == 0)
    return 0.5 * std::pow(10.0, -step.decimals) * step.scale;
  return 0.5 * std::pow(10.0, std::floor(std::log10(std::abs(shown))) + 1 - significantWithPower) *
         step.scale;
}

/// Whether more decimals would change nothing.
bool isWhole(const NumberPutIn& number) {
  return std::abs(asWritten(number) - number.value) <= 1e-15 * std::abs(number.value);
}

} // namespace

bool isRecoverable(const Step& step) {
  NumbersPutIn printed = step.putIn;
  for (NumberPutIn& number : printed)
    number.value = asWritten(number);
  return std::abs(step.formula.valueWith(printed) - step.result) <= halfDigitOf(step);
}

Step recoverable(Step step) {
  Step before = step;
  while (!isRecoverable(step)) {
    bool more = false;
    for (NumberPutIn& number : step.putIn)
      if (number.decimals < mostDecimals && !isWhole(number)) {
        ++number.decimals;
        more = true;
      }
    if (!more)
      return before;
  }
  return step;
}

} // namespace planewright
