// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/working/formula_walk.h"

namespace planewright {

/// Something set in type: parts of a Picture around the start of their base line at (0, 0), in mm, y down.
struct Typeset {
  double width = 0;
  double above = 0; ///< height over the base line
  double below = 0; ///< depth under it
  std::vector<std::variant<Path, Label>> parts;

  double height() const { return above + below; }
};

/// Moved by an offset; scaled about the start of its base line.
Typeset moved(Typeset set, Vec offset);
Typeset scaled(Typeset set, double factor);

/// How formulas are set: a Medium of FormulaWalk with real fractions, roots, exponents and parentheses that
/// grow with what they hold.
class FormulaType {
public:
  using Piece = Typeset;

  /// `size` of the letters in mm.
  FormulaType(double size, Role role) : m_size(size), m_role(role) {}

  Piece words(const std::string& text) const;
  Piece joined(const std::vector<Piece>& pieces) const;
  Piece inParentheses(const Piece& piece) const;
  Piece betweenBars(const Piece& piece) const;
  Piece sign(const std::string& text) const;
  HeldPiece<Piece> quotient(HeldPiece<Piece> a, HeldPiece<Piece> b) const;
  Piece power(const Piece& base, HeldPiece<Piece> exponent) const;
  Piece root(const Piece& piece) const;

  double size() const { return m_size; }

private:
  Piece bracket(const Piece& held, bool opening) const;

  double m_size;
  Role m_role;
};

/// The formula in lines of at most `width`: broken before the signs of its outermost sum, a term that is
/// still too wide before the signs of its product; what no break helps is set smaller. Without numbers in
/// symbols, else with the numbers put in.
std::vector<Typeset> setFormula(const Formula& formula, const NumbersPutIn* numbers, const FormulaType& type,
                                double width);

} // namespace planewright
