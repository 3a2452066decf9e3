// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/problem.h"

namespace planewright {

inline constexpr std::string_view unsavedFormat = "planewright-unsaved";
inline constexpr int unsavedFileVersion = 1;

/// A study whose changes are in no file of the user's yet, as it is kept for the next start.
struct UnsavedStudy {
  std::string file;         ///< path of the file that it was read from or saved to last; may be empty
  std::string restoredFrom; ///< path of the figure or sheet that it was taken out of; may be empty
  std::string written;      ///< when, as ISO 8601 in UTC
  std::string saved;        ///< the bytes of `file` as they were read or saved last; may be empty
  Study study;
  bool operator==(const UnsavedStudy&) const = default;
};

/// The study as `saved` has it, or the new study where that is empty or does not read.
Study studyBefore(const UnsavedStudy& unsaved);

/// As UTF-8 JSON. `saved` is left out where the whole would be too large to be read again.
std::string writeUnsaved(const UnsavedStudy& unsaved);

/// Reads such a file as strictly as a study; Problems of the study inside have the lines of the study's text.
Results<UnsavedStudy> readUnsaved(std::string_view bytes);

} // namespace planewright
