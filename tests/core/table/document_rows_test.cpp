// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/document_rows.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Table smallTable() {
  Table table;
  table.columns = {{"plane", PW_TEXT("Test", "Plane"), "", false}, {"sn", symbol("σ_{n}"), "MPa", true}};
  table.rows.resize(2);
  table.rows[0].cells = {{verbatim("cut | 50 % & more"), std::nullopt}, {verbatim("−2.85"), -2.85}};
  table.rows[1].cells = {{symbol("Principal σ_{1}"), std::nullopt}, {verbatim("8.87"), 8.87}};
  table.cautions = {PW_TEXT("Test", "Mind the case.")};
  return table;
}

TEST(DocumentRows, areMarkdown) {
  EXPECT_EQ(markdown(smallTable()), "| Plane | σ<sub>n</sub> (MPa) |\n"
                                    "| --- | ---: |\n"
                                    "| cut \\| 50 % & more | −2.85 |\n"
                                    "| Principal σ<sub>1</sub> | 8.87 |\n"
                                    "\nMind the case.\n");
}

TEST(DocumentRows, areLatex) {
  EXPECT_EQ(latexRows(smallTable()), "Plane & $\\sigma_{\\mathrm{n}}$ (MPa) \\\\\n\\hline\n"
                                     "cut $|$ 50 \\% \\& more & $-$2.85 \\\\\n"
                                     "Principal $\\sigma_{\\mathrm{1}}$ & 8.87 \\\\\n"
                                     "% Mind the case.\n");
}

TEST(DocumentRows, keepCellsInTheirRows) {
  Table table = smallTable();
  table.rows[0].cells[0].shown = verbatim("two\nlines\tand a tab");
  EXPECT_NE(markdown(table).find("| two lines and a tab |"), std::string::npos);
  EXPECT_NE(latexRows(table).find("two lines and a tab &"), std::string::npos);
}

} // namespace
} // namespace planewright
