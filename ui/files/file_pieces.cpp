// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_pieces.h"

#include "ui/files/file_errors.h"

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

namespace planewright {

namespace {
constexpr std::size_t pieceSize = std::size_t{1} << 20;
}

FilePieces::FilePieces(std::string path, Descriptor file)
    : m_path(std::move(path)), m_file(std::move(file)), m_buffer(pieceSize) {
  struct stat status {};
  if (::fstat(m_file.number(), &status) == 0 && S_ISREG(status.st_mode))
    m_size = static_cast<std::size_t>(status.st_size);
}

Result<FilePieces> FilePieces::of(const std::string& path) {
  const bool isInput = path == "-";
  Descriptor file(isInput ? ::fcntl(STDIN_FILENO, F_DUPFD_CLOEXEC, 0)
                          : ::open(path.c_str(), O_RDONLY | O_CLOEXEC));
  if (!file)
    return tl::unexpected(unread(isInput ? "standard input" : path, errno));
  return FilePieces(isInput ? "standard input" : path, std::move(file));
}

Result<std::string_view> FilePieces::next(const std::function<bool()>& goesOn) {
  for (;;) {
    const ssize_t count = ::read(m_file.number(), m_buffer.data(), m_buffer.size());
    if (count >= 0)
      return std::string_view(m_buffer.data(), static_cast<std::size_t>(count));
    if (errno != EINTR)
      return tl::unexpected(unread(m_path, errno));
    if (!goesOn())
      return std::string_view();
  }
}

} // namespace planewright
