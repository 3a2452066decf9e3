// SPDX-License-Identifier: GPL-3.0-or-later
// The kernels built for each level of processors give the same bits as those that the program takes here.
#include "core/screen/kernels.h"

#include "tests/core/screen/levels.h"
#include "tests/support/field_gen.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {
namespace {

using Lane = std::array<double, laneSize>;

/// What all kernels make of one lane of random states, in a row.
std::vector<double> madeBy(const KernelSet& kernels, std::uint64_t seed) {
  Dice dice(seed);
  std::array<Lane, 5> given{};
  for (Lane& lane : given)
    for (double& value : lane)
      value = dice.below(8) == 0 ? 0 : dice.between(-100, 100);
  for (std::size_t i = 0; i < laneSize; ++i) {
    const CosSin twice = cosSinOfDouble(Angle::fromDegrees(given[3][i]));
    given[3][i] = twice.cos;
    given[4][i] = twice.sin;
  }
  std::vector<double> state(stateSize), sum(stateSize), made;
  kernels.resolve(given[0].data(), given[1].data(), given[2].data(), given[3].data(), given[4].data(),
                  state.data());
  const std::vector<const double*> states(7, state.data());
  const std::vector<double> factors = {1.35, 0.1, -0.7, 1.5, 0.3, -2, 1e-3};
  kernels.combine(states.data(), factors.data(), 1 + seed % 7, sum.data());
  made.insert(made.end(), sum.begin(), sum.end());
  const auto positive = [&] { return dice.between(0.001, 0.3); };
  const SquaresForm squares{{positive(), positive()}, {positive(), positive()}, {}, positive(), false};
  const SquaresForm products{{0.3, 0.4}, {0.5, 0.2}, {{-0.1, -0.2}, {-0.3, -0.05}}, positive(), true};
  const LinearForm linear{positive(), -0.0005, positive(), positive(), positive(), -positive()};
  const RatiosForm ratios{{positive(), positive()}, {positive(), positive()}, positive()};
  const SumForm sums{{positive(), positive()}, {positive(), positive()}, positive()};
  const CosSin twice = cosSinOfDouble(Angle::fromDegrees(dice.between(0, 90)));
  const HalfBand band{twice.cos, twice.sin};
  Lane best{}, which{};
  best.fill(-1);
  const auto keep = [&](const auto& kernel, const auto& form, const auto&... more) {
    kernel(sum.data(), form, more..., static_cast<double>(made.size()), best.data(), which.data());
    made.insert(made.end(), best.begin(), best.end());
    made.insert(made.end(), which.begin(), which.end());
    best.fill(-1);
  };
  keep(kernels.squares, squares);
  keep(kernels.squares, products);
  keep(kernels.linear, linear);
  keep(kernels.ratios, ratios);
  keep(kernels.sum, sums);
  keep(kernels.squaresInBand, squares, band);
  keep(kernels.squaresInBand, products, band);
  keep(kernels.linearInBand, linear, band);
  keep(kernels.ratiosInBand, ratios, band);
  keep(kernels.sumInBand, sums, band);
  std::array<Lane, 4> principal{};
  kernels.principal(given[0].data(), given[1].data(), given[2].data(), principal[0].data(),
                    principal[1].data(), principal[2].data(), principal[3].data());
  for (const Lane& lane : principal)
    made.insert(made.end(), lane.begin(), lane.end());
  return made;
}

TEST(Levels, giveTheSameBits) {
  for (const Level& level : levels()) {
    if (!level.isHere)
      continue;
    for (std::uint64_t seed = 1; seed <= 200; ++seed)
      ASSERT_EQ(madeBy(level.kernels, seed), madeBy(kernelsOfProgram(), seed)) << level.name;
  }
}

// A wrong value must not hide behind the right ones that come after it.
TEST(Kernels, keepForGoodWhatIsNotANumber) {
  const SquaresForm squares{{0.1, 0.2}, {0.3, 0.4}, {}, 0.5, false};
  const SquaresForm products{{0.3, 0.4}, {0.5, 0.2}, {{-0.1, -0.2}, {-0.3, -0.05}}, 0.6, true};
  const LinearForm linear{0.1, -0.01, 0.2, 0.3, 0.1, -0.1};
  const RatiosForm ratios{{0.1, 0.2}, {0.3, 0.4}, 0.5};
  const SumForm sums{{0.1, 0.2}, {0.3, 0.4}, 0.5};
  const HalfBand band{0.8, 0.6};
  for (std::size_t wrong : {0U, 1U, 2U}) {
    std::array<Lane, 5> given{};
    for (Lane& lane : given)
      lane.fill(0.5);
    given[wrong].fill(NAN);
    std::vector<double> state(stateSize);
    resolveLane(given[0].data(), given[1].data(), given[2].data(), given[3].data(), given[4].data(),
                state.data());
    const std::vector<double> right(stateSize, 100);
    const auto expectKept = [&](const auto& kernel, const auto& form, const auto&... more) {
      Lane best{}, which{};
      best.fill(-1);
      kernel(right.data(), form, more..., 1, best.data(), which.data());
      kernel(state.data(), form, more..., 2, best.data(), which.data());
      kernel(right.data(), form, more..., 3, best.data(), which.data());
      EXPECT_TRUE(std::ranges::all_of(best, [](double value) { return std::isnan(value); }));
      EXPECT_TRUE(std::ranges::all_of(which, [](double number) { return number == 2; }));
    };
    expectKept(keepSquares, squares);
    expectKept(keepSquares, products);
    expectKept(keepLinear, linear);
    expectKept(keepRatios, ratios);
    expectKept(keepSum, sums);
    expectKept(keepSquaresInBand, squares, band);
    expectKept(keepSquaresInBand, products, band);
    expectKept(keepLinearInBand, linear, band);
    expectKept(keepRatiosInBand, ratios, band);
    expectKept(keepSumInBand, sums, band);
  }
}

TEST(Principals, areThoseOfTheCircle) {
  Dice dice(7);
  for (int round = 0; round < 200; ++round) {
    std::array<Lane, 3> given{};
    for (Lane& lane : given)
      for (double& value : lane)
        value = dice.below(5) == 0 ? 0 : std::round(dice.between(-100, 100) * 10) / (round % 2 ? 10 : 7);
    std::array<Lane, 4> made{};
    principalLane(given[0].data(), given[1].data(), given[2].data(), made[0].data(), made[1].data(),
                  made[2].data(), made[3].data());
    for (std::size_t i = 0; i < laneSize; ++i) {
      const Circle circle = circleOf({given[0][i], given[1][i], given[2][i]});
      const double larger = std::max(std::abs(circle.s1), std::abs(circle.s2));
      EXPECT_NEAR(made[0][i], circle.s1, 5e-16 * larger);
      EXPECT_NEAR(made[1][i], circle.s2, 5e-16 * larger);
      EXPECT_NEAR(made[2][i], circle.radius, 4e-16 * circle.radius);
      if (circle.theta1) {
        EXPECT_NEAR(made[3][i], circle.theta1->value.degrees(), 5e-14);
      }
    }
  }
}

} // namespace
} // namespace planewright
