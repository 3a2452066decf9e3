// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>

namespace planewright {

/// Which list a material stands in: the study's, the user's own library, or that of the program.
enum class MaterialOrigin { study, own, shipped };

struct MaterialChoice {
  MaterialOrigin origin = MaterialOrigin::study;
  std::string name; ///< empty: none
  bool operator==(const MaterialChoice&) const = default;
};

} // namespace planewright
