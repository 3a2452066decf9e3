// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/evidence.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

constexpr std::string_view heading =
    "id,case,class,inputs,quantity,unit,printed,tol,recomputed,status,note,source,locator,basis";

Results<std::vector<CheckResult>> recomputedRow(const std::string& row) {
  const std::vector<std::string_view> rows = {heading, row};
  return recomputed(rows);
}

/// A row over the state 80, 20, -30 with these fields from quantity to status.
std::string row(const std::string& inputs, const std::string& rest) {
  return "X1,\"a, b\",," + inputs + "," + rest + ",,\"A work, with a comma\",Example 1,from memory";
}

bool agrees(const std::string& inputs, const std::string& rest) {
  const auto results = recomputedRow(row(inputs, rest));
  EXPECT_TRUE(results && results->size() == 1) << rest;
  return results && results->front().agrees;
}

std::string problemOf(const std::string& text) {
  const auto results = recomputedRow(text);
  return results ? "none" : plain(results.error().front());
}

const std::string state = "sx=80; sy=20; txy=-30";

TEST(Evidence, aResultCarriesItsSourceAndBasis) {
  const auto results = recomputedRow(row(state, "s1,MPa,92.43,0.005,92.42640687,OK"));
  ASSERT_TRUE(results);
  const CheckResult& result = results->front();
  EXPECT_EQ(result.id, "X1");
  EXPECT_EQ(result.source, "A work, with a comma");
  EXPECT_EQ(result.locator, "Example 1");
  EXPECT_EQ(result.basis, "from memory");
  EXPECT_EQ(result.quantity, "s1");
  EXPECT_EQ(result.printed, 92.43);
  EXPECT_NEAR(result.computed, 92.4264, 1e-4);
  EXPECT_TRUE(result.agrees);
}

TEST(Evidence, aPrintedValueOutsideItsToleranceDisagrees) {
  EXPECT_TRUE(agrees(state, "s2,MPa,7.57,0.005,7.573593129,OK"));
  EXPECT_FALSE(agrees(state, "s2,MPa,7.58,0.005,7.573593129,OK"));
  EXPECT_TRUE(agrees("sx=3; sy=0; txy=0", "tmax,MPa,2,0.5,1.5,OK"));
}

TEST(Evidence, roundedWorkingIsJudgedByOwnArithmetic) {
  EXPECT_TRUE(agrees(state, "s2,MPa,7.61,0.005,7.573593129,LAST_DIGIT"));
  EXPECT_FALSE(agrees(state, "s2,MPa,7.57,0.005,7.57359,LAST_DIGIT"));
}

TEST(Evidence, magnitudesAreJudgedWhereTheSourceHasAnotherSign) {
  EXPECT_TRUE(agrees(state + "; theta=25", "txyp,MPa,42.26,0.005,-42.26496,SIGN"));
  EXPECT_FALSE(agrees(state + "; theta=25", "txyp,MPa,42.26,0.005,-42.26496,OK"));
  EXPECT_FALSE(agrees(state + "; theta=25", "txyp,MPa,42.36,0.005,-42.26496,SIGN"));
}

TEST(Evidence, withoutAPrintedValueOwnArithmeticIsAllThereIs) {
  const auto results = recomputedRow(row(state, "tabs,MPa,,,46.21320344,NO_PRINTED_VALUE"));
  ASSERT_TRUE(results);
  EXPECT_FALSE(results->front().printed);
  EXPECT_TRUE(results->front().agrees);
  EXPECT_FALSE(agrees(state, "tabs,MPa,,,42.42640687,NO_PRINTED_VALUE"));
}

TEST(Evidence, anglesAreComparedModulo180) {
  EXPECT_TRUE(agrees(state, "thp1,deg,157.5,0.05,-22.5,OK"));
  EXPECT_TRUE(agrees(state, "thp1,deg,-22.5,0.05,-22.5,OK"));
  EXPECT_FALSE(agrees(state, "thp1,deg,67.5,0.05,-22.5,OK"));
  EXPECT_TRUE(agrees(state, "thp2,deg,67.5,0.05,67.5,OK"));
  EXPECT_TRUE(agrees(state, "ths,deg,-67.5,0.05,-67.5,OK"));
}

TEST(Evidence, theShearFollowsWhereS1IsGiven) {
  EXPECT_TRUE(agrees("sx=8; sy=0; s1=10", "txy,ksi,4.47,0.005,4.472135955,OK"));
  EXPECT_TRUE(agrees("sx=8; sy=0; s1=10", "s1,ksi,10,1e-9,10,OK"));
}

TEST(Evidence, sectionsAreChecksToo) {
  const std::string beam = "shape=rectangle; b=80; h=300";
  EXPECT_TRUE(agrees(beam, "Iz,cm4,18000,0.5,18000,OK"));
  EXPECT_FALSE(agrees(beam, "Iz,cm4,18001,0.5,18000,OK"));
  EXPECT_TRUE(agrees(beam + "; Mz=30e6; at=bottom", "sx,MPa,25,0.01,25,OK"));
  EXPECT_TRUE(agrees(beam + "; Vy=16e3; z=40", "txy,kPa,1000,1,1000,OK"));
  EXPECT_TRUE(agrees(beam + "; Vy=16e3; rule=slope; z=40", "txy,MPa,-1,0.01,-1,OK"));
  EXPECT_TRUE(agrees(beam + "; Vz=16e3; y=150; view=top", "txy,MPa,-1,0.01,-1,OK"));
}

TEST(Evidence, sectionsThatDoNotReadAreProblems) {
  const auto problem = [](const std::string& inputs, const std::string& quantity = "A") {
    return problemOf(row(inputs, quantity + ",mm2,1,1,1,OK"));
  };
  EXPECT_EQ(problem("shape=oval; b=1"), "line 2: Checks know no such shape.");
  EXPECT_EQ(problem("shape=tabled; A=1"), "line 2: Checks know no such shape.");
  EXPECT_EQ(problem("shape=circle; d=4O"), "line 2: This input is no number.");
  EXPECT_EQ(problem("shape=circle; d=40; N=1k"), "line 2: This input is no number.");
  EXPECT_EQ(problem("shape=circle; d=40; view=back"), "line 2: This view is not known.");
  EXPECT_EQ(problem("shape=circle; d=40; rule=down"), "line 2: This rule of signs is not known.");
  EXPECT_EQ(problem("shape=circle; d=40; at=edge"), "line 2: This place in the section is not known.");
  EXPECT_EQ(problem("shape=circle"), "line 2: The diameter is missing.");
  EXPECT_EQ(problem("shape=circle; d=40", "thp1"),
            "line 2: This quantity does not follow from these inputs.");
  EXPECT_EQ(problem("shape=t; h=90; b=60; t_w=5; t_f=8", "Wpl"),
            "line 2: This quantity does not follow from these inputs.");
}

TEST(Evidence, whatDoesNotReadIsAProblemAndNeverPassedOver) {
  EXPECT_EQ(problemOf("X1,too,short"), "line 2: This row has not as many fields as its heading.");
  EXPECT_EQ(problemOf(row(state, "s3,MPa,1,1,1,OK")),
            "line 2: This quantity does not follow from these inputs.");
  EXPECT_EQ(problemOf(row(state, "sxp,MPa,1,1,1,OK")),
            "line 2: This quantity does not follow from these inputs.");
  EXPECT_EQ(problemOf(row("sx=5; sy=5; txy=0", "thp1,deg,0,1,0,OK")),
            "line 2: This quantity does not follow from these inputs.");
  EXPECT_EQ(problemOf(row("sx=80; sy=2O; txy=0", "s1,MPa,1,1,1,OK")),
            "line 2: These inputs make no state of stress.");
  EXPECT_EQ(problemOf(row(state, "s1,MPa,1,1,1,ok")), "line 2: This status is not known.");
  EXPECT_EQ(problemOf(row(state, "s1,MPa,,1,1,OK")), "line 2: The numbers of this row do not read.");
  EXPECT_EQ(problemOf(row(state, "s1,MPa,1,nan,1,OK")), "line 2: The numbers of this row do not read.");
  EXPECT_EQ(problemOf(row(state, "s1,MPa,1,1,1,NO_PRINTED_VALUE")),
            "line 2: The numbers of this row do not read.");
  EXPECT_FALSE(recomputed({}));
  const std::vector<std::string_view> other = {"id,inputs"};
  EXPECT_FALSE(recomputed(other));
}

} // namespace
} // namespace planewright
