// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/misprints.h"

#include "core/evidence/evidence.h"
#include "core/record/csv.h"

#include <cassert>

namespace planewright {

std::vector<Misprint> knownMisprints() {
  std::vector<Misprint> misprints;
  for (const std::string_view row : shippedMisprints().subspan(1)) {
    const std::vector<std::string> fields = csvFields(row);
    assert(fields.size() == 4);
    misprints.push_back({fields[0], fields[1], fields[2], fields[3]});
  }
  return misprints;
}

} // namespace planewright
