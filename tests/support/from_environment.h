// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstdlib>

namespace planewright {

/// How much a long test is asked to do: the number in an environment variable, or another without it.
inline int fromEnvironment(const char* name, int otherwise) {
  const char* value = std::getenv(name);
  return value ? std::atoi(value) : otherwise;
}

} // namespace planewright
