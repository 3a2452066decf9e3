// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/writing_problems.h"

#include "core/quantity/nearest.h"
#include "core/words/utf8.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr std::size_t greatestLength = 4096;

/// A character that is seen when it is printed, and changes nothing round it.
bool isSeen(char32_t c) {
  const bool control = c < 0x20 || (c >= 0x7F && c < 0xA0) || c == 0xAD;
  const bool format = (c >= 0x200B && c <= 0x200F) || (c >= 0x2028 && c <= 0x202E) ||
                      (c >= 0x2060 && c <= 0x206F) || c == 0x61C || c == 0xFEFF || c >= 0xE0000;
  return !control && !format;
}

} // namespace

std::optional<Problem> unreadableText(std::string_view text) {
  if (const auto offset = invalidUtf8In(text)) {
    const int column = static_cast<int>(codePointsIn(text.substr(0, *offset))) + 1;
    return problemAt({"", column},
                     PW_TEXT("Expression", "The byte %1 is not UTF-8.")
                         .with(hexadecimal(static_cast<unsigned char>(text[*offset]), 2)),
                     PW_TEXT("Expression", "Type the text again, or save its file as UTF-8."));
  }
  if (codePointsIn(text) > greatestLength)
    return problemAt({"", static_cast<int>(greatestLength) + 1},
                     PW_TEXT("Expression", "The text is longer than 4096 characters."),
                     PW_TEXT("Expression", "Work out a part of it and type the result."));
  return std::nullopt;
}

Problem tooDeep(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "Here the expression goes deeper than 200 levels."),
                   PW_TEXT("Expression", "Take parentheses or signs away."));
}

Problem notClosed(const Piece& open) {
  return problemAt(open, PW_TEXT("Expression", "The “(” is not closed."),
                   PW_TEXT("Expression", "Add a “)”."));
}

Problem closedTwice(const Piece& close) {
  return problemAt(close, PW_TEXT("Expression", "The “)” closes nothing."),
                   PW_TEXT("Expression", "Take it away, or add a “(” before it."));
}

Problem valueMissing(const Piece& piece) {
  const Text mend = PW_TEXT("Expression", "Type a number, pi, a function or a “(” here.");
  if (piece.text.empty())
    return problemAt(piece, PW_TEXT("Expression", "The expression ends where a number is needed."), mend);
  return problemAt(piece, PW_TEXT("Expression", "“%1” stands where a number is needed.").with(piece.text),
                   mend);
}

Problem operatorMissing(const Piece& first, const Piece& second) {
  return problemAt(second,
                   PW_TEXT("Expression", "Between “%1” and “%2” an operator is missing.")
                       .with(shortened(first.text))
                       .with(shortened(second.text)),
                   PW_TEXT("Expression", "Put + - * / or ^ between them; digits are not grouped."));
}

Problem brokenNumber(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” is no number.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Write one decimal point, as in 1.5 or 1.5e-3."));
}

Problem decimalComma(const Piece& piece, std::string_view mended) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” has a decimal comma.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Write %1, with a decimal point.").with(shortened(mended)));
}

Problem thousandsComma(const Piece& piece, std::string_view mended) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” has a comma between thousands.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Write %1; digits are not grouped.").with(shortened(mended)));
}

Problem strayComma(const Piece& comma) {
  return problemAt(comma, PW_TEXT("Expression", "The “,” parts nothing here."),
                   PW_TEXT("Expression", "Commas stand only between the values of min and max."));
}

Problem leadingEquals(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“=” is not part of an expression."),
                   PW_TEXT("Expression", "Leave the “=” out."));
}

Problem bracketsRoundUnit(const Piece& piece, std::string_view unit) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” has brackets round a unit.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Write %1 without them.").with(shortened(unit)));
}

Problem notANumber(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” is no finite number.").with(piece.text),
                   PW_TEXT("Expression", "Type a number."));
}

Problem strangeCharacter(const Piece& piece) {
  const char32_t code = codePointAt(piece.text, 0).value_or(CodePoint{}).value;
  const Text mend = PW_TEXT("Expression", "Expressions have numbers, units, + - * / ^ ( ) and functions.");
  if (code > ' ' && code < 0x7F)
    return problemAt(piece, PW_TEXT("Expression", "“%1” is not part of an expression.").with(piece.text),
                     mend);
  const std::string number = "U+" + hexadecimal(code, 4);
  if (isSeen(code))
    return problemAt(
        piece, PW_TEXT("Expression", "“%1” (%2) is not part of an expression.").with(piece.text).with(number),
        mend);
  return problemAt(
      piece, PW_TEXT("Expression", "The character %1 is not part of an expression.").with(number), mend);
}

Problem unknownFunction(const Piece& name) {
  const std::string_view meant = nearestOf(functionNames(), name.text);
  const Text all = PW_TEXT("Expression", "There are sqrt, abs, min, max, sin, cos and tan.");
  return problemAt(name, PW_TEXT("Expression", "There is no function “%1”.").with(shortened(name.text)),
                   meant.empty() ? all : PW_TEXT("Expression", "Did you mean %1? %2").with(meant).with(all));
}

Problem unknownWord(const Piece& name) {
  const auto& functions = functionNames();
  if (std::find(functions.begin(), functions.end(), name.text) != functions.end())
    return problemAt(name, PW_TEXT("Expression", "The function “%1” has no parentheses.").with(name.text),
                     PW_TEXT("Expression", "Write %1(...).").with(name.text));
  return problemAt(name, PW_TEXT("Expression", "“%1” is not known here.").with(shortened(name.text)),
                   PW_TEXT("Expression", "Type a number, pi or a function such as sqrt(2)."));
}

Problem superscriptRow(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” follows another superscript.").with(piece.text),
                   PW_TEXT("Expression", "Write the exponent with ^, as in 2^23."));
}

} // namespace planewright
