// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/value_problems.h"

#include "core/words/utf8.h"

namespace planewright {

Problem problemAt(const Piece& piece, Text what, Text mend) {
  return {"", 0, piece.column, std::string(piece.text), std::move(what), std::move(mend)};
}

Text shortened(std::string_view text) {
  constexpr int longest = 40;
  std::size_t end = 0;
  for (int i = 0; i < longest && end < text.size(); ++i)
    end += codePointAt(text, end).value_or(CodePoint{0, 1}).bytes;
  return verbatim(end < text.size() ? std::string(text.substr(0, end)) + "…" : std::string(text));
}

Problem notFinite(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” gives no finite number.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Results go up to 1.7e308 in N, mm and deg."));
}

Problem outOfRange(const Piece& number) {
  return problemAt(number,
                   PW_TEXT("Expression", "“%1” is out of the range of numbers.").with(shortened(number.text)),
                   PW_TEXT("Expression", "Numbers go from 1e-307 to 1.7e308; write 0 for less."));
}

Problem dimensionTooGreat(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” raises units too far.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "No exponent of a unit may exceed 100."));
}

Problem divisionByZero(const Piece& divisor) {
  return problemAt(
      divisor,
      PW_TEXT("Expression", "“%1” is zero and something is divided by it.").with(shortened(divisor.text)),
      PW_TEXT("Expression", "Divide by something else."));
}

Problem rootOfNegative(const Piece& piece) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” is negative and has no root.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Put the sign in front of the root."));
}

Problem oddRoot(const Value& value) {
  return problemAt(value.piece,
                   PW_TEXT("Expression", "“%1” is %2; its root has no whole unit.")
                       .with(shortened(value.piece.text))
                       .with(nameOf(value.dimension)),
                   PW_TEXT("Expression", "Take roots of plain numbers or of squares, as in sqrt(9 mm^2)."));
}

Problem brokenDimension(const Value& base, const Piece& exponent) {
  return problemAt(exponent,
                   PW_TEXT("Expression", "“%1” is %2; raised to “%3” it has no whole unit.")
                       .with(shortened(base.piece.text))
                       .with(nameOf(base.dimension))
                       .with(shortened(exponent.text)),
                   PW_TEXT("Expression", "Raise quantities with a unit to whole numbers up to 100."));
}

Problem exponentWithDimension(const Value& exponent) {
  return problemAt(exponent.piece,
                   PW_TEXT("Expression", "“%1” is %2; an exponent is a plain number.")
                       .with(shortened(exponent.piece.text))
                       .with(nameOf(exponent.dimension)),
                   PW_TEXT("Expression", "Take its unit away, or divide by a quantity of its kind."));
}

Problem unlikeTerms(const Value& a, const Value& b) {
  const bool oneIsPlain = a.dimension == dimension::none || b.dimension == dimension::none;
  return problemAt(b.piece,
                   PW_TEXT("Expression", "“%1” is %2 and “%3” is %4; they do not go together.")
                       .with(shortened(a.piece.text))
                       .with(nameOf(a.dimension))
                       .with(shortened(b.piece.text))
                       .with(nameOf(b.dimension)),
                   oneIsPlain
                       ? PW_TEXT("Expression", "Give each its unit, as in 2 MPa + 3 MPa or (2 + 3) MPa.")
                       : PW_TEXT("Expression", "Add and compare only what is of one kind."));
}

Problem angleWanted(std::string_view function, const Value& value) {
  const bool plainNumber = value.dimension == dimension::none;
  const Text what = PW_TEXT("Expression", "“%1” is %2; %3 wants an angle.")
                        .with(shortened(value.piece.text))
                        .with(nameOf(value.dimension))
                        .with(function);
  if (plainNumber && value.form == Form::plainNumber && !value.hasUnit)
    return problemAt(value.piece, what,
                     PW_TEXT("Expression", "Write %1(%2 deg) or %1(%2 rad).")
                         .with(function)
                         .with(shortened(value.piece.text)));
  return problemAt(value.piece, what,
                   PW_TEXT("Expression", "Give the angle its unit, as in %1(30 deg).").with(function));
}

Problem countOfArguments(std::string_view function, bool several, const Piece& call) {
  return problemAt(
      call,
      (several ? PW_TEXT("Expression", "%1 compares two values or more.")
               : PW_TEXT("Expression", "%1 takes one value."))
          .with(function),
      (several ? PW_TEXT("Expression", "Write %1(a, b).") : PW_TEXT("Expression", "Write %1(a)."))
          .with(function));
}

} // namespace planewright
