// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/route_words.h"

#include "core/quantity/format.h"

#include <cmath>

namespace planewright {

std::string shownDifference(double difference) {
  if (difference == 0)
    return "0";
  if (!std::isfinite(difference))
    return "∞";
  int exponent = static_cast<int>(std::floor(std::log10(difference)));
  double digit = std::ceil(difference / std::pow(10.0, exponent) - 1e-9);
  if (digit > 9) {
    digit = 1;
    ++exponent;
  }
  const std::string power = exactNumber(std::abs(exponent));
  return exactNumber(digit) + "e" + (exponent < 0 ? "−" : "+") + power;
}

Text routesSentence(const RouteComparison& routes) {
  if (routes.agrees())
    return PW_TEXT("Sheet", "Second route agrees within %1.").with(shownDifference(routes.greatest));
  return PW_TEXT("Sheet", "The two routes disagree by %1: do not use this sheet.")
      .with(shownDifference(routes.greatest));
}

} // namespace planewright
