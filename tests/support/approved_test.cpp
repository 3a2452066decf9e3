// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/approved.h"

namespace planewright {
namespace {

TEST(Approved, namesTheFirstLineThatDiffers) {
  EXPECT_EQ(firstDifference("a\nb\n", "a\nb\n"), "");
  EXPECT_EQ(firstDifference("a\nbc\nd", "a\nbx\ne"), "line 2\n  approved: bc\n  actual:   bx");
  EXPECT_EQ(firstDifference("a", "a\nb"), "line 1\n  approved: a\n  actual:   a");
  EXPECT_EQ(firstDifference("a\nb", "a\n"), "line 2\n  approved: b\n  actual:   ");
  EXPECT_EQ(firstDifference("", "a"), "line 1\n  approved: \n  actual:   a");
}

/// These compare for certain, also while the approved files of other tests are being written.
class ApprovedFile : public testing::Test {
protected:
  void SetUp() override { unsetenv("PLANEWRIGHT_APPROVE"); }
};

TEST_F(ApprovedFile, thatIsMissingIsAFailure) {
  EXPECT_FALSE(matchesApproved("support/there_is_none.txt", "x"));
}

TEST_F(ApprovedFile, isComparedToTheLastByte) {
  EXPECT_TRUE(matchesApproved("support/two_lines.txt", "one\ntwo\n"));
  EXPECT_FALSE(matchesApproved("support/two_lines.txt", "one\ntwo"));
  EXPECT_FALSE(matchesApproved("support/two_lines.txt", "one\nTwo\n"));
}

} // namespace
} // namespace planewright
