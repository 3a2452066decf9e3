// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"
#include "ui/files/descriptor.h"

#include <functional>
#include <vector>

namespace planewright {

/// A file, or ("-") standard input, read piece by piece into one buffer that is used again.
class FilePieces {
public:
  /// A Problem where it cannot be opened.
  static Result<FilePieces> of(const std::string& path);

  /// The next piece, which stands until the one after it is asked for; empty at the end, and where a signal
  /// broke the waiting and `goesOn` is false. A Problem where it cannot be read.
  Result<std::string_view> next(const std::function<bool()>& goesOn);
  /// Bytes of the whole file; 0 where nobody knows.
  std::size_t size() const { return m_size; }

private:
  FilePieces(std::string path, Descriptor file);

  std::string m_path;
  Descriptor m_file;
  std::size_t m_size = 0;
  std::vector<char> m_buffer;
};

} // namespace planewright
