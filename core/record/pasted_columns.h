// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_cells.h"
#include "core/study/place.h"

namespace planewright {

/// What a column of a table of points holds.
enum class ColumnKind { unused, point, note, loadCase, sx, sy, txy, sz, N, Vy, Vz, T, My, Mz };

template <>
const std::vector<Named<ColumnKind>>& namesOf<ColumnKind>();

/// The spot that a column of numbers fills; none for the others.
std::optional<Spot> spotOf(ColumnKind kind);
bool isForce(ColumnKind kind);
/// The kinds of numbers, in the order of the file.
std::vector<ColumnKind> numberColumns(bool withForces);

/// The kind that a heading names ("σx", "V_y", "load case"), with or without capitals; none for other words.
std::optional<ColumnKind> kindOfHeading(std::string_view heading);

struct PastedColumn {
  std::string heading; ///< as it stands in the table; empty without a header
  std::optional<ColumnKind> kind;
  std::optional<Unit> unit; ///< of bare numbers, where the heading names one
};

/// What the caller says about a table; what is left out is read from the table.
struct ColumnChoices {
  std::vector<std::optional<ColumnKind>> kinds;
  std::optional<bool> hasHeader;
};

struct PastedColumns {
  std::vector<PastedColumn> columns;
  bool hasHeader = false;
  bool areGuessed = false; ///< from their count, of a table without a header
  Problems problems;
};

/// The columns of a table with at least one row: from its header with names and units (`sx [MPa]`, `N (kN)`),
/// else from the choices, else from their count where that says it: a case and three numbers are σx, σy and
/// τxy; a case and four are N, V_y, M_z and T. Problems, with the column of the table, for columns of which
/// nothing is told, that stand twice, and for a table without cases or without numbers.
PastedColumns columnsOf(const Study& study, const CellTable& table, const ColumnChoices& choices);

} // namespace planewright
