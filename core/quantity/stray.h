// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/cursor.h"
#include "core/quantity/expression.h"

namespace planewright {

/// Why the token at the cursor cannot start a value.
Problem strayForValue(const Cursor& cursor);
/// Why the name at the cursor, which a "(" follows, is no function.
Problem strayCall(const Cursor& cursor);
/// Why the token at the cursor cannot follow a value.
Problem strayAfterValue(const Cursor& cursor, Slopes slopes);

} // namespace planewright
