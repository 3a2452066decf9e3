// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/entry_binding.h"

namespace planewright {

EntryBinding boundTo(std::function<Place(const Study&)> place) {
  EntryBinding binding;
  binding.path = [place](const Study& study) { return pathOf(place(study)); };
  binding.text = [place](const Study& study) { return textAt(study, place(study)).value_or(""); };
  binding.edits = [place](const Study& study, const std::string& typed) -> Result<Edits> {
    return Edits{Type{place(study), typed}};
  };
  return binding;
}

EntryBinding boundInto(std::function<Place(const Study&)> owner, Spot spot) {
  const auto place = [owner, spot](const Study& study) {
    Place inside = owner(study);
    inside.spot = spot;
    return inside;
  };
  EntryBinding binding = boundTo(place);
  binding.edits = [owner, place](const Study& study, const std::string& typed) -> Result<Edits> {
    const Type text{place(study), typed};
    return textAt(study, text.place) ? Edits{text} : Edits{Insert{owner(study), std::nullopt}, text};
  };
  binding.putBack = [owner, place](const Study& study, const std::string& atEntry) -> Result<Edits> {
    if (atEntry.empty())
      return Edits{Remove{owner(study)}};
    return Edits{Type{place(study), atEntry}};
  };
  return binding;
}

} // namespace planewright
