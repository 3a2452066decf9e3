// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/file_problems.h"

#include <cstdint>
#include <optional>
#include <string>
#include <vector>

namespace planewright {

struct JsonMember;

/// A JSON value that knows where it stands. Numbers keep their written form.
struct Json {
  enum class Kind { null, boolean, number, text, list, object };
  Kind kind = Kind::null;
  std::uint32_t offset = 0;        ///< of its first byte in the file
  std::string text;                ///< of a text, its characters; of a number, its digits as written
  std::vector<JsonMember> members; ///< of an object, or the items of a list (without keys)
};

struct JsonMember {
  std::string key;
  std::uint32_t keyOffset = 0;
  Json value;
};

/// The first member with this key, or null.
const JsonMember* member(const Json& object, std::string_view key);

/// Bounds of what is read.
inline constexpr std::size_t deepestJson = 64;
inline constexpr std::size_t mostJsonValues = 1'000'000;

/// Reads JSON (RFC 8259) strictly into a tree. None when it cannot be read to its end, or when a text or key
/// has control characters other than line feed and tab. An object that has a key twice is a Problem too, but
/// reading goes on and the first of the two stands.
std::optional<Json> readJson(FileProblems& problems);

} // namespace planewright
