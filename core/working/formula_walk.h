// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"
#include "core/working/formula.h"

#include <algorithm>
#include <cassert>

namespace planewright {

/// How tightly the last operation of a written piece holds its parts together.
enum class Hold { sum, product, power, atom };

/// A written piece of a formula and how it holds together.
template <class Piece>
struct HeldPiece {
  Piece piece;
  Hold hold = Hold::atom;
};

/// Walks a Formula and writes it in a medium: on one line of text, set in type, as MathML. What stands in
/// parentheses, which products need a sign and how numbers put in are written is decided here, once.
///
/// A Medium has a `Piece` and these functions:
///   Piece words(std::string)               a symbol, number or word; `_{...}` is an index
///   Piece joined(std::vector<Piece>)       side by side
///   Piece inParentheses(Piece)
///   Piece betweenBars(Piece)               the size of it without its sign
///   Piece sign(const char*)                "+", "−", "·" between two pieces, with its gaps
///   HeldPiece<Piece> quotient(HeldPiece a, HeldPiece b)
///   Piece power(Piece base, HeldPiece exponent)
///   Piece root(Piece)
template <class Medium>
class FormulaWalk {
public:
  using Piece = typename Medium::Piece;
  using Held = HeldPiece<Piece>;
  using Operation = Formula::Operation;

  /// Without numbers symbols stand as they are; else each symbol must be among them.
  FormulaWalk(const Medium& medium, const NumbersPutIn* numbers) : m_medium(medium), m_numbers(numbers) {}

  Held piece(const Formula& formula) const {
    switch (formula.operation()) {
    case Operation::number:
      return ofNumber(constant(formula.number()));
    case Operation::angle:
      return ofNumber(constant(formula.number()) + "°");
    case Operation::symbol:
      return ofSymbol(formula.symbol());
    case Operation::power:
      return ofPower(piece(formula.parts()[0]), piece(formula.parts()[1]));
    case Operation::absolute:
      return {m_medium.betweenBars(piece(formula.parts()[0]).piece), Hold::atom};
    case Operation::root:
      return {m_medium.root(piece(formula.parts()[0]).piece), Hold::atom};
    case Operation::hypotenuse:
      return ofHypotenuse(formula);
    case Operation::sum:
    case Operation::difference:
    case Operation::product:
    case Operation::quotient:
      return ofTwo(formula);
    case Operation::negative:
      return {m_medium.joined({m_medium.words("−"), held(piece(formula.parts()[0]), Hold::product)}),
              Hold::sum};
    default:
      return ofCall(formula);
    }
  }

  /// In parentheses where the piece would fall apart beside what stands next to it.
  Piece held(Held piece, Hold least) const {
    return piece.hold < least ? m_medium.inParentheses(std::move(piece.piece)) : std::move(piece.piece);
  }

  /// Whether the product of these parts is written without a sign: 2θ.
  bool isJoined(const Formula& product) const {
    return !m_numbers && product.parts()[0].operation() == Operation::number &&
           product.parts()[1].operation() == Operation::symbol;
  }

private:
  static std::string constant(double value) {
    const std::string digits = withDecimalSign(exactNumber(value));
    return value < 0 ? "−" + digits.substr(1) : digits;
  }

  Held ofNumber(const std::string& shown) const {
    return {m_medium.words(shown), shown.starts_with("−") ? Hold::sum : Hold::atom};
  }

  Held ofSymbol(const std::string& symbol) const {
    if (!m_numbers)
      return {m_medium.words(symbol), Hold::atom};
    const auto row = std::ranges::find(*m_numbers, symbol, &NumberPutIn::symbol);
    assert(row != m_numbers->end());
    if (row->isAngle)
      return ofNumber(shownDegrees(Angle::fromDegrees(row->value), row->decimals));
    const std::string number = shownNumber(row->value / row->scale, row->decimals);
    if (row->unit.empty())
      return ofNumber(number);
    // A number with its unit is a product of the two.
    const Hold hold = number.starts_with("−") ? Hold::sum : Hold::product;
    return {m_medium.words(number + " " + row->unit), hold};
  }

  Held ofPower(Held base, const Held& exponent) const {
    return {m_medium.power(held(std::move(base), Hold::atom), exponent), Hold::power};
  }

  Held ofHypotenuse(const Formula& formula) const {
    const Held two{m_medium.words("2"), Hold::atom};
    return {m_medium.root(m_medium.joined(
                {m_medium.power(held(piece(formula.parts()[0]), Hold::atom), two), m_medium.sign("+"),
                 m_medium.power(held(piece(formula.parts()[1]), Hold::atom), two)})),
            Hold::atom};
  }

  Held ofTwo(const Formula& formula) const {
    Held a = piece(formula.parts()[0]);
    Held b = piece(formula.parts()[1]);
    switch (formula.operation()) {
    case Operation::sum:
      return {m_medium.joined(
                  {held(std::move(a), Hold::sum), m_medium.sign("+"), held(std::move(b), Hold::product)}),
              Hold::sum};
    case Operation::difference:
      return {m_medium.joined(
                  {held(std::move(a), Hold::sum), m_medium.sign("−"), held(std::move(b), Hold::product)}),
              Hold::sum};
    case Operation::quotient:
      return m_medium.quotient(std::move(a), std::move(b));
    default:
      break;
    }
    std::vector<Piece> pieces = {held(std::move(a), Hold::product)};
    if (!isJoined(formula))
      pieces.push_back(m_medium.sign("·"));
    pieces.push_back(held(std::move(b), Hold::product));
    return {m_medium.joined(std::move(pieces)), Hold::product};
  }

  Held ofCall(const Formula& formula) const {
    std::vector<Piece> arguments;
    for (const Formula& part : formula.parts()) {
      if (!arguments.empty())
        arguments.push_back(m_medium.words(", "));
      arguments.push_back(piece(part).piece);
    }
    return {m_medium.joined({m_medium.words(nameOf(formula.operation())),
                             m_medium.inParentheses(m_medium.joined(std::move(arguments)))}),
            Hold::atom};
  }

  static std::string nameOf(Operation operation) {
    switch (operation) {
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

  const Medium& m_medium;
  const NumbersPutIn* m_numbers;
};

} // namespace planewright
