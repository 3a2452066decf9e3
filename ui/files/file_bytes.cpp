// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_bytes.h"

#include "ui/files/file_aside.h"
#include "ui/files/file_errors.h"

#include <algorithm>
#include <array>
#include <cerrno>
#include <filesystem>

#include <fcntl.h>
#include <unistd.h>

namespace planewright {

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

namespace {

Result<void> writeTo(Result<FileAside> file, std::string_view bytes, bool keepsPrevious) {
  if (!file)
    return tl::unexpected(std::move(file).error());
  if (keepsPrevious)
    file->keepPrevious();
  if (Result<void> written = file->write(bytes); !written)
    return written;
  return file->finish();
}

} // namespace

Result<void> writeAside(const std::string& path, std::string_view bytes) {
  return writeTo(FileAside::to(path), bytes, false);
}

Result<void> writeKeepingPrevious(const std::string& path, std::string_view bytes) {
  return writeTo(FileAside::to(path), bytes, true);
}

bool isSameFile(const std::string& a, const std::string& b) {
  std::error_code failed;
  return std::filesystem::equivalent(a, b, failed);
}

} // namespace planewright
