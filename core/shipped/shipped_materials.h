// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/material.h"

#include <string_view>
#include <vector>

namespace planewright {

/// What the shipped materials are sorted by.
enum class MaterialFamily { solidTimber, glulam, lvl, lamina, filletWeld };
template <>
const std::vector<Named<MaterialFamily>>& namesOf<MaterialFamily>();

/// A material that comes with the program, as a study takes it: typed texts with units, source, edition and
/// trust. Timber is in service class 1.
struct ShippedMaterial {
  MaterialFamily family;
  Material material;
};
/// All of them, those of one family together in the order of the families; from resources/materials.
const std::vector<ShippedMaterial>& shippedMaterials();

/// The service classes of EN 1995-1-1 that factors are shipped for: "1", "2", "3".
const std::vector<std::string>& serviceClasses();
/// A shipped material in one of them, which only changes the duration factors of timber. Others stay as they
/// are.
Material inServiceClass(Material shipped, std::string_view serviceClass);

} // namespace planewright
