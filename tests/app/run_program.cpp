// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

#include <cstdlib>
#include <fstream>
#include <iterator>

#include <sys/wait.h>

namespace planewright {

namespace fs = std::filesystem;

ProgramTest::ProgramTest() {
  std::string name = (fs::temp_directory_path() / "planewright-test-XXXXXX").string();
  if (::mkdtemp(name.data()))
    m_folder = name;
  fs::create_directory(m_folder / "work");
}

ProgramTest::~ProgramTest() {
  fs::remove_all(m_folder);
}

Ran ProgramTest::shell(const std::string& line) const {
  const std::string folder = m_folder.string();
  put("../script", "cd '" + folder + "/work' && unset DISPLAY WAYLAND_DISPLAY QT_QPA_PLATFORM\n" +
                       "program='" PLANEWRIGHT_PROGRAM "' demo='" PLANEWRIGHT_DEMO "'\n" + line + "\n");
  const std::string command =
      "sh '" + folder + "/script' >'" + folder + "/out' 2>'" + folder + "/err' </dev/null";
  const int status = std::system(command.c_str());
  return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, contents("../out"), contents("../err")};
}

Ran ProgramTest::run(const std::string& words, const std::string& before) const {
  return shell(before + " \"$program\" " + words);
}

std::string ProgramTest::contents(const std::string& name) const {
  std::ifstream file(m_folder / "work" / name, std::ios::binary);
  return {std::istreambuf_iterator<char>(file), {}};
}

void ProgramTest::put(const std::string& name, const std::string& bytes) const {
  std::ofstream(m_folder / "work" / name, std::ios::binary) << bytes;
}

std::size_t ProgramTest::files() const {
  return static_cast<std::size_t>(std::distance(fs::directory_iterator(m_folder / "work"), {}));
}

void expectWrongUse(const Ran& ran, const std::string& words) {
  EXPECT_EQ(ran.exit, 2) << ran.err;
  EXPECT_EQ(ran.out, "");
  EXPECT_THAT(ran.err, testing::StartsWith("planewright: "));
  EXPECT_THAT(ran.err, testing::HasSubstr(words));
}

} // namespace planewright
