// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>
#include <vector>

namespace planewright {

/// What a scan of a file's bytes for carried studies came to.
struct CarriedTexts {
  enum class State { whole, cutOff, changed };
  std::vector<std::string_view> texts; ///< in their order in the file
  State state = State::whole;          ///< of the file, as far as the scan saw
};

} // namespace planewright
