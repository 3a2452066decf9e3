// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/check_steps.h"

#include "core/quantity/format.h"
#include "core/strength/judgement.h"
#include "core/working/recoverable.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int angleDecimals = 2;
constexpr int mostBeyondState = 4; ///< decimals of a number put in, beyond those of the state
constexpr int mostDecimals = 12;

/// Four significant digits; more where what is not 1 would be written so.
int decimalsOfRatio(double ratio) {
  int decimals = decimalsFor(std::abs(ratio));
  const auto readsAsOne = [&] { return std::abs(ratio - 1) < 0.5 * std::pow(10.0, -decimals); };
  while (std::abs(ratio - 1) > exceedingFrom - 1 && decimals < mostDecimals && readsAsOne())
    ++decimals;
  return decimals;
}

void addFinite(std::vector<Step>& steps, Step step) {
  const bool isFinite =
      std::isfinite(step.result) &&
      std::ranges::all_of(step.putIn, [](const NumberPutIn& one) { return std::isfinite(one.value); });
  if (isFinite)
    steps.push_back(recoverable(std::move(step)));
}

} // namespace

CheckSteps::CheckSteps(WrittenUnits units, int stressDecimals)
    : m_units(std::move(units)), m_stressDecimals(stressDecimals) {}

Formula CheckSteps::put(const std::string& symbol, double value, Dimension dimension) {
  std::erase_if(m_numbers, [&](const NumberPutIn& number) { return number.symbol == symbol; });
  if (!std::isfinite(value)) {
    m_numbers.push_back({symbol, value});
    return Formula::symbol(symbol);
  }
  NumberPutIn number = m_units.put(symbol, value, dimension);
  if (number.isAngle)
    number.decimals = angleDecimals + 1;
  m_numbers.push_back(std::move(number));
  return Formula::symbol(symbol);
}

Formula CheckSteps::putStress(const std::string& symbol, double value) {
  Formula formula = put(symbol, value, dimension::stress);
  NumberPutIn& number = m_numbers.back();
  number.decimals = std::min(number.decimals, m_stressDecimals + mostBeyondState);
  return formula;
}

bool CheckSteps::knows(const std::string& symbol) const {
  return std::ranges::find(m_numbers, symbol, &NumberPutIn::symbol) != m_numbers.end();
}

Step CheckSteps::stepOf(const CheckLine& line) const {
  Step step =
      m_units.step(line.name, line.symbol, line.formula, m_numbers, line.result, line.dimension, line.source);
  if (line.dimension == dimension::angle)
    step.decimals = angleDecimals;
  if (line.dimension == dimension::none)
    step.decimals = decimalsOfRatio(line.result);
  for (NumberPutIn& number : step.putIn)
    if (number.unit == step.unit)
      number.unit.clear();
  return step;
}

Text CheckSteps::named(const Text& name) const {
  switch (m_at) {
  case StepsAt::worst:
    return PW_TEXT("Working", "%1, at the worst direction").with(name);
  case StepsAt::first:
    return PW_TEXT("Working", "%1, at the direction that comes to its limit first").with(name);
  case StepsAt::nominal:
    break;
  }
  return name;
}

Formula CheckSteps::addStrength(const CheckLine& line) {
  addFinite(m_strengths, stepOf(line));
  return put(line.symbol, line.result, line.dimension);
}

Formula CheckSteps::addStress(CheckLine line) {
  line.name = named(line.name);
  Step step = stepOf(line);
  step.decimals = m_stressDecimals;
  addFinite(m_rest, std::move(step));
  return putStress(line.symbol, line.result);
}

Formula CheckSteps::add(CheckLine line) {
  line.name = named(line.name);
  addFinite(m_rest, stepOf(line));
  return put(line.symbol, line.result, line.dimension);
}

std::vector<Step> CheckSteps::steps() const {
  std::vector<Step> all = m_strengths;
  all.insert(all.end(), m_rest.begin(), m_rest.end());
  return all;
}

} // namespace planewright
