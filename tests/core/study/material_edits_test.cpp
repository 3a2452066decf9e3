// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/material_edits.h"

#include "rich_study.h"

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

RC_GTEST_PROP(MaterialEdits, aTakenMaterialIsTheSameInAnotherStudy, ()) {
  const Study from = *anyStudy();
  Study to = *anyStudy();
  for (const Material& material : from.materials) {
    const std::string name = freshMaterialName(to, material.name);
    RC_ASSERT(!findMaterial(to, name));
    const Result<Study> after = edited(to, editsThatTake(material, name));
    RC_LOG() << (after ? "" : plain(after.error()));
    RC_ASSERT(after);
    Material expected = material;
    expected.name = name;
    RC_ASSERT(after->materials.back() == expected);
    RC_ASSERT(problemsIn(*after).empty());
    to = *after;
  }
}

RC_GTEST_PROP(MaterialEdits, anotherKindLeavesTheStudyValidAndKeepsWhatBothHave, ()) {
  Study study = *anyStudy();
  for (Point& point : study.points)
    point.checks.clear();
  study.materials.emplace_back().name = "one more";
  const Material before = *rc::gen::elementOf(study.materials);
  const MaterialKind kind = study_gen::anyWord<MaterialKind>();
  const Result<Study> after = edited(study, editsThatChangeKind(study, before.name, kind));
  RC_LOG() << (after ? "" : plain(after.error()));
  RC_ASSERT(after);
  RC_ASSERT(problemsIn(*after).empty());
  for (std::size_t i = 0; i < strengthKeys; ++i) {
    const auto key = static_cast<StrengthKey>(i);
    const Place place{spotOf(key), before.name, {}};
    RC_ASSERT(*textAt(*after, place) == (has(kind, key) ? *textAt(study, place) : ""));
  }
  const Material& now = *findMaterial(*after, before.name);
  RC_ASSERT(now.seam == (kind == MaterialKind::throat ? before.seam : Seam::fillet));
}

Study judged() {
  Material timber;
  timber.name = "C24";
  timber.alongTension = "14.5 MPa";
  Study study = with(richStudy(), editsThatTake(timber, "C24"));
  study = with(study, {Insert{{Spot::line, "P2", "grain"}, {}}});
  Check check;
  check.id = "along the grain";
  check.material = "C24";
  check.line = "grain";
  for (Point& point : study.points)
    point.checks.push_back(check);
  EXPECT_TRUE(problemsIn(study).empty()) << plain(problemsIn(study).front());
  return study;
}

TEST(MaterialEdits, aKindThatACheckCannotJudgeIsRefusedWithTheReason) {
  const Study study = judged();
  const Result<Study> after = edited(study, editsThatChangeKind(study, "C24", MaterialKind::bond));
  ASSERT_FALSE(after);
  EXPECT_EQ(after.error().place, "points/P1/checks/along the grain/criterion");
  EXPECT_TRUE(edited(study, editsThatChangeKind(study, "C24", MaterialKind::generic)));
}

TEST(MaterialEdits, namesThatAreTakenGetANumber) {
  Study study = judged();
  EXPECT_EQ(freshMaterialName(study, "C30"), "C30");
  EXPECT_EQ(freshMaterialName(study, "C24"), "C24 2");
  study = with(study, editsThatTake({}, "C24 2"));
  EXPECT_EQ(freshMaterialName(study, "C24"), "C24 3");
}

TEST(MaterialEdits, theChecksThatGoWithAMaterialAreThoseThatGo) {
  const Study study = judged();
  EXPECT_EQ(checksBy(study, "C24"), (std::vector<Place>{{Spot::check, "P1", "along the grain"},
                                                        {Spot::check, "P2", "along the grain"}}));
  const Study after = with(study, {Remove{{Spot::material, "C24", {}}}});
  EXPECT_TRUE(after.points[0].checks.empty());
  EXPECT_TRUE(after.points[1].checks.empty());
  EXPECT_TRUE(checksBy(study, "C30").empty());
}

} // namespace
} // namespace planewright
