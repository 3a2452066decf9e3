// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/step.h"

#include "core/quantity/format.h"
#include "core/working/written.h"

namespace planewright {

ShownValue shownValue(const Step& step) {
  const std::string number = shownNumber(step.result / step.scale, step.decimals);
  if (step.unit == "°")
    return {number + step.unit, {}};
  return {number, step.unit};
}

std::string shownResult(const Step& step) {
  const ShownValue shown = shownValue(step);
  return shown.unit.empty() ? shown.number : shown.number + " " + shown.unit;
}

Text written(const Step& step) {
  return symbol("%1 = %2 = %3 = %4")
      .with(step.symbol)
      .with(written(step.formula))
      .with(written(step.formula, step.putIn))
      .with(shownResult(step));
}

} // namespace planewright
