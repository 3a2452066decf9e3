// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/crc32.h"

#include <array>

namespace planewright {

namespace {

constexpr std::array<std::uint32_t, 256> remainders = [] {
  std::array<std::uint32_t, 256> table{};
  for (std::uint32_t byte = 0; byte < table.size(); ++byte) {
    std::uint32_t value = byte;
    for (int bit = 0; bit < 8; ++bit)
      value = (value >> 1) ^ ((value & 1) != 0 ? 0xEDB88320u : 0u);
    table[byte] = value;
  }
  return table;
}();

} // namespace

std::uint32_t crc32(std::string_view bytes) {
  std::uint32_t value = 0xFFFFFFFFu;
  for (const char c : bytes)
    value = (value >> 8) ^ remainders[(value ^ static_cast<unsigned char>(c)) & 0xFF];
  return ~value;
}

} // namespace planewright
