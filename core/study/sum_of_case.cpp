// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/sum_of_case.h"

#include "core/quantity/shown_count.h"
#include "core/stress/circle.h"
#include "core/study/typed.h"

#include <cmath>

namespace planewright {

namespace {

struct Component {
  Text name;
  std::string letters; ///< "σ_{x"
  Spot spot;
  double PlaneStress::*of;
};

const std::vector<Component>& components() {
  static const std::vector<Component> all = {
      {PW_TEXT("Working", "normal stress on the x face"), "σ_{x", Spot::sx, &PlaneStress::sx},
      {PW_TEXT("Working", "normal stress on the y face"), "σ_{y", Spot::sy, &PlaneStress::sy},
      {PW_TEXT("Working", "shear stress on the x face"), "τ_{xy", Spot::txy, &PlaneStress::txy}};
  return all;
}

const std::string& textOf(const CaseStress& stress, Spot spot) {
  return spot == Spot::sx ? stress.sx : spot == Spot::sy ? stress.sy : stress.txy;
}

} // namespace

std::vector<Step> sumOfCase(const Study& study, const CaseStress& stress,
                            const std::vector<NamedContribution>& sources) {
  const bool isTurned = study.convention.positive == Positive::compression;
  const WrittenUnits units = writtenUnitsOf(study);
  std::vector<Step> steps;
  for (const Component& one : components()) {
    const double typed = valueOf(study, one.spot, textOf(stress, one.spot));
    NumbersPutIn numbers;
    std::optional<Formula> sum;
    double made = 0;
    double scale = std::abs(typed);
    for (std::size_t i = 0; i < sources.size(); ++i) {
      const double part = sources[i].contribution.stress.*one.of;
      if (part == 0)
        continue;
      const std::string symbol = one.letters + "," + shownCount(i + 1) + "}";
      numbers.push_back(units.put(symbol, part, dimension::stress));
      sum = sum ? *sum + Formula::symbol(symbol) : Formula::symbol(symbol);
      made += part;
      scale += std::abs(part);
    }
    if (!sum || (numbers.size() == 1 && typed == 0 && !isTurned))
      continue;
    const std::string symbolOfTyped = one.letters + ",typed}";
    Formula whole = isTurned ? -*sum : *sum;
    if (typed != 0) {
      numbers.insert(numbers.begin(), units.put(symbolOfTyped, typed, dimension::stress));
      const Formula ofTyped = Formula::symbol(symbolOfTyped);
      whole = isTurned ? ofTyped - *sum : ofTyped + *sum;
    }
    const double result = typed + (isTurned ? -made : made);
    // Of parts that cancel only rounding is left.
    steps.push_back(units.step(one.name, one.letters + "}", whole, numbers, withoutRounding(result, scale),
                               dimension::stress, PW_TEXT("Working", "the parts of a case add up")));
  }
  return steps;
}

} // namespace planewright
