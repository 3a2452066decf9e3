// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_bytes.h"

#include "ui/files/descriptor.h"

#include <algorithm>
#include <array>
#include <cerrno>
#include <filesystem>
#include <optional>

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

namespace planewright {

namespace {

namespace fs = std::filesystem;

Text reasonOf(int error) {
  switch (error) {
  case ENOSPC:
  case EDQUOT:
    return PW_TEXT("File", "the disk is full");
  case EACCES:
  case EPERM:
    return PW_TEXT("File", "permission is denied");
  case EROFS:
    return PW_TEXT("File", "the disk is read-only");
  case EISDIR:
    return PW_TEXT("File", "it is a folder");
  case EPIPE:
    return PW_TEXT("File", "its reader has gone");
  case EBADF:
    return PW_TEXT("File", "it is closed");
  case ENOENT:
    return PW_TEXT("File", "there is no such file or folder");
  default:
    return verbatim(std::generic_category().message(error));
  }
}

Problem unread(const std::string& path, int error) {
  return {path, 0, 0, "", PW_TEXT("File", "This cannot be read: %1.").with(reasonOf(error)), {}};
}

Problem unwritten(const std::string& path, int error) {
  return {path, 0, 0, "", PW_TEXT("File", "This could not be written: %1.").with(reasonOf(error)), {}};
}

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

int errorOfWritingDirectly(const std::string& path, std::string_view bytes) {
  Descriptor file(::open(path.c_str(), O_WRONLY | O_CLOEXEC));
  if (!file)
    return errno;
  const int error = errorOfWriting(file.number(), bytes);
  return error ? error : file.errorOfClosing();
}

/// A new file beside `target`, named after it so that a leftover tells where it comes from. `mode` is less
/// the user's mask.
struct Aside {
  std::string path;
  Descriptor file;
};

Aside openedAside(const fs::path& target, mode_t mode) {
  constexpr int tries = 100;
  Aside aside;
  for (int i = 0; i < tries && !aside.file; ++i) {
    const std::string name = "." + target.filename().string().substr(0, 200) + "." +
                             std::to_string(::getpid()) + "-" + std::to_string(i);
    aside.path = (target.parent_path() / name).string();
    aside.file = Descriptor(::open(aside.path.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, mode));
    if (!aside.file && errno != EEXIST)
      break;
  }
  return aside;
}

/// The new name is on the disk only when its folder is synced too; a disk that cannot do that has its
/// reasons.
void syncFolderOf(const fs::path& target) {
  const fs::path folder = target.has_parent_path() ? target.parent_path() : fs::path(".");
  const Descriptor open(::open(folder.c_str(), O_RDONLY | O_DIRECTORY | O_CLOEXEC));
  if (open)
    ::fsync(open.number());
}

int errorOfReplacing(const std::string& target, std::string_view bytes, std::optional<mode_t> mode) {
  // What replaces a private file is private from its first byte on.
  Aside aside = openedAside(target, mode ? 0600 : 0666);
  if (!aside.file)
    return errno;
  int error = errorOfWriting(aside.file.number(), bytes);
  if (!error && mode && ::fchmod(aside.file.number(), *mode) != 0)
    error = errno;
  if (!error && ::fsync(aside.file.number()) != 0)
    error = errno;
  if (const int closing = aside.file.errorOfClosing(); !error)
    error = closing;
  if (!error && ::rename(aside.path.c_str(), target.c_str()) != 0)
    error = errno;
  if (error)
    ::unlink(aside.path.c_str());
  else
    syncFolderOf(target);
  return error;
}

int errorOfSaving(const std::string& target, std::string_view bytes) {
  struct stat old {};
  if (::stat(target.c_str(), &old) != 0)
    return errno == ENOENT ? errorOfReplacing(target, bytes, std::nullopt) : errno;
  if (S_ISDIR(old.st_mode))
    return EISDIR;
  if (!S_ISREG(old.st_mode))
    return errorOfWritingDirectly(target, bytes);
  // A rename would replace a file that nobody may write to.
  if (::access(target.c_str(), W_OK) != 0)
    return errno;
  return errorOfReplacing(target, bytes, old.st_mode & 07777);
}

} // namespace

Result<std::string> bytesFrom(int descriptor, std::size_t most, const std::string& place) {
  std::string bytes;
  std::array<char, 65536> block{};
  while (bytes.size() <= most) {
    const std::size_t wanted = std::min(block.size(), most + 1 - bytes.size());
    const ssize_t count = ::read(descriptor, block.data(), wanted);
    if (count < 0 && errno == EINTR)
      continue;
    if (count < 0)
      return tl::unexpected(unread(place, errno));
    if (count == 0)
      break;
    bytes.append(block.data(), static_cast<std::size_t>(count));
  }
  return bytes;
}

Result<std::string> bytesOf(const std::string& path, std::size_t most) {
  const Descriptor file(::open(path.c_str(), O_RDONLY | O_CLOEXEC));
  if (!file)
    return tl::unexpected(unread(path, errno));
  return bytesFrom(file.number(), most, path);
}

Result<void> writeTo(int descriptor, std::string_view bytes, const std::string& place) {
  if (const int error = errorOfWriting(descriptor, bytes))
    return tl::unexpected(unwritten(place, error));
  return {};
}

Result<void> writeAside(const std::string& path, std::string_view bytes) {
  if (const int error = errorOfSaving(targetOf(path), bytes))
    return tl::unexpected(unwritten(path, error));
  return {};
}

bool isSameFile(const std::string& a, const std::string& b) {
  std::error_code failed;
  return fs::equivalent(a, b, failed);
}

} // namespace planewright
