// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/working_of_sum.h"

#include "core/study/stress_form.h"

#include <algorithm>
#include <functional>

namespace planewright {

namespace {

struct Component {
  const char* symbol; ///< without its index
  const char* index;
  Text name;
  std::function<double(const PlaneStress&, double sz)> value;
};

const std::vector<Component>& components() {
  static const std::vector<Component> rows = {{"σ", "x", PW_TEXT("Working", "normal stress on the x face"),
                                               [](const PlaneStress& stress, double) { return stress.sx; }},
                                              {"σ", "y", PW_TEXT("Working", "normal stress on the y face"),
                                               [](const PlaneStress& stress, double) { return stress.sy; }},
                                              {"τ", "xy", PW_TEXT("Working", "shear stress"),
                                               [](const PlaneStress& stress, double) { return stress.txy; }},
                                              {"σ", "z", PW_TEXT("Working", "stress across the plane"),
                                               [](const PlaneStress&, double sz) { return sz; }}};
  return rows;
}

/// The id of a case as an index of a symbol, without the characters that symbols are written with; a prime
/// keeps apart what becomes equal so.
std::string asIndex(std::string id, const std::vector<std::string>& taken) {
  std::erase_if(id, [](char c) { return c == '%' || c == '_' || c == '{' || c == '}'; });
  while (std::ranges::find(taken, id) != taken.end())
    id += "′";
  return id;
}

std::vector<std::string> indicesOf(const Readout& readout, const StateReading& state) {
  std::vector<std::string> indices;
  indices.reserve(state.acting.size());
  for (const ActingCase& acting : state.acting)
    indices.push_back(asIndex(readout.cases[acting.index].id, indices));
  return indices;
}

} // namespace

std::vector<Step> workingOfSum(const Study& study, const Readout& readout, const StateReading& state) {
  std::vector<Step> steps;
  if (state.acting.empty())
    return steps;
  const StressForm form = stressFormOf(study, state);
  const std::vector<std::string> indices = indicesOf(readout, state);
  const bool hasThird = std::ranges::any_of(
      state.acting, [&](const ActingCase& one) { return readout.cases[one.index].sz != 0; });
  for (const Component& component : components()) {
    if (component.index == std::string_view("z") && !hasThird)
      continue;
    std::optional<Formula> sum;
    NumbersPutIn numbers;
    for (std::size_t i = 0; i < state.acting.size(); ++i) {
      const ActingCase& acting = state.acting[i];
      const CaseReading& one = readout.cases[acting.index];
      const std::string symbol =
          std::string(component.symbol) + "_{" + component.index + "," + indices[i] + "}";
      const Formula term = Formula(acting.factor) * Formula::symbol(symbol);
      sum = sum ? *sum + term : term;
      numbers.push_back({symbol, form.inUnit(component.value(one.stress, one.sz)), form.decimals + 1});
    }
    steps.push_back({component.name, symbol(std::string(component.symbol) + "_{" + component.index + "}"),
                     *sum, std::move(numbers), form.inUnit(component.value(state.stress, state.sz)),
                     form.decimals, form.unit.name, PW_TEXT("Working", "common practice, no source")});
  }
  return steps;
}

} // namespace planewright
