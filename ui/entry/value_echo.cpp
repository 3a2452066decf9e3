// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/value_echo.h"

#include "core/quantity/format.h"
#include "ui/look/look.h"

#include <cmath>

namespace planewright {

QString echoOfValue(const Study& study, const Place& place, const std::string& typed) {
  const EntryKind kind = entryKindOf(study, place);
  const std::string unit = kind.unit.name.empty() ? "" : " " + kind.unit.name;
  const std::string number = typed.substr(0, typed.find_first_not_of("0123456789."));
  const Result<Entry> entry = readEntry(typed, kind);
  if (!entry || typed == number + unit)
    return {};
  const double value = kind.unit.fromBase(entry->value);
  return fromUtf8(shownNumber(value, decimalsFor(std::abs(value))) + unit);
}

} // namespace planewright
