// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/table.h"

#include "core/study/edit.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study goldenStudy() {
  return *edited(newStudy(),
                 Edits{Type{{Spot::sx, "P1", "G"}, "80"}, Type{{Spot::sy, "P1", "G"}, "20"},
                       Type{{Spot::txy, "P1", "G"}, "-30"}, Type{{Spot::lineAngle, "P1", "grain"}, "1 in 10"},
                       Type{{Spot::reading, "P1", {}}, "25"}});
}

std::vector<std::string> shown(const Row& row) {
  std::vector<std::string> words;
  for (const Cell& cell : row.cells)
    words.push_back(plain(cell.shown));
  return words;
}

TEST(Table, aStateHasOneCountOfDecimals) {
  const Study study = goldenStudy();
  const Readout readout = evaluate(study);
  const Table table = planesTable(study, readout, readout.state());
  ASSERT_EQ(table.rows.size(), 9U);
  EXPECT_EQ(shown(table.rows[0]),
            (std::vector<std::string>{"Reading plane", "25.00°", "−65.00°", "46.30", "−42.26"}));
  EXPECT_EQ(shown(table.rows[3]),
            (std::vector<std::string>{"Principal σ1", "−22.50°", "67.50°", "92.43", "0.00"}));
  EXPECT_EQ(shown(table.rows[8]), (std::vector<std::string>{"Following the grain (stress across it)",
                                                            "−84.29°", "5.71°", "26.53", "35.35"}));
}

TEST(Table, unitsAreTheStudys) {
  const Study study = *edited(goldenStudy(), Edit{Type{{Spot::unitStress, {}, {}}, "GPa"}});
  const Readout readout = evaluate(study);
  const Table table = planesTable(study, readout, readout.state());
  EXPECT_EQ(table.columns[3].unit, "GPa");
  EXPECT_EQ(plain(table.rows[1].cells[3].shown), "0.08000");
  EXPECT_EQ(table.rows[1].cells[3].exact, 0.08);
}

TEST(Table, aDegenerateStateHasNoFalseAngle) {
  const Study study = newStudy();
  const Readout readout = evaluate(study);
  const Table table = planesTable(study, readout, readout.state());
  EXPECT_EQ(plain(table.rows[3].cells[1].shown), "every direction");
  EXPECT_FALSE(table.rows[3].cells[1].exact);
  EXPECT_EQ(plain(table.rows[3].cells[3].shown), "0.000");
}

TEST(Table, sweepsTheHalfTurnOnce) {
  const Study study = goldenStudy();
  const Readout readout = evaluate(study);
  const StateReading& state = readout.state();
  const Table table = sweepTable(study, readout, state, Angle::fromDegrees(5));
  ASSERT_EQ(table.rows.size(), 36U);
  EXPECT_EQ(plain(table.rows.front().cells[1].shown), "−85.00°");
  EXPECT_EQ(plain(table.rows.back().cells[1].shown), "90.00°");
  EXPECT_EQ(sweepTable(study, readout, state, Angle::fromDegrees(0.1)).rows.size(), 1800U);
  EXPECT_EQ(sweepTable(study, readout, state, Angle::fromDegrees(90)).rows.size(), 2U);
}

TEST(Clipboard, tabSeparatedHasFullDigitsAndAsciiMinus) {
  const Study study = goldenStudy();
  const Readout readout = evaluate(study);
  const std::string text = tabSeparated(planesTable(study, readout, readout.state()));
  EXPECT_TRUE(text.starts_with("Plane\tnormal at\tcut at\tσn (MPa)\tτnt (MPa)\n"
                               "Reading plane\t25\t-65\t46.302294"))
      << text;
  EXPECT_EQ(std::count(text.begin(), text.end(), '\n'), 10);
}

TEST(Clipboard, namesCannotBreakTheTable) {
  const Study study = *edited(goldenStudy(), Edit{Insert{{Spot::plane, "P1", "a < b & c"}, {}}});
  const Readout readout = evaluate(study);
  const std::string text = html(planesTable(study, readout, readout.state()));
  EXPECT_NE(text.find("a &lt; b &amp; c"), std::string::npos);
  EXPECT_NE(text.find("σ<sub>n</sub> (MPa)"), std::string::npos);
}

/// The golden state in "G + S", of which the point lacks S.
Study studyWithoutOneCase() {
  return *edited(goldenStudy(),
                 Edits{Insert{{Spot::loadCase, "S", {}}, {}}, Insert{{Spot::combination, "G + S", {}}, {}},
                       Insert{{Spot::factor, "G + S", "G"}, {}}, Type{{Spot::factor, "G + S", "G"}, "1"},
                       Insert{{Spot::factor, "G + S", "S"}, {}}, Type{{Spot::factor, "G + S", "S"}, "1"}});
}

TEST(Table, aCaseThatCountsAsZeroIsCopiedAsACaution) {
  const Study study = studyWithoutOneCase();
  const Readout readout = evaluate(study);
  const std::string caution = "No stresses are given for case S: it counts as 0.";
  for (const Table& table : {planesTable(study, readout, readout.state()),
                             sweepTable(study, readout, readout.state(), Angle::fromDegrees(45))}) {
    EXPECT_TRUE(tabSeparated(table).ends_with("\n" + caution + "\n")) << tabSeparated(table);
    EXPECT_TRUE(html(table).ends_with("</table>\n<p>" + caution + "</p>\n")) << html(table);
  }
}

TEST(Table, withoutACautionTheRowsEndIt) {
  const Study study = goldenStudy();
  const Readout readout = evaluate(study);
  EXPECT_TRUE(html(planesTable(study, readout, readout.state())).ends_with("</table>\n"));
}

} // namespace
} // namespace planewright
