// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_errors.h"

#include <cerrno>
#include <system_error>

namespace planewright {

namespace {

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

} // namespace

Problem unread(const std::string& path, int error) {
  return {path, 0, 0, "", PW_TEXT("File", "This cannot be read: %1.").with(reasonOf(error)), {}};
}

Problem unwritten(const std::string& path, int error) {
  return {path, 0, 0, "", PW_TEXT("File", "This could not be written: %1.").with(reasonOf(error)), {}};
}

} // namespace planewright
