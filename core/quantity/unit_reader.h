// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/cursor.h"
#include "core/quantity/expression.h"

namespace planewright {

/// Whether a unit starts here: the name of one that no parenthesis follows, so that it is no call.
bool unitFollows(const Cursor& cursor, std::size_t ahead = 0);

/// Takes a unit: atom {("*" | "/") atom}, atom = name ["^" integer | superscript]. The cursor stands where
/// `unitFollows`. In a field of slopes `in` and, where `slopes` is `line`, % are Problems.
Result<Unit> readUnitAt(Cursor& cursor, Slopes slopes);

} // namespace planewright
