// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/fresh_name.h"

#include <charconv>

namespace planewright {

CountedName countedOn(const std::string& name) {
  constexpr std::size_t mostDigits = 8; // a number too long to count with stays part of the name
  const std::size_t stem = name.find_last_not_of("0123456789") + 1;
  if (stem == name.size() || name.size() - stem > mostDigits)
    return {name + " "};
  int number = 1;
  std::from_chars(name.data() + stem, name.data() + name.size(), number);
  return {name.substr(0, stem), number + 1};
}

} // namespace planewright
