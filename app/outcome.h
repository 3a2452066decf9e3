// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

namespace planewright {

/// How a command ends. The numbers are what scripts rely on.
enum class Exit { done = 0, exceeds = 1, wrongUse = 2, machineFailed = 3, leftOut = 4, disagrees = 5 };

/// A command that came to nothing.
struct Failure {
  Exit exit = Exit::wrongUse;
  Problems problems;
};

template <class T>
using Outcome = tl::expected<T, Failure>;

inline tl::unexpected<Failure> wrongUse(Problem problem) {
  return tl::unexpected(Failure{Exit::wrongUse, {std::move(problem)}});
}

inline tl::unexpected<Failure> machineFailed(Problem problem) {
  return tl::unexpected(Failure{Exit::machineFailed, {std::move(problem)}});
}

} // namespace planewright
