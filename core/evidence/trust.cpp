// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/trust.h"

namespace planewright {

template <>
const std::vector<Named<Trust>>& namesOf<Trust>() {
  static const std::vector<Named<Trust>> names = {
      {Trust::work, "work", PW_TEXT("Validate", "read in the work itself")},
      {Trust::companion, "companion", PW_TEXT("Validate", "read in a companion of the work or second-hand")},
      {Trust::memory, "memory", PW_TEXT("Validate", "from memory")},
      {Trust::own, "own", PW_TEXT("Validate", "own arithmetic")}};
  return names;
}

Trust trustOf(const CheckResult& check) {
  const std::string& basis = check.basis;
  const auto says = [&](const char* words) { return basis.find(words) != std::string::npos; };
  if (!check.printed || says("recomputed") || says("identity") || says("own arithmetic"))
    return Trust::own;
  if (says("from memory"))
    return Trust::memory;
  return basis == "read in the work itself" ? Trust::work : Trust::companion;
}

} // namespace planewright
