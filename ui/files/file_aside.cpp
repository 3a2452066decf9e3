// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_aside.h"

#include "ui/files/file_errors.h"

#include <filesystem>

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

namespace planewright {

namespace {

namespace fs = std::filesystem;

/// Where the links of `path` lead, also when no file is there yet.
std::string targetOf(const std::string& path) {
  std::error_code failed;
  fs::path target = path;
  constexpr int mostLinks = 40;
  for (int i = 0; i < mostLinks && fs::is_symlink(target, failed); ++i) {
    const fs::path next = fs::read_symlink(target, failed);
    target = next.is_absolute() ? next : target.parent_path() / next;
  }
  return target.string();
}

/// The new name is on the disk only when its folder is synced too; a disk that cannot do that has its
/// reasons.
void syncFolderOf(const fs::path& target) {
  const fs::path folder = target.has_parent_path() ? target.parent_path() : fs::path(".");
  const Descriptor open(::open(folder.c_str(), O_RDONLY | O_DIRECTORY | O_CLOEXEC));
  if (open)
    ::fsync(open.number());
}

/// Gives the old file a second name, at no moment taking away the first. Where the disk knows no second names
/// it is copied; a previous version that cannot be kept does not hold up the new one.
void keepBeside(const std::string& target) {
  const std::string aside = target + "~" + std::to_string(::getpid());
  std::error_code failed;
  fs::create_hard_link(target, aside, failed);
  if (failed)
    fs::copy_file(target, aside, failed);
  if (!failed)
    fs::rename(aside, target + "~", failed);
  if (failed)
    fs::remove(aside, failed);
}

} // namespace

int errorOfWriting(int descriptor, std::string_view bytes) {
  while (!bytes.empty()) {
    const ssize_t count = ::write(descriptor, bytes.data(), bytes.size());
    if (count < 0 && errno == EINTR)
      continue;
    if (count < 0)
      return errno;
    bytes.remove_prefix(static_cast<std::size_t>(count));
  }
  return 0;
}

Result<FileAside> FileAside::to(const std::string& path) {
  FileAside file(path);
  if (const int error = file.errorOfOpening())
    return tl::unexpected(unwritten(path, error));
  return file;
}

FileAside::FileAside(FileAside&& other) noexcept
    : m_path(std::move(other.m_path)), m_target(std::move(other.m_target)),
      m_aside(std::exchange(other.m_aside, {})), m_mode(other.m_mode), m_keepsPrevious(other.m_keepsPrevious),
      m_file(std::move(other.m_file)) {}

FileAside::~FileAside() {
  if (!m_aside.empty())
    ::unlink(m_aside.c_str());
}

int FileAside::errorOfOpening() {
  m_target = targetOf(m_path);
  struct stat old {};
  if (::stat(m_target.c_str(), &old) != 0)
    return errno == ENOENT ? errorOfOpeningAside(0666) : errno;
  if (S_ISDIR(old.st_mode))
    return EISDIR;
  if (!S_ISREG(old.st_mode)) {
    m_file = Descriptor(::open(m_path.c_str(), O_WRONLY | O_CLOEXEC));
    return m_file ? 0 : errno;
  }
  // A rename would replace a file that nobody may write to.
  if (::access(m_target.c_str(), W_OK) != 0)
    return errno;
  m_mode = old.st_mode & 07777;
  // What replaces a private file is private from its first byte on.
  return errorOfOpeningAside(0600);
}

/// Opens a new file beside the target, named after it so that a leftover tells where it comes from. `mode` is
/// less the user's mask.
int FileAside::errorOfOpeningAside(mode_t mode) {
  constexpr int tries = 100;
  const fs::path target = m_target;
  for (int i = 0; i < tries; ++i) {
    const std::string name = "." + target.filename().string().substr(0, 200) + "." +
                             std::to_string(::getpid()) + "-" + std::to_string(i);
    const std::string path = (target.parent_path() / name).string();
    m_file = Descriptor(::open(path.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, mode));
    if (m_file) {
      m_aside = path;
      return 0;
    }
    if (errno != EEXIST)
      break;
  }
  return errno;
}

int FileAside::errorOfPutting() {
  if (m_aside.empty())
    return m_file.errorOfClosing();
  if (m_mode && ::fchmod(m_file.number(), *m_mode) != 0)
    return errno;
  if (::fsync(m_file.number()) != 0)
    return errno;
  if (const int error = m_file.errorOfClosing())
    return error;
  if (m_mode && m_keepsPrevious)
    keepBeside(m_target);
  if (::rename(m_aside.c_str(), m_target.c_str()) != 0)
    return errno;
  m_aside.clear();
  syncFolderOf(m_target);
  return 0;
}

Result<void> FileAside::write(std::string_view bytes) {
  if (const int error = errorOfWriting(m_file.number(), bytes))
    return tl::unexpected(unwritten(m_path, error));
  return {};
}

Result<void> FileAside::finish() {
  if (const int error = errorOfPutting())
    return tl::unexpected(unwritten(m_path, error));
  return {};
}

} // namespace planewright
