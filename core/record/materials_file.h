// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/material.h"
#include "core/words/problem.h"

#include <vector>

namespace planewright {

/// What "format" says in a file of materials.
inline constexpr std::string_view materialsFormat = "planewright-materials";
/// Version of the file of materials that this program writes and the newest that it reads.
inline constexpr int materialsFileVersion = 1;

/// Materials as a file of their own, with the list that a study has under "materials".
std::string writeMaterials(const std::vector<Material>& materials);

/// Reads such a file as strictly as a study: every material can be taken into one as it stands. Problems with
/// path, line and column; never guesses. At most greatestStudyFile bytes.
Results<std::vector<Material>> readMaterials(std::string_view bytes);

} // namespace planewright
