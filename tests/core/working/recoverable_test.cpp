// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/recoverable.h"

#include <gtest/gtest.h>

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

const Formula a = Formula::symbol("a");
const Formula b = Formula::symbol("b");

Step stepOf(const Formula& formula, double x, double y, int decimals) {
  const NumbersPutIn numbers = {{"a", x, decimals + 1}, {"b", y, decimals + 1}};
  return {verbatim("name"), symbol("c"), formula, numbers, formula.valueWith(numbers), decimals, "MPa", {}};
}

TEST(Recoverable, leavesAStepWhosePrintedNumbersGiveItsResult) {
  const Step step = stepOf(a + b, 1.23456, 2.34567, 2);
  EXPECT_TRUE(isRecoverable(step));
  EXPECT_EQ(recoverable(step).putIn, step.putIn);
}

TEST(Recoverable, printsMoreDigitsWhereTermsCancel) {
  // 1/(a − b) with a − b = 0.0001: one digit more than the result has is far from enough.
  const Step step = stepOf(1 / (a - b), 1.23456, 1.23446, 2);
  EXPECT_FALSE(isRecoverable(step));
  const Step more = recoverable(step);
  EXPECT_TRUE(isRecoverable(more));
  EXPECT_GT(more.putIn[0].decimals, step.putIn[0].decimals);
  EXPECT_EQ(more.result, step.result);
}

TEST(Recoverable, numbersThatAreWrittenWholeGetNoMoreDecimals) {
  EXPECT_EQ(plain(written(recoverable(stepOf(a - b, 5.12345678, 5.1, 2)))),
            "c = a − b = 5.123 − 5.100 = 0.02 MPa");
  Step step = stepOf(a - b, 5.12345678, 5.1, 3);
  for (NumberPutIn& number : step.putIn)
    number.decimals = 1;
  EXPECT_EQ(plain(written(recoverable(step))), "c = a − b = 5.123 − 5.1 = 0.023 MPa");
}

TEST(Recoverable, countsInTheUnitsInWhichNumbersAreWritten) {
  // 12.3456 kN m over 2 m, in kN: moments in N mm, written in kN m.
  Step step{verbatim("force"),
            symbol("F"),
            a / b,
            {{"a", 12.3456e6, 2, false, "kN·m", 1e6}, {"b", 2000, 0}},
            12.3456e6 / 2000,
            3,
            "kN",
            {},
            1000};
  EXPECT_FALSE(isRecoverable(step));
  EXPECT_EQ(recoverable(step).putIn[0].decimals, 3);
}

TEST(Recoverable, givesUpOnAResultThatIsNotThatOfTheFormula) {
  Step step = stepOf(a + b, 1, 2, 2);
  step.result = 4;
  EXPECT_EQ(recoverable(step).putIn, step.putIn);
}

RC_GTEST_PROP(Recoverable, whatIsGivenBackFollowsFromItsPrintedNumbers, ()) {
  const double x = *rc::gen::inRange(-100000000, 100000000) / 7.0e5;
  const double y = *rc::gen::inRange(-100000000, 100000000) / 9.0e5;
  RC_PRE(x != y);
  const Formula formula = *rc::gen::element(a + b, a - b, a * b, power(a, 2) - power(b, 2));
  const Step step = recoverable(stepOf(formula, x, y, *rc::gen::inRange(0, 6)));
  RC_ASSERT(isRecoverable(step));
}

} // namespace
} // namespace planewright
