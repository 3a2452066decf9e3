// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/unsaved_study.h"
#include "ui/desk/desk.h"
#include "ui/files/document_lock.h"

#include <functional>

namespace planewright {

/// What to do with changes that are in no file yet.
enum class Unsaved { save, drop, stay };

/// What to do with a study that another window has open.
enum class Elsewhere { readOnly, takeOver, stay };

/// What saving meets in the place of the file that was read or saved last.
enum class Obstacle {
  changedOnDisk, ///< somebody else wrote it since
  openElsewhere  ///< another window has it open
};
/// What to do then.
enum class Overwrite { replace, saveAs, stay };

/// What is asked of the person at the window; an empty path means that they thought better of it.
struct FileQuestions {
  std::function<Unsaved(const QString& name)> aboutUnsaved;
  std::function<QString()> pathToOpen;
  std::function<QString(const QString& proposed)> pathToSave;
  std::function<QString()> pathToImport;
  std::function<QString(const QString& proposed)> pathToExport;
  std::function<Elsewhere(const QString& name, const Holder& holder)> aboutOpenElsewhere;
  std::function<Overwrite(const QString& name, Obstacle obstacle)> aboutObstacle;
};

/// A file that holds a table: its name, and what is in it.
struct TableFile {
  QString name;
  std::string bytes;
};

/// Brings studies from files to the desk and back. Whether there is something to save is what the undo stack
/// says: which point is shown does not count.
class Filing : public QObject {
  Q_OBJECT

public:
  Filing(Desk& desk, FileQuestions questions, QObject* parent = nullptr);

  /// The file of the study; empty while it has none.
  const QString& path() const { return m_path; }
  /// The figure or sheet that the study was taken out of; empty when it came otherwise or was saved since.
  const QString& restoredFrom() const { return m_restoredFrom; }
  /// The file's name without folder and ending, "Study from" a figure, or "New study".
  QString name() const;
  bool hasChanges() const { return !m_desk.undoStack()->isClean(); }
  /// The file is open elsewhere, and is not written over as long as this window has not taken it over.
  bool isReadOnly() const { return m_isReadOnly; }
  void takeOver();
  /// The study with what is known of its file.
  UnsavedStudy unsaved() const;

  /// A new study, when nothing is lost by it.
  bool begin();
  bool open();
  /// Also of a file that the person did not choose in a dialog: dropped, recent, named on the command line. A
  /// study that a figure carries belongs to no file and counts as unsaved, so that saving it leaves the
  /// figure as it is.
  bool open(const QString& path);
  /// Puts a study on the desk that belongs to no file.
  bool openUnnamed(Study study);
  /// Puts back a study whose changes were in no file; they still are not.
  void openUnsaved(const UnsavedStudy& unsaved);
  bool save();
  bool saveAs();
  /// A table of points that the person chooses; none when they thought better of it, or it was refused.
  std::optional<TableFile> readTable();
  /// Writes the stresses of all points as CSV.
  bool writeTable();
  /// Asks about unsaved changes; true when the study may go.
  bool mayLeave();

signals:
  /// Another study is on the desk.
  void begun();
  /// Another file, or the same one written.
  void fileChanged(const QString& path);
  /// The study is about to be written to its file.
  void saving();
  /// The person lets the changes go; the study still is on the desk.
  void dropped();
  /// A file that was not read or not written.
  void refused(const QString& path, const planewright::Problems& problems);

private:
  void put(Study study, const QString& path = {});
  /// Locks a file that is to be opened; none where the person wants to stay.
  struct Access {
    DocumentLock lock;
    bool isReadOnly = false;
  };
  std::optional<Access> accessTo(const QString& path);
  QString proposedPath() const;
  bool writeTo(const QString& path);
  /// Whether this stands against writing the study to a file; `lock` gets it where nobody else has it open.
  bool stands(Obstacle obstacle, const QString& path, DocumentLock& lock) const;
  /// Tells why a file was not written.
  bool isDone(const QString& path, const Result<void>& written);

  Desk& m_desk;
  FileQuestions m_questions;
  QString m_path;
  QString m_restoredFrom;
  std::string m_bytes; ///< of the file as it was read or saved last
  DocumentLock m_lock;
  bool m_isReadOnly = false;
};

} // namespace planewright
