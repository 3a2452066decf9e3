// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/copied_table.h"

#include "planes_fixture.h"
#include "ui/planes/planes_model.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(CopiedTable, aPartHasTheTouchedRowsAndColumnsWithTheirHeadings) {
  Desk desk(planesStudy());
  PlanesModel model(desk);
  const Table part = partOf(model.table(), {model.index(x, 1), model.index(s1, 3), model.index(watch, 0)});
  ASSERT_EQ(part.columns.size(), 3U);
  ASSERT_EQ(part.rows.size(), 2U);
  EXPECT_EQ(tabSeparated(part),
            "Plane\tnormal at\tσn (MPa)\nx face\t0\t80\nPrincipal σ1\t-22.5\t92.4264068711929\n");
}

TEST(CopiedTable, aPartKeepsTheCautions) {
  Desk desk(planesStudy());
  PlanesModel model(desk);
  Table table = model.table();
  table.cautions = {verbatim("Case S counts as 0.")};
  EXPECT_EQ(tabSeparated(partOf(table, {model.index(x, 1)})), "normal at\n0\nCase S counts as 0.\n");
}

TEST(CopiedTable, aCellIsANumberAtFullPrecisionOrItsWords) {
  Desk desk(planesStudy());
  PlanesModel model(desk);
  EXPECT_EQ(oneCell(model.table(), model.index(s1, 1)), "-22.5");
  EXPECT_EQ(oneCell(model.table(), model.index(scarf, 0)), "scarf");
  EXPECT_EQ(oneCell(model.table(), model.index(watch, 0)), "");
}

} // namespace
} // namespace planewright
