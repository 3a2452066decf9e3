// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/few_names.h"

#include "core/quantity/shown_count.h"

#include <algorithm>

namespace planewright {

Text fewOf(const std::vector<std::string>& names) {
  constexpr std::size_t mostNamed = 3;
  std::string first;
  for (std::size_t i = 0; i < std::min(names.size(), mostNamed); ++i)
    first += (i == 0 ? "" : ", ") + names[i];
  if (names.size() <= mostNamed)
    return verbatim(first);
  return PW_TEXT("Readout", "%1 and %2 more").with(first).with(shownCount(names.size() - mostNamed));
}

} // namespace planewright
