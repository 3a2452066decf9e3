// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_csv.h"

#include "core/screen/screened.h"
#include "tests/support/field_gen.h"

#include <gmock/gmock.h>

#include <charconv>

namespace planewright {
namespace {

struct Screened {
  Study study =
      fieldStudy(Criterion::sumOfSquares, c24(), Angle::fromDegrees(10), Angle(), {{1, 0}, {1, 1.5}});
  ScreenPlan plan = *screenPlanOf(study, "field");
  Field field{plan.cases, {true, false, false, false, false, false}};
  Screened() {
    field.add("n,1", Layer::top, 2);
    field.add("2", Layer::bottom, 3);
    field.add("3", Layer::none, 4);
    for (std::size_t i : {0U, 1U})
      for (std::size_t k : {0U, 1U})
        field.setStress(k, i, {10 + static_cast<double>(i), static_cast<double>(k), -1});
    field.setStress(0, 2, {});
    field.setStress(1, 2, {});
  }
  std::string csv(const std::vector<std::uint32_t>* points, bool principals) const {
    const FieldResults results = *screened(plan, field);
    const FieldPrincipals all = principalsOf(plan, field, results);
    std::string text;
    const auto sink = [&](std::string_view bytes) {
      text += bytes;
      return true;
    };
    EXPECT_TRUE(writeFieldCsv(study, plan, field, results, sink, points, principals ? &all : nullptr));
    return text;
  }
};

TEST(FieldCsv, hasARowForEachJudgedPoint) {
  const Screened it;
  const PointResult result = (*screened(it.plan, it.field))[0];
  const Readout readout = evaluate(it.study);
  EXPECT_EQ(it.csv(nullptr, false).substr(0, it.csv(nullptr, false).find('\n') + 1),
            "point,layer,utilisation,load_multiplier,combination,check,mode,worst_angle\n");
  const std::string csv = it.csv(nullptr, false);
  EXPECT_THAT(csv, testing::HasSubstr("\n\"n,1\",top,"));
  EXPECT_THAT(csv, testing::HasSubstr(",C2,check,"));
  EXPECT_THAT(csv, testing::HasSubstr("\n3,,0,,C1,check,,10\n"));
  double read = 0;
  const std::size_t at = csv.find("top,") + 4;
  std::from_chars(csv.data() + at, csv.data() + csv.size(), read);
  EXPECT_NEAR(read, result.utilisation, 1e-11 * read);
}

TEST(FieldCsv, orOnlyThoseAskedForInTheirOrderWithPrincipals) {
  const Screened it;
  const std::vector<std::uint32_t> points = {1, 0};
  const std::string csv = it.csv(&points, true);
  EXPECT_LT(csv.find("\n2,bottom,"), csv.find("\n\"n,1\",top,"));
  const Circle circle = circleOf({11 * 2.5, 1.5, -2.5});
  double s1 = 0;
  const std::string line =
      csv.substr(csv.find("\n2,bottom,") + 1, csv.find("\n\"n,1\"") - csv.find("\n2,bottom,") - 1);
  std::vector<std::string> cells = {""};
  for (const char c : line)
    if (c == ',')
      cells.emplace_back();
    else
      cells.back() += c;
  ASSERT_EQ(cells.size(), 11U);
  std::from_chars(cells[8].data(), cells[8].data() + cells[8].size(), s1);
  EXPECT_NEAR(s1, circle.s1, 1e-10);
  std::from_chars(cells[10].data(), cells[10].data() + cells[10].size(), s1);
  EXPECT_NEAR(s1, circle.theta1->value.degrees(), 1e-6);
}

TEST(FieldCsv, endsWhenNobodyTakesMore) {
  const Screened it;
  EXPECT_FALSE(writeFieldCsv(it.study, it.plan, it.field, *screened(it.plan, it.field),
                             [](std::string_view) { return false; }));
}

} // namespace
} // namespace planewright
