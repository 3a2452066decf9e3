// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"
#include "core/study/readout.h"

#include <QString>

#include <functional>

namespace planewright {

/// What one field stands for, as functions of the study alone.
struct EntryBinding {
  /// Path of the spot; a field may follow the shown point or case and so move to another spot.
  std::function<std::string(const Study&)> path;
  /// The text while nobody types.
  std::function<std::string(const Study&)> text;
  /// What taking a typed text does.
  std::function<Result<Edits>(const Study&, const std::string& typed)> edits;
  /// What Escape does to bring the text at entry back; an empty function when that is taking it again.
  std::function<Result<Edits>(const Study&, const std::string& atEntry)> putBack;
  /// The evaluated value, "8.611 MPa", to show under a text of a study that has it; an empty function or
  /// text for none.
  std::function<QString(const Study&, const Readout&, const std::string& typed)> echo;
};

/// A field over one place, which may follow the shown point or case.
EntryBinding boundTo(std::function<Place(const Study&)> place);

/// The same over a place in a thing, `owner`, that the study need not have: then it is shown empty, the first
/// text inserts the thing, and Escape removes it.
EntryBinding boundInto(std::function<Place(const Study&)> owner, Spot spot);

} // namespace planewright
