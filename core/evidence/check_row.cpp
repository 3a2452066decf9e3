// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/check_row.h"

#include "core/record/csv.h"
#include "core/words/names.h"

#include <charconv>
#include <cmath>

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

std::optional<double> numberIn(std::string_view text) {
  double value = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
  if (error != std::errc() || end != text.data() + text.size() || !std::isfinite(value))
    return std::nullopt;
  return value;
}

std::string_view trimmed(std::string_view text) {
  while (text.starts_with(' '))
    text.remove_prefix(1);
  while (text.ends_with(' '))
    text.remove_suffix(1);
  return text;
}

/// The value of one input; none when it is missing or no number.
std::optional<double> input(std::string_view pieces, std::string_view name) {
  while (!pieces.empty()) {
    const std::size_t end = std::min(pieces.find(';'), pieces.size());
    const std::string_view piece = trimmed(pieces.substr(0, end));
    pieces.remove_prefix(std::min(end + 1, pieces.size()));
    if (piece.starts_with(name) && piece.substr(name.size()).starts_with('='))
      return numberIn(piece.substr(name.size() + 1));
  }
  return std::nullopt;
}

std::optional<PlaneStress> stressIn(std::string_view pieces) {
  const auto sx = input(pieces, "sx");
  const auto sy = input(pieces, "sy");
  const auto txy = input(pieces, "txy");
  const auto s1 = input(pieces, "s1");
  if (!sx || !sy || (!txy && !s1))
    return std::nullopt;
  return PlaneStress{*sx, *sy, txy ? *txy : std::sqrt((*s1 - *sx) * (*s1 - *sy))};
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

Result<CheckRow> readCheckRow(std::string_view row) {
  const std::vector<std::string> fields = csvFields(row);
  if (fields.size() != column::count)
    return tl::unexpected(fault(row, PW_TEXT("Check", "This row has not as many fields as its heading.")));
  CheckRow read;
  read.result = {.id = fields[column::id],
                 .source = fields[column::source],
                 .locator = fields[column::locator],
                 .basis = fields[column::basis],
                 .inputs = fields[column::inputs],
                 .quantity = fields[column::quantity],
                 .unit = fields[column::unit]};
  const std::optional<CheckStatus> status = fromWord<CheckStatus>(fields[column::status]);
  if (!status)
    return tl::unexpected(fault(fields[column::status], PW_TEXT("Check", "This status is not known.")));
  read.result.status = *status;
  const std::optional<PlaneStress> stress = stressIn(read.result.inputs);
  if (!stress)
    return tl::unexpected(
        fault(read.result.inputs, PW_TEXT("Check", "These inputs make no state of stress.")));
  read.stress = *stress;
  if (const std::optional<double> theta = input(read.result.inputs, "theta"))
    read.theta = Angle::fromDegrees(*theta);
  if (!readNumbers(read.result, fields))
    return tl::unexpected(
        fault(fields[column::printed], PW_TEXT("Check", "The numbers of this row do not read.")));
  return read;
}

} // namespace planewright
