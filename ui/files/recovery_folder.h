// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/unsaved_study.h"
#include "ui/files/descriptor.h"

#include <chrono>
#include <optional>

namespace planewright {

/// Where unsaved studies are kept: a folder beside the settings.
std::string recoveryPath();

/// The place of one window in the folder of unsaved studies: a file for its study, and a locked one beside it
/// that tells other windows, also after a crash of this one, whose it is.
class RecoveryPlace {
public:
  /// Makes the folder too. A Problem where nothing can be written there.
  static Result<RecoveryPlace> in(const std::string& folder);
  RecoveryPlace(RecoveryPlace&&) noexcept = default;
  RecoveryPlace& operator=(RecoveryPlace&&) = delete;
  /// The lock is gone; a study that is still there is left to the next start.
  ~RecoveryPlace();

  /// The file of the study; there is none as long as nothing is unsaved.
  const std::string& path() const { return m_path; }

private:
  RecoveryPlace(std::string path, std::string lock, Descriptor held)
      : m_path(std::move(path)), m_lock(std::move(lock)), m_held(std::move(held)) {}

  std::string m_path;
  std::string m_lock;
  Descriptor m_held;
};

/// An unsaved study in the folder.
struct LeftStudy {
  std::string path;
  Results<UnsavedStudy> study;
};

/// The unsaved studies that no window holds, the newest first. What windows that ended left besides is
/// cleared away, also a study that is in its file as it is.
std::vector<LeftStudy> leftStudies(const std::string& folder);

/// Unsaved studies that were discarded, the newest first.
std::vector<LeftStudy> discardedStudies(const std::string& folder);

/// How long a discarded study can still be found.
inline constexpr std::chrono::days keptDiscarded{30};
/// Puts an unsaved study among the discarded ones; nothing where there is none at `path`. Those discarded
/// longer ago than keptDiscarded by the clock `now` are removed.
Result<void> discard(const std::string& folder, const std::string& path,
                     std::chrono::system_clock::time_point now = std::chrono::system_clock::now());

/// Puts an unsaved or discarded study into a place; of two windows that try, one does. A Problem where it is
/// not there any more.
Result<void> takeStudy(const std::string& path, const RecoveryPlace& place);

} // namespace planewright
