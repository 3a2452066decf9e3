// SPDX-License-Identifier: GPL-3.0-or-later
// What can be wrong with units, slopes and the kind of quantity.
#include "core/quantity/format.h"
#include "core/quantity/writing_problems.h"

namespace planewright {

namespace {

Text joined(std::string_view first, std::string_view second, std::string_view third = "") {
  return shortened(std::string(first) + std::string(second) + std::string(third));
}

/// A value of this dimension that a user could type.
std::string_view exampleOf(Dimension dimension) {
  if (dimension == dimension::force)
    return "12 kN";
  if (dimension == dimension::length)
    return "90 mm";
  if (dimension == dimension::angle)
    return "30 deg";
  if (dimension == dimension::stress)
    return "8 MPa";
  if (dimension == dimension::moment)
    return "3 kN*m";
  return "1.5";
}

/// The value as typed where it is a plain number, else in the base: "12 kN", "18000 N".
std::string amountOf(const Value& value) {
  if (value.form == Form::plainNumber)
    return std::string(value.piece.text);
  const std::string number = exactNumber(value.number);
  if (value.dimension == dimension::force)
    return number + " N";
  if (value.dimension == dimension::length)
    return number + " mm";
  if (value.dimension == dimension::angle)
    return number + " deg";
  if (value.dimension == dimension::stress)
    return number + " MPa";
  if (value.dimension == dimension::moment)
    return number + " N*mm";
  return value.dimension == dimension::none ? number : std::string(value.piece.text);
}

Text mendOf(const Value& value, const EntryKind& kind) {
  if (value.dimension == dimension::force && kind.dimension == dimension::stress)
    return PW_TEXT("Expression", "Write for example 12 kN/(90 mm*240 mm).");
  if (value.dimension == dimension::none && kind.dimension != dimension::angle)
    return PW_TEXT("Expression", "It has no unit of its own; to give it one write %1.")
        .with(joined("(" + std::string(value.piece.text), ") ", kind.unit.name));
  if (value.dimension == -1 * kind.dimension)
    return PW_TEXT("Expression",
                   "A unit belongs to the number right before it; for a quotient write (1/2) %1.")
        .with(kind.unit.name);
  if (kind.slopes != Slopes::none)
    return PW_TEXT("Expression", "Type for example 4.8 deg or 1 in 12.");
  return PW_TEXT("Expression", "Type for example %1.").with(exampleOf(kind.dimension));
}

} // namespace

Problem emptyEntry(const EntryKind& kind) {
  return problemAt({"", 1},
                   PW_TEXT("Expression", "Nothing is typed; %1 is needed.").with(nameOf(kind.dimension)),
                   PW_TEXT("Expression", "Type for example %1.").with(exampleOf(kind.dimension)));
}

Problem emptyUnit() {
  return problemAt({"", 1}, PW_TEXT("Expression", "No unit is typed."),
                   PW_TEXT("Expression", "Type for example MPa, kN, mm or kN*m."));
}

Problem unknownUnit(const Piece& name) {
  if (const std::string spelled = spelledUnit(name.text); !spelled.empty())
    return problemAt(name, PW_TEXT("Expression", "There is no unit “%1”.").with(shortened(name.text)),
                     PW_TEXT("Expression", "Write %1.").with(spelled));
  const std::string_view meant = nearestUnitName(name.text);
  return problemAt(name, PW_TEXT("Expression", "There is no unit “%1”.").with(shortened(name.text)),
                   meant.empty() ? PW_TEXT("Expression", "Type for example MPa, psi, kN, mm or deg.")
                                 : PW_TEXT("Expression", "Did you mean %1?").with(meant));
}

Problem unitGoesOn(const Piece& piece) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” does not belong to a unit.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "Write units as in MPa, kN*m or N/mm^2."));
}

Problem unitExponent(const Piece& piece) {
  return problemAt(piece, PW_TEXT("Expression", "“%1” does not raise a unit.").with(shortened(piece.text)),
                   PW_TEXT("Expression",
                           "After a unit write one whole exponent up to 99, as in mm^2, or put the "
                           "quantity into parentheses."));
}

Problem unitWithoutNumber(const Piece& unit) {
  return problemAt(unit, PW_TEXT("Expression", "The unit “%1” has no number before it.").with(unit.text),
                   PW_TEXT("Expression", "Write 1 %1.").with(unit.text));
}

Problem unitAfterUnit(const Piece& second, std::string_view first) {
  return problemAt(second,
                   PW_TEXT("Expression", "The unit “%1” follows another unit.").with(shortened(second.text)),
                   PW_TEXT("Expression", "Write %1 or %2.")
                       .with(joined(first, "*", second.text))
                       .with(joined(first, "/", second.text)));
}

Problem unitAfterQuantity(const Piece& unit, const Value& quantity) {
  return problemAt(unit,
                   PW_TEXT("Expression", "“%1” already has a unit (%2); “%3” cannot follow it.")
                       .with(shortened(quantity.piece.text))
                       .with(nameOf(quantity.dimension))
                       .with(unit.text),
                   PW_TEXT("Expression", "Take one of the units away, or write * 1 %1.").with(unit.text));
}

Problem unitThenNumber(const Piece& piece, std::string_view unit, std::string_view number) {
  return problemAt(
      piece, PW_TEXT("Expression", "A number follows the unit in “%1”.").with(shortened(piece.text)),
      number == "2" || number == "3" || number == "4"
          ? PW_TEXT("Expression", "Write %1: a unit is raised with ^.").with(joined(unit, "^", number))
          : PW_TEXT("Expression", "Put an operator between."));
}

Problem unitOnExponent(const Piece& power, const Piece& plainPower, const Piece& unit) {
  return problemAt(
      power, PW_TEXT("Expression", "In “%1” the unit stands on the exponent.").with(shortened(power.text)),
      PW_TEXT("Expression", "Write %1.").with(joined("(" + std::string(plainPower.text), ") ", unit.text)));
}

Problem slopeStandsAlone(const Piece& piece) {
  return problemAt(
      piece, PW_TEXT("Expression", "“%1” makes a slope here, and a slope stands alone.").with(piece.text),
      PW_TEXT("Expression", "Write a slope as 1 in 12 or 1:12, an angle as 4.8 deg."));
}

Problem slopeForNormal(const Piece& slope) {
  return problemAt(slope, PW_TEXT("Expression", "“%1” is a slope.").with(shortened(slope.text)),
                   PW_TEXT("Expression",
                           "Write an angle, as in 30 deg: the normal of a plane takes no slope, only "
                           "the field of a line does."));
}

Problem slopeOverNothing(const Piece& run) {
  return problemAt(run, PW_TEXT("Expression", "The run of the slope is zero."),
                   PW_TEXT("Expression", "Write 90 deg for a line along y."));
}

Problem signBehindSlope(const Piece& run, std::string_view mended) {
  return problemAt(run,
                   PW_TEXT("Expression", "The sign of a slope stands in front, not before “%1”.")
                       .with(shortened(run.text)),
                   PW_TEXT("Expression", "Write %1.").with(shortened(mended)));
}

Problem negativeTolerance(const Piece& piece) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” is negative; a tolerance is not.").with(shortened(piece.text)),
                   PW_TEXT("Expression", "It counts to both sides: leave the sign out."));
}

Problem otherDimension(const Piece& piece, Dimension is, Dimension wanted) {
  return problemAt(piece,
                   PW_TEXT("Expression", "“%1” is the unit of %2; the unit of %3 is needed.")
                       .with(shortened(piece.text))
                       .with(nameOf(is))
                       .with(nameOf(wanted)),
                   PW_TEXT("Expression", "Type the unit as in %1.").with(exampleOf(wanted)));
}

Problem otherQuantity(const Value& value, const EntryKind& kind) {
  const bool forceForStress = value.dimension == dimension::force && kind.dimension == dimension::stress;
  const Text what = forceForStress
                        ? PW_TEXT("Expression", "This is %1 (%2); %3 is needed: divide by an area.")
                        : PW_TEXT("Expression", "This is %1 (%2); %3 is needed.");
  return problemAt(
      value.piece,
      what.with(nameOf(value.dimension)).with(shortened(amountOf(value))).with(nameOf(kind.dimension)),
      mendOf(value, kind));
}

} // namespace planewright
