// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

namespace planewright {

/// What makes a point with all that is said of it at `index`, or at the end. The study has no point of its
/// name.
Edits editsThatMakePoint(const Study& study, const Point& point, std::optional<std::size_t> index = {});

/// What makes a point `to` right behind `from` with all that was said of it.
Edits editsThatCopyPoint(const Study& study, const std::string& from, const std::string& to);

/// A name that no point has yet: the name with the next free number behind it, "P1" gives "P2".
std::string freshPointName(const Study& study, const std::string& like);

} // namespace planewright
