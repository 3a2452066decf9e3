// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

namespace planewright {

/// The terms of a combination written as people write it: "1.35 G + 1.5*0.7 S - W". A term is a factor, as
/// any expression without a dimension, and the id of a case; without a factor it counts once. Each case
/// stands once. A Problem with the column for a term that names no case, a factor that does not read, an
/// empty text.
Result<std::vector<Factor>> factorsIn(const Study& study, std::string_view text);

/// The same the other way: factors as they were typed, sums in parentheses, "1.35 G + 1.5*0.7 S".
std::string textOf(const Combination& combination);

/// The same with each factor as its value and without those that are 0, as built combinations are named:
/// "1.35 G + 1.05 S".
std::string valuesOf(const Combination& combination);
/// One more term of such a text.
void addTerm(std::string& values, double factor, const std::string& caseId);

/// Whether the name of a combination reads as terms of the study's cases, but with other factors than it has.
/// A number in the name stands for all that round to it, at least to two decimals.
bool isMisnamed(const Study& study, const Combination& combination);

/// What gives the combination of this name the factors of the text. One that goes by its own expression is
/// renamed to the new one.
Result<Edits> editsThatSet(const Study& study, const std::string& combination, std::string_view text);
/// What renames a case, and the combinations that go by their expression with it.
Edits editsThatRenameCase(const Study& study, const std::string& id, const std::string& to);
/// What takes a case away. A combination that goes by its expression goes by what is left of it; where that
/// is nothing, or stands already, it goes too.
Edits editsThatRemoveCase(const Study& study, const std::string& id);

/// What adds a combination that goes by its expression.
Result<Edits> editsThatAdd(const Study& study, std::string_view text);
/// What adds the combinations of a text, one a line: its expression, or its name, a tab and its expression.
/// Those that the study has already are left as they are. All are added or none: the first Problem with its
/// line.
Result<Edits> editsThatAddLines(const Study& study, std::string_view text);
/// What adds a combination to begin with: all cases that may act together once, or the first multiple of them
/// that there is not yet. Measured cases, which take factor 1 only, stand in it where there are no others.
Edits editsThatAddNext(const Study& study);

} // namespace planewright
