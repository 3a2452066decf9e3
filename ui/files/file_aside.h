// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"
#include "ui/files/descriptor.h"

#include <optional>

#include <sys/types.h>

namespace planewright {

/// A file that is written piece by piece aside in its folder, and put in the place of the old one when it is
/// whole: at every moment the old or the new bytes stand there whole. A link stays a link and the old file's
/// permissions stay. What is no plain file (a pipe, a device) is written to directly.
class FileAside {
public:
  /// A Problem where nothing can be written there.
  static Result<FileAside> to(const std::string& path);
  FileAside(FileAside&& other) noexcept;
  FileAside& operator=(FileAside&&) = delete;
  /// What was not finished is gone.
  ~FileAside();

  /// The old file will stay beside the new one, under its name with a tilde behind it.
  void keepPrevious() { m_keepsPrevious = true; }
  Result<void> write(std::string_view bytes);
  /// Syncs what was written and puts it in place. After a Problem nothing more can be done with it.
  Result<void> finish();

private:
  explicit FileAside(std::string path) : m_path(std::move(path)) {}
  int errorOfOpening();
  int errorOfOpeningAside(mode_t mode);
  int errorOfPutting();

  std::string m_path;           ///< as it was given
  std::string m_target;         ///< where its links lead
  std::string m_aside;          ///< empty where the target is written to directly, and when it is in place
  std::optional<mode_t> m_mode; ///< of the old file
  bool m_keepsPrevious = false;
  Descriptor m_file;
};

/// Writes all bytes to an open descriptor; 0 or the error of the system.
int errorOfWriting(int descriptor, std::string_view bytes);

} // namespace planewright
