// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/slot.h"

namespace planewright {

/// `text` as the study keeps it at this place (a bare number completed with its unit, blanks trimmed), or
/// the Problem, with the place's path.
Result<std::string> keptText(const Study& study, const Place& place, const Slot& slot, std::string_view text);

/// The value, in the base, of a text that stands at such a spot of a study whose texts read; 0 of an empty
/// text where it may be empty. Not of sizes, whose dimension goes by their key.
double valueOf(const Study& study, Spot spot, const std::string& text);

inline constexpr std::size_t longestName = 200; ///< bytes, of a key

/// Why a name cannot be a key: empty, blank at an end, control characters, longer than 200 bytes, broken
/// UTF-8. Empty for a good name.
Text faultOfName(std::string_view name);
/// The same for the key of a thing of this kind: the id of a case has no comma either, since ids are typed
/// with commas between them.
Text faultOfKey(Spot spot, std::string_view name);

/// A Problem at a place.
Problem problemAt(const Place& place, std::string_view quoted, Text what, Text mend = {});

} // namespace planewright
