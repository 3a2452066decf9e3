// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/recovery_folder.h"

#include "core/record/study_file.h"
#include "ui/files/file_bytes.h"
#include "ui/files/file_errors.h"

#include <QFileInfo>
#include <QSettings>

#include <algorithm>
#include <filesystem>

#include <fcntl.h>
#include <sys/file.h>
#include <sys/stat.h>
#include <unistd.h>

namespace planewright {

namespace {

namespace fs = std::filesystem;

constexpr auto studyEnding = ".study";
constexpr auto lockEnding = ".lock";
constexpr mode_t ownOnly = 0600;

std::string discardedIn(const std::string& folder) {
  return folder + "/discarded";
}

int errorOfMakingFolder(const std::string& folder) {
  std::error_code failed;
  fs::create_directories(folder, failed);
  if (failed)
    return failed.value();
  fs::permissions(folder, fs::perms::owner_all, failed);
  return 0;
}

bool isLocked(const Descriptor& file) {
  return ::flock(file.number(), LOCK_EX | LOCK_NB) == 0;
}

/// Whether a file still has its name in a folder.
bool isNamed(const Descriptor& file) {
  struct stat found {};
  return ::fstat(file.number(), &found) == 0 && found.st_nlink > 0;
}

/// The files of a folder with an ending, the newest first.
std::vector<fs::path> filesOf(const std::string& folder, std::string_view ending) {
  std::vector<std::pair<fs::file_time_type, fs::path>> found;
  std::error_code failed;
  for (fs::directory_iterator at(folder, failed), end; !failed && at != end; at.increment(failed))
    if (at->path().extension() == ending && !at->path().filename().string().starts_with('.'))
      found.emplace_back(fs::last_write_time(at->path(), failed), at->path());
  std::ranges::sort(found, std::greater());
  std::vector<fs::path> files;
  files.reserve(found.size());
  for (auto& [time, path] : found)
    files.push_back(std::move(path));
  return files;
}

LeftStudy studyAt(const fs::path& path) {
  const Result<std::string> bytes = bytesOf(path.string(), greatestStudyFile);
  if (!bytes)
    return {path.string(), tl::unexpected(Problems{bytes.error()})};
  return {path.string(), readUnsaved(*bytes)};
}

/// True where a window that still runs holds this lock. One that nobody holds is removed, with what its
/// window was just writing.
bool isHeld(const fs::path& lock) {
  const Descriptor file(::open(lock.c_str(), O_RDWR | O_CLOEXEC));
  if (!file)
    return false;
  if (!isLocked(file))
    return true;
  std::error_code failed;
  const std::string halves = "." + lock.stem().string() + studyEnding;
  for (fs::directory_iterator at(lock.parent_path(), failed), end; !failed && at != end; at.increment(failed))
    if (at->path().filename().string().starts_with(halves))
      fs::remove(at->path(), failed);
  ::unlink(lock.c_str());
  return false;
}

/// Whether its window ended between saving it and taking it away.
bool isSaved(const LeftStudy& left) {
  if (!left.study || left.study->file.empty())
    return false;
  const Result<std::string> bytes = bytesOf(left.study->file, greatestStudyFile);
  return bytes && readStudy(*bytes) == left.study->study;
}

int errorOfMoving(const std::string& from, const std::string& to) {
  return ::rename(from.c_str(), to.c_str()) == 0 ? 0 : errno;
}

void removeOld(const std::string& folder, std::chrono::system_clock::time_point now) {
  std::error_code failed;
  for (const fs::path& path : filesOf(folder, studyEnding)) {
    const auto written = fs::last_write_time(path, failed);
    if (!failed && now - std::chrono::file_clock::to_sys(written) > keptDiscarded)
      fs::remove(path, failed);
  }
}

} // namespace

std::string recoveryPath() {
  return (QFileInfo(QSettings().fileName()).absolutePath() + QStringLiteral("/unsaved")).toStdString();
}

Result<RecoveryPlace> RecoveryPlace::in(const std::string& folder) {
  constexpr int tries = 100;
  int error = errorOfMakingFolder(folder);
  for (int i = 0; i < tries && error == 0; ++i) {
    const std::string name = folder + "/" + std::to_string(::time(nullptr)) + "-" +
                             std::to_string(::getpid()) + "-" + std::to_string(i);
    const std::string lock = name + lockEnding;
    Descriptor held(::open(lock.c_str(), O_RDWR | O_CREAT | O_EXCL | O_CLOEXEC, ownOnly));
    if (!held && errno != EEXIST)
      error = errno;
    // Another window that clears away may have been quicker than the lock; and a study may have been left.
    else if (held && isLocked(held) && isNamed(held) && !fs::exists(name + studyEnding))
      return RecoveryPlace(name + studyEnding, lock, std::move(held));
    else if (held)
      ::unlink(lock.c_str());
  }
  return tl::unexpected(unwritten(folder, error == 0 ? EEXIST : error));
}

RecoveryPlace::~RecoveryPlace() {
  if (m_held)
    ::unlink(m_lock.c_str());
}

// Studies are listed before locks: who wrote one that is listed had locked it before.
std::vector<LeftStudy> leftStudies(const std::string& folder) {
  const std::vector<fs::path> studies = filesOf(folder, studyEnding);
  std::vector<fs::path> held;
  for (const fs::path& lock : filesOf(folder, lockEnding))
    if (isHeld(lock))
      held.push_back(lock.stem());
  std::vector<LeftStudy> left;
  for (const fs::path& path : studies)
    if (std::ranges::find(held, path.stem()) == held.end())
      left.push_back(studyAt(path));
  std::error_code failed;
  std::erase_if(left, [&](const LeftStudy& one) { return isSaved(one) && fs::remove(one.path, failed); });
  return left;
}

std::vector<LeftStudy> discardedStudies(const std::string& folder) {
  std::vector<LeftStudy> discarded;
  for (const fs::path& path : filesOf(discardedIn(folder), studyEnding))
    discarded.push_back(studyAt(path));
  return discarded;
}

Result<void> discard(const std::string& folder, const std::string& path,
                     std::chrono::system_clock::time_point now) {
  const std::string discarded = discardedIn(folder);
  std::error_code failed;
  if (!fs::exists(path, failed))
    return {};
  if (const int error = errorOfMakingFolder(discarded))
    return tl::unexpected(unwritten(discarded, error));
  std::string to;
  int number = 0;
  do
    to = discarded + "/" + fs::path(path).stem().string() + "-" + std::to_string(number++) + studyEnding;
  while (fs::exists(to, failed));
  if (const int error = errorOfMoving(path, to))
    return tl::unexpected(unwritten(to, error));
  fs::last_write_time(to, std::chrono::file_clock::from_sys(now), failed);
  removeOld(discarded, now);
  return {};
}

Result<void> takeStudy(const std::string& path, const RecoveryPlace& place) {
  if (const int error = errorOfMoving(path, place.path()))
    return tl::unexpected(unread(path, error));
  return {};
}

} // namespace planewright
