// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/table/table.h"

namespace planewright {

/// A table in Markdown with bars between cells (a common extension of it), with the shown numbers, aligned;
/// then a paragraph for each caution.
std::string markdown(const Table& table, const Translate& translate = {});
/// Rows for a tabular environment of LaTeX, heading first, with the shown numbers, symbols in math; then a
/// comment for each caution.
std::string latexRows(const Table& table, const Translate& translate = {});

} // namespace planewright
