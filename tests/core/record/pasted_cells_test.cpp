// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_cells.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

using Cells = std::vector<std::string>;

TEST(PastedCells, oneSeparatorForTheWholeTable) {
  EXPECT_EQ(cellsIn("a\tb;c,d")->rows[0].cells, (Cells{"a", "b;c,d"}));
  EXPECT_EQ(cellsIn("a,b;c\nd,e")->rows[1].cells, (Cells{"d,e"}));
  EXPECT_EQ(cellsIn("a,b\n\"c;d\te\",f")->rows[1].cells, (Cells{"c;d\te", "f"}));
  EXPECT_EQ(cellsIn("\"a\"\"\t\"\"b\",c")->rows[0].cells, (Cells{"a\"\t\"b", "c"}));
  EXPECT_EQ(cellsIn("alone")->rows[0].cells, (Cells{"alone"}));
}

TEST(PastedCells, passesOverBlankLinesAndTheByteOrderMark) {
  const CellTable table = cellsIn("\xEF\xBB\xBF"
                                  "a;b\r\n\r\n;\r\"c\r\nd\";e\r\nf;g")
                              .value();
  EXPECT_EQ(table.rows, (std::vector<CellRow>{{1, {"a", "b"}}, {4, {"c\nd", "e"}}, {6, {"f", "g"}}}));
}

TEST(PastedCells, aQuoteInsideACellIsItself) {
  EXPECT_EQ(cellsIn("12\" pipe\tb")->rows[0].cells, (Cells{"12\" pipe", "b"}));
}

TEST(PastedCells, refusesBrokenQuotesAndOtherEncodings) {
  const Problem open = cellsIn("a;b\nc;\"d\ne;f").error();
  EXPECT_EQ(open.line, 2);
  EXPECT_EQ(open.column, 2);
  EXPECT_EQ(cellsIn("a\t\"b\" c").error().column, 2);
  EXPECT_EQ(cellsIn("a\n\xFF\xFE").error().line, 2);
}

TEST(PastedCells, isBounded) {
  EXPECT_FALSE(cellsIn(std::string(greatestTable + 1, ' ')));
  EXPECT_TRUE(cellsIn(std::string(greatestTable, ' ')));
  std::string rows;
  for (std::size_t i = 0; i < mostTableRows; ++i)
    rows += "1\n";
  EXPECT_TRUE(cellsIn(rows));
  EXPECT_EQ(cellsIn(rows + "1\n").error().line, static_cast<int>(mostTableRows) + 1);
  EXPECT_TRUE(cellsIn("a" + std::string(mostTableColumns - 1, ',')));
  EXPECT_FALSE(cellsIn("a" + std::string(mostTableColumns, ',')));
}

RC_GTEST_PROP(PastedCells, writtenCellsReadBackWhateverIsInThem, ()) {
  const char separator = *rc::gen::element('\t', ',');
  const auto anyCell = rc::gen::container<std::string>(rc::gen::element('a', ' ', '"', ',', ';', '\t', '\n'));
  const auto rows = *rc::gen::container<std::vector<Cells>>(rc::gen::container<Cells>(3, anyCell));
  std::string text = std::string("h") + separator + "h" + separator + "h\n";
  for (const Cells& row : rows)
    for (const std::string& cell : row)
      text += writtenCell("x" + cell, separator) + (&cell == &row.back() ? '\n' : separator);
  const Result<CellTable> table = cellsIn(text);
  RC_ASSERT(table.has_value());
  RC_ASSERT(table->separator == separator);
  RC_ASSERT(table->rows.size() == rows.size() + 1);
  for (std::size_t i = 0; i < rows.size(); ++i)
    for (std::size_t j = 0; j < 3; ++j)
      RC_ASSERT(table->rows[i + 1].cells[j] == "x" + rows[i][j]);
}

} // namespace
} // namespace planewright
