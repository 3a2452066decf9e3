// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/leave_out.h"

#include <algorithm>

namespace planewright {

std::size_t leaveOut(Field& field, std::string_view name) {
  const bool isBeginning = name.ends_with('*');
  const std::string_view start = name.substr(0, name.size() - (isBeginning ? 1 : 0));
  const auto isMeant = [&](std::string_view one) {
    return isBeginning ? one.starts_with(start) : one == name;
  };
  std::size_t count = 0;
  for (std::size_t point = 0; point < field.size(); ++point)
    if (isMeant(field.nameOf(point)) || (field.columns().region && isMeant(field.regionOf(point)))) {
      field.setStanding(point, PointStanding::leftOut);
      ++count;
    }
  return count;
}

std::vector<std::string> leaveOutListed(Field& field, std::vector<std::string> names) {
  std::ranges::sort(names);
  const auto repeated = std::ranges::unique(names);
  names.erase(repeated.begin(), repeated.end());
  std::vector<bool> isMet(names.size());
  for (std::size_t point = 0; point < field.size(); ++point) {
    const auto name = std::ranges::lower_bound(names, field.nameOf(point), {},
                                               [](const std::string& one) { return std::string_view(one); });
    if (name == names.end() || *name != field.nameOf(point))
      continue;
    field.setStanding(point, PointStanding::leftOut);
    isMet[static_cast<std::size_t>(name - names.begin())] = true;
  }
  std::vector<std::string> unmet;
  for (std::size_t i = 0; i < names.size(); ++i)
    if (!isMet[i])
      unmet.push_back(names[i]);
  return unmet;
}

} // namespace planewright
