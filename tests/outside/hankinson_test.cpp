// SPDX-License-Identifier: GPL-3.0-or-later
// Slope of grain: Hankinson's formula with the constants published for it, against the strengths published
// for slopes. USDA Wood Handbook, FPL-GTR-282 (2021): constants on page 5-29 under equation 5-2, slopes in
// table 5-12 (read).
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

/// Strength at a slope of 1 in `run` over that of straight grain.
double shareAt(double run, double n, double ratio) {
  const Strengths f = lineStrengths(MaterialKind::timber, 1, 1, ratio, ratio, 1);
  const auto judge = Judge::of(Criterion::hankinson, f, {n, {}, {}, {}}, demandOf({1, 0, 0}));
  return 1 / judge->utilisation(Angle::fromRadians(std::atan(1 / run)));
}

struct Published {
  double run;
  double percent;
};

/// Table 5-12, modulus of rupture.
constexpr Published bending[] = {{25, 96}, {20, 93}, {15, 89}, {10, 81}, {5, 55}};
/// Table 5-12, compression parallel to the grain.
constexpr Published compression[] = {{25, 100}, {20, 100}, {15, 100}, {10, 99}, {5, 93}};

TEST(SlopeOfGrain, publishedBendingStrengthsLieWithinThePublishedConstants) {
  for (const Published& row : bending) {
    EXPECT_LE(100 * shareAt(row.run, 1.5, 0.04), row.percent) << "1 in " << row.run;
    EXPECT_GE(100 * shareAt(row.run, 2, 0.10), row.percent) << "1 in " << row.run;
  }
}

TEST(SlopeOfGrain, publishedCompressionStrengthsLieWithinThePublishedConstants) {
  for (const Published& row : compression) {
    EXPECT_LE(100 * shareAt(row.run, 2, 0.03), row.percent) << "1 in " << row.run;
    EXPECT_GE(100 * shareAt(row.run, 2.5, 0.40) + 0.5, row.percent) << "1 in " << row.run;
  }
}

} // namespace
} // namespace planewright
