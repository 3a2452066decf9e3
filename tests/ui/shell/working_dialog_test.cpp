// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/shell/shell_test.h"
#include "ui/shell/worked_example.h"
#include "ui/shell/working_dialog.h"

namespace planewright {
namespace {

TEST(WorkingDialog, hasSignsLimitsAndStepsOfEachSourceAndFollowsTheStudy) {
  Desk desk(workedExample());
  WorkingDialog dialog(desk, nullptr);
  EXPECT_TRUE(dialog.words().contains("Case G: section forces on ridge beam"));
  EXPECT_TRUE(dialog.words().contains("is positive when it sags"));
  EXPECT_TRUE(dialog.words().contains("Limit:"));
  EXPECT_TRUE(dialog.words().contains("Combination 1.35 G + 1.5 S"));
  EXPECT_TRUE(dialog.words().contains("Working of the check in 1.35 G + 1.5 S, tension positive"));
  EXPECT_TRUE(dialog.words().contains("R = 1/u = 1/"));
  desk.show("P3 gauge on the side face", "1 M");
  EXPECT_TRUE(dialog.words().contains("strains measured by a rosette"));
  EXPECT_FALSE(dialog.words().contains("ridge beam"));
}

} // namespace
} // namespace planewright
