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
  EXPECT_THAT(ran.out, HasSubstr("; 0 disagree."));
  EXPECT_THAT(ran.out, Not(HasSubstr("DISAGREES")));
  for (const char* source : {"Beer", "Kaw", "EN 1993-1-8", "from memory"})
    EXPECT_THAT(ran.out, HasSubstr(source));
}

TEST_F(Validate, writesIntoAFile) {
  EXPECT_EQ(run("validate -o values.txt").exit, 0);
  EXPECT_THAT(contents("values.txt"), HasSubstr("0 disagree"));
}

TEST_F(Validate, takesNoStudy) {
  expectWrongUse(run("validate beam.planewright"), "beam.planewright");
}

} // namespace
} // namespace planewright
