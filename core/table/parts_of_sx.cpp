// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/parts_of_sx.h"

namespace planewright {

namespace {

template <class Reading>
Text partsOf(const StressForm& form, const Reading& reading) {
  const bool hasForces = reading.axial != 0 || reading.bending != 0;
  if (!hasForces && (reading.typed == 0 || reading.measured == 0))
    return {};
  Text list;
  const auto add = [&](double part, const Text& name, bool always) {
    if (part == 0 && !always)
      return;
    const Text one = symbol("%1 %2").with(name).with(form.shown(part));
    list = list.empty() ? one : symbol("%1, %2").with(list).with(one);
  };
  add(reading.typed, PW_TEXT("Readout", "typed"), false);
  add(reading.axial, PW_TEXT("Readout", "axial"), hasForces);
  add(reading.bending, PW_TEXT("Readout", "bending"), hasForces);
  add(reading.measured, PW_TEXT("Readout", "measured"), false);
  return PW_TEXT("Readout", "of σ_{x} (%1): %2").with(form.unit.name).with(list);
}

} // namespace

Text partsOfSx(const StressForm& form, const CaseReading& reading) {
  return partsOf(form, reading);
}

Text partsOfSx(const StressForm& form, const StateReading& reading) {
  return partsOf(form, reading);
}

} // namespace planewright
