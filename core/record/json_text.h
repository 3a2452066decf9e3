// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>
#include <string>
#include <string_view>

namespace planewright {

/// Where a byte of a file stands for people: line and column from 1, the column in code points.
struct LineColumn {
  int line = 1;
  int column = 1;
  bool operator==(const LineColumn&) const = default;
};
/// Lines end with a line feed; a byte order mark has no column. `offset` may be the size of the bytes.
LineColumn lineColumnOf(std::string_view bytes, std::size_t offset);

/// Length of the byte order mark at the start, 3 or 0.
std::size_t byteOrderMark(std::string_view bytes);

/// Start of the next JSON token from `from` on: blanks, commas and colons are passed over.
std::size_t tokenStart(std::string_view bytes, std::size_t from);
/// One past the token at `start`: a text with its quotes, a bracket, or a number or word.
std::size_t tokenEnd(std::string_view bytes, std::size_t start);

/// Offset of the character with this index (from 0, escapes count as what they stand for) in the JSON text
/// that starts with a quote at `start`; that of the closing quote when there are fewer.
std::size_t offsetInText(std::string_view bytes, std::size_t start, std::size_t index);

/// The token at `start` without its quotes, cut after 60 code points, for quoting in a Problem.
std::string pieceAt(std::string_view bytes, std::size_t start);

} // namespace planewright
