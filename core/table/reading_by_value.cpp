// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/reading_by_value.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"
#include "core/study/place.h"

#include <cmath>

namespace planewright {

namespace {

constexpr int noteDecimals = 1;

Text symbolOf(Component component) {
  return symbol(component == Component::sn ? "σ_{n}" : "τ_{nt}");
}

Problem outOfReach(const Study& study, const Readout& readout, Component component,
                   const PlanesOfValue& planes, std::string_view text) {
  const StressForm stresses = stressFormOf(study, readout.state());
  Problem problem;
  problem.place = pathOf({Spot::reading, readout.point, {}});
  problem.quoted = text;
  problem.what = PW_TEXT("Inverse", "%1 reaches only %2 to %3.")
                     .with(symbolOf(component))
                     .with(stresses.shown(planes.least))
                     .with(stresses.withUnit(planes.greatest));
  return problem;
}

Text touchedName(Component component, bool greatest) {
  if (component == Component::sn)
    return symbol(greatest ? "σ_{1}" : "σ_{2}");
  return greatest ? PW_TEXT("Inverse", "the greatest τ_{nt}") : PW_TEXT("Inverse", "the least τ_{nt}");
}

Text touchingNote(Component component, const PlanesOfValue& planes, double value) {
  const bool greatest = planes.greatest - value < value - planes.least;
  Text at = PW_TEXT("Inverse", "touches the circle at %1").with(touchedName(component, greatest));
  // Rounded up, for the target as typed is met nowhere outside the spread.
  const double spread = std::ceil(planes.spread.degrees() * 10 - 1e-9) / 10;
  if (planes.spread.degrees() < 1e-3)
    return at;
  return PW_TEXT("Inverse", "%1, ± %2").with(at).with(shownDegrees(Angle::fromDegrees(spread), noteDecimals));
}

} // namespace

Result<ReadingByValue> readingFor(const Study& study, const Readout& readout, Component component,
                                  std::string_view text) {
  Result<Entry> entry = readEntry(text, entryKindOf(study, Spot::sx));
  if (!entry)
    return tl::unexpected(std::move(entry).error());
  const StateReading& state = readout.state();
  ReadingByValue result;
  result.planes = planesOf(state.circle, component, {entry->value, entry->halfWidth}, readout.reading);
  result.reading = angleText(result.planes.first.value);
  switch (result.planes.kind) {
  case PlanesOfValue::Kind::outOfReach:
    return tl::unexpected(outOfReach(study, readout, component, result.planes, text));
  case PlanesOfValue::Kind::two:
    result.other = angleText(result.planes.second.value);
    result.note =
        PW_TEXT("Inverse", "also at %1").with(shownDegrees(result.planes.second.value, noteDecimals));
    break;
  case PlanesOfValue::Kind::touching:
    result.note = touchingNote(component, result.planes, entry->value);
    break;
  case PlanesOfValue::Kind::every:
    result.reading = findPoint(study, readout.point)->reading;
    result.note = PW_TEXT("Inverse", "every direction");
    break;
  }
  return result;
}

} // namespace planewright
