// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/json.h"

namespace planewright {

/// What the first two keys of a file say.
struct FileHead {
  std::string_view format;
  int version; ///< the newest that is read
  Text isNone; ///< of a file of another format
  Text mend;   ///< with %1 for the format
};

/// Tells why the file is not one of this kind that this program reads.
void checkHead(const Json& root, const FileHead& head, FileProblems& problems);

} // namespace planewright
