// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/written.h"

#include "core/working/formula_walk.h"

namespace planewright {

namespace {

/// A Medium of FormulaWalk: one line of text.
struct OneLine {
  using Piece = std::string;
  using Held = HeldPiece<Piece>;

  static Piece words(const std::string& text) { return text; }
  static Piece joined(const std::vector<Piece>& pieces) {
    Piece all;
    for (const Piece& piece : pieces)
      all += piece;
    return all;
  }
  static Piece inParentheses(const Piece& piece) { return "(" + piece + ")"; }
  static Piece betweenBars(const Piece& piece) { return "|" + piece + "|"; }
  static Piece sign(const std::string& text) { return " " + text + " "; }
  static Piece root(const Piece& piece) { return "√(" + piece + ")"; }
  static Held quotient(const Held& a, const Held& b) {
    const auto held = [](const Held& part, Hold least) {
      return part.hold < least ? inParentheses(part.piece) : part.piece;
    };
    return {held(a, Hold::product) + "/" + held(b, Hold::power), Hold::product};
  }
  /// `base` holds together; an exponent that is no single number or symbol needs parentheses.
  static Piece power(const Piece& base, const Held& exponent) {
    if (exponent.piece == "2" || exponent.piece == "3")
      return base + (exponent.piece == "2" ? "²" : "³");
    return base + "^" + (exponent.hold < Hold::atom ? inParentheses(exponent.piece) : exponent.piece);
  }
};

std::string lineOf(const Formula& formula, const NumbersPutIn* numbers) {
  const OneLine medium;
  return FormulaWalk<OneLine>(medium, numbers).piece(formula).piece;
}

} // namespace

Text written(const Formula& formula) {
  return symbol(lineOf(formula, nullptr));
}

Text written(const Formula& formula, const NumbersPutIn& numbers) {
  return symbol(lineOf(formula, &numbers));
}

} // namespace planewright
