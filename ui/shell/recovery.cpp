// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/recovery.h"

#include "ui/files/file_bytes.h"

#include <filesystem>

namespace planewright {

namespace {

constexpr int afterEdit = 300; // ms, so that with the writing it is well within a second

/// Writes the study to its place, or takes away what is there where nothing is unsaved.
Result<void> keptAt(const std::string& path, const std::optional<UnsavedStudy>& unsaved) {
  if (unsaved)
    return writeAside(path, writeUnsaved(*unsaved));
  std::error_code failed;
  std::filesystem::remove(path, failed);
  return {};
}

} // namespace

Recovery::Recovery(Desk& desk, Filing& filing, std::string folder, QObject* parent)
    : QObject(parent), m_filing(filing), m_folder(std::move(folder)) {
  m_due.setSingleShot(true);
  m_due.setInterval(afterEdit);
  connect(&m_due, &QTimer::timeout, this, &Recovery::keep);
  connect(&desk, &Desk::changed, this, &Recovery::note);
  connect(&filing, &Filing::fileChanged, this, &Recovery::note);
  // Killed between the writing of the file and the taking away of the unsaved study, the two are then equal.
  connect(&filing, &Filing::saving, this, &Recovery::settle);
  connect(&filing, &Filing::dropped, this, &Recovery::discardHere);
}

Recovery::~Recovery() {
  if (!m_isDropped)
    settle();
}

// Edits that follow one another do not put off the writing.
void Recovery::note() {
  m_isDropped = false;
  if (!m_due.isActive())
    m_due.start();
}

std::optional<UnsavedStudy> Recovery::unsaved() const {
  return m_filing.hasChanges() ? std::optional(m_filing.unsaved()) : std::nullopt;
}

bool Recovery::hasPlace() {
  if (m_place)
    return true;
  Result<RecoveryPlace> place = RecoveryPlace::in(m_folder);
  if (place)
    m_place.emplace(*std::move(place));
  else
    tell(tl::unexpected(place.error()));
  return m_place.has_value();
}

void Recovery::keep() {
  std::optional<UnsavedStudy> unsaved = this->unsaved();
  // As long as nothing was ever unsaved the disk is left alone.
  if ((!unsaved && !m_place) || !hasPlace())
    return;
  if (!m_work)
    m_work.emplace();
  m_work->run(
      [this, path = m_place->path(), unsaved = std::move(unsaved)](const std::stop_token&) -> Beside::Then {
        Result<void> outcome = keptAt(path, unsaved);
        return [this, outcome = std::move(outcome)] { tell(outcome); };
      });
}

void Recovery::settle() {
  m_due.stop();
  m_work.reset();
  const std::optional<UnsavedStudy> unsaved = this->unsaved();
  if ((unsaved || m_place) && hasPlace())
    tell(keptAt(m_place->path(), unsaved));
}

void Recovery::tell(const Result<void>& outcome) {
  const bool wasTroubled = std::exchange(m_isTroubled, !outcome);
  if (!outcome && !wasTroubled)
    Q_EMIT troubled(outcome.error());
}

void Recovery::discardHere() {
  settle();
  if (m_place)
    tell(discard(m_folder, m_place->path()));
  m_isDropped = true;
}

bool Recovery::open(const LeftStudy& left) {
  if (!left.study || !m_filing.mayLeave() || !hasPlace())
    return false;
  m_due.stop();
  m_work.reset();
  if (const Result<void> taken = takeStudy(left.path, *m_place); !taken) {
    Q_EMIT troubled(taken.error());
    return false;
  }
  m_filing.openUnsaved(*left.study);
  return true;
}

void Recovery::discardLeft(const LeftStudy& left) {
  tell(discard(m_folder, left.path));
}

} // namespace planewright
