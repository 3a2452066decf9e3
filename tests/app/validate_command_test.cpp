// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::HasSubstr;
using testing::Not;

class Validate : public ProgramTest {};

TEST_F(Validate, recomputesEveryPublishedValue) {
  const Ran ran = run("validate");
  EXPECT_EQ(ran.exit, 0) << ran.err;
  EXPECT_THAT(ran.err, HasSubstr("values agree."));
  EXPECT_THAT(ran.out, Not(HasSubstr("DISAGREES")));
  for (const char* source : {"Beer", "Kaw", "EN 1993-1-8", "from memory"})
    EXPECT_THAT(ran.out, HasSubstr(source));
}

TEST_F(Validate, writesIntoAFile) {
  EXPECT_EQ(run("validate -o values.txt").exit, 0);
  EXPECT_THAT(contents("values.txt"), HasSubstr("values agree."));
}

TEST_F(Validate, writesAReport) {
  EXPECT_EQ(run("validate -o report.html").exit, 0);
  EXPECT_THAT(contents("report.html"), HasSubstr("are evidence from outside the program"));
  EXPECT_EQ(run("validate -o report.pdf").exit, 0);
  EXPECT_THAT(shell("pdftotext -layout report.pdf -").out, HasSubstr("Known misprints of the sources"));
}

TEST_F(Validate, takesNoStudy) {
  expectWrongUse(run("validate beam.planewright"), "beam.planewright");
}

} // namespace
} // namespace planewright
