// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/evidence.h"

#include "core/evidence/check_row.h"
#include "core/stress/circle.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

struct Computed {
  PlaneStress stress;
  std::optional<PlaneStress> turned;
  Circle circle;
};
using Value = std::optional<double>;

Value degrees(const std::optional<NormalAngle>& normal) {
  return normal ? Value(normal->value.degrees()) : std::nullopt;
}

/// What a quantity is and how it follows; none where the state or its inputs do not have it.
struct Quantity {
  std::string_view word;
  Value (*value)(const Computed&);
  bool isAngle = false;
};
constexpr std::array quantities = {
    Quantity{"sxp", [](const Computed& c) { return c.turned ? Value(c.turned->sx) : std::nullopt; }},
    Quantity{"syp", [](const Computed& c) { return c.turned ? Value(c.turned->sy) : std::nullopt; }},
    Quantity{"txyp", [](const Computed& c) { return c.turned ? Value(c.turned->txy) : std::nullopt; }},
    Quantity{"s1", [](const Computed& c) { return Value(c.circle.s1); }},
    Quantity{"s2", [](const Computed& c) { return Value(c.circle.s2); }},
    Quantity{"tmax", [](const Computed& c) { return Value(c.circle.radius); }},
    Quantity{"tabs", [](const Computed& c) { return Value(c.circle.tauAbsMax); }},
    Quantity{"savg", [](const Computed& c) { return Value(c.circle.mean); }},
    Quantity{"txy", [](const Computed& c) { return Value(c.stress.txy); }},
    Quantity{"thp1", [](const Computed& c) { return degrees(c.circle.theta1); }, true},
    Quantity{"thp2", [](const Computed& c) { return degrees(c.circle.theta2()); }, true},
    Quantity{"ths", [](const Computed& c) { return degrees(c.circle.thetaTauMax); }, true}};

double difference(bool isAngle, double a, double b) {
  return isAngle ? apart(Angle::fromDegrees(a), Angle::fromDegrees(b)).degrees() : std::abs(a - b);
}

/// Own arithmetic stands in the files with ten digits.
constexpr double ownDigits = 1e-9;

bool agreement(const CheckResult& result, bool isAngle, double scale) {
  if (result.status == CheckStatus::lastDigit || !result.printed)
    return difference(isAngle, result.computed, result.recomputed) <= ownDigits * (isAngle ? 180 : scale);
  // A value printed exactly on the edge of its tolerance agrees.
  const double tolerance = result.tolerance * (1 + ownDigits);
  if (result.status == CheckStatus::sign)
    return difference(isAngle, std::abs(result.computed), std::abs(*result.printed)) <= tolerance;
  return difference(isAngle, result.computed, *result.printed) <= tolerance;
}

Result<CheckResult> judged(CheckRow row) {
  const auto quantity = std::ranges::find(quantities, std::string_view(row.result.quantity), &Quantity::word);
  Computed computed{row.stress, std::nullopt, circleOf(row.stress)};
  if (row.theta)
    computed.turned = inTurnedAxes(row.stress, *row.theta);
  const Value value = quantity == quantities.end() ? std::nullopt : quantity->value(computed);
  if (!value)
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  row.result.quantity,
                                  PW_TEXT("Check", "This quantity does not follow from these inputs."),
                                  {}});
  row.result.computed = *value;
  row.result.agrees = agreement(row.result, quantity->isAngle, scaleOf(row.stress));
  return std::move(row.result);
}

} // namespace

Results<std::vector<CheckResult>> recomputed(std::span<const std::string_view> rows) {
  std::vector<CheckResult> results;
  Problems problems;
  if (rows.empty() || !isHeading(rows.front()))
    return tl::unexpected(
        Problems{{{}, 1, 0, {}, PW_TEXT("Check", "This is not the heading of checks."), {}}});
  for (std::size_t i = 1; i < rows.size(); ++i) {
    Result<CheckResult> result = readCheckRow(rows[i]).and_then(judged);
    if (result) {
      results.push_back(*std::move(result));
    } else {
      result.error().line = static_cast<int>(i) + 1;
      problems.push_back(std::move(result).error());
    }
  }
  if (!problems.empty())
    return tl::unexpected(std::move(problems));
  return results;
}

Results<std::vector<CheckResult>> publishedChecks() {
  return recomputed(shippedChecks());
}

} // namespace planewright
