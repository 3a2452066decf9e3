// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_rows.h"

#include "core/screen/summary.h"
#include "tests/support/field_gen.h"

#include <gmock/gmock.h>
#include <rapidcheck/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

using testing::ElementsAre;

bool always() {
  return true;
}

struct Rows {
  Field field{{"A"}, {true, false, false, true, true, true}};
  FieldResults results{0};

  Rows(std::size_t size, Dice& dice) : results(size) {
    for (std::size_t i = 0; i < size; ++i) {
      const std::size_t point = field.add("n" + exactNumber(static_cast<double>(dice.below(50))),
                                          static_cast<Layer>(dice.below(4)), 1);
      field.setRegion(point, "R" + exactNumber(static_cast<double>(dice.below(12))));
      if (dice.below(5))
        field.setPlace(point, std::round(dice.between(-9, 9)), 0);
      PointResult result;
      result.utilisation = dice.below(9) ? std::round(dice.between(0, 20)) / 10 : NAN;
      result.combination = static_cast<std::uint32_t>(dice.below(3));
      result.worstAngle = std::round(dice.between(-9, 9));
      results.set(i, result);
    }
  }
};

double valueOf(const Rows& rows, std::uint32_t i, FieldKey key) {
  const double utilisation = rows.results.utilisations()[i];
  switch (key) {
  case FieldKey::x:
    return rows.field.xOf(i);
  case FieldKey::layer:
    return static_cast<double>(rows.field.layerOf(i));
  case FieldKey::region:
    return std::stod(std::string(rows.field.regionOf(i).substr(1)));
  case FieldKey::point:
    return std::stod(std::string(rows.field.nameOf(i).substr(1)));
  case FieldKey::combination:
    return std::isnan(utilisation) ? utilisation : static_cast<double>(rows.results[i].combination);
  case FieldKey::multiplier:
    return utilisation > 0 ? 1 / utilisation : NAN;
  default:
    return utilisation;
  }
}

RC_GTEST_PROP(FieldRows, areThoseOfAPlainSort, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const Rows rows(dice.below(3) ? 200 : 70000, dice);
  const FieldKey key =
      *rc::gen::element(FieldKey::utilisation, FieldKey::x, FieldKey::layer, FieldKey::region,
                        FieldKey::point, FieldKey::combination, FieldKey::multiplier);
  const bool isFalling = *rc::gen::arbitrary<bool>();
  FieldFilter filter;
  filter.exceedingOnly = dice.below(4) == 0;
  if (dice.below(3) == 0)
    filter.from = 0.7;
  if (dice.below(3) == 0)
    filter.combination = 1;
  if (dice.below(4) == 0)
    filter.bin = 4;
  std::vector<std::uint32_t> wanted;
  for (std::uint32_t i = 0; i < rows.field.size(); ++i) {
    const double u = rows.results.utilisations()[i];
    const bool all = !filter.exceedingOnly && !filter.from && !filter.combination && !filter.bin;
    if (std::isnan(u)
            ? all
            : (!filter.exceedingOnly || u > 1) && (!filter.from || u >= 0.7) &&
                  (!filter.combination || rows.results[i].combination == 1) && (!filter.bin || binOf(u) == 4))
      wanted.push_back(i);
  }
  std::ranges::stable_sort(wanted, [&](std::uint32_t a, std::uint32_t b) {
    const double one = valueOf(rows, a, key), other = valueOf(rows, b, key);
    if (std::isnan(one) || std::isnan(other))
      return !std::isnan(one) && std::isnan(other);
    return isFalling ? one > other : one < other;
  });
  RC_ASSERT(fieldRowsOf(rows.field, rows.results, filter, {key, isFalling}, always) == wanted);
}

TEST(FieldRows, namesGoByTheNumbersInThem) {
  Field field{{"A"}, {}};
  for (const char* name : {"b10", "b9x", "b9", "a2", "a10", "a", "12", "b009"})
    field.add(name, Layer::none, 1);
  const FieldResults results(field.size());
  EXPECT_THAT(*fieldRowsOf(field, results, {}, {FieldKey::point, false}, always),
              ElementsAre(6, 5, 3, 4, 2, 7, 1, 0));
  FieldFilter filter;
  filter.text = "B9";
  EXPECT_THAT(*fieldRowsOf(field, results, filter, {FieldKey::point, true}, always), ElementsAre(1, 2));
}

TEST(FieldRows, canBeEnded) {
  Dice dice(1);
  const Rows rows(100000, dice);
  for (int after = 0; after < 6; ++after) {
    int asked = 0;
    EXPECT_EQ(fieldRowsOf(rows.field, rows.results, {}, {}, [&] { return asked++ < after; }), std::nullopt);
  }
}

} // namespace
} // namespace planewright
