// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/parser.h"

#include "core/quantity/stray.h"
#include "core/quantity/unit_reader.h"
#include "core/quantity/writing_problems.h"

#include <algorithm>
#include <numbers>
#include <optional>

namespace planewright {

namespace {

using Kind = Token::Kind;

constexpr int greatestDepth = 200;

class Parser {
public:
  Parser(std::string_view text, const Tokens& tokens, Slopes slopes)
      : m_cursor(text, tokens), m_slopes(slopes) {}

  Result<Value> whole() {
    auto value = sum();
    if (value && !m_cursor.next(Kind::end))
      return tl::unexpected(strayAfterValue(m_cursor, m_slopes));
    return value;
  }

private:
  Result<Value> sum() {
    const std::size_t start = m_cursor.at();
    auto left = product();
    while (left && (m_cursor.next(Kind::plus) || m_cursor.next(Kind::minus))) {
      const bool plus = m_cursor.next(Kind::plus);
      m_cursor.take();
      auto right = product();
      if (!right)
        return right;
      left = (plus ? sumOf : differenceOf)(*left, *right, m_cursor.since(start));
    }
    return left;
  }

  Result<Value> product() {
    const std::size_t start = m_cursor.at();
    auto left = signedPower(start);
    while (left && (m_cursor.next(Kind::times) || m_cursor.next(Kind::divide))) {
      const bool times = m_cursor.next(Kind::times);
      m_cursor.take();
      auto right = signedPower(m_cursor.at());
      if (!right)
        return right;
      left = (times ? productOf : quotientOf)(*left, *right, m_cursor.since(start));
    }
    return left;
  }

  /// `outermost` is where the base of the outermost power starts that this is an exponent of.
  Result<Value> signedPower(std::size_t outermost) {
    const std::size_t start = m_cursor.at();
    if (!m_cursor.next(Kind::minus) && !m_cursor.next(Kind::plus))
      return power(outermost);
    const bool minus = m_cursor.next(Kind::minus);
    m_cursor.take();
    auto value = nested([&] { return signedPower(outermost == start ? m_cursor.at() : outermost); });
    if (!value || !minus)
      return value;
    return negated(*value, m_cursor.since(start));
  }

  Result<Value> power(std::size_t outermost) {
    const std::size_t start = m_cursor.at();
    auto base = primary();
    if (base && m_cursor.next(Kind::superscript))
      base = superscript(*base, start);
    if (!base || !m_cursor.next(Kind::power))
      return base;
    m_cursor.take();
    auto exponent = nested([&] { return signedPower(outermost); });
    if (!exponent)
      return exponent;
    if (exponent->unitAt != 0)
      return tl::unexpected(unitOnExponent(m_cursor.since(outermost),
                                           m_cursor.upTo(outermost, exponent->unitAt),
                                           m_cursor.since(exponent->unitAt)));
    return powerOf(*base, *exponent, m_cursor.since(start));
  }

  Result<Value> superscript(const Value& base, std::size_t start) {
    Value exponent;
    exponent.number = m_cursor.peek().text == "²" ? 2 : 3;
    exponent.piece = m_cursor.here();
    m_cursor.take();
    if (m_cursor.next(Kind::superscript))
      return tl::unexpected(superscriptRow(m_cursor.here()));
    auto raised = powerOf(base, exponent, m_cursor.since(start));
    if (raised && unitFollows(m_cursor))
      return tl::unexpected(
          unitOnExponent(m_cursor.upTo(start, m_cursor.at() + 1), m_cursor.since(start), m_cursor.here()));
    return raised;
  }

  Result<Value> primary() {
    const std::size_t start = m_cursor.at();
    auto value = withoutUnit();
    if (!value || !unitFollows(m_cursor))
      return value;
    if (value->dimension != dimension::none)
      return tl::unexpected(unitAfterQuantity(m_cursor.here(), *value));
    const std::size_t unitAt = m_cursor.at();
    const auto unit = readUnitAt(m_cursor, m_slopes);
    if (!unit)
      return tl::unexpected(unit.error());
    value = planewright::withUnit(*value, *unit, m_cursor.since(start));
    if (value)
      value->unitAt = unitAt;
    return value;
  }

  Result<Value> withoutUnit() {
    const Piece piece = m_cursor.here();
    switch (m_cursor.peek().kind) {
    case Kind::number:
      m_cursor.take();
      return numberOf(piece);
    case Kind::open:
      return nested([&] { return group(); });
    case Kind::name:
      return named(piece);
    default:
      return tl::unexpected(strayForValue(m_cursor));
    }
  }

  Result<Value> named(const Piece& piece) {
    if (m_cursor.peek(1).is(Kind::open))
      return nested([&] { return call(piece); });
    if (piece.text != "pi")
      return tl::unexpected(strayForValue(m_cursor));
    m_cursor.take();
    Value value;
    value.number = std::numbers::pi;
    value.form = Form::primary;
    value.piece = piece;
    return value;
  }

  Result<Value> group() {
    const std::size_t start = m_cursor.at();
    m_cursor.take();
    auto value = sum();
    if (!value)
      return value;
    if (const auto wrong = closed(start))
      return tl::unexpected(*wrong);
    value->form = Form::primary;
    value->unitAt = 0;
    value->piece = m_cursor.since(start);
    return value;
  }

  Result<Value> call(const Piece& name) {
    const std::size_t start = m_cursor.at();
    const auto& names = functionNames();
    if (std::find(names.begin(), names.end(), name.text) == names.end())
      return tl::unexpected(strayCall(m_cursor));
    const bool several = name.text == "min" || name.text == "max";
    m_cursor.take();
    std::vector<Value> arguments;
    do {
      m_cursor.take();
      auto value = sum();
      if (!value)
        return value;
      arguments.push_back(*value);
    } while (several && m_cursor.next(Kind::comma));
    if (const auto wrong = closed(start + 1))
      return tl::unexpected(*wrong);
    return callOf(name.text, arguments, m_cursor.since(start));
  }

  /// Takes the ")" that belongs to the "(" at `open`.
  std::optional<Problem> closed(std::size_t open) {
    if (m_cursor.next(Kind::end))
      return notClosed(m_cursor.upTo(open, open + 1));
    if (!m_cursor.next(Kind::close))
      return strayAfterValue(m_cursor, m_slopes);
    m_cursor.take();
    return std::nullopt;
  }

  template <class Read>
  Result<Value> nested(const Read& read) {
    if (m_depth == greatestDepth)
      return tl::unexpected(tooDeep(m_cursor.here()));
    ++m_depth;
    auto value = read();
    --m_depth;
    return value;
  }

  Cursor m_cursor;
  Slopes m_slopes;
  int m_depth = 0;
};

} // namespace

Result<Value> readExpression(std::string_view text, const Tokens& tokens, Slopes slopes) {
  return Parser(text, tokens, slopes).whole();
}

} // namespace planewright
