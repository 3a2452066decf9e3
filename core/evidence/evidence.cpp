// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/evidence.h"

#include "core/evidence/check_row.h"
#include "core/evidence/quantity.h"

#include "core/quantity/angle.h"

#include <cmath>

namespace planewright {

namespace {

double difference(bool isAngle, double a, double b) {
  return isAngle ? apart(Angle::fromDegrees(a), Angle::fromDegrees(b)).degrees() : std::abs(a - b);
}

/// Own arithmetic stands in the files with ten digits.
constexpr double ownDigits = 1e-9;

bool agreement(const CheckResult& result, const Quantity& quantity) {
  const bool isAngle = quantity.isAngle;
  if (result.status == CheckStatus::lastDigit || !result.printed)
    return difference(isAngle, result.computed, result.recomputed) <= ownDigits * quantity.scale;
  // A value printed exactly on the edge of its tolerance agrees.
  const double tolerance = result.tolerance * (1 + ownDigits);
  if (result.status == CheckStatus::sign)
    return difference(isAngle, std::abs(result.computed), std::abs(*result.printed)) <= tolerance;
  return difference(isAngle, result.computed, *result.printed) <= tolerance;
}

Result<Quantity> quantityOf(const CheckInputs& inputs, const CheckResult& asked) {
  if (inputs.word("typed"))
    return quantityOfTyped(inputs, asked.quantity);
  if (inputs.word("criterion"))
    return quantityOfStrength(inputs, asked.quantity);
  if (inputs.word("ea") || inputs.word("ex"))
    return quantityOfStrain(inputs, asked.quantity);
  if (inputs.word("shape"))
    return quantityOfSection(inputs, asked.quantity, asked.unit);
  return quantityOfState(inputs, asked.quantity);
}

Result<CheckResult> judged(CheckResult result) {
  Result<Quantity> quantity = quantityOf(CheckInputs(result.inputs), result);
  if (!quantity)
    return tl::unexpected(std::move(quantity).error());
  result.computed = quantity->value;
  result.agrees = agreement(result, *quantity);
  return result;
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
  std::vector<CheckResult> results;
  Problems problems;
  for (const ShippedChecks& file : shippedChecks()) {
    Results<std::vector<CheckResult>> checks = recomputed(file.rows);
    if (checks)
      results.insert(results.end(), checks->begin(), checks->end());
    else
      for (Problem& problem : checks.error()) {
        problem.place = file.name;
        problems.push_back(std::move(problem));
      }
  }
  if (!problems.empty())
    return tl::unexpected(std::move(problems));
  return results;
}

} // namespace planewright
