// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_numbers.h"

#include "core/quantity/lexer.h"

#include <algorithm>
#include <optional>

namespace planewright {

namespace {

std::size_t digitsAt(std::string_view text) {
  return std::min(text.find_first_not_of("0123456789"), text.size());
}

/// A plain number with one point or comma: what stands before and behind it.
struct MarkedNumber {
  std::string_view sign;
  std::string_view whole;
  char mark = '.';
  std::string_view decimals;
  std::string_view exponent;

  bool mayPartThousands() const {
    return exponent.empty() && decimals.size() == 3 && !whole.empty() && whole.size() <= 3 && whole[0] != '0';
  }
  std::string with(std::string_view between) const {
    return std::string(sign) + (whole.empty() ? "0" : std::string(whole)) + std::string(between) +
           std::string(decimals) + std::string(exponent);
  }
};

bool isExponent(std::string_view text) {
  if (text.empty() || (text[0] != 'e' && text[0] != 'E'))
    return text.empty();
  text.remove_prefix(1);
  if (text.starts_with('-') || text.starts_with('+'))
    text.remove_prefix(1);
  return !text.empty() && digitsAt(text) == text.size();
}

std::optional<MarkedNumber> markedNumber(std::string_view cell) {
  std::string_view text = trimmed(cell);
  MarkedNumber number;
  for (const std::string_view sign : {"+", "-", "−"})
    if (text.starts_with(sign))
      number.sign = text.substr(0, sign.size());
  text.remove_prefix(number.sign.size());
  number.whole = text.substr(0, digitsAt(text));
  text.remove_prefix(number.whole.size());
  if (text.empty() || (text[0] != '.' && text[0] != ','))
    return std::nullopt;
  number.mark = text[0];
  text.remove_prefix(1);
  number.decimals = text.substr(0, digitsAt(text));
  number.exponent = text.substr(number.decimals.size());
  const bool isOne = !number.decimals.empty() && isExponent(number.exponent);
  return isOne ? std::optional(number) : std::nullopt;
}

Problem twoMeanings(std::string_view cell, const MarkedNumber& number) {
  const std::string thousands = number.with("");
  const std::string decimal = number.with(".") + "0";
  Problem problem;
  problem.quoted = trimmed(cell);
  problem.what = PW_TEXT("Paste", "“%1” can be %2 or %3.").with(trimmed(cell)).with(thousands).with(decimal);
  problem.mend = PW_TEXT("Paste", "Write the one that is meant.");
  return problem;
}

} // namespace

void DecimalMarks::see(std::string_view cell) {
  const auto number = markedNumber(cell);
  if (!number || number->mayPartThousands())
    return;
  m_hasDecimalComma = m_hasDecimalComma || number->mark == ',';
  m_hasDecimalPoint = m_hasDecimalPoint || number->mark == '.';
}

Result<std::string> DecimalMarks::pointed(std::string_view cell) const {
  const auto number = markedNumber(cell);
  if (!number)
    return std::string(cell);
  const bool saysComma = m_separator == ';' || m_hasDecimalComma;
  const bool isComma = number->mark == ',';
  const bool isTold =
      isComma ? m_separator != ',' && saysComma && !m_hasDecimalPoint : !saysComma || m_hasDecimalPoint;
  if (number->mayPartThousands() && !isTold)
    return tl::unexpected(twoMeanings(cell, *number));
  // Between commas the reader of entries says what is wrong with it.
  if (!isComma || m_separator == ',')
    return std::string(cell);
  return number->with(".");
}

} // namespace planewright
