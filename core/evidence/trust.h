// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"

namespace planewright {

/// How far a check is evidence from outside the program.
enum class Trust {
  work,      ///< the value was read in the work itself
  companion, ///< read in a companion of the work, or second-hand
  memory,    ///< value or inputs are from memory
  own        ///< own arithmetic: the program is compared with its authors' own sums
};
template <>
const std::vector<Named<Trust>>& namesOf<Trust>();

/// Values from memory and own arithmetic are no evidence from outside.
constexpr bool isOutside(Trust trust) {
  return trust == Trust::work || trust == Trust::companion;
}

/// By what the check says of its basis; without a printed value it is own arithmetic.
Trust trustOf(const CheckResult& check);

} // namespace planewright
