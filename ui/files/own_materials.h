// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/material.h"
#include "core/words/problem.h"

#include <optional>
#include <vector>

namespace planewright {

/// Where the user's own materials are kept: a file in the folder of settings.
std::string ownMaterialsPath();

/// The user's own library of materials, in a file that several windows may share: it is read again before
/// each change. A file that does not read is left untouched.
class OwnMaterials {
public:
  explicit OwnMaterials(std::string path);

  const std::string& path() const { return m_path; }
  const std::vector<Material>& all() const { return m_materials; }
  /// Why the file does not read; a file that is not there is an empty library.
  const Problems& problems() const { return m_problems; }

  void readAgain();
  /// Keeps a copy. The Problem when the name is taken, or the file was not read or not written.
  std::optional<Problem> keep(const Material& material);
  /// Takes the material of this name out.
  std::optional<Problem> drop(const std::string& name);

private:
  std::optional<Problem> write(std::vector<Material> materials);

  std::string m_path;
  std::vector<Material> m_materials;
  Problems m_problems;
};

} // namespace planewright
