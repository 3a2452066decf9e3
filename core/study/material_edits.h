// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

namespace planewright {

/// Edits of materials as wholes, so that no study between is without sense.

/// Takes a material of a library into a study under a name that the study does not have: a copy, which has
/// nothing more to do with the library.
Edits editsThatTake(const Material& material, const std::string& name);

/// Gives a material of the study another kind; what this kind does not have goes.
Edits editsThatChangeKind(const Study& study, const std::string& name, MaterialKind kind);

/// `wanted`, or with the first number that makes a name which the study does not have: "GL24h 2".
std::string freshMaterialName(const Study& study, const std::string& wanted);

/// The checks of all points that judge by a material, and so go with it.
std::vector<Place> checksBy(const Study& study, const std::string& material);

} // namespace planewright
