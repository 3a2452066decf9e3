// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/summary.h"

#include "core/screen/screened.h"
#include "tests/support/field_gen.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::ElementsAre;

/// Points with the utilisations that are asked for, one of them left out.
struct Judged {
  Field field{{"A"}, {}};
  FieldResults results;

  explicit Judged(const std::vector<double>& utilisations) : results(utilisations.size()) {
    for (std::size_t i = 0; i < utilisations.size(); ++i) {
      field.add("n" + exactNumber(static_cast<double>(i)), Layer::none, 1);
      PointResult result;
      result.utilisation = utilisations[i];
      results.set(i, result);
    }
  }
};

TEST(FieldSummary, countsAndOrders) {
  const Judged judged({0.2, 0.95, 0.95, NAN, 1 + 1e-10, 7, 1.01});
  const FieldSummary summary = summaryOf(judged.field, judged.results);
  EXPECT_EQ(summary.points, 7U);
  EXPECT_EQ(summary.judged, 6U);
  EXPECT_EQ(summary.exceeding, 2U);
  EXPECT_THAT(summary.histogram, ElementsAre(0, 1, 0, 0, 0, 0, 0, 0, 0, 3, 1, 0, 0, 1));
  EXPECT_THAT(worstOf(judged.results, 10), ElementsAre(5, 6, 4, 1, 2, 0));
  EXPECT_THAT(worstOf(judged.results, 4), ElementsAre(5, 6, 4, 1));
}

TEST(FieldSummary, nearlyAllLeavesASingularCornerOut) {
  std::vector<double> utilisations(2000, 0.5);
  utilisations[17] = 40;
  const Judged judged(utilisations);
  EXPECT_EQ(summaryOf(judged.field, judged.results).nearlyAll, 0.5);
  EXPECT_EQ(summaryOf(Judged({}).field, Judged({}).results).nearlyAll, 0);
  EXPECT_EQ(summaryOf(Judged({3}).field, Judged({3}).results).nearlyAll, 3);
}

} // namespace
} // namespace planewright
