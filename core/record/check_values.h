// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/verdict.h"

#include <string>
#include <vector>

namespace planewright {

/// A value of a check as files write it: a text, a number, a truth, or nothing.
struct CheckValue {
  enum class Is { nothing, text, number, truth };
  Is is = Is::nothing;
  std::string text{};
  double number = 0;
  bool truth = false;

  CheckValue() = default;
  explicit CheckValue(std::string words) : is(Is::text), text(std::move(words)) {}
  explicit CheckValue(double value) : is(Is::number), number(value) {}
  explicit CheckValue(bool value) : is(Is::truth), truth(value) {}
};

/// One value of a check in one state and the key that names it in files.
struct CheckField {
  const char* key;
  CheckValue value;
};

/// A finite number, or nothing.
CheckValue finite(const std::optional<double>& number);
/// The word of the mode, or nothing.
CheckValue modeOf(const Judgement& judgement);

/// The parameters of a check that are given: n, F12 in 1/stress^2 of the unit, k_c90, edge in deg.
std::vector<CheckField> parametersOf(const CheckSetup& check, const Unit& stress);

/// What files tell of a check in one state besides its id, parameters and band, in three parts: what is
/// judged by what; the nominal direction; the worst of the band. No number that is not finite stands in them:
/// a utilisation without a finite number is nothing, and `exceeds` holds.
std::vector<CheckField> subjectOf(const CheckSetup& check);
std::vector<CheckField> nominalOf(const CheckSetup& check, const CheckReading& reading);
std::vector<CheckField> worstOf(const CheckReading& reading);

} // namespace planewright
