// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/filing.h"

#include "core/record/copied_points.h"
#include "core/record/embedded_study.h"
#include "core/record/pasted_cells.h"
#include "core/record/study_file.h"
#include "ui/files/file_bytes.h"
#include "ui/shell/table_words.h"

#include <QFileInfo>

namespace planewright {

namespace {

Results<OpenedStudy> studyIn(const QString& path) {
  const Result<std::string> bytes = bytesOf(path.toStdString(), greatestCarrier);
  if (!bytes)
    return tl::unexpected(Problems{bytes.error()});
  return openedStudy(*bytes);
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
  return openUnnamed(newStudy());
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
  if (Results<OpenedStudy> early = studyIn(path); !early)
    return refuse(std::move(early).error());
  if (!mayLeave())
    return false;
  // Only now, for leaving may have saved to this very file.
  Results<OpenedStudy> opened = studyIn(path);
  if (!opened)
    return refuse(std::move(opened).error());
  const QString file = QFileInfo(path).absoluteFilePath();
  if (opened->isRestored)
    put(std::move(opened->study), {}, file);
  else
    put(std::move(opened->study), file);
  return true;
}

bool Filing::openUnnamed(Study study) {
  if (!mayLeave())
    return false;
  put(std::move(study), {});
  return true;
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
    return true;
  case Unsaved::stay:
    break;
  }
  return false;
}

void Filing::put(Study study, const QString& path, const QString& restoredFrom) {
  m_path = path;
  m_restoredFrom = restoredFrom;
  m_desk.replace(std::move(study));
  if (!restoredFrom.isEmpty())
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
  if (path.isEmpty() || !writeBytes(path, copiedPoints(m_desk.study().points, ',')))
    return false;
  m_desk.say(tr("The points are in %1.").arg(QFileInfo(path).fileName()) +
             leftOutInWords(m_desk.study().points));
  return true;
}

bool Filing::writeBytes(const QString& path, const std::string& bytes) {
  const Result<void> written = writeAside(path.toStdString(), bytes);
  if (!written)
    Q_EMIT refused(path, {written.error()});
  return written.has_value();
}

bool Filing::writeTo(const QString& path) {
  if (!writeBytes(path, writeStudy(m_desk.study())))
    return false;
  m_path = path;
  m_restoredFrom.clear();
  m_desk.undoStack()->setClean();
  Q_EMIT fileChanged(m_path);
  m_desk.say(tr("Saved as %1.").arg(QFileInfo(m_path).fileName()));
  return true;
}

} // namespace planewright
