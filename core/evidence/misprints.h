// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <vector>

namespace planewright {

/// A printed answer that does not follow from its own inputs.
struct Misprint {
  std::string source;
  std::string printed;
  std::string recomputed; ///< own arithmetic from the printed inputs
  std::string reason;
};

/// Those that were met in the sources of the published checks. Nothing is judged against them.
std::vector<Misprint> knownMisprints();

} // namespace planewright
