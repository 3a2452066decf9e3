// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/base64.h"

#include <array>
#include <cstdint>

namespace planewright {

namespace {

constexpr std::string_view alphabet = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/";
constexpr std::uint8_t noDigit = 0xFF;

constexpr std::array<std::uint8_t, 256> values = [] {
  std::array<std::uint8_t, 256> table{};
  table.fill(noDigit);
  for (std::size_t i = 0; i < alphabet.size(); ++i)
    table[static_cast<unsigned char>(alphabet[i])] = static_cast<std::uint8_t>(i);
  return table;
}();

/// Up to three bytes as four characters.
void addGroup(std::string& text, std::string_view bytes) {
  std::uint32_t group = 0;
  for (std::size_t i = 0; i < 3; ++i)
    group = group << 8 | (i < bytes.size() ? static_cast<unsigned char>(bytes[i]) : 0u);
  for (std::size_t i = 0; i < 4; ++i)
    text += i <= bytes.size() ? alphabet[group >> (18 - 6 * i) & 0x3F] : '=';
}

} // namespace

std::string base64Lines(std::string_view bytes) {
  constexpr std::size_t bytesOfLine = 57; // 76 characters
  std::string text;
  text.reserve(base64Size(bytes.size()) + bytes.size() / bytesOfLine + 1);
  for (std::size_t at = 0; at < bytes.size(); at += 3) {
    addGroup(text, bytes.substr(at, 3));
    if ((at + 3) % bytesOfLine == 0 || at + 3 >= bytes.size())
      text += '\n';
  }
  return text;
}

std::optional<std::string> bytesOfBase64(std::string_view text) {
  std::string bytes;
  bytes.reserve(text.size() / 4 * 3);
  std::uint32_t bits = 0;
  int held = 0; // bits that no byte has taken yet
  std::size_t digits = 0;
  std::size_t padding = 0;
  for (const char c : text) {
    if (isBlank(c))
      continue;
    if (c == '=') {
      ++padding;
      continue;
    }
    const std::uint8_t value = values[static_cast<unsigned char>(c)];
    if (value == noDigit || padding > 0)
      return std::nullopt;
    ++digits;
    bits = (bits << 6 | value) & 0xFFF;
    held += 6;
    if (held < 8)
      continue;
    held -= 8;
    bytes += static_cast<char>(bits >> held & 0xFF);
  }
  const std::uint32_t beyond = bits & ((1u << held) - 1);
  if ((digits + padding) % 4 != 0 || padding > 2 || beyond != 0)
    return std::nullopt;
  return bytes;
}

} // namespace planewright
