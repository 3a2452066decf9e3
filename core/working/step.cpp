// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/step.h"

#include "core/quantity/format.h"
#include "core/working/written.h"

#include <cmath>

namespace planewright {

namespace {

constexpr int mostExtraDecimals = 6;
constexpr int mostDecimals = 12;
constexpr int significantBeyond = 4; ///< digits of a number that is written with a power of ten

/// The value of a number as it is written.
double asWritten(const NumberPutIn& number) {
  const double shown = number.value / number.scale;
  const double digits = std::pow(10.0, number.decimals);
  const double rounded = std::round(shown * digits) / digits;
  return number.decimals > mostDecimals || !std::isfinite(rounded) ? number.value : rounded * number.scale;
}

bool isWhole(const NumberPutIn& number) {
  return std::abs(asWritten(number) - number.value) <= 1e-12 * std::abs(number.value);
}

double lastDecimalOf(const Step& step) {
  return step.decimals <= mostDecimals ? std::pow(10.0, -step.decimals) * step.scale
                                       : std::abs(step.result) * std::pow(10.0, 1 - significantBeyond);
}

bool isRecoverable(const Step& step) {
  NumbersPutIn numbers = step.putIn;
  for (NumberPutIn& number : numbers)
    number.value = asWritten(number);
  return std::abs(step.formula.valueWith(numbers) - step.result) <= lastDecimalOf(step) / 2;
}

} // namespace

Step withEnoughDigits(Step step) {
  for (int extra = 0; extra < mostExtraDecimals && !isRecoverable(step); ++extra)
    for (NumberPutIn& number : step.putIn)
      if (number.decimals < mostDecimals && !isWhole(number))
        ++number.decimals;
  return step;
}

std::string shownResult(const Step& step) {
  const std::string number = shownNumber(step.result / step.scale, step.decimals);
  return number + (step.unit == "°" || step.unit.empty() ? "" : " ") + step.unit;
}

Text written(const Step& step) {
  return symbol("%1 = %2 = %3 = %4")
      .with(step.symbol)
      .with(written(step.formula))
      .with(written(step.formula, step.putIn))
      .with(shownResult(step));
}

} // namespace planewright
