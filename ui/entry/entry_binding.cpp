// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/entry_binding.h"

namespace planewright {

EntryBinding boundTo(std::function<Place(const Study&)> place, std::function<Edits(const Study&)> made) {
  EntryBinding binding;
  binding.path = [place](const Study& study) { return pathOf(place(study)); };
  binding.text = [place](const Study& study) { return textAt(study, place(study)).value_or(""); };
  binding.edits = [place, made](const Study& study, const std::string& typed) -> Result<Edits> {
    Edits edits = made && !textAt(study, place(study)) ? made(study) : Edits{};
    edits.push_back(Type{place(study), typed});
    return edits;
  };
  return binding;
}

} // namespace planewright
