// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/formula.h"

#include "core/quantity/angle.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace planewright {

struct Formula::Node {
  Operation operation = Operation::number;
  double number = 0;
  std::string symbol;
  std::vector<Formula> parts;
};

Formula::Formula(Node node) : m_node(std::make_shared<const Node>(std::move(node))) {}
Formula::Formula(double number) : Formula(Node{Operation::number, number, {}, {}}) {}

Formula Formula::degrees(double angle) {
  return Formula(Node{Operation::angle, angle, {}, {}});
}

Formula Formula::symbol(std::string_view name) {
  return Formula(Node{Operation::symbol, 0, std::string(name), {}});
}

Formula Formula::of(Operation operation, std::vector<Formula> parts) {
  assert(!parts.empty());
  return Formula(Node{operation, 0, {}, std::move(parts)});
}

Formula::Operation Formula::operation() const {
  return m_node->operation;
}
double Formula::number() const {
  return m_node->number;
}
const std::string& Formula::symbol() const {
  return m_node->symbol;
}
const std::vector<Formula>& Formula::parts() const {
  return m_node->parts;
}

bool Formula::operator==(const Formula& other) const {
  return operation() == other.operation() && number() == other.number() && symbol() == other.symbol() &&
         parts() == other.parts();
}

namespace {

double valueOf(const std::string& symbol, const NumbersPutIn& numbers) {
  const auto row = std::ranges::find(numbers, symbol, &NumberPutIn::symbol);
  assert(row != numbers.end());
  return row->value;
}

double evaluated(Formula::Operation operation, const std::vector<double>& parts) {
  using Operation = Formula::Operation;
  const double a = parts.front();
  const double b = parts.back();
  switch (operation) {
  case Operation::negative:
    return 0.0 - a;
  case Operation::sum:
    return a + b;
  case Operation::difference:
    return a - b;
  case Operation::product:
    return a * b;
  case Operation::quotient:
    return a / b;
  case Operation::power:
    return std::pow(a, b);
  case Operation::root:
    return std::sqrt(a);
  case Operation::hypotenuse:
    return std::hypot(a, b);
  case Operation::cosine:
    return cosSin(Angle::fromDegrees(a)).cos;
  case Operation::sine:
    return cosSin(Angle::fromDegrees(a)).sin;
  case Operation::tangent: {
    const CosSin both = cosSin(Angle::fromDegrees(a));
    return both.sin / both.cos;
  }
  case Operation::absolute:
    return std::abs(a);
  case Operation::arcTangent:
    return Angle::fromRadians(std::atan2(a + 0.0, b)).degrees();
  case Operation::greatest:
    return std::ranges::max(parts);
  case Operation::least:
    return std::ranges::min(parts);
  case Operation::number:
  case Operation::angle:
  case Operation::symbol:
    break;
  }
  assert(false && "leaves have no parts");
  return 0;
}

} // namespace

double Formula::valueWith(const NumbersPutIn& numbers) const {
  if (operation() == Operation::symbol)
    return valueOf(symbol(), numbers);
  if (parts().empty())
    return number();
  std::vector<double> values;
  for (const Formula& part : parts())
    values.push_back(part.valueWith(numbers));
  return evaluated(operation(), values);
}

namespace {

bool names(const Formula& formula, const std::string& symbol) {
  return formula.symbol() == symbol ||
         std::ranges::any_of(formula.parts(), [&](const Formula& part) { return names(part, symbol); });
}

} // namespace

NumbersPutIn namedBy(const Formula& formula, NumbersPutIn numbers) {
  std::erase_if(numbers, [&](const NumberPutIn& number) { return !names(formula, number.symbol); });
  return numbers;
}

Formula operator-(const Formula& a) {
  return Formula::of(Formula::Operation::negative, {a});
}
Formula operator+(const Formula& a, const Formula& b) {
  return Formula::of(Formula::Operation::sum, {a, b});
}
Formula operator-(const Formula& a, const Formula& b) {
  return Formula::of(Formula::Operation::difference, {a, b});
}
Formula operator*(const Formula& a, const Formula& b) {
  return Formula::of(Formula::Operation::product, {a, b});
}
Formula operator/(const Formula& a, const Formula& b) {
  return Formula::of(Formula::Operation::quotient, {a, b});
}
Formula power(const Formula& base, const Formula& exponent) {
  return Formula::of(Formula::Operation::power, {base, exponent});
}
Formula root(const Formula& a) {
  return Formula::of(Formula::Operation::root, {a});
}
Formula hypotenuse(const Formula& a, const Formula& b) {
  return Formula::of(Formula::Operation::hypotenuse, {a, b});
}
Formula cosine(const Formula& degrees) {
  return Formula::of(Formula::Operation::cosine, {degrees});
}
Formula sine(const Formula& degrees) {
  return Formula::of(Formula::Operation::sine, {degrees});
}
Formula tangent(const Formula& degrees) {
  return Formula::of(Formula::Operation::tangent, {degrees});
}
Formula absolute(const Formula& a) {
  return Formula::of(Formula::Operation::absolute, {a});
}
Formula arcTangent(const Formula& y, const Formula& x) {
  return Formula::of(Formula::Operation::arcTangent, {y, x});
}
Formula greatest(std::vector<Formula> parts) {
  return Formula::of(Formula::Operation::greatest, std::move(parts));
}
Formula least(std::vector<Formula> parts) {
  return Formula::of(Formula::Operation::least, std::move(parts));
}

} // namespace planewright
