// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/cut_text.h"

#include "core/quantity/format.h"

namespace planewright {

std::string angleText(Angle angle) {
  return shortestNumber(angle.degrees()) + " deg";
}

Result<std::string> normalTextForCut(std::string_view cut) {
  Result<Entry> entry = readEntry(cut, {dimension::angle, degreeUnit(), Slopes::line});
  if (!entry)
    return tl::unexpected(std::move(entry).error());
  return angleText(normalOf(LineAngle{Angle::fromDegrees(entry->value)}).value);
}

std::string cutText(NormalAngle normal) {
  return angleText(cutOf(normal).value);
}

} // namespace planewright
