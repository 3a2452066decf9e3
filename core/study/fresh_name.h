// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/format.h"

#include <string>

namespace planewright {

/// The first name that is not taken of those that `named` makes of `number` and the numbers after it.
template <class Named, class IsTaken>
std::string freshName(int number, Named named, IsTaken isTaken) {
  for (;; ++number)
    if (std::string name = named(exactNumber(number)); !isTaken(name))
      return name;
}

/// A name cut before the number that it ends with: "P1" is "P", and 2 comes next; "heel" is "heel ", and 2.
struct CountedName {
  std::string stem;
  int next = 2;
};
CountedName countedOn(const std::string& name);

/// The name with the next number behind it that is free: "P1" gives "P2".
template <class IsTaken>
std::string freshNameLike(const std::string& like, IsTaken isTaken) {
  const CountedName counted = countedOn(like);
  return freshName(
      counted.next, [&](const std::string& number) { return counted.stem + number; }, isTaken);
}

} // namespace planewright
