// SPDX-License-Identifier: GPL-3.0-or-later
// Kills a session of editing and saving again and again and looks at what is on the disk: nothing may be lost
// beyond the last second, and no file may be half. PLANEWRIGHT_KILLS says how often (a few, if not given),
// and PLANEWRIGHT_KILLS_SEED with what dice; both are printed.
#include "core/record/study_file.h"
#include "tests/support/from_environment.h"
#include "ui/files/file_bytes.h"
#include "ui/files/recovery_folder.h"

#include <QTemporaryDir>

#include <gtest/gtest.h>

#include <array>
#include <chrono>
#include <csignal>
#include <cstdlib>
#include <filesystem>
#include <iostream>
#include <random>
#include <sstream>
#include <thread>

#include <fcntl.h>
#include <spawn.h>
#include <sys/wait.h>
#include <unistd.h>

namespace planewright {
namespace {

using namespace std::chrono_literals;
using Clock = std::chrono::steady_clock;

/// The program beside this one, so that both can be copied away from a build that goes on.
std::string sessionProgram() {
  return (std::filesystem::read_symlink("/proc/self/exe").parent_path() / "long_session").string();
}

/// σx, which counts the edits.
int editsIn(const Study& study) {
  return std::atoi(study.points.at(0).stress.at(0).sx.c_str());
}

struct Witnessed {
  int last = 0; ///< the last edit that was made before a time
  int saves = 0;
  int messages = 0;
};

class KilledSession : public testing::Test {
protected:
  std::string path(const std::string& name) const { return m_folder.path().toStdString() + "/" + name; }

  /// A session, whose words are read when it is killed.
  struct Session {
    pid_t process = 0;
    int words = -1;
  };
  Session start(unsigned seed, const std::string& more = {}) const {
    const std::string program = sessionProgram();
    std::vector<std::string> words = {program, m_folder.path().toStdString(), std::to_string(seed)};
    if (!more.empty())
      words.push_back(more);
    std::vector<char*> pointers;
    pointers.reserve(words.size() + 1);
    for (std::string& word : words)
      pointers.push_back(word.data());
    pointers.push_back(nullptr);
    std::array<int, 2> pipe{};
    EXPECT_EQ(::pipe2(pipe.data(), O_CLOEXEC), 0);
    posix_spawn_file_actions_t actions;
    ::posix_spawn_file_actions_init(&actions);
    ::posix_spawn_file_actions_adddup2(&actions, pipe[1], STDOUT_FILENO);
    Session session{0, pipe[0]};
    EXPECT_EQ(::posix_spawn(&session.process, program.c_str(), &actions, nullptr, pointers.data(), environ),
              0);
    ::posix_spawn_file_actions_destroy(&actions);
    ::close(pipe[1]);
    return session;
  }
  Clock::time_point kill(const Session& session) {
    const Clock::time_point when = Clock::now();
    ::kill(session.process, SIGKILL);
    int status = 0;
    ::waitpid(session.process, &status, 0);
    EXPECT_TRUE(WIFSIGNALED(status)) << "it ended by itself with " << status;
    m_witness += bytesFrom(session.words, std::size_t{1} << 24, "").value_or("");
    ::close(session.words);
    return when;
  }
  /// What the session says that it did up to a time.
  Witnessed witnessed(Clock::time_point before) const {
    std::istringstream lines(m_witness);
    Witnessed all;
    for (std::string word; lines >> word;) {
      std::string rest;
      std::getline(lines, rest);
      if (word == "saved")
        ++all.saves;
      else if (word == "message")
        ++all.messages;
      else {
        char* end = nullptr;
        const long edit = std::strtol(rest.c_str(), &end, 10);
        const Clock::time_point at{std::chrono::milliseconds(std::strtoll(end, nullptr, 10))};
        if (at <= before)
          all.last = static_cast<int>(edit);
      }
    }
    return all;
  }
  /// The number of the newest edit that the disk has; every file that is there must read.
  int onDisk() const {
    int newest = 0;
    for (const char* name : {"beam.planewright", "beam.planewright~"}) {
      const Result<std::string> bytes = bytesOf(path(name), greatestStudyFile);
      if (!bytes)
        continue; // not there yet
      const Results<Study> study = readStudy(*bytes);
      EXPECT_TRUE(study) << name << ": " << plain(study.error().front());
      if (study)
        newest = std::max(newest, editsIn(*study));
    }
    for (const LeftStudy& left : leftStudies(path("unsaved"))) {
      EXPECT_TRUE(left.study) << plain(left.study.error().front());
      if (left.study)
        newest = std::max(newest, editsIn(left.study->study));
    }
    return newest;
  }

  QTemporaryDir m_folder;
  std::string m_witness; ///< the lines of all sessions
};

TEST_F(KilledSession, losesNothingBeyondTheLastSecond) {
  const int kills = fromEnvironment("PLANEWRIGHT_KILLS", 8);
  const int seed = fromEnvironment("PLANEWRIGHT_KILLS_SEED", static_cast<int>(std::random_device()() >> 2));
  // A machine that is busy with other tests may hold the session up.
  const auto grace = std::getenv("PLANEWRIGHT_KILLS") ? 1000ms : 4000ms;
  std::mt19937 dice(static_cast<unsigned>(seed));
  std::uniform_int_distribution<int> wait(50, 2500);
  int mostLost = 0;
  for (int i = 0; i < kills; ++i) {
    const Session session = start(static_cast<unsigned>(dice()));
    std::this_thread::sleep_for(std::chrono::milliseconds(wait(dice)));
    const Clock::time_point killed = kill(session);
    const int found = onDisk();
    ASSERT_GE(found, witnessed(killed - grace).last) << "kill " << i << " with seed " << seed;
    mostLost = std::max(mostLost, witnessed(killed).last - found);
  }
  const Witnessed all = witnessed(Clock::now());
  EXPECT_EQ(all.messages, 0) << m_witness.substr(m_witness.find("message"), 200);
  EXPECT_GT(all.last, 0);
  std::cout << "kills " << kills << ", seed " << seed << ", edits " << all.last << ", saves " << all.saves
            << ", most edits lost at one kill " << mostLost << "\n";
}

TEST_F(KilledSession, onADiskThatFillsKeepsWhatWasThereAndSaysSo) {
  const Session first = start(1);
  std::this_thread::sleep_for(3s);
  kill(first);
  const int before = onDisk();
  ASSERT_GT(before, 0);
  // Each file of the next session breaks off after some bytes.
  for (const char* bytes : {"0", "1", "700", "1500"}) {
    const Session session = start(2, bytes);
    std::this_thread::sleep_for(1500ms);
    kill(session);
    EXPECT_GE(onDisk(), before) << bytes;
  }
  EXPECT_GT(witnessed(Clock::now()).messages, 0);
}

} // namespace
} // namespace planewright
