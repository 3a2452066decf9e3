// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string_view>
#include <vector>

namespace planewright {

/// A piece of a typed expression.
struct Token {
  enum class Kind {
    number,
    name, ///< letters, or one of ° and %
    plus,
    minus, ///< also U+2212
    times, ///< also the middle dot and the times sign
    divide,
    power,
    superscript, ///< ² or ³
    open,
    close,
    comma,
    colon,
    other, ///< any character that no expression has
    end
  };
  Kind kind = Kind::end;
  std::string_view text;  ///< as typed; lives as long as the typed text
  std::size_t offset = 0; ///< of its first byte in the typed text
  int column = 0;         ///< 1-based, in code points
  bool is(Kind wanted) const { return kind == wanted; }
};
using Tokens = std::vector<Token>;

/// The pieces of a text of valid UTF-8 in their order, and an `end` behind the last. Blanks (also the
/// no-break and the narrow ones of pasted text) part pieces and are dropped.
Tokens tokensOf(std::string_view text);

/// The typed text from the start of one token to the end of another.
std::string_view between(std::string_view text, const Token& first, const Token& last);
/// Without blanks at both ends.
std::string_view trimmed(std::string_view text);

} // namespace planewright
