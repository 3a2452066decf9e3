// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <functional>

namespace planewright {

/// What to do with changes that are in no file yet.
enum class Unsaved { save, drop, stay };

/// What is asked of the person at the window; an empty path means that they thought better of it.
struct FileQuestions {
  std::function<Unsaved(const QString& name)> aboutUnsaved;
  std::function<QString()> pathToOpen;
  std::function<QString(const QString& proposed)> pathToSave;
  std::function<QString()> pathToImport;
  std::function<QString(const QString& proposed)> pathToExport;
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

  /// A new study, when nothing is lost by it.
  bool begin();
  bool open();
  /// Also of a file that the person did not choose in a dialog: dropped, recent, named on the command line. A
  /// study that a figure carries belongs to no file and counts as unsaved, so that saving it leaves the
  /// figure as it is.
  bool open(const QString& path);
  /// Puts a study on the desk that belongs to no file.
  bool openUnnamed(Study study);
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
  /// A file that was not read or not written.
  void refused(const QString& path, const planewright::Problems& problems);

private:
  void put(Study study, const QString& path, const QString& restoredFrom = {});
  QString proposedPath() const;
  bool writeTo(const QString& path);
  bool writeBytes(const QString& path, const std::string& bytes);

  Desk& m_desk;
  FileQuestions m_questions;
  QString m_path;
  QString m_restoredFrom;
};

} // namespace planewright
