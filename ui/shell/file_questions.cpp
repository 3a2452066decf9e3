// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/file_questions.h"

#include "ui/files/file_names.h"
#include "ui/files/folders.h"
#include "ui/shell/recent_files.h"

#include <QCoreApplication>
#include <QDir>
#include <QFileDialog>
#include <QMessageBox>
#include <QPushButton>

namespace planewright {

namespace {

QString words(const char* source) {
  return QCoreApplication::translate("FileQuestions", source);
}

QString filter() {
  return words(QT_TRANSLATE_NOOP("FileQuestions", "Studies (*.planewright);;All files (*)"));
}

/// A figure or a sheet may carry its study.
QString filterToOpen() {
  return words(QT_TRANSLATE_NOOP("FileQuestions",
                                 "Studies (*.planewright);;Figures and sheets with their study inside (*.svg "
                                 "*.pdf *.png *.html);;All files (*)"));
}

/// The folder that the user chose, else that of the newest file, else that of documents.
QString folder() {
  const QString chosen = chosenFolder(Folder::studies);
  return chosen.isEmpty() ? folderOf(recentFiles().value(0)) : chosen;
}

Unsaved askAboutUnsaved(QWidget& window, const QString& name) {
  QMessageBox box(
      QMessageBox::NoIcon, words(QT_TRANSLATE_NOOP("FileQuestions", "Unsaved changes")),
      words(QT_TRANSLATE_NOOP("FileQuestions", "“%1” has changes that are in no file.")).arg(name),
      QMessageBox::Save | QMessageBox::Discard | QMessageBox::Cancel, &window);
  box.setProperty("helpPlace", "files#unsaved");
  box.setInformativeText(words(QT_TRANSLATE_NOOP("FileQuestions", "Save them before going on?")));
  box.setDefaultButton(QMessageBox::Save);
  const int answer = box.exec();
  return answer == QMessageBox::Save      ? Unsaved::save
         : answer == QMessageBox::Discard ? Unsaved::drop
                                          : Unsaved::stay;
}

Elsewhere askAboutOpenElsewhere(QWidget& window, const QString& name, const Holder& holder) {
  QMessageBox box(
      QMessageBox::NoIcon, words(QT_TRANSLATE_NOOP("FileQuestions", "Open elsewhere")),
      words(QT_TRANSLATE_NOOP("FileQuestions", "“%1” is open in another window: process %2 on %3."))
          .arg(name)
          .arg(holder.process)
          .arg(holder.host),
      QMessageBox::Cancel, &window);
  box.setProperty("helpPlace", "files#locks");
  box.setInformativeText(words(QT_TRANSLATE_NOOP(
      "FileQuestions",
      "Read-only, it is not saved over here. Taken over, the other window is asked before it "
      "saves over it.")));
  const QPushButton* readOnly =
      box.addButton(words(QT_TRANSLATE_NOOP("FileQuestions", "Open &read-only")), QMessageBox::AcceptRole);
  const QPushButton* takeOver =
      box.addButton(words(QT_TRANSLATE_NOOP("FileQuestions", "&Take over")), QMessageBox::DestructiveRole);
  box.exec();
  return box.clickedButton() == readOnly   ? Elsewhere::readOnly
         : box.clickedButton() == takeOver ? Elsewhere::takeOver
                                           : Elsewhere::stay;
}

Overwrite askAboutObstacle(QWidget& window, const QString& name, Obstacle obstacle) {
  const bool isOpen = obstacle == Obstacle::openElsewhere;
  QMessageBox box(
      QMessageBox::NoIcon, words(QT_TRANSLATE_NOOP("FileQuestions", "Save over it?")),
      (isOpen ? words(QT_TRANSLATE_NOOP("FileQuestions", "“%1” is open in another window."))
              : words(QT_TRANSLATE_NOOP("FileQuestions",
                                        "“%1” was changed on the disk since it was opened or saved here.")))
          .arg(name),
      QMessageBox::Cancel, &window);
  box.setProperty("helpPlace", "files#changed");
  box.setInformativeText(words(QT_TRANSLATE_NOOP(
      "FileQuestions", "What is saved over stays beside it, with a tilde (~) behind its name.")));
  const QPushButton* saveAs =
      box.addButton(words(QT_TRANSLATE_NOOP("FileQuestions", "Save &as…")), QMessageBox::AcceptRole);
  const QPushButton* replace =
      box.addButton(isOpen ? words(QT_TRANSLATE_NOOP("FileQuestions", "&Take over and save"))
                           : words(QT_TRANSLATE_NOOP("FileQuestions", "Save &over it")),
                    QMessageBox::DestructiveRole);
  box.exec();
  return box.clickedButton() == saveAs    ? Overwrite::saveAs
         : box.clickedButton() == replace ? Overwrite::replace
                                          : Overwrite::stay;
}

QString askPathToOpen(QWidget& window) {
  return QFileDialog::getOpenFileName(&window, words(QT_TRANSLATE_NOOP("FileQuestions", "Open a study")),
                                      folder(), filterToOpen());
}

QString tableFilter() {
  return words(QT_TRANSLATE_NOOP("FileQuestions", "Tables (*.csv *.tsv *.txt);;All files (*)"));
}

QString askPathToImport(QWidget& window) {
  return QFileDialog::getOpenFileName(&window, words(QT_TRANSLATE_NOOP("FileQuestions", "Import points")),
                                      folder(), tableFilter());
}

QString askPathToWrite(QWidget& window, const QString& title, const QString& filters, const QString& suffix,
                       const QString& proposed) {
  const QString start = QFileInfo(proposed).isAbsolute() ? proposed : QDir(folder()).filePath(proposed);
  QFileDialog dialog(&window, title, QFileInfo(start).absolutePath(), filters);
  dialog.setAcceptMode(QFileDialog::AcceptSave);
  dialog.setDefaultSuffix(suffix);
  dialog.selectFile(QFileInfo(start).fileName());
  return dialog.exec() == QDialog::Accepted ? dialog.selectedFiles().value(0) : QString();
}

QString askPathToSave(QWidget& window, const QString& proposed) {
  return askPathToWrite(window, words(QT_TRANSLATE_NOOP("FileQuestions", "Save the study as")), filter(),
                        QStringLiteral("planewright"), proposed);
}

QString askPathToExport(QWidget& window, const QString& proposed) {
  return askPathToWrite(window, words(QT_TRANSLATE_NOOP("FileQuestions", "Export the points")), tableFilter(),
                        QStringLiteral("csv"), proposed);
}

} // namespace

FileQuestions askedOver(QWidget& window) {
  return {
      [&window](const QString& name) { return askAboutUnsaved(window, name); },
      [&window] { return askPathToOpen(window); },
      [&window](const QString& proposed) { return askPathToSave(window, proposed); },
      [&window] { return askPathToImport(window); },
      [&window](const QString& proposed) { return askPathToExport(window, proposed); },
      [&window](const QString& name, const Holder& holder) {
        return askAboutOpenElsewhere(window, name, holder);
      },
      [&window](const QString& name, Obstacle obstacle) { return askAboutObstacle(window, name, obstacle); }};
}

} // namespace planewright
