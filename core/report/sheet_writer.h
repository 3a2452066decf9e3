// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/make_sheet.h"
#include "core/study/readout.h"
#include "core/table/table.h"

namespace planewright {

/// A sheet while it grows: numbers its headings and keeps the list of sources that its steps refer to.
class SheetWriter {
public:
  void heading(Text words);
  void subheading(Text words);
  void text(Text words, Voice voice = Voice::plain);
  void box(std::vector<Text> lines, bool alarms);
  void table(SheetTable table);
  /// A table as window and files share it.
  void table(const Table& table);
  void figure(Picture picture, Text caption);
  void step(const Step& step);
  void steps(const std::vector<Step>& steps);
  void signatures(SheetSignatures lines);
  /// The sources that steps referred to, with their numbers.
  void sources();

  std::vector<SheetBlock> taken() { return std::move(m_blocks); }

private:
  std::string referenceTo(const Text& source);

  std::vector<SheetBlock> m_blocks;
  std::vector<Text> m_sources;
  int m_number = 0;
  int m_subnumber = 0;
};

/// "2.4 MPa": a column of numbers has its unit in the heading.
Text withUnit(const Text& heading, const std::string& unit);

/// The sections of a sheet, each in a file of its own.
void writeInputs(SheetWriter& sheet, const Study& study, const std::vector<Readout>& points);
void writePoint(SheetWriter& sheet, const Study& study, const Readout& readout, const SheetOrder& order);
void writeRoutes(SheetWriter& sheet, const std::vector<Readout>& points, const RouteComparison& routes);
void writeChanges(SheetWriter& sheet, const Study& earlier, const Study& study,
                  const std::string& earlierName);
void writeClosing(SheetWriter& sheet, const Study& study, const std::vector<Readout>& points);

/// The state that governs a point: by its checks, else by the greatest s1.
std::size_t governingStateOf(const Readout& readout);
/// The point and state in words: "P1, 1.35 G + 1.5 S".
Text pointAndState(const Readout& readout, std::size_t state);

} // namespace planewright
