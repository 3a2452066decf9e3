// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/check_values.h"

#include <cmath>

namespace planewright {

namespace {

CheckValue named(const std::string& name) {
  return name.empty() ? CheckValue() : CheckValue(name);
}

void add(std::vector<CheckField>& fields, const char* key, const std::optional<double>& value) {
  if (value)
    fields.push_back({key, CheckValue(*value)});
}

} // namespace

CheckValue finite(const std::optional<double>& number) {
  return number && std::isfinite(*number) ? CheckValue(*number) : CheckValue();
}

CheckValue modeOf(const Judgement& judgement) {
  return judgement.mode ? CheckValue(std::string(wordOf(*judgement.mode))) : CheckValue();
}

std::vector<CheckField> parametersOf(const CheckSetup& check, const Unit& stress) {
  std::vector<CheckField> fields;
  const Parameters& given = check.parameters;
  add(fields, "n", given.n);
  if (given.F12)
    add(fields, "F12", stress.toBase(stress.toBase(*given.F12)));
  add(fields, "k_c90", given.kc90);
  if (given.edge)
    add(fields, "edge", given.edge->degrees());
  return fields;
}

std::vector<CheckField> subjectOf(const CheckSetup& check) {
  return {{"material", CheckValue(check.material)},
          {"criterion", CheckValue(std::string(wordOf(check.criterion)))},
          {"line", named(check.line)},
          {"plane", named(check.plane)}};
}

std::vector<CheckField> nominalOf(const CheckSetup& check, const CheckReading& reading) {
  const bool judged = !reading.problem;
  return {{"basis", CheckValue(std::string(wordOf(check.basis)))},
          {"factor", reading.hasFactor ? CheckValue(reading.factor.value) : CheckValue()},
          {"utilisation", judged ? finite(reading.nominal.utilisation) : CheckValue()},
          {"load_multiplier", judged ? finite(reading.nominal.multiplier) : CheckValue()},
          {"mode", judged ? modeOf(reading.nominal) : CheckValue()}};
}

std::vector<CheckField> worstOf(const CheckReading& reading) {
  const bool judged = !reading.problem;
  const bool hasBand = judged && reading.worstAngle.has_value();
  return {{"worst_angle", hasBand ? CheckValue(reading.worstAngle->degrees()) : CheckValue()},
          {"worst_utilisation", hasBand ? finite(reading.worst.utilisation) : CheckValue()},
          {"worst_load_multiplier", hasBand ? finite(reading.leastMultiplier()) : CheckValue()},
          {"worst_mode", hasBand ? modeOf(reading.worst) : CheckValue()},
          {"exceeds", judged ? CheckValue(reading.exceeds()) : CheckValue()},
          {"pairing", named(plain(reading.pairing))},
          {"problem", judged ? CheckValue() : CheckValue(plain(*reading.problem))}};
}

} // namespace planewright
