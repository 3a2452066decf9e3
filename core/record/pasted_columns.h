// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_cells.h"
#include "core/study/place.h"

namespace planewright {

/// What a column of a table of points holds: names, texts of the point, of its fibre and its line; then texts
/// of one case at the point.
enum class ColumnKind {
  unused,
  point,
  note,
  section,
  y,
  z,
  view,
  line, ///< its name
  lineKind,
  lineAngle,
  lineTolerance,
  loadCase,
  sx,
  sy,
  txy,
  sz,
  N,
  Vy,
  Vz,
  T,
  My,
  Mz,
  pressure,
  radius,
  wall,
  ends,
  strainA,
  angleA,
  strainB,
  angleB,
  strainC,
  angleC,
  material,
  E,
  nu,
  along,
  across,
  nu12,
  G
};

template <>
const std::vector<Named<ColumnKind>>& namesOf<ColumnKind>();

/// The spot whose text a column fills; none for names.
std::optional<Spot> spotOf(ColumnKind kind);
/// The thing that the text belongs to: point, fibre, line, caseStress, forces, pressure or rosette; none
/// where there is no spot.
std::optional<Spot> thingOf(ColumnKind kind);
/// Whether it says something of one case at a point.
bool isOfCase(ColumnKind kind);
/// Whether it says something of the point, in any of its rows.
bool isOfPoint(ColumnKind kind);
/// Whether it holds expressions.
bool isExpression(ColumnKind kind);
/// The kinds that fill the texts of a thing, in their order.
std::vector<ColumnKind> columnsThatFill(Spot thing);

/// The kind that a heading names ("σx", "V_y", "load case"), with or without capitals; none for other words.
std::optional<ColumnKind> kindOfHeading(std::string_view heading);

struct PastedColumn {
  std::string heading; ///< as it stands in the table; empty without a header
  std::optional<ColumnKind> kind;
  std::optional<Unit> unit;     ///< of bare numbers, where the heading names one
  std::string writtenUnit = {}; ///< as the heading writes it, where that is not as expressions do: "kNm"
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
