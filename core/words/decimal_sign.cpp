// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/decimal_sign.h"

#include <algorithm>

namespace planewright {

namespace {

// One sign for each thread: sheets are made beside the window, which goes on writing points.
thread_local DecimalSign writtenSign = DecimalSign::point;

} // namespace

template <>
const std::vector<Named<DecimalSign>>& namesOf() {
  static const std::vector<Named<DecimalSign>> names = {
      {DecimalSign::point, "point", PW_TEXT("Decimal sign", "point: 0.5")},
      {DecimalSign::comma, "comma", PW_TEXT("Decimal sign", "comma: 0,5")}};
  return names;
}

WritesDecimals::WritesDecimals(DecimalSign sign) : m_before(writtenSign) {
  writtenSign = sign;
}

WritesDecimals::~WritesDecimals() {
  writtenSign = m_before;
}

std::string withDecimalSign(std::string number) {
  if (writtenSign == DecimalSign::comma)
    std::ranges::replace(number, '.', ',');
  return number;
}

Text numberText(std::string_view written) {
  return {std::string(numberContext), std::string(written), {}};
}

} // namespace planewright
