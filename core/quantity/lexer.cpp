// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/lexer.h"

#include "core/words/utf8.h"

#include <cassert>

namespace planewright {

namespace {

constexpr char32_t minusSign = 0x2212;
constexpr char32_t middleDot = 0xB7;
constexpr char32_t timesSign = 0xD7;
constexpr char32_t degreeSign = 0xB0;
constexpr char32_t microSign = 0xB5;

bool isDigit(char32_t c) {
  return c >= '0' && c <= '9';
}

/// Letters of the alphabet, and those that pasted symbols of the trade are made of (micro sign, Greek).
bool isLetter(char32_t c) {
  return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == microSign || (c >= 0x370 && c <= 0x3FF);
}

bool isBlank(char32_t c) {
  return c == ' ' || c == 0xA0 || (c >= 0x2000 && c <= 0x200A) || c == 0x202F;
}

/// Line ends and tabs are blanks only round the text: pasted cells end with them.
bool isBlankAtEnds(char32_t c) {
  return isBlank(c) || c == '\n' || c == '\r' || c == '\t';
}

Token::Kind kindOf(char32_t c) {
  using Kind = Token::Kind;
  switch (c) {
  case '+':
    return Kind::plus;
  case '-':
  case minusSign:
    return Kind::minus;
  case '*':
  case middleDot:
  case timesSign:
    return Kind::times;
  case '/':
    return Kind::divide;
  case '^':
    return Kind::power;
  case 0xB2:
  case 0xB3:
    return Kind::superscript;
  case '(':
    return Kind::open;
  case ')':
    return Kind::close;
  case ',':
    return Kind::comma;
  case ':':
    return Kind::colon;
  case '%':
  case degreeSign:
    return Kind::name;
  default:
    return Kind::other;
  }
}

/// Walks the text; `at` is the offset of the next code point.
class Lexer {
public:
  explicit Lexer(std::string_view text) : m_text(text) {}

  Tokens tokens() {
    const std::string_view kept = trimmed(m_text);
    const std::size_t end = static_cast<std::size_t>(kept.data() - m_text.data()) + kept.size();
    Tokens result;
    for (m_at = end - kept.size(); m_at < end;) {
      if (isBlank(peek().value))
        m_at += peek().bytes;
      else
        result.push_back(next());
    }
    result.push_back(token(Token::Kind::end, end));
    return result;
  }

private:
  CodePoint peek(std::size_t offset) const { return codePointAt(m_text, offset).value_or(CodePoint{}); }
  CodePoint peek() const { return peek(m_at); }

  Token token(Token::Kind kind, std::size_t start) {
    m_column += static_cast<int>(codePointsIn(m_text.substr(m_counted, start - m_counted)));
    m_counted = start;
    return {kind, m_text.substr(start, m_at - start), start, m_column};
  }

  Token next() {
    const std::size_t start = m_at;
    const CodePoint first = peek();
    if (isDigit(first.value) || (first.value == '.' && isDigit(peek(m_at + 1).value))) {
      skipNumber();
      return token(Token::Kind::number, start);
    }
    m_at += first.bytes;
    if (!isLetter(first.value))
      return token(kindOf(first.value), start);
    while (isLetter(peek().value))
      m_at += peek().bytes;
    return token(Token::Kind::name, start);
  }

  void skipDigits() {
    while (isDigit(peek().value))
      ++m_at;
  }

  void skipNumber() {
    skipDigits();
    if (peek().value == '.')
      ++m_at;
    skipDigits();
    if (peek().value != 'e' && peek().value != 'E')
      return;
    std::size_t exponent = m_at + 1;
    const CodePoint sign = peek(exponent);
    if (sign.value == '+' || sign.value == '-' || sign.value == minusSign)
      exponent += sign.bytes;
    if (!isDigit(peek(exponent).value))
      return;
    m_at = exponent;
    skipDigits();
  }

  std::string_view m_text;
  std::size_t m_at = 0;
  std::size_t m_counted = 0; ///< offset up to which columns are counted
  int m_column = 1;
};

} // namespace

Tokens tokensOf(std::string_view text) {
  return Lexer(text).tokens();
}

std::string_view between(std::string_view text, const Token& first, const Token& last) {
  assert(first.offset <= last.offset);
  return text.substr(first.offset, last.offset + last.text.size() - first.offset);
}

std::string_view trimmed(std::string_view text) {
  std::size_t start = 0;
  while (const auto point = codePointAt(text, start)) {
    if (!isBlankAtEnds(point->value))
      break;
    start += point->bytes;
  }
  std::size_t end = start;
  for (std::size_t at = start; const auto point = codePointAt(text, at);) {
    at += point->bytes;
    if (!isBlankAtEnds(point->value))
      end = at;
  }
  return text.substr(start, end - start);
}

} // namespace planewright
