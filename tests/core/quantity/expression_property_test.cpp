// SPDX-License-Identifier: GPL-3.0-or-later
// Random expressions, built as trees whose value is worked out beside their text.
#include "tests/support/expression_corpus.h"

#include "core/quantity/format.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>

namespace planewright {
namespace {

int pick(int count) {
  return *rc::gen::inRange(0, count);
}

/// How tightly the last operation of a text binds.
enum class Binds { sum, product, sign, power, primary };

struct Tree {
  std::string text;
  double value = 0;
  double size = 0; ///< of the terms before they cancel: what rounding is measured by
  Binds binds = Binds::primary;
};

std::string blank() {
  return pick(3) == 0 ? " " : "";
}

std::string held(const Tree& tree, Binds least) {
  return tree.binds < least || pick(8) == 0 ? "(" + tree.text + ")" : tree.text;
}

template <std::size_t N>
const char* oneOf(const char* const (&spellings)[N]) {
  return spellings[pick(static_cast<int>(N))];
}

constexpr const char* minuses[] = {"-", "−"};
constexpr const char* crosses[] = {"*", "·", "×"};

Tree joined(const Tree& a, const char* sign, const Tree& b, Binds binds) {
  const Binds right = binds == Binds::sum ? Binds::product : Binds::sign;
  return {held(a, binds) + blank() + sign + blank() + held(b, right), 0, 0, binds};
}

Tree sum(const Tree& a, const Tree& b) {
  Tree tree = joined(a, "+", b, Binds::sum);
  tree.value = a.value + b.value;
  tree.size = a.size + b.size;
  return tree;
}

Tree difference(const Tree& a, const Tree& b) {
  Tree tree = joined(a, oneOf(minuses), b, Binds::sum);
  tree.value = a.value - b.value;
  tree.size = a.size + b.size;
  return tree;
}

Tree product(const Tree& a, const Tree& b) {
  Tree tree = joined(a, oneOf(crosses), b, Binds::product);
  tree.value = a.value * b.value;
  tree.size = a.size * b.size;
  return tree;
}

/// The divisor is a number as it stands: no cancellation in it.
Tree quotient(const Tree& a, const Tree& divisor) {
  Tree tree = joined(a, "/", divisor, Binds::product);
  tree.value = a.value / divisor.value;
  tree.size = a.size / std::abs(divisor.value);
  return tree;
}

Tree negative(const Tree& a) {
  return {oneOf(minuses) + blank() + held(a, Binds::sign), -a.value, a.size, Binds::sign};
}

Tree extreme(bool greatest, const Tree& a, const Tree& b) {
  return {std::string(greatest ? "max" : "min") + "(" + a.text + "," + blank() + b.text + ")",
          greatest ? std::max(a.value, b.value) : std::min(a.value, b.value), std::max(a.size, b.size)};
}

Tree absolute(const Tree& a) {
  return {"abs(" + a.text + ")", std::abs(a.value), a.size};
}

Tree leaf(double value, std::string_view unit = "", double factor = 1) {
  Tree tree{exactNumber(value), value * factor, value * factor};
  if (!unit.empty())
    tree.text += blank() + std::string(unit);
  return tree;
}

double someNumber() {
  return *rc::gen::inRange(1, 100000) / *rc::gen::element(1.0, 10.0, 1000.0);
}

Tree plainTree(int depth);

Tree power(int depth) {
  const Tree base = plainTree(depth - 1);
  const int exponent = pick(4);
  const Tree raised = leaf(exponent);
  return {held(base, Binds::primary) + blank() + "^" + blank() + held(raised, Binds::sign),
          std::pow(base.value, exponent), std::pow(base.size, exponent), Binds::power};
}

Tree plainTree(int depth) {
  if (depth == 0)
    return leaf(someNumber());
  switch (pick(8)) {
  case 0:
    return sum(plainTree(depth - 1), plainTree(depth - 1));
  case 1:
    return difference(plainTree(depth - 1), plainTree(depth - 1));
  case 2:
    return product(plainTree(depth - 1), plainTree(depth - 1));
  case 3:
    return quotient(plainTree(depth - 1), leaf(someNumber()));
  case 4:
    return negative(plainTree(depth - 1));
  case 5:
    return extreme(pick(2) == 0, plainTree(depth - 1), plainTree(depth - 1));
  case 6:
    return absolute(plainTree(depth - 1));
  default:
    return power(depth);
  }
}

// Factors to N and mm. Pound and inch: international yard and pound agreement 1959; g_n: 3rd CGPM 1901.
constexpr double newtonsPerPound = 0.45359237 * 9.80665;

Tree stressLeaf() {
  struct Row {
    const char* unit;
    double factor;
  };
  static constexpr Row rows[] = {{"MPa", 1},
                                 {"kPa", 1e-3},
                                 {"GPa", 1e3},
                                 {"bar", 0.1},
                                 {"N/mm^2", 1},
                                 {"kN / m²", 1e-3},
                                 {"kN/m/mm", 1},
                                 {"MN·m^-2", 1},
                                 {"psi", newtonsPerPound / 645.16},
                                 {"lbf/in^2", newtonsPerPound / 645.16}};
  const Row& row = rows[pick(static_cast<int>(std::size(rows)))];
  return leaf(someNumber(), row.unit, row.factor);
}

Tree forceOverArea() {
  const Tree force =
      pick(2) == 0 ? leaf(someNumber(), "kN", 1e3) : leaf(someNumber(), "lbf", newtonsPerPound);
  if (pick(2) == 0)
    return quotient(force, leaf(someNumber(), "cm^2", 100));
  const Tree width = leaf(someNumber(), "mm");
  const Tree height = leaf(someNumber(), "in", 25.4);
  return quotient(force, {"(" + width.text + "*" + height.text + ")", width.value * height.value});
}

/// A group or a call without a unit, and the unit behind it.
Tree unitBehind(int depth) {
  Tree tree = plainTree(depth - 1);
  if (tree.binds != Binds::primary || tree.text.front() != 'a')
    tree.text = "(" + tree.text + ")";
  tree.text += " MPa";
  tree.binds = Binds::primary;
  return tree;
}

Tree stressTree(int depth) {
  if (depth == 0)
    return stressLeaf();
  switch (pick(9)) {
  case 0:
    return sum(stressTree(depth - 1), stressTree(depth - 1));
  case 1:
    return difference(stressTree(depth - 1), stressTree(depth - 1));
  case 2:
    return product(plainTree(depth - 1), stressTree(depth - 1));
  case 3:
    return product(stressTree(depth - 1), plainTree(depth - 1));
  case 4:
    return quotient(stressTree(depth - 1), leaf(someNumber()));
  case 5:
    return negative(stressTree(depth - 1));
  case 6:
    return extreme(pick(2) == 0, stressTree(depth - 1), stressTree(depth - 1));
  case 7:
    return unitBehind(depth);
  default:
    return forceOverArea();
  }
}

bool readsBack(const Entry& entry, const EntryKind& kind) {
  const auto again = readEntry(entry.text, kind);
  return again && *again == entry;
}

void expectReadAs(const Tree& tree, const EntryKind& kind, double factor) {
  RC_PRE(tree.text.size() < 4000 && std::isfinite(tree.size) && tree.size < 1e290);
  const auto entry = readEntry(tree.text, kind);
  RC_LOG() << tree.text << "\n";
  if (!entry)
    RC_FAIL(plain(entry.error()));
  RC_ASSERT(std::abs(entry->value - factor * tree.value) <= 1e-13 * factor * tree.size);
  RC_ASSERT(readsBack(*entry, kind));
}

RC_GTEST_PROP(ExpressionTrees, plainOnesHaveTheirValueAndReadBack, ()) {
  expectReadAs(plainTree(pick(5)), *fieldOf("number"), 1);
}

RC_GTEST_PROP(ExpressionTrees, bareOnesTakeTheUnitOfTheField, ()) {
  expectReadAs(plainTree(pick(5)), *fieldOf("psi"), newtonsPerPound / 645.16);
}

RC_GTEST_PROP(ExpressionTrees, onesWithUnitsHaveTheirValueAndReadBack, ()) {
  expectReadAs(stressTree(pick(5)), *fieldOf("stress"), 1);
}

RC_GTEST_PROP(ExpressionTrees, everyPieceThatIsTakenOutLeavesAnEntryOrAProblem, ()) {
  std::string text = stressTree(3).text;
  const int start = pick(static_cast<int>(text.size()));
  text.erase(static_cast<std::size_t>(start), static_cast<std::size_t>(1 + pick(4)));
  const auto entry = readEntry(text, *fieldOf("stress"));
  if (entry)
    RC_ASSERT(readsBack(*entry, *fieldOf("stress")));
  else
    RC_ASSERT(entry.error().column >= 1 && !entry.error().what.empty() && !entry.error().mend.empty());
}

RC_GTEST_PROP(ExpressionTrees, aUnitBindsBeforeTheOperators, ()) {
  const double a = someNumber();
  const double b = someNumber();
  const std::string first = exactNumber(a) + " kN";
  const std::string second = exactNumber(b) + " mm^2";
  const auto open = readEntry(first + "/" + second, *fieldOf("stress"));
  const auto grouped = readEntry("(" + first + ")/(" + second + ")", *fieldOf("stress"));
  RC_ASSERT(open.has_value() && grouped.has_value());
  RC_ASSERT(open->value == grouped->value);
  RC_ASSERT(!readEntry(exactNumber(a) + "^2 MPa", *fieldOf("stress")));
}

} // namespace
} // namespace planewright
