// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/filing.h"

#include "core/record/copied_points.h"
#include "core/record/embedded_study.h"
#include "core/record/pasted_cells.h"
#include "core/record/study_file.h"
#include "ui/files/file_bytes.h"
#include "ui/look/look.h"
#include "ui/shell/preferences.h"
#include "ui/shell/table_words.h"

#include <QDateTime>
#include <QFileInfo>

namespace planewright {

namespace {

struct ReadFile {
  std::string bytes;
  OpenedStudy opened;
};

Results<ReadFile> fileAt(const QString& path) {
  Result<std::string> bytes = bytesOf(path.toStdString(), greatestCarrier);
  if (!bytes)
    return tl::unexpected(Problems{bytes.error()});
  Results<OpenedStudy> opened = openedStudy(*bytes);
  if (!opened)
    return tl::unexpected(std::move(opened).error());
  return ReadFile{*std::move(bytes), *std::move(opened)};
}

} // namespace

Filing::Filing(Desk& desk, FileQuestions questions, QObject* parent)
    : QObject(parent), m_desk(desk), m_questions(std::move(questions)) {}

QString Filing::name() const {
  if (!m_path.isEmpty())
    return QFileInfo(m_path).completeBaseName();
  return m_restoredFrom.isEmpty() ? tr("New study")
                                  : tr("Study from %1").arg(QFileInfo(m_restoredFrom).fileName());
}

bool Filing::begin() {
  return openUnnamed(preferredStudy());
}

bool Filing::open() {
  const QString path = m_questions.pathToOpen();
  return !path.isEmpty() && open(path);
}

bool Filing::open(const QString& path) {
  const auto refuse = [&](const Problems& problems) {
    Q_EMIT refused(path, problems);
    return false;
  };
  const Results<ReadFile> early = fileAt(path);
  if (!early)
    return refuse(early.error());
  const QString file = QFileInfo(path).absoluteFilePath();
  std::optional<Access> access = early->opened.isRestored ? Access{} : accessTo(file);
  if (!access || !mayLeave())
    return false;
  // Only now, for leaving may have saved to this very file.
  Results<ReadFile> read = fileAt(path);
  if (!read)
    return refuse(std::move(read).error());
  if (read->opened.isRestored) {
    m_restoredFrom = file;
    put(std::move(read->opened.study));
    return true;
  }
  // What was locked before stays locked where it is the same file.
  if (!m_lock.isOf(file))
    m_lock = std::move(access->lock);
  m_isReadOnly = access->isReadOnly;
  m_bytes = std::move(read->bytes);
  put(std::move(read->opened.study), file);
  return true;
}

std::optional<Filing::Access> Filing::accessTo(const QString& path) {
  Access access;
  if (m_lock.isOf(path) && m_lock.isOurs())
    return access;
  const std::optional<Holder> holder = DocumentLock::lock(path, access.lock);
  if (!holder)
    return access;
  switch (m_questions.aboutOpenElsewhere(QFileInfo(path).fileName(), *holder)) {
  case Elsewhere::readOnly:
    access.isReadOnly = true;
    return access;
  case Elsewhere::takeOver:
    DocumentLock::takeOver(path, access.lock);
    return access;
  case Elsewhere::stay:
    break;
  }
  return std::nullopt;
}

void Filing::takeOver() {
  DocumentLock::takeOver(m_path, m_lock);
  m_isReadOnly = false;
  Q_EMIT fileChanged(m_path);
}

bool Filing::openUnnamed(Study study) {
  if (!mayLeave())
    return false;
  put(std::move(study));
  return true;
}

UnsavedStudy Filing::unsaved() const {
  return {m_path.toStdString(), m_restoredFrom.toStdString(),
          QDateTime::currentDateTimeUtc().toString(Qt::ISODate).toStdString(), m_bytes, m_desk.study()};
}

// Its file is another window's as long as that has it open.
void Filing::openUnsaved(const UnsavedStudy& unsaved) {
  const QString path = fromUtf8(unsaved.file);
  m_restoredFrom = fromUtf8(unsaved.restoredFrom);
  m_lock = DocumentLock();
  m_isReadOnly = !path.isEmpty() && DocumentLock::lock(path, m_lock).has_value();
  m_bytes = unsaved.saved;
  put(unsaved.study, path);
  m_desk.undoStack()->resetClean();
  Q_EMIT fileChanged(m_path);
}

bool Filing::save() {
  return m_path.isEmpty() ? saveAs() : writeTo(m_path);
}

bool Filing::saveAs() {
  const QString path = m_questions.pathToSave(proposedPath());
  return !path.isEmpty() && writeTo(QFileInfo(path).absoluteFilePath());
}

QString Filing::proposedPath() const {
  if (!m_path.isEmpty())
    return m_path;
  if (m_restoredFrom.isEmpty())
    return tr("study.planewright");
  const QFileInfo figure(m_restoredFrom);
  return figure.path() + QLatin1Char('/') + figure.completeBaseName() + QStringLiteral(".planewright");
}

bool Filing::mayLeave() {
  if (!hasChanges())
    return true;
  switch (m_questions.aboutUnsaved(name())) {
  case Unsaved::save:
    return save();
  case Unsaved::drop:
    Q_EMIT dropped();
    return true;
  case Unsaved::stay:
    break;
  }
  return false;
}

void Filing::put(Study study, const QString& path) {
  m_path = path;
  if (path.isEmpty()) {
    m_bytes.clear();
    m_lock = DocumentLock();
    m_isReadOnly = false;
  } else {
    m_restoredFrom.clear();
  }
  m_desk.replace(std::move(study));
  if (!m_restoredFrom.isEmpty())
    m_desk.undoStack()->resetClean();
  Q_EMIT fileChanged(m_path);
  Q_EMIT begun();
}

std::optional<TableFile> Filing::readTable() {
  const QString path = m_questions.pathToImport();
  if (path.isEmpty())
    return std::nullopt;
  Result<std::string> bytes = bytesOf(path.toStdString(), greatestTable);
  if (bytes)
    return TableFile{QFileInfo(path).fileName(), *std::move(bytes)};
  Q_EMIT refused(path, {bytes.error()});
  return std::nullopt;
}

bool Filing::writeTable() {
  const QString beside = m_path.isEmpty() ? QString() : QFileInfo(m_path).path() + QLatin1Char('/');
  const QString path = m_questions.pathToExport(beside + tr("%1 points.csv").arg(name()));
  if (path.isEmpty() ||
      !isDone(path, writeAside(path.toStdString(), copiedPoints(m_desk.study().points, ','))))
    return false;
  m_desk.say(tr("The points are in %1.").arg(QFileInfo(path).fileName()) +
             leftOutInWords(m_desk.study().points));
  return true;
}

bool Filing::isDone(const QString& path, const Result<void>& written) {
  if (!written)
    Q_EMIT refused(path, {written.error()});
  return written.has_value();
}

bool Filing::stands(Obstacle obstacle, const QString& path, DocumentLock& lock) const {
  if (obstacle == Obstacle::openElsewhere)
    return DocumentLock::lock(path, lock).has_value();
  if (path != m_path)
    return false;
  const Result<std::string> there = bytesOf(m_path.toStdString(), greatestCarrier);
  return there ? *there != m_bytes : QFileInfo::exists(m_path);
}

bool Filing::writeTo(const QString& path) {
  DocumentLock newLock;
  DocumentLock& lock = m_lock.isOf(path) ? m_lock : newLock;
  for (const Obstacle obstacle : {Obstacle::openElsewhere, Obstacle::changedOnDisk}) {
    if (!stands(obstacle, path, lock))
      continue;
    const Overwrite answer = m_questions.aboutObstacle(QFileInfo(path).fileName(), obstacle);
    if (answer == Overwrite::saveAs)
      return saveAs();
    if (answer == Overwrite::stay)
      return false;
    if (obstacle == Obstacle::openElsewhere)
      DocumentLock::takeOver(path, lock);
  }
  Q_EMIT saving();
  std::string bytes = writeStudy(m_desk.study());
  if (!isDone(path, writeKeepingPrevious(path.toStdString(), bytes)))
    return false;
  if (&lock == &newLock)
    m_lock = std::move(newLock);
  m_isReadOnly = false;
  m_bytes = std::move(bytes);
  m_path = path;
  m_restoredFrom.clear();
  m_desk.undoStack()->setClean();
  Q_EMIT fileChanged(m_path);
  m_desk.say(tr("Saved as %1.").arg(QFileInfo(m_path).fileName()));
  return true;
}

} // namespace planewright
