// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/summary.h"

#include <algorithm>
#include <cmath>
#include <numeric>

namespace planewright {

namespace {
constexpr double nearlyAllShare = 0.999;
} // namespace

std::size_t binOf(double utilisation) {
  for (std::size_t bin = 0; bin < binEnds.size(); ++bin)
    if (binEnds[bin] == 1 ? !exceedsLimit(utilisation) : utilisation <= binEnds[bin])
      return bin;
  return binEnds.size();
}

FieldSummary summaryOf(const Field& field, const FieldResults& results) {
  FieldSummary summary;
  summary.points = field.size();
  std::vector<double> judged;
  judged.reserve(field.size());
  for (std::size_t point = 0; point < field.size(); ++point) {
    summary.incomplete += field.standingOf(point) == PointStanding::incomplete;
    summary.leftOut += field.standingOf(point) == PointStanding::leftOut;
    const double utilisation = results.utilisations()[point];
    if (std::isnan(utilisation))
      continue;
    judged.push_back(utilisation);
    summary.exceeding += exceedsLimit(utilisation);
    ++summary.histogram[binOf(utilisation)];
  }
  summary.judged = judged.size();
  if (judged.empty())
    return summary;
  const auto rank =
      static_cast<std::size_t>(std::ceil(nearlyAllShare * static_cast<double>(judged.size()))) - 1;
  std::ranges::nth_element(judged, judged.begin() + static_cast<std::ptrdiff_t>(rank));
  summary.nearlyAll = judged[rank];
  return summary;
}

std::vector<std::uint32_t> worstOf(const FieldResults& results, std::size_t most) {
  std::vector<std::uint32_t> points;
  points.reserve(results.size());
  const WideVector<double>& utilisations = results.utilisations();
  for (std::size_t point = 0; point < results.size(); ++point)
    if (!std::isnan(utilisations[point]))
      points.push_back(static_cast<std::uint32_t>(point));
  const auto isWorse = [&](std::uint32_t a, std::uint32_t b) {
    return utilisations[a] != utilisations[b] ? utilisations[a] > utilisations[b] : a < b;
  };
  const std::size_t count = std::min(most, points.size());
  std::ranges::partial_sort(points, points.begin() + static_cast<std::ptrdiff_t>(count), isWorse);
  points.resize(count);
  return points;
}

} // namespace planewright
