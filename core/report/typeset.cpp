// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/typeset.h"

#include "core/figure/metrics.h"

#include <cmath>

namespace planewright {

namespace {

// Parts of the size of the letters.
constexpr double overLetters = 0.74;
constexpr double underLetters = 0.22;
constexpr double underIndex = 0.32;
constexpr double axis = 0.26; ///< of fraction bars over the base line
constexpr double gapOfBar = 0.17;
constexpr double gapOfSign = 0.22;
constexpr double stroke = 0.055;
constexpr double exponentSize = 0.72;
constexpr double exponentRise = 0.40;
constexpr double smallerInside = 0.86; ///< of a fraction inside a fraction
constexpr double taller = 1.25;        ///< of letters: parentheses are drawn from here on

bool hasIndex(const Runs& runs) {
  return std::ranges::any_of(runs, &Run::lowered);
}

} // namespace

Typeset moved(Typeset set, Vec offset) {
  for (auto& part : set.parts)
    if (auto* path = std::get_if<Path>(&part)) {
      for (Vec& point : path->points)
        point = point + offset;
    } else {
      auto& label = std::get<Label>(part);
      label.at = label.at + offset;
    }
  return set;
}

Typeset scaled(Typeset set, double factor) {
  for (auto& part : set.parts)
    if (auto* path = std::get_if<Path>(&part)) {
      for (Vec& point : path->points)
        point = factor * point;
      if (path->pen)
        path->pen->width *= factor;
    } else {
      auto& label = std::get<Label>(part);
      label.at = factor * label.at;
      label.size *= factor;
    }
  set.width *= factor;
  set.above *= factor;
  set.below *= factor;
  return set;
}

Typeset FormulaType::words(const std::string& text) const {
  Label label;
  label.runs = runs(symbol("%1").with(symbol(text)));
  label.size = m_size;
  label.role = m_role;
  Typeset set;
  set.width = textWidth(label.runs, m_size, false);
  set.above = overLetters * m_size;
  set.below = (hasIndex(label.runs) ? underIndex : underLetters) * m_size;
  set.parts.emplace_back(std::move(label));
  return set;
}

Typeset FormulaType::joined(const std::vector<Piece>& pieces) const {
  Typeset all;
  for (const Piece& piece : pieces) {
    Typeset next = moved(piece, {all.width, 0});
    all.width += piece.width;
    all.above = std::max(all.above, piece.above);
    all.below = std::max(all.below, piece.below);
    all.parts.insert(all.parts.end(), next.parts.begin(), next.parts.end());
  }
  return all;
}

Typeset FormulaType::sign(const std::string& text) const {
  const double gap = gapOfSign * m_size;
  Typeset set = moved(words(text), {gap, 0});
  set.width += 2 * gap;
  return set;
}

/// Half of a flat ellipse, as tall as what it holds.
Typeset FormulaType::bracket(const Piece& held, bool opening) const {
  constexpr int steps = 16;
  const double width = 0.32 * m_size;
  const double bow = 0.22 * m_size;
  const double middle = (held.below - held.above) / 2;
  const double half = held.height() / 2;
  Path path;
  path.pen = Pen{m_role, stroke * m_size, Dash::solid};
  for (int i = 0; i <= steps; ++i) {
    const double y = -half + held.height() * i / steps;
    const double in = bow * (1 - std::sqrt(std::max(0.0, 1 - y * y / (half * half) * 0.96)));
    path.points.push_back(
        {opening ? width - bow + in - 0.02 * m_size : bow - in + 0.02 * m_size, middle + y});
  }
  Typeset set;
  set.width = width;
  set.above = held.above;
  set.below = held.below;
  set.parts.emplace_back(std::move(path));
  return set;
}

Typeset FormulaType::inParentheses(const Piece& piece) const {
  if (piece.height() <= taller * m_size)
    return joined({words("("), piece, words(")")});
  return joined({bracket(piece, true), piece, bracket(piece, false)});
}

Typeset FormulaType::betweenBars(const Piece& piece) const {
  Typeset bar;
  bar.width = 0.3 * m_size;
  bar.above = piece.above;
  bar.below = piece.below;
  Path line;
  line.points = {{bar.width / 2, -piece.above}, {bar.width / 2, piece.below}};
  line.pen = Pen{m_role, stroke * m_size, Dash::solid};
  bar.parts.emplace_back(std::move(line));
  return joined({bar, piece, bar});
}

HeldPiece<Typeset> FormulaType::quotient(HeldPiece<Piece> a, HeldPiece<Piece> b) const {
  const auto inside = [&](Piece piece) {
    return piece.height() > taller * m_size ? scaled(std::move(piece), smallerInside) : piece;
  };
  const Piece over = inside(std::move(a.piece));
  const Piece under = inside(std::move(b.piece));
  const double width = std::max(over.width, under.width) + 0.2 * m_size;
  const double gap = gapOfBar * m_size;
  const double bar = -axis * m_size;
  Typeset set;
  set.width = width + 0.16 * m_size;
  const double left = 0.08 * m_size;
  const auto add = [&](const Piece& piece, double base) {
    const Typeset at = moved(piece, {left + (width - piece.width) / 2, base});
    set.parts.insert(set.parts.end(), at.parts.begin(), at.parts.end());
  };
  const double overBase = bar - gap - over.below;
  const double underBase = bar + gap + under.above;
  add(over, overBase);
  add(under, underBase);
  Path line;
  line.points = {{left, bar}, {left + width, bar}};
  line.pen = Pen{m_role, stroke * m_size, Dash::solid};
  set.parts.emplace_back(std::move(line));
  set.above = over.above - overBase;
  set.below = under.below + underBase;
  return {std::move(set), Hold::product};
}

Typeset FormulaType::power(const Piece& base, HeldPiece<Piece> raising) const {
  Piece exponent = scaled(std::move(raising.piece), exponentSize);
  const double rise = std::max(exponentRise * m_size, base.above - 0.45 * m_size);
  Typeset raised = moved(std::move(exponent), {0.03 * m_size, -rise});
  raised.above += rise;
  raised.below = std::max(0.0, raised.below - rise);
  raised.width += 0.03 * m_size;
  return joined({base, raised});
}

Typeset FormulaType::root(const Piece& piece) const {
  const double hook = 0.62 * m_size;
  const double top = -piece.above - 0.14 * m_size;
  const double bottom = piece.below;
  Typeset set = moved(piece, {hook, 0});
  set.width = hook + piece.width + 0.12 * m_size;
  set.above = -top + stroke * m_size;
  Path path;
  path.pen = Pen{m_role, stroke * m_size, Dash::solid};
  const double knee = std::min(-0.30 * m_size, (top + bottom) / 2);
  path.points = {{0.06 * m_size, knee + 0.08 * m_size},
                 {0.18 * m_size, knee},
                 {0.34 * m_size, bottom},
                 {0.54 * m_size, top},
                 {set.width - 0.04 * m_size, top}};
  set.parts.emplace_back(std::move(path));
  return set;
}

namespace {

/// A term with the sign before it.
struct Term {
  std::string sign; ///< none before the first
  Formula formula;
};

bool isSum(const Formula& formula) {
  return formula.operation() == Formula::Operation::sum ||
         formula.operation() == Formula::Operation::difference;
}

std::vector<Term> chainOf(Formula formula, bool ofSum) {
  std::vector<Term> terms;
  const auto goesOn = [&] {
    return ofSum ? isSum(formula) : formula.operation() == Formula::Operation::product;
  };
  while (goesOn()) {
    const bool minus = formula.operation() == Formula::Operation::difference;
    terms.insert(terms.begin(), {ofSum ? (minus ? "−" : "+") : "·", formula.parts()[1]});
    formula = Formula(formula.parts()[0]);
  }
  terms.insert(terms.begin(), {"", formula});
  return terms;
}

/// Sets formulas in lines.
class LineSetter {
public:
  LineSetter(const NumbersPutIn* numbers, const FormulaType& type, double width)
      : m_walk(type, numbers), m_type(type), m_width(width) {}

  std::vector<Typeset> lines(const Formula& formula) {
    const Typeset whole = m_walk.piece(formula).piece;
    if (whole.width <= m_width)
      return {whole};
    if (isSum(formula))
      for (const Term& term : chainOf(formula, true))
        addTerm(term);
    else if (formula.operation() == Formula::Operation::product)
      addFactors({"", formula});
    else
      add(whole);
    flush();
    return std::move(m_lines);
  }

private:
  double indent() const { return m_lines.empty() ? 0 : m_type.size(); }
  double room() const { return m_width - indent() - m_line.width; }

  void addTerm(const Term& term) {
    const Hold least = term.sign.empty() ? Hold::sum : Hold::product;
    const Typeset set = withSign(term.sign, m_walk.held(m_walk.piece(term.formula), least));
    const bool isWide = set.width > m_width - m_type.size();
    if (isWide && term.formula.operation() == Formula::Operation::product)
      return addFactors(term);
    add(set);
  }

  void addFactors(const Term& product) {
    for (const Term& factor : chainOf(product.formula, false)) {
      const std::string& before = factor.sign.empty() ? product.sign : factor.sign;
      add(withSign(before, m_walk.held(m_walk.piece(factor.formula), Hold::product)));
    }
  }

  Typeset withSign(const std::string& sign, const Typeset& piece) const {
    return sign.empty() ? piece : m_type.joined({m_type.sign(sign), piece});
  }

  void add(Typeset piece) {
    if (!m_line.parts.empty() && piece.width > room())
      flush();
    if (const double part = room() / piece.width; part < 1)
      piece = scaled(std::move(piece), part);
    m_line = m_type.joined({m_line, piece});
  }

  void flush() {
    if (m_line.parts.empty())
      return;
    Typeset line = moved(std::move(m_line), {indent(), 0});
    line.width += indent();
    m_lines.push_back(std::move(line));
    m_line = {};
  }

  FormulaWalk<FormulaType> m_walk;
  const FormulaType& m_type;
  double m_width;
  Typeset m_line;
  std::vector<Typeset> m_lines;
};

} // namespace

std::vector<Typeset> setFormula(const Formula& formula, const NumbersPutIn* numbers, const FormulaType& type,
                                double width) {
  return LineSetter(numbers, type, width).lines(formula);
}

} // namespace planewright
