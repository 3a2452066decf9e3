// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <gtest/gtest.h>

#include <algorithm>
#include <cstdlib>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <string>
#include <string_view>

namespace planewright {

/// The first line in which two texts differ, in words; empty for equal texts.
inline std::string firstDifference(std::string_view approved, std::string_view actual) {
  if (approved == actual)
    return {};
  const auto parting = std::mismatch(approved.begin(), approved.end(), actual.begin(), actual.end()).first;
  const auto equal = static_cast<std::size_t>(parting - approved.begin());
  const auto line = std::count(approved.begin(), parting, '\n') + 1;
  const std::size_t start = equal == 0 ? 0 : approved.rfind('\n', equal - 1) + 1;
  const auto lineFrom = [start](std::string_view text) {
    return std::string(text.substr(start, std::min(text.find('\n', start), text.size()) - start));
  };
  return "line " + std::to_string(line) + "\n  approved: " + lineFrom(approved) +
         "\n  actual:   " + lineFrom(actual);
}

/// Compares `actual` to the last byte with the file tests/approved/`name`. With PLANEWRIGHT_APPROVE=1 in the
/// environment the file is written instead: read what changed before it is committed.
///
///     EXPECT_TRUE(matchesApproved("figure/plain.svg", svg));
inline testing::AssertionResult matchesApproved(const std::string& name, std::string_view actual) {
  const std::filesystem::path path = std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "approved" / name;
  const char* approve = std::getenv("PLANEWRIGHT_APPROVE");
  if (approve != nullptr && std::string_view(approve) == "1") {
    std::filesystem::create_directories(path.parent_path());
    std::ofstream(path, std::ios::binary) << actual;
  }
  std::ifstream file(path, std::ios::binary);
  if (!file)
    return testing::AssertionFailure() << "There is no " << path << "; write it with PLANEWRIGHT_APPROVE=1.";
  const std::string approved{std::istreambuf_iterator<char>(file), {}};
  if (const std::string difference = firstDifference(approved, actual); !difference.empty())
    return testing::AssertionFailure() << name << " differs in " << difference;
  return testing::AssertionSuccess();
}

} // namespace planewright
