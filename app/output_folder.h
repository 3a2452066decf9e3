// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <optional>
#include <string>
#include <vector>

namespace planewright {

/// A folder into which a command writes several files, and the option that names it.
struct OutputFolder {
  std::string option;
  std::string path;

  std::string pathOf(const std::string& file) const;
  /// That files of these names are there already, which are written over only on request.
  std::optional<Problem> existing(const std::vector<std::string>& files) const;
  /// Makes the folder, or one in it, where it is not there.
  std::optional<Problem> make(const std::string& inner = {}) const;
};

} // namespace planewright
