// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_columns.h"

namespace planewright {

/// What the texts of one row of a table of points stand in; null where the study has no such thing.
struct RowThings {
  const Point* point = nullptr;
  const Line* line = nullptr;
  const CaseStress* stress = nullptr;
};

/// Whether the study has the thing that a column fills.
bool has(const RowThings& row, Spot thing);

/// The text, word or name that a column holds in such a row; none where its thing is not there.
std::optional<std::string> textIn(const RowThings& row, ColumnKind kind);

} // namespace planewright
