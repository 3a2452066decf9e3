// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/study_file.h"
#include "core/study/edit.h"
#include "core/study/readout.h"
#include "core/study/stress_form.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study withDigits(const std::string& count) {
  Study study = newStudy();
  const Point& point = study.points[0];
  return edited(study, Edits{Type{{Spot::sx, point.name, point.stress[0].caseId}, "12.345678 MPa"},
                             Type{{Spot::digits, {}, {}}, count}})
      .value();
}

std::string shownSx(const Study& study) {
  const Readout readout = evaluate(study);
  return shownStress(study, readout.state(), readout.state().stress.sx);
}

TEST(Digits, areThoseOfTheGreatestStress) {
  EXPECT_EQ(shownSx(withDigits("3")), "12.3");
  EXPECT_EQ(shownSx(withDigits("4")), "12.35");
  EXPECT_EQ(shownSx(withDigits("5")), "12.346");
  EXPECT_EQ(shownSx(withDigits("6")), "12.3457");
}

TEST(Digits, otherThanTheUsualOnesAreKeptInTheFile) {
  EXPECT_EQ(writeStudy(withDigits("4")).find("digits"), std::string::npos);
  const Study study = withDigits("6");
  EXPECT_EQ(readStudy(writeStudy(study)).value(), study);
  EXPECT_FALSE(edited(study, Edits{Type{{Spot::digits, {}, {}}, "7"}}));
}

} // namespace
} // namespace planewright
