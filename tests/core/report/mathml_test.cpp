// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/mathml.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Formula sx = Formula::symbol("σ_{x}");
const Formula sy = Formula::symbol("σ_{y}");

TEST(MathMl, writesTheTree) {
  EXPECT_EQ(mathml(sx / 2), "<math><mfrac><mrow><msub><mi>σ</mi><mtext>x</mtext></msub></mrow>"
                            "<mrow><mn>2</mn></mrow></mfrac></math>");
  EXPECT_EQ(mathml(root(sx)), "<math><msqrt><msub><mi>σ</mi><mtext>x</mtext></msub></msqrt></math>");
  EXPECT_EQ(mathml(power(sx - sy, 2)),
            "<math><msup><mrow><mrow><mo>(</mo><mrow><msub><mi>σ</mi><mtext>x</mtext></msub><mo>−</mo>"
            "<msub><mi>σ</mi><mtext>y</mtext></msub></mrow><mo>)</mo></mrow></mrow><mrow><mn>2</mn></mrow>"
            "</msup></math>");
}

TEST(MathMl, putsNumbersIn) {
  const NumbersPutIn numbers = {{"σ_{x}", -8.4, 2}, {"σ_{y}", 0.6, 2, false, "kN·m"}};
  EXPECT_EQ(mathml(sx + sy, &numbers),
            "<math><mrow><mn>−8.40</mn><mo>+</mo><mn>0.60 kN·m</mn></mrow></math>");
}

TEST(MathMl, escapesWhatAUserCalledHisCase) {
  EXPECT_EQ(mathml(Formula::symbol("<b>&")), "<math><mi>&lt;b&gt;&amp;</mi></math>");
}

} // namespace
} // namespace planewright
