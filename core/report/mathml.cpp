// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/mathml.h"

#include "core/words/markup.h"
#include "core/working/formula_walk.h"

namespace planewright {

namespace {

std::string element(const char* name, const std::string& inside) {
  return std::string("<") + name + ">" + inside + "</" + name + ">";
}

bool isNumber(const std::string& text) {
  const std::string_view digits = text.starts_with("−") ? std::string_view(text).substr(3) : text;
  return !digits.empty() && digits.front() >= '0' && digits.front() <= '9';
}

/// A Medium of FormulaWalk.
struct MathMarkup {
  using Piece = std::string;

  static Piece words(const std::string& text) {
    Piece piece;
    const Runs parts = runs(symbol("%1").with(symbol(text)));
    for (std::size_t i = 0; i < parts.size(); ++i) {
      const char* kind = isNumber(parts[i].text) ? "mn" : "mi";
      const std::string base = element(kind, markupOf(parts[i].text));
      if (i + 1 < parts.size() && parts[i + 1].lowered) {
        piece += element("msub", base + element("mtext", markupOf(parts[i + 1].text)));
        ++i;
      } else {
        piece += base;
      }
    }
    return piece;
  }
  static Piece joined(const std::vector<Piece>& pieces) {
    Piece all;
    for (const Piece& piece : pieces)
      all += piece;
    return element("mrow", all);
  }
  static Piece inParentheses(const Piece& piece) {
    return element("mrow", element("mo", "(") + piece + element("mo", ")"));
  }
  static Piece sign(const std::string& text) { return element("mo", markupOf(text)); }
  static HeldPiece<Piece> quotient(const HeldPiece<Piece>& a, const HeldPiece<Piece>& b) {
    return {element("mfrac", element("mrow", a.piece) + element("mrow", b.piece)), Hold::product};
  }
  static Piece betweenBars(const Piece& piece) {
    return element("mrow", element("mo", "|") + piece + element("mo", "|"));
  }
  static Piece power(const Piece& base, const HeldPiece<Piece>& exponent) {
    return element("msup", element("mrow", base) + element("mrow", exponent.piece));
  }
  static Piece root(const Piece& piece) { return element("msqrt", piece); }
};

} // namespace

std::string mathml(const Formula& formula, const NumbersPutIn* numbers) {
  const MathMarkup medium;
  return "<math>" + FormulaWalk<MathMarkup>(medium, numbers).piece(formula).piece + "</math>";
}

} // namespace planewright
