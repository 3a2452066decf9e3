// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/png_study.h"

#include "core/record/crc32.h"

#include <cassert>
#include <cstdint>

namespace planewright {

namespace {

constexpr std::string_view signature = "\x89PNG\r\n\x1A\n";
constexpr std::string_view keyword = "planewright-study";
constexpr std::size_t frameSize = 12; // length, type and checksum of a chunk

std::uint32_t numberAt(std::string_view bytes, std::size_t offset) {
  std::uint32_t number = 0;
  for (std::size_t i = 0; i < 4; ++i)
    number = number << 8 | static_cast<unsigned char>(bytes[offset + i]);
  return number;
}

std::string bytesOf(std::uint32_t number) {
  std::string bytes;
  for (int shift = 24; shift >= 0; shift -= 8)
    bytes += static_cast<char>(number >> shift & 0xFF);
  return bytes;
}

/// What stands behind the next zero byte; empty when there is none.
std::string_view behindZero(std::string_view data) {
  const std::size_t zero = data.find('\0');
  return zero == std::string_view::npos ? std::string_view() : data.substr(zero + 1);
}

/// Takes the text of a chunk of text with our keyword. Programs that edit pictures write such a chunk anew in
/// any of the three forms; the packed ones are not unpacked.
void take(std::string_view type, std::string_view data, CarriedTexts& found) {
  const bool isText = type == "tEXt" || type == "iTXt" || type == "zTXt";
  if (!isText || data.substr(0, data.find('\0')) != keyword)
    return;
  data = behindZero(data);
  if (type == "tEXt") {
    found.texts.push_back(data);
    return;
  }
  const bool isPacked = type == "zTXt" || !data.starts_with('\0');
  if (isPacked)
    found.state = CarriedTexts::State::changed;
  else // a flag, a method, a language and the keyword in that language go before the text
    found.texts.push_back(behindZero(behindZero(data.substr(std::min<std::size_t>(2, data.size())))));
}

} // namespace

bool isPng(std::string_view bytes) {
  return bytes.starts_with(signature.substr(0, 4));
}

std::string pngWithText(std::string png, std::string_view text) {
  assert(png.size() >= signature.size() + frameSize && png.substr(png.size() - 8, 4) == "IEND");
  const std::string body = "tEXt" + std::string(keyword) + '\0' + std::string(text);
  png.insert(png.size() - frameSize,
             bytesOf(static_cast<std::uint32_t>(body.size() - 4)) + body + bytesOf(crc32(body)));
  return png;
}

CarriedTexts textsInPng(std::string_view bytes) {
  CarriedTexts found;
  if (!bytes.starts_with(signature)) {
    found.state = signature.starts_with(bytes) ? CarriedTexts::State::cutOff : CarriedTexts::State::changed;
    return found;
  }
  bytes.remove_prefix(signature.size());
  while (bytes.size() >= frameSize) {
    const std::string_view type = bytes.substr(4, 4);
    const std::size_t length = numberAt(bytes, 0);
    if (type == "IEND")
      return found;
    if (length > bytes.size() - frameSize)
      break;
    take(type, bytes.substr(8, length), found);
    bytes.remove_prefix(frameSize + length);
  }
  found.state = CarriedTexts::State::cutOff;
  return found;
}

} // namespace planewright
