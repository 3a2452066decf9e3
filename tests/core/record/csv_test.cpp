// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/csv.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

using Fields = std::vector<std::string>;

TEST(Csv, fieldsEndAtCommasOutsideQuotes) {
  EXPECT_EQ(csvFields("a,,c"), (Fields{"a", "", "c"}));
  EXPECT_EQ(csvFields(R"("a,b","say ""x""",)"), (Fields{"a,b", "say \"x\"", ""}));
  EXPECT_EQ(csvFields(""), (Fields{""}));
  EXPECT_EQ(csvFields("\"open, end"), (Fields{"open, end"}));
}

TEST(Csv, quotesStandOnlyWhereTheyAreNeeded) {
  EXPECT_EQ(csvField("P1"), "P1");
  EXPECT_EQ(csvField("a,b"), "\"a,b\"");
  EXPECT_EQ(csvField("say \"x\""), "\"say \"\"x\"\"\"");
  EXPECT_EQ(csvRow({"a", "", "1.5"}), "a,,1.5\n");
}

RC_GTEST_PROP(Csv, readsBackWhatItWrote, ()) {
  const auto field = rc::gen::container<std::string>(rc::gen::element('a', ',', '"', ' ', '='));
  const Fields fields = *rc::gen::nonEmpty(rc::gen::container<Fields>(field));
  const std::string row = csvRow(fields);
  RC_ASSERT(csvFields(std::string_view(row).substr(0, row.size() - 1)) == fields);
}

} // namespace
} // namespace planewright
