// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <gtest/gtest.h>

#include <filesystem>
#include <string>

namespace planewright {

/// How a run of the program ended.
struct Ran {
  int exit = -1;
  std::string out;
  std::string err;
};

/// Runs the program in a folder of its own, without a display.
class ProgramTest : public testing::Test {
protected:
  ProgramTest();
  ~ProgramTest() override;

  /// The program with these words, quoted for the shell; `$demo` is the worked example. `before` stands in
  /// front of it: variables, another program.
  Ran run(const std::string& words, const std::string& before = "") const;
  /// A line for the shell, in which `$program` and `$demo` are known.
  Ran shell(const std::string& line) const;
  std::string contents(const std::string& name) const;
  void put(const std::string& name, const std::string& bytes) const;
  /// Files in the folder.
  std::size_t files() const;

private:
  std::filesystem::path m_folder;
};

/// Wrong use: exit code 2, nothing on standard output, and these words on standard error.
void expectWrongUse(const Ran& ran, const std::string& words);

} // namespace planewright
