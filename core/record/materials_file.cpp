// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/materials_file.h"

#include "core/record/file_head.h"
#include "core/record/material_json.h"
#include "core/record/study_spots.h"
#include "core/record/typed_texts.h"
#include "core/study/edit.h"

namespace planewright {

std::string writeMaterials(const std::vector<Material>& materials) {
  JsonWriter json;
  json.beginObject();
  put(json, "format", materialsFormat);
  json.key("version").whole(materialsFileVersion);
  json.key("materials").beginList();
  for (const Material& material : materials)
    put(json, material);
  json.endList();
  json.endObject();
  return json.taken();
}

Results<std::vector<Material>> readMaterials(std::string_view bytes) {
  FileProblems problems(bytes);
  const std::optional<Json> root = readJson(problems);
  if (!root)
    return tl::unexpected(problems.taken());
  FileProblems head(bytes);
  checkHead(*root,
            {materialsFormat, materialsFileVersion,
             PW_TEXT("File", "This is not a file of materials of Planewright."),
             PW_TEXT("File", "A file of materials begins with \"format\": \"%1\".")},
            head);
  if (!head.empty())
    return tl::unexpected(head.taken());
  Reading reading{problems, problems.empty()};
  ObjectReader object(*root, {}, reading);
  object.value("format");
  object.value("version");
  // What a material may be is said of those of a study.
  Study study = newStudy();
  if (const auto* items = object.list("materials"))
    for (const JsonMember& item : *items)
      read(item.value, reading, study.materials.emplace_back());
  object.refuseUnread();
  if (reading.complete)
    addProblemsOf(study, *root, bytes, problems);
  if (!problems.empty())
    return tl::unexpected(problems.taken());
  return std::move(study.materials);
}

} // namespace planewright
