// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

#include <variant>

namespace planewright {

/// Where a place lives inside a study: the text itself, or a list of ids, or the word of an enum. For the
/// edits and the reader of texts only; monostate when the place does not exist or holds no text.
using Slot = std::variant<std::monostate, std::string*, std::vector<std::string>*, Positive*, ShearAxis*,
                          ShearRule*, Digits*, LineKind*, Nature*, Duration*, Basis*, SectionShape*, View*,
                          Ends*, Elasticity*, MaterialKind*, StrengthBasis*, Seam*, Criterion*>;

Slot slotOf(Study& study, const Place& place);

/// The written form of what the slot holds; none for an empty slot.
std::optional<std::string> written(const Slot& slot);
/// Puts a text into a slot as it is, or the word or ids that it names; false when the word is none of its
/// kind's, or the slot is empty.
bool put(const Slot& slot, std::string_view text);
/// Whether `put` would take the text.
bool fits(const Slot& slot, std::string_view text);
/// The words that a slot of an enum takes, joined by ", ".
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
