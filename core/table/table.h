// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/stress_form.h"

namespace planewright {

/// A column: `key` is its name in csv and json, `heading` on screen and paper, `unit` stands behind it.
struct Column {
  std::string key;
  Text heading;
  std::string unit; ///< "MPa", "°", empty
  bool isNumber = true;
};

/// A cell: `shown` with the state's count of decimals, `exact` in the column's unit where it is a number.
struct Cell {
  Text shown;
  std::optional<double> exact;
  std::string combination = {}; ///< of a value that another combination gives: its name
};

/// A row; `kind` gives its mark. `group` changes where a hair rule stands.
struct Row {
  PlaneKind kind = PlaneKind::reading;
  std::string name;
  int group = 0;
  std::vector<Cell> cells;
};

/// Rows as window, csv, figure and clipboard share them: headings, signs and rounding exist once.
struct Table {
  std::vector<Column> columns;
  std::vector<Row> rows;
  std::vector<Text> cautions;     ///< what a reader of the rows must know, a sentence each
  std::vector<Text> ofRange = {}; ///< those of them that least and greatest values have
};

/// plane | normal at | cut at | sn | tnt for one state, in the study's unit.
Table planesTable(const Study& study, const Readout& readout, const StateReading& state);
/// Puts least sn | greatest sn | greatest |tnt| over all judged states behind the columns of such a table,
/// each with the combination that gives it; the table as it is where there is one state only. The planes of
/// principal values and greatest shear are those of the shown state.
Table withEnvelope(Table table, const Study& study, const Readout& readout);
/// The envelope of the planes that are the same in every state: name | angles | the three values.
Table envelopeTable(const Study& study, const Readout& readout);
/// The columns of planesTable for normals from -90 (excluded) to 90 deg by `step` degrees (0.1 to 90).
Table sweepTable(const Study& study, const Readout& readout, const StateReading& state, Angle step);

/// Tab separated, a heading line first, numbers at full precision with ASCII minus; then a line for each
/// caution.
std::string tabSeparated(const Table& table, const Translate& translate = {});
/// One HTML table element, with the shown numbers; then a paragraph for each caution.
std::string html(const Table& table, const Translate& translate = {});

} // namespace planewright
