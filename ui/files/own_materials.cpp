// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/own_materials.h"

#include "core/record/materials_file.h"
#include "core/record/study_file.h"
#include "ui/files/file_bytes.h"

#include <QStandardPaths>

#include <algorithm>
#include <filesystem>

namespace planewright {

namespace {

namespace fs = std::filesystem;

Results<std::vector<Material>> materialsIn(const std::string& path) {
  std::error_code failed;
  if (!fs::exists(path, failed) && !failed)
    return std::vector<Material>();
  const Result<std::string> bytes = bytesOf(path, greatestStudyFile);
  if (!bytes)
    return tl::unexpected(Problems{bytes.error()});
  return readMaterials(*bytes);
}

} // namespace

std::string ownMaterialsPath() {
  const QString folder = QStandardPaths::writableLocation(QStandardPaths::AppConfigLocation);
  return (folder + QStringLiteral("/materials.json")).toStdString();
}

OwnMaterials::OwnMaterials(std::string path) : m_path(std::move(path)) {
  readAgain();
}

void OwnMaterials::readAgain() {
  Results<std::vector<Material>> materials = materialsIn(m_path);
  m_materials.clear();
  m_problems.clear();
  if (materials)
    m_materials = *std::move(materials);
  else
    m_problems = std::move(materials).error();
}

std::optional<Problem> OwnMaterials::keep(const Material& material) {
  readAgain();
  if (std::ranges::find(m_materials, material.name, &Material::name) != m_materials.end())
    return Problem{{},
                   0,
                   0,
                   material.name,
                   PW_TEXT("File", "Your library has another “%1” already.").with(material.name),
                   PW_TEXT("File", "Give this one another name, or remove that one first.")};
  std::vector<Material> materials = m_materials;
  materials.push_back(material);
  return write(std::move(materials));
}

std::optional<Problem> OwnMaterials::drop(const std::string& name) {
  readAgain();
  std::vector<Material> materials = m_materials;
  std::erase_if(materials, [&](const Material& one) { return one.name == name; });
  return write(std::move(materials));
}

// Nothing is written that would not be read again.
std::optional<Problem> OwnMaterials::write(std::vector<Material> materials) {
  if (!m_problems.empty())
    return Problem{m_path,
                   0,
                   0,
                   {},
                   PW_TEXT("File", "The file of your materials does not read, so nothing is written to it."),
                   PW_TEXT("File", "Mend it, or move it away to begin another.")};
  const std::string bytes = writeMaterials(materials);
  if (const auto again = readMaterials(bytes); !again)
    return again.error().front();
  std::error_code failed;
  fs::create_directories(fs::path(m_path).parent_path(), failed);
  if (const Result<void> written = writeAside(m_path, bytes); !written)
    return written.error();
  m_materials = std::move(materials);
  return std::nullopt;
}

} // namespace planewright
