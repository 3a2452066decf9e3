// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/json_writer.h"
#include "core/record/object_reader.h"
#include "core/study/text_fields.h"

namespace planewright {

/// The name of an item, for the path of its Problems; empty as long as it has none.
inline std::string nameIn(const Json& json, const char* key) {
  const JsonMember* name = json.kind == Json::Kind::object ? member(json, key) : nullptr;
  return name && name->value.kind == Json::Kind::text ? name->value.text : "";
}

/// The texts of a thing by the keys of their spots.
template <class Thing>
void readTexts(ObjectReader& object, Thing& thing) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>())
    object.text(rowOf(field.spot).key(), thing.*field.text);
}

/// An object that holds nothing but texts.
template <class Thing>
void readAllTexts(const Json& json, std::string path, Reading& reading, Thing& thing) {
  ObjectReader object(json, std::move(path), reading);
  readTexts(object, thing);
  object.refuseUnread();
}

inline void put(JsonWriter& json, const char* key, std::string_view text) {
  json.key(key).text(text);
}

/// The texts of a thing by the keys of their spots.
template <class Thing>
void putTexts(JsonWriter& json, const Thing& thing) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>())
    json.key(rowOf(field.spot).key()).text(thing.*field.text);
}

/// The texts that are not empty.
template <class Thing>
void putGivenTexts(JsonWriter& json, const Thing& thing) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>())
    if (!(thing.*field.text).empty())
      json.key(rowOf(field.spot).key()).text(thing.*field.text);
}

} // namespace planewright
