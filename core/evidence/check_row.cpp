// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/check_row.h"

#include "core/evidence/check_inputs.h"
#include "core/record/csv.h"
#include "core/words/names.h"

namespace planewright {

template <>
const std::vector<Named<CheckStatus>>& namesOf() {
  static const std::vector<Named<CheckStatus>> names = {
      {CheckStatus::ok, "OK", PW_TEXT("Check", "printed value")},
      {CheckStatus::lastDigit, "LAST_DIGIT", PW_TEXT("Check", "rounded on its way in the source")},
      {CheckStatus::sign, "SIGN", PW_TEXT("Check", "magnitude only")},
      {CheckStatus::noPrintedValue, "NO_PRINTED_VALUE", PW_TEXT("Check", "no printed value")}};
  return names;
}

namespace {

constexpr std::string_view heading =
    "id,case,class,inputs,quantity,unit,printed,tol,recomputed,status,note,source,locator,basis";
/// In the order of the heading.
namespace column {
enum {
  id,
  title,
  kind,
  inputs,
  quantity,
  unit,
  printed,
  tol,
  recomputed,
  status,
  note,
  source,
  locator,
  basis,
  count
};
}

Problem fault(std::string_view quoted, Text what) {
  return {{}, 0, 0, std::string(quoted), std::move(what), {}};
}

/// Reads the printed value, its tolerance and own arithmetic; false when one does not read.
bool readNumbers(CheckResult& result, const std::vector<std::string>& fields) {
  const std::optional<double> own = numberIn(fields[column::recomputed]);
  result.recomputed = own.value_or(0);
  if (result.status == CheckStatus::noPrintedValue)
    return own && fields[column::printed].empty();
  const std::optional<double> tolerance = numberIn(fields[column::tol]);
  result.printed = numberIn(fields[column::printed]);
  result.tolerance = tolerance.value_or(0);
  return own && result.printed && tolerance;
}

} // namespace

bool isHeading(std::string_view row) {
  return row == heading;
}

Result<CheckResult> readCheckRow(std::string_view row) {
  const std::vector<std::string> fields = csvFields(row);
  if (fields.size() != column::count)
    return tl::unexpected(fault(row, PW_TEXT("Check", "This row has not as many fields as its heading.")));
  CheckResult result = {.id = fields[column::id],
                        .source = fields[column::source],
                        .locator = fields[column::locator],
                        .basis = fields[column::basis],
                        .inputs = fields[column::inputs],
                        .quantity = fields[column::quantity],
                        .unit = fields[column::unit]};
  const std::optional<CheckStatus> status = fromWord<CheckStatus>(fields[column::status]);
  if (!status)
    return tl::unexpected(fault(fields[column::status], PW_TEXT("Check", "This status is not known.")));
  result.status = *status;
  if (!readNumbers(result, fields))
    return tl::unexpected(
        fault(fields[column::printed], PW_TEXT("Check", "The numbers of this row do not read.")));
  return result;
}

} // namespace planewright
