// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/typeset.h"

#include "core/figure/metrics.h"

#include <gtest/gtest.h>

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

const Formula a = Formula::symbol("a");
const Formula b = Formula::symbol("b_{1}");
const FormulaType type(3, Role::ink);

Typeset setIn(const Formula& formula) {
  const std::vector<Typeset> lines = setFormula(formula, nullptr, type, 100);
  EXPECT_EQ(lines.size(), 1u);
  return lines.front();
}

const Label& labelOf(const Typeset& set, const std::string& words) {
  for (const auto& part : set.parts)
    if (const auto* label = std::get_if<Label>(&part); label && plain(label->runs) == words)
      return *label;
  ADD_FAILURE() << "no label " << words;
  static const Label none;
  return none;
}

TEST(Typeset, aQuotientStandsOnABar) {
  const Typeset set = setIn(a / b);
  EXPECT_LT(labelOf(set, "a").at.y, labelOf(set, "b1").at.y);
  const auto& bar = std::get<Path>(set.parts.back());
  ASSERT_EQ(bar.points.size(), 2u);
  EXPECT_EQ(bar.points[0].y, bar.points[1].y);
  EXPECT_LT(labelOf(set, "a").at.y, bar.points[0].y);
  EXPECT_GT(labelOf(set, "b1").at.y - capHeight * 3, bar.points[0].y);
}

TEST(Typeset, aPowerIsRaisedAndSmaller) {
  const Typeset set = setIn(power(a, 2));
  EXPECT_LT(labelOf(set, "2").at.y, 0);
  EXPECT_LT(labelOf(set, "2").size, labelOf(set, "a").size);
}

TEST(Typeset, parenthesesGrowWithWhatTheyHold) {
  const Typeset low = setIn((a + b) * a);
  EXPECT_EQ(plain(labelOf(low, "(").runs), "(");
  const Typeset tall = setIn(power(a / b, 2));
  for (const auto& part : tall.parts)
    if (const auto* label = std::get_if<Label>(&part)) {
      EXPECT_NE(plain(label->runs), "(");
    }
}

TEST(Typeset, aWideSumIsBrokenBeforeItsSigns) {
  const Formula term = Formula::symbol("long name of a symbol");
  const std::vector<Typeset> lines = setFormula(term + term - term, nullptr, type, 45);
  ASSERT_EQ(lines.size(), 3u);
  EXPECT_EQ(plain(std::get<Label>(lines[1].parts.front()).runs), "+");
  EXPECT_EQ(plain(std::get<Label>(lines[2].parts.front()).runs), "−");
  for (const Typeset& line : lines)
    EXPECT_LE(line.width, 45 + 1e-9);
}

Formula anyFormula(int depth) {
  if (depth == 0)
    return *rc::gen::element(a, b, Formula(2), Formula(1.35), Formula::degrees(45));
  const Formula x = anyFormula(depth - 1);
  const Formula y = anyFormula(*rc::gen::inRange(0, depth));
  return *rc::gen::element(x + y, x - y, x * y, x / y, -x, power(x, 2), root(x), hypotenuse(x, y), cosine(x),
                           sine(x), arcTangent(x, y), greatest({x, y, a}));
}

/// The box of a part.
Box extentOf(const std::variant<Path, Label>& part) {
  if (const auto* label = std::get_if<Label>(&part)) {
    const double width = textWidth(label->runs, label->size, label->bold);
    return {label->at.x, label->at.y - capHeight * label->size, label->at.x + width, label->at.y};
  }
  Box box{1e9, 1e9, -1e9, -1e9};
  for (const Vec& point : std::get<Path>(part).points)
    box = {std::min(box.left, point.x), std::min(box.top, point.y), std::max(box.right, point.x),
           std::max(box.bottom, point.y)};
  return box;
}

RC_GTEST_PROP(Typeset, nothingLeavesItsBoxAndNoLineIsTooWide, ()) {
  const Formula formula = anyFormula(*rc::gen::inRange(1, 5));
  const NumbersPutIn numbers = {{"a", -1234.5, 3}, {"b_{1}", 0.5, 1}};
  const double width = 60;
  for (const NumbersPutIn* put : {static_cast<const NumbersPutIn*>(nullptr), &numbers})
    for (const Typeset& line : setFormula(formula, put, type, width)) {
      RC_ASSERT(line.width <= width + 1e-9);
      for (const auto& part : line.parts) {
        const Box box = extentOf(part);
        RC_ASSERT(box.left >= -1e-9);
        RC_ASSERT(box.right <= line.width + 0.1);
        RC_ASSERT(box.top >= -line.above - 0.05);
        RC_ASSERT(box.bottom <= line.below + 0.05);
      }
    }
}

RC_GTEST_PROP(Typeset, wordsOfAFormulaNeverLieOnEachOther, ()) {
  const Formula formula = anyFormula(*rc::gen::inRange(1, 4));
  const std::vector<Typeset> lines = setFormula(formula, nullptr, type, 1e6);
  RC_ASSERT(lines.size() == 1u);
  const auto& parts = lines.front().parts;
  for (std::size_t i = 0; i < parts.size(); ++i)
    for (std::size_t j = i + 1; j < parts.size(); ++j)
      if (std::holds_alternative<Label>(parts[i]) && std::holds_alternative<Label>(parts[j])) {
        Box first = extentOf(parts[i]);
        first.right -= 0.01;
        RC_ASSERT(!overlap(first, extentOf(parts[j])));
      }
}

} // namespace
} // namespace planewright
