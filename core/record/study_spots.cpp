// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/study_spots.h"

#include "core/record/json_text.h"
#include "core/study/place.h"

#include <algorithm>
#include <array>

namespace planewright {

namespace {

bool isNamed(const Json& item, std::string_view name) {
  for (const char* key : {"id", "name"})
    if (const JsonMember* found = member(item, key); found && found->value.text == name)
      return true;
  return false;
}

/// Of items with one name the last, which is the one too many.
const JsonMember* lastNamed(const Json& list, std::string_view name) {
  const auto at = std::ranges::find_if(list.members.rbegin(), list.members.rend(),
                                       [name](const JsonMember& item) { return isNamed(item.value, name); });
  return at == list.members.rend() ? nullptr : &*at;
}

const JsonMember* step(const Json& from, std::string_view name) {
  return from.kind == Json::Kind::list ? lastNamed(from, name) : member(from, name);
}

} // namespace

std::size_t offsetOf(const Problem& problem, const Json& root, std::string_view bytes) {
  const std::optional<Place> place = placeOf(problem.place);
  if (!place)
    return root.offset;
  const std::array<std::string_view, 2> names{place->owner, place->item};
  std::size_t next = 0;
  const Json* value = &root;
  std::size_t keyOffset = root.offset;
  std::string_view path = rowOf(place->spot).path;
  while (!path.empty()) {
    const std::size_t slash = std::min(path.find('/'), path.size());
    const std::string_view segment = path.substr(0, slash);
    path.remove_prefix(std::min(slash + 1, path.size()));
    const JsonMember* found = step(*value, segment == "*" ? names.at(next++) : segment);
    if (!found)
      return value->offset;
    keyOffset = value->kind == Json::Kind::object && found->key == problem.quoted ? found->keyOffset
                                                                                  : found->value.offset;
    value = &found->value;
  }
  if (value->kind == Json::Kind::list)
    for (const JsonMember& item : value->members)
      if (item.value.text == problem.quoted)
        return item.value.offset;
  if (value->kind == Json::Kind::text && problem.column > 0)
    return offsetInText(bytes, value->offset, static_cast<std::size_t>(problem.column) - 1);
  return keyOffset;
}

} // namespace planewright
