// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/conventions.h"

#include "tests/core/figure/studies.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

std::string wordsFor(const Study& study) {
  std::string words;
  for (const Text& sentence : conventionsOf(study, evaluate(study)))
    words += plain(sentence) + "\n";
  return words;
}

bool says(const Study& study, std::string_view words) {
  return wordsFor(study).find(words) != std::string::npos;
}

TEST(Conventions, nameSignsAnglesAndTheSenseOfTheCircle) {
  Study study = studyOf({8.4, -0.6, 2.1, 5.71, 3, 30, 0, true});
  EXPECT_TRUE(says(study, "Tension positive.\n"));
  EXPECT_TRUE(says(study, "Angles counter-clockwise from +x, seen from +z.\n"));
  EXPECT_TRUE(says(study, "drawn + down: turning the plane by θ turns its point by 2θ in the same sense.\n"));
  study.convention = {Positive::compression, ShearAxis::tensorUp};
  EXPECT_TRUE(says(study, "Compression positive.\n"));
  EXPECT_TRUE(says(study, "drawn + up: turning the plane by θ turns its point by 2θ the other way.\n"));
}

TEST(Conventions, sayTheLineAsTyped) {
  Study study = studyOf({8.4, -0.6, 2.1, 0, 3, 30, 0, true});
  study.points.front().lines.front().angle = "1 in 10";
  EXPECT_TRUE(says(study, "Line “grain”: φ = 5.71°, given as 1 in 10, ± 3.00°.\n"));
  study.points.front().lines = {Line{"seam", LineKind::weld, "40 deg", ""}};
  EXPECT_TRUE(says(study, "Line “seam” (weld): φ = 40.00°, given as 40 deg, without tolerance.\n"));
  study.points.front().lines.clear();
  EXPECT_FALSE(says(study, "φ"));
}

TEST(Conventions, sayTheThirdStressAndTheGreatestShear) {
  Study study = studyOf({8.4, 2.6, 0, 0, 0, 30, 0, true});
  EXPECT_TRUE(says(study, "With σ3 = 0 the greatest shear on any plane is 4.200 MPa.\n"));
  study.points.front().stress.front().sz = "-2 MPa";
  EXPECT_TRUE(says(study, "With σ3 = −2.000 MPa the greatest shear on any plane is 5.200 MPa.\n"));
}

TEST(Conventions, sayWhatCountsAsZeroWhatIsInclinedAndWhatIsDegenerate) {
  Study study = studyOf({5, 5, 0, 0, 0, 30, 20, true});
  study.cases.push_back({"S", "Snow", Nature::variable, Duration::shortTerm, {}});
  study.combinations = {{"G + S", {{"G", "1"}, {"S", "1.5"}}, Basis::design}};
  EXPECT_TRUE(says(study, "No stresses are given for S: counted as 0.\n"));
  EXPECT_TRUE(says(study, "drawn with x inclined by 20.00°.\n"));
  EXPECT_TRUE(says(study, "every direction is principal.\n"));
}

TEST(Conventions, sayThatANameSaysOtherFactors) {
  Study study = studyOf({5, 2, 0, 0, 0, 30, 20, true});
  study.combinations = {{"1 G", {{"G", "1.35"}}, Basis::design}};
  EXPECT_TRUE(says(study, "The name “1 G” says other factors than the combination has: 1.35 G.\n"));
  study.combinations.front().name = "1.35 G";
  EXPECT_FALSE(says(study, "other factors"));
}

TEST(Conventions, endWithTheCaution) {
  const std::string words = wordsFor(studyOf({}));
  EXPECT_TRUE(words.ends_with("not a design check: the code in force and a licensed engineer decide.\n"))
      << words;
}

} // namespace
} // namespace planewright
