// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/step.h"

#include "core/quantity/format.h"
#include "core/working/written.h"

namespace planewright {

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
