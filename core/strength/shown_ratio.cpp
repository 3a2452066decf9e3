// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/shown_ratio.h"

#include "core/quantity/format.h"
#include "core/strength/judgement.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int usualDecimals = 2;
constexpr int mostDecimals = 12;
/// A decimal number is not the double next to it: 0.87 is not rounded up to 0.88.
constexpr double rounding = 1e-13;

double scaleOf(int decimals) {
  return std::pow(10.0, decimals);
}

} // namespace

std::string shownUtilisation(double utilisation) {
  if (!std::isfinite(utilisation))
    return "∞";
  if (utilisation >= 1 && utilisation <= exceedingFrom)
    return shownNumber(1, usualDecimals);
  for (int decimals = usualDecimals;; ++decimals) {
    const double scale = scaleOf(decimals);
    const double units = std::ceil(utilisation * scale * (1 - rounding));
    if (utilisation >= 1 || units < scale || decimals == mostDecimals)
      return shownNumber(units / scale, decimals);
  }
}

std::string shownMultiplier(double multiplier) {
  const int decimals = multiplier > 0 ? std::clamp(1 - static_cast<int>(std::floor(std::log10(multiplier))),
                                                   usualDecimals, mostDecimals)
                                      : usualDecimals;
  const double scale = scaleOf(decimals);
  const double units = std::floor(multiplier * scale * (1 + rounding));
  // Of what is too large for its decimals they mean nothing.
  return std::isfinite(units) ? shownNumber(units / scale, decimals) : shownNumber(multiplier, decimals);
}

} // namespace planewright
