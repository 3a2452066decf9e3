// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/check_inputs.h"

#include <algorithm>
#include <charconv>
#include <cmath>

namespace planewright {

namespace {

std::string_view trimmed(std::string_view text) {
  while (text.starts_with(' '))
    text.remove_prefix(1);
  while (text.ends_with(' '))
    text.remove_suffix(1);
  return text;
}

struct Input {
  std::string_view name;
  std::string_view value;
};

std::vector<Input> inputsIn(std::string_view pieces) {
  std::vector<Input> inputs;
  while (!pieces.empty()) {
    const std::size_t end = std::min(pieces.find(';'), pieces.size());
    const std::string_view piece = trimmed(pieces.substr(0, end));
    pieces.remove_prefix(std::min(end + 1, pieces.size()));
    if (const std::size_t sign = piece.find('='); sign != std::string_view::npos)
      inputs.push_back({piece.substr(0, sign), piece.substr(sign + 1)});
  }
  return inputs;
}

} // namespace

std::optional<double> numberIn(std::string_view text) {
  double value = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
  if (error != std::errc() || end != text.data() + text.size() || !std::isfinite(value))
    return std::nullopt;
  return value;
}

std::optional<std::string_view> CheckInputs::word(std::string_view name) const {
  for (const Input& input : inputsIn(m_pieces))
    if (input.name == name)
      return input.value;
  return std::nullopt;
}

std::optional<double> CheckInputs::number(std::string_view name) const {
  const std::optional<std::string_view> value = word(name);
  return value ? numberIn(*value) : std::nullopt;
}

std::vector<std::string_view> CheckInputs::names() const {
  std::vector<std::string_view> names;
  for (const Input& input : inputsIn(m_pieces))
    names.push_back(input.name);
  return names;
}

} // namespace planewright
