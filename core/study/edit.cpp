// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"

#include "core/study/list_of.h"
#include "core/study/references.h"
#include "core/study/rules.h"
#include "core/study/source_rules.h"
#include "core/study/typed.h"

namespace planewright {

namespace {

Problem noSuchPlace(const Place& place) {
  return problemAt(place, {}, PW_TEXT("Study", "There is no such place in this study."));
}

std::optional<Problem> takes(Study& study, const Type& type) {
  const Slot slot = slotOf(study, type.place);
  if (!written(slot))
    return noSuchPlace(type.place);
  Result<std::string> kept = keptText(study, type.place, slot, type.text);
  if (!kept)
    return std::move(kept).error();
  put(slot, *kept);
  return std::nullopt;
}

std::optional<Problem> takes(Study& study, const Insert& insert) {
  const std::string& key = keyOf(insert.place);
  if (Text fault = faultOfKey(insert.place.spot, key); !fault.empty())
    return problemAt(insert.place, key, std::move(fault));
  const bool done = withList(study, insert.place, [&](auto& list) {
    if (list.holds(key))
      return false;
    list.insert(insert.index, key);
    return true;
  });
  if (done)
    return std::nullopt;
  return problemAt(insert.place, key, PW_TEXT("Study", "“%1” cannot be added here.").with(key),
                   PW_TEXT("Study", "Use a name that is not taken yet."));
}

std::optional<Problem> takes(Study& study, const Remove& remove) {
  const bool done =
      withList(study, remove.place, [&](auto& list) { return list.erase(keyOf(remove.place)); });
  if (!done)
    return noSuchPlace(remove.place);
  dropReferences(study, remove.place);
  return std::nullopt;
}

std::optional<Problem> takes(Study& study, const Move& move) {
  const bool done =
      withList(study, move.place, [&](auto& list) { return list.move(keyOf(move.place), move.index); });
  return done ? std::nullopt : std::optional(noSuchPlace(move.place));
}

std::optional<Problem> takes(Study& study, const Rename& rename) {
  if (Text fault = faultOfKey(rename.place.spot, rename.name); !fault.empty())
    return problemAt(rename.place, rename.name, std::move(fault));
  const std::string& key = keyOf(rename.place);
  const bool same = key == rename.name;
  bool taken = false;
  const bool done = withList(study, rename.place, [&](auto& list) {
    taken = !same && list.holds(key) && list.holds(rename.name);
    return list.holds(key) && !taken && list.rename(key, rename.name);
  });
  if (taken)
    return problemAt(rename.place, rename.name, PW_TEXT("Study", "The name “%1” is taken.").with(rename.name),
                     PW_TEXT("Study", "Use another name."));
  if (!done)
    return noSuchPlace(rename.place);
  if (!same)
    renameReferences(study, rename.place, rename.name);
  return std::nullopt;
}

} // namespace

Result<Study> edited(const Study& study, const Edits& edits) {
  Study after = study;
  for (const Edit& edit : edits)
    if (auto problem = std::visit([&after](const auto& one) { return takes(after, one); }, edit))
      return tl::unexpected(*std::move(problem));
  // Each text was read when it was typed; what is left are the rules between places.
  if (Problems problems = brokenRules(after); !problems.empty())
    return tl::unexpected(std::move(problems.front()));
  if (Problems problems = brokenSources(after, study); !problems.empty())
    return tl::unexpected(std::move(problems.front()));
  return after;
}

Result<Study> edited(const Study& study, const Edit& edit) {
  return edited(study, Edits{edit});
}

} // namespace planewright
