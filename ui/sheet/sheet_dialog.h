// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/sheet/sheet_run.h"
#include "ui/sheet/sheet_settings.h"

#include <QDialog>
#include <QTimer>

class QHBoxLayout;
class QLabel;
class QPrinter;

namespace planewright {

class SheetOptions;
class SheetPreview;

/// The calculation sheet: follows the study soon after it changes, shows the pages as they will be, saves
/// them as PDF or HTML and prints them. It opens with the choices used last.
class SheetDialog : public QDialog {
  Q_OBJECT

public:
  explicit SheetDialog(Desk& desk, QWidget* parent = nullptr);

  /// Where the study is saved; empty while it is not. Sheets are offered beside it and bear its name.
  void setStudyFile(const QString& path);

  SheetPreview& preview() const { return *m_preview; }
  /// Whether the pages that are shown are those of the study as it is now.
  bool isUpToDate() const { return !m_soon.isActive() && !m_run->isRunning(); }
  SheetOptions& options() const { return *m_options; }

  /// Compares with the study in this file, which is an earlier revision; its changes become a section.
  Result<void> compareWith(const QString& path);

  /// Saves the sheet as it is now, as HTML where the name ends with .html, else as PDF.
  Result<void> saveTo(const QString& path);
  /// Prints all pages.
  Result<void> printTo(QPrinter& printer);

signals:
  /// The user wants to fill in the title block.
  void titleAsked();

protected:
  void showEvent(QShowEvent* event) override;

private:
  void build();
  QHBoxLayout* footer();
  void addButton(QHBoxLayout& row, const QString& words, void (SheetDialog::*act)());
  void arrange();
  void refresh();
  void say(const QString& sentence, bool isWrong = false);
  void take(const MadeSheet& made);
  SheetOrder order() const;
  Sheet sheet() const;
  QString offeredPath(const QString& ending) const;
  void save(const QString& ending, const QString& kind);
  void savePdf();
  void saveHtml();
  void print();
  void compare();

  Desk& m_desk;
  QString m_studyFile;
  SheetOptions* m_options = nullptr;
  SheetPreview* m_preview = nullptr;
  QLabel* m_routes = nullptr;     ///< how the two routes agree on the pages that are shown
  QLabel* m_sentence = nullptr;   ///< what came of the last action
  std::optional<Study> m_earlier; ///< the revision that the sheet is compared with
  QString m_earlierFile;
  SheetRun* m_run = nullptr;
  QTimer m_soon; ///< a long sheet is not made anew for each step of a drag
};

} // namespace planewright
