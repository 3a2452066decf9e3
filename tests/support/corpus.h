// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"
#include "tests/support/approved.h"

#include <set>

namespace planewright {

/// A folder of tests/corpus that holds one input for each trap, NAME.KIND, and beside it NAME.problems with
/// what is expected of it.
class Corpus {
public:
  Corpus(std::string folder, std::string kind) : m_folder(std::move(folder)), m_kind(std::move(kind)) {}

  /// Of the inputs.
  std::set<std::string> names() const {
    std::set<std::string> names;
    for (const auto& entry : std::filesystem::directory_iterator(path()))
      if (entry.path().extension() == m_kind)
        names.insert(entry.path().stem().string());
    return names;
  }

  std::string bytesOf(const std::string& name) const {
    std::ifstream stream(path() / (name + m_kind), std::ios::binary);
    return {std::istreambuf_iterator<char>(stream), {}};
  }

  testing::AssertionResult matches(const std::string& name, std::string_view problems) const {
    return matchesApproved("../corpus/" + m_folder + "/" + name + ".problems", problems);
  }

  /// Files that belong to no input.
  std::set<std::string> strays() const {
    const std::set<std::string> inputs = names();
    std::set<std::string> strays;
    for (const auto& entry : std::filesystem::directory_iterator(path()))
      if (!inputs.contains(entry.path().stem().string()))
        strays.insert(entry.path().filename().string());
    return strays;
  }

private:
  std::filesystem::path path() const {
    return std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "corpus" / m_folder;
  }

  std::string m_folder;
  std::string m_kind; ///< ".table"
};

/// "LINE:COLUMN PLACE QUOTED" for each Problem of a file.
inline std::string listed(const Problems& problems) {
  std::string lines;
  for (const Problem& problem : problems)
    lines += std::to_string(problem.line) + ":" + std::to_string(problem.column) + " " +
             (problem.place.empty() ? "-" : problem.place) + " " + problem.quoted + "\n";
  return lines;
}

/// A name of the corpus as that of a test.
inline std::string testName(std::string name) {
  std::erase(name, '-');
  return name;
}

} // namespace planewright
