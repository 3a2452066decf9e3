// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

namespace planewright {

/// Where a place lives inside a study: the text itself, or the word of an enum, or a list of ids. For the
/// edits and the reader of texts only; none of the members is set when the place does not exist.
struct Slot {
  std::string* text = nullptr;
  Positive* positive = nullptr;
  ShearAxis* shearAxis = nullptr;
  LineKind* lineKind = nullptr;
  Nature* nature = nullptr;
  Duration* duration = nullptr;
  Basis* basis = nullptr;
  std::vector<std::string>* ids = nullptr;
};

Slot slotOf(Study& study, const Place& place);

/// The written form of what the slot holds; none for an empty slot.
std::optional<std::string> written(const Slot& slot);
/// Puts the word or ids of `text` into a slot that holds such; false when the word is none of its kind's.
bool putWord(const Slot& slot, std::string_view text);
/// The words that such a slot takes, joined by ", ".
std::string wordsOf(const Slot& slot);

/// The item of a list with this key, or null.
template <class Item, class Key>
Item* itemIn(std::vector<Item>& items, Key Item::*key, const std::string& wanted) {
  for (Item& item : items)
    if (item.*key == wanted)
      return &item;
  return nullptr;
}

} // namespace planewright
