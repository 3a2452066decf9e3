// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/lexer.h"
#include "core/quantity/unit.h"

namespace planewright {

/// A stretch of the typed text that a Problem points at.
struct Piece {
  std::string_view text;
  int column = 0;
};

/// A place among the tokens of a typed text, from which they are taken one by one.
class Cursor {
public:
  Cursor(std::string_view text, const Tokens& tokens) : m_text(text), m_tokens(tokens) {}

  std::size_t at() const { return m_at; }
  const Token& peek(std::size_t ahead = 0) const {
    return m_tokens[m_at + ahead < m_tokens.size() ? m_at + ahead : m_tokens.size() - 1];
  }
  const Token& taken(std::size_t back = 1) const { return m_tokens[m_at - back]; }
  bool next(Token::Kind kind) const { return peek().is(kind); }
  void take() { m_at += m_at + 1 < m_tokens.size() ? 1 : 0; }

  /// The next token, as a piece.
  Piece here() const { return {peek().text, peek().column}; }
  /// What was taken since the cursor stood at `start`.
  Piece since(std::size_t start) const { return upTo(start, m_at); }
  /// What stands from one token to before another.
  Piece upTo(std::size_t start, std::size_t end) const {
    const Token& first = m_tokens[start];
    return {between(m_text, first, m_tokens[end > start ? end - 1 : start]), first.column};
  }

private:
  std::string_view m_text;
  const Tokens& m_tokens;
  std::size_t m_at = 0;
};

} // namespace planewright
