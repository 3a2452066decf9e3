// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

#include <variant>

namespace planewright {

/// Puts a typed text at a place. A bare number is completed with the field's unit.
struct Type {
  Place place;
  std::string text;
  bool operator==(const Type&) const = default;
};

/// Makes a new thing with this key (a case, combination, point, plane, factor, stress of a case, line) at
/// `index` of its list, or at the end.
struct Insert {
  Place place;
  std::optional<std::size_t> index;
  bool operator==(const Insert&) const = default;
};

/// Takes a thing away, and what cannot stand without it (a case's factors and stresses).
struct Remove {
  Place place;
  bool operator==(const Remove&) const = default;
};

/// Puts a thing at another index of its list.
struct Move {
  Place place;
  std::size_t index = 0;
  bool operator==(const Move&) const = default;
};

/// Gives a thing another key and rewrites what refers to it.
struct Rename {
  Place place;
  std::string name;
  bool operator==(const Rename&) const = default;
};

using Edit = std::variant<Type, Insert, Remove, Move, Rename>;
/// Edits that belong together: all are taken or none.
using Edits = std::vector<Edit>;

/// The study after the edits, or the first Problem; never an invalid study.
Result<Study> edited(const Study& study, const Edit& edit);
Result<Study> edited(const Study& study, const Edits& edits);

/// Everything that keeps a study from being valid, each with the path of its place; no more than the first
/// 100, and of a study with too many things in a list only that.
inline constexpr std::size_t mostProblems = 100;
Problems problemsIn(const Study& study);

} // namespace planewright
