// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/slope_edits.h"

#include "core/quantity/format.h"
#include "core/strength/slope_of_faces.h"

#include <cmath>

namespace planewright {

namespace {

Result<Angle> slopeIn(std::string_view text, const char* place) {
  Result<Entry> entry = readEntry(text, {dimension::angle, degreeUnit(), Slopes::line});
  if (entry)
    return Angle::fromDegrees(entry->value);
  Problem problem = std::move(entry).error();
  problem.place = place;
  return tl::unexpected(std::move(problem));
}

} // namespace

Edits withinEitherWay(const std::string& point, const std::string& line, const std::string& slope) {
  return {Type{{Spot::lineTolerance, point, line}, slope}};
}

Result<Angle> trueSlopeOf(std::string_view a, std::string_view b) {
  Result<Angle> first = slopeIn(a, "a");
  if (!first)
    return first;
  Result<Angle> second = slopeIn(b, "b");
  if (!second)
    return second;
  return slopeOfFaces(*first, *second);
}

std::string toleranceText(Angle slope) {
  constexpr double units = 1e4;      // of a degree
  constexpr double rounding = 1e-13; // a decimal number is not the double next to it
  return exactNumber(std::ceil(slope.degrees() * units * (1 - rounding)) / units) + " deg";
}

} // namespace planewright
