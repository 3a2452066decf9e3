// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/material_json.h"

#include "core/record/typed_texts.h"

namespace planewright {

void read(const Json& json, Reading& reading, Material& material) {
  ObjectReader object(json, pathOf({Spot::material, nameIn(json, "name"), {}}), reading);
  object.neededText("name", material.name);
  object.word("kind", material.kind);
  object.word("basis", material.basis);
  readTexts(object, material);
  object.word("seam", material.seam);
  if (const Json* durations = object.value("duration_factors"))
    readAllTexts(*durations, pathOf({Spot::material, material.name, {}}) + "/duration_factors", reading,
                 material.durations);
  object.refuseUnread();
}

void put(JsonWriter& json, const Material& material) {
  json.beginObject();
  put(json, "name", material.name);
  put(json, "kind", wordOf(material.kind));
  put(json, "basis", wordOf(material.basis));
  putGivenTexts(json, material);
  if (material.kind == MaterialKind::throat || material.seam != Seam::fillet)
    put(json, "seam", wordOf(material.seam));
  if (material.durations != DurationTexts{}) {
    json.key("duration_factors").beginObject();
    putGivenTexts(json, material.durations);
    json.endObject();
  }
  json.endObject();
}

} // namespace planewright
