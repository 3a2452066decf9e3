// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/written.h"

#include "core/quantity/format.h"

#include <algorithm>
#include <array>
#include <cassert>

namespace planewright {

namespace {

using Operation = Formula::Operation;

/// How tightly the last operation of a line holds its parts together.
enum class Hold { sum, product, power, atom };

struct Line {
  std::string words;
  Hold hold = Hold::atom;
};

/// In parentheses where the line would fall apart beside what stands next to it.
std::string held(const Line& line, Hold least) {
  return line.hold < least ? "(" + line.words + ")" : line.words;
}

Line ofNumber(const std::string& shown) {
  return {shown, shown.starts_with("−") ? Hold::sum : Hold::atom};
}

std::string constant(double value) {
  const std::string digits = exactNumber(value);
  return value < 0 ? "−" + digits.substr(1) : digits;
}

/// Writes a formula; without numbers symbols stand as they are.
class Writer {
public:
  explicit Writer(const NumbersPutIn* numbers) : m_numbers(numbers) {}

  Line line(const Formula& formula) const {
    switch (formula.operation()) {
    case Operation::number:
      return ofNumber(constant(formula.number()));
    case Operation::angle:
      return ofNumber(constant(formula.number()) + "°");
    case Operation::symbol:
      return ofSymbol(formula.symbol());
    case Operation::power:
      return ofPower(line(formula.parts()[0]), line(formula.parts()[1]));
    case Operation::hypotenuse:
      return {"√(" + ofPower(line(formula.parts()[0]), {"2"}).words + " + " +
              ofPower(line(formula.parts()[1]), {"2"}).words + ")"};
    case Operation::absolute:
      return {"|" + line(formula.parts()[0]).words + "|"};
    default:
      return formula.parts().size() == 2 ? ofTwo(formula) : ofCall(formula);
    }
  }

private:
  Line ofSymbol(const std::string& symbol) const {
    if (!m_numbers)
      return {symbol};
    const auto row = std::ranges::find(*m_numbers, symbol, &NumberPutIn::symbol);
    assert(row != m_numbers->end());
    if (row->isAngle)
      return ofNumber(shownDegrees(Angle::fromDegrees(row->value), row->decimals));
    Line line = ofNumber(shownNumber(row->value / row->scale, row->decimals));
    if (row->unit.empty())
      return line;
    // A number with its unit is a product of the two.
    return {line.words + " " + row->unit, std::min(line.hold, Hold::product)};
  }

  static Line ofPower(const Line& base, const Line& exponent) {
    if (exponent.words == "2" || exponent.words == "3")
      return {held(base, Hold::atom) + (exponent.words == "2" ? "²" : "³"), Hold::power};
    return {held(base, Hold::atom) + "^" + held(exponent, Hold::atom), Hold::power};
  }

  Line ofTwo(const Formula& formula) const {
    const Line a = line(formula.parts()[0]);
    const Line b = line(formula.parts()[1]);
    switch (formula.operation()) {
    case Operation::sum:
      return {held(a, Hold::sum) + " + " + held(b, Hold::product), Hold::sum};
    case Operation::difference:
      return {held(a, Hold::sum) + " − " + held(b, Hold::product), Hold::sum};
    case Operation::product:
      return {held(a, Hold::product) + productSign(formula) + held(b, Hold::product), Hold::product};
    case Operation::quotient:
      return {held(a, Hold::product) + "/" + held(b, Hold::power), Hold::product};
    default:
      return ofCall(formula);
    }
  }

  /// A number before a symbol needs no sign: 2θ.
  const char* productSign(const Formula& product) const {
    const bool joined = !m_numbers && product.parts()[0].operation() == Operation::number &&
                        product.parts()[1].operation() == Operation::symbol;
    return joined ? "" : " · ";
  }

  Line ofCall(const Formula& formula) const {
    if (formula.operation() == Operation::negative)
      return {"−" + held(line(formula.parts()[0]), Hold::product), Hold::sum};
    std::string arguments;
    for (const Formula& part : formula.parts())
      arguments += (arguments.empty() ? "" : ", ") + line(part).words;
    return {nameOf(formula.operation()) + "(" + arguments + ")"};
  }

  static std::string nameOf(Operation operation) {
    switch (operation) {
    case Operation::root:
      return "√";
    case Operation::cosine:
      return "cos";
    case Operation::sine:
      return "sin";
    case Operation::tangent:
      return "tan";
    case Operation::arcTangent:
      return "atan2";
    case Operation::greatest:
      return "max";
    case Operation::least:
      return "min";
    default:
      assert(false && "no call");
      return {};
    }
  }

  const NumbersPutIn* m_numbers;
};

} // namespace

Text written(const Formula& formula) {
  return symbol(Writer(nullptr).line(formula).words);
}

Text written(const Formula& formula, const NumbersPutIn& numbers) {
  return symbol(Writer(&numbers).line(formula).words);
}

} // namespace planewright
