// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/json_writer.h"

#include "core/quantity/format.h"

#include <array>
#include <cassert>
#include <charconv>
#include <cmath>

namespace planewright {

namespace {

std::string escaped(char c) {
  switch (c) {
  case '"':
    return "\\\"";
  case '\\':
    return "\\\\";
  case '\n':
    return "\\n";
  case '\t':
    return "\\t";
  default:
    break;
  }
  const auto byte = static_cast<unsigned char>(c);
  if (byte >= 0x20)
    return {c};
  constexpr std::string_view digits = "0123456789abcdef";
  return std::string("\\u00") + digits[byte >> 4] + digits[byte & 15];
}

} // namespace

JsonWriter& JsonWriter::key(std::string_view key) {
  text(key);
  m_out += ": ";
  m_behindKey = true;
  return *this;
}

void JsonWriter::text(std::string_view text) {
  separate();
  m_out += '"';
  for (const char c : text)
    m_out += escaped(c);
  m_out += '"';
}

void JsonWriter::number(double number) {
  assert(std::isfinite(number));
  word(exactNumber(number));
}

void JsonWriter::number(std::optional<double> number) {
  if (number)
    this->number(*number);
  else
    null();
}

void JsonWriter::whole(int number) {
  std::array<char, 12> digits{};
  const auto end = std::to_chars(digits.data(), digits.data() + digits.size(), number).ptr;
  word({digits.data(), end});
}

std::string JsonWriter::taken() {
  assert(m_depth == 0);
  return std::move(m_out) + "\n";
}

void JsonWriter::begin(char bracket) {
  separate();
  m_out += bracket;
  ++m_depth;
  m_first = true;
}

void JsonWriter::end(char bracket) {
  --m_depth;
  if (!m_first)
    m_out += "\n" + std::string(2 * m_depth, ' ');
  m_out += bracket;
  m_first = false;
}

void JsonWriter::word(std::string_view word) {
  separate();
  m_out += word;
}

void JsonWriter::separate() {
  if (!m_behindKey && m_depth > 0)
    m_out += (m_first ? "\n" : ",\n") + std::string(2 * m_depth, ' ');
  m_behindKey = false;
  m_first = false;
}

} // namespace planewright
