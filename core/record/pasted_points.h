// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_columns.h"
#include "core/study/edit.h"

namespace planewright {

/// One row of a table of points as it would be taken.
struct PastedRow {
  int line = 0; ///< of the table
  std::vector<std::string>
      cells;         ///< one a column: as the study will keep it; as it stands where that is wrong
  Problems problems; ///< each with the line and the column of the table
};

/// What pasting a table into a study comes to. Nothing is taken half: there are edits only where nothing is
/// wrong, and they hold for the study that the table was read for.
struct PastedPoints {
  std::vector<PastedColumn> columns;
  bool hasHeader = false;
  std::vector<PastedRow> rows;
  Problems problems; ///< of the table as a whole
  std::vector<std::string> newPoints;
  std::vector<std::string> newCases;    ///< made as variable
  std::vector<std::string> newMeasured; ///< cases made as measured, for their strains
  std::size_t replaced = 0;             ///< texts of the study that others take the place of
  std::vector<Text> cautions;
  Edits edits;

  bool isSound() const;
  /// Those of the table and then those of its rows.
  Problems allProblems() const;
};

/// Reads a table of stresses, section forces, pressure and measured strains, a row for one case at one point:
/// without a column of points into the shown one. Numbers are entries as in the fields, bare ones in the unit
/// of their heading or the study's; an empty cell leaves what the study has. Points and cases that the study
/// does not have are made; a row with a point alone makes the point. Fibres lie in sections that the study
/// has; a fibre, a pressure or a rosette that is new has to be given whole. What `edited` says against the
/// whole stands at the row that it is about.
PastedPoints pastedPoints(const Study& study, std::string_view text, const ColumnChoices& choices = {});

} // namespace planewright
