// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/study_spots.h"

#include "core/record/json_text.h"
#include "core/study/edit.h"
#include "core/study/place.h"

#include <algorithm>
#include <array>
#include <cassert>

namespace planewright {

namespace {

/// What names an item of a list, or null.
const Json* nameOf(const Json& item) {
  for (const char* key : {"id", "name"})
    if (const JsonMember* found = item.kind == Json::Kind::object ? member(item, key) : nullptr)
      return &found->value;
  return nullptr;
}

/// Of items with one name the last, which is the one too many.
const JsonMember* lastNamed(const Json& list, std::string_view name) {
  const auto at =
      std::ranges::find_if(list.members.rbegin(), list.members.rend(), [name](const JsonMember& item) {
        const Json* own = nameOf(item.value);
        return own && own->text == name;
      });
  return at == list.members.rend() ? nullptr : &*at;
}

const JsonMember* step(const Json& from, std::string_view name) {
  return from.kind == Json::Kind::list ? lastNamed(from, name) : member(from, name);
}

struct Found {
  const Json* value;
  std::size_t offset;   ///< of the value, or of its key where the key is the offending piece
  bool isPlace = false; ///< false: the nearest thing around the place
};

/// Walks from the root along the path of a place.
Found found(const Place& place, std::string_view quoted, const Json& root) {
  const std::array<std::string_view, 2> names{place.owner, place.item};
  std::size_t next = 0;
  Found at{&root, root.offset};
  std::string_view path = rowOf(place.spot).path;
  while (!path.empty()) {
    const std::size_t slash = std::min(path.find('/'), path.size());
    const std::string_view segment = path.substr(0, slash);
    path.remove_prefix(std::min(slash + 1, path.size()));
    assert(segment != "*" || next < names.size());
    const JsonMember* inner = step(*at.value, segment == "*" ? names[next++] : segment);
    if (!inner && segment == "lines") {
      inner = step(*at.value, "line"); // a single line has no list
      if (inner)
        path.remove_prefix(std::min(std::string_view("*/").size(), path.size()));
    }
    if (!inner)
      return at;
    const bool isKey = at.value->kind == Json::Kind::object && inner->key == quoted;
    at = {&inner->value, isKey ? inner->keyOffset : inner->value.offset};
  }
  at.isPlace = true;
  return at;
}

} // namespace

std::size_t offsetOf(const Problem& problem, const Json& root, std::string_view bytes) {
  const std::optional<Place> place = placeOf(problem.place);
  if (!place)
    return root.offset;
  const auto [value, offset, isPlace] = found(*place, problem.quoted, root);
  if (!isPlace)
    return offset;
  if (value->kind == Json::Kind::list)
    for (const JsonMember& item : value->members)
      if (item.value.text == problem.quoted)
        return item.value.offset;
  if (value->kind == Json::Kind::text && problem.column > 0)
    return offsetInText(bytes, value->offset, static_cast<std::size_t>(problem.column) - 1);
  const Json* name = rowOf(place->spot).holds == Holds::thing ? nameOf(*value) : nullptr;
  return name && name->text == problem.quoted ? name->offset : offset;
}

void addProblemsOf(const Study& study, const Json& root, std::string_view bytes, FileProblems& problems) {
  for (Problem& problem : problemsIn(study)) {
    const std::size_t offset = offsetOf(problem, root, bytes);
    problems.add(offset, std::move(problem));
  }
}

} // namespace planewright
