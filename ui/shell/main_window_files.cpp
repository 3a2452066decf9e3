// SPDX-License-Identifier: GPL-3.0-or-later
// What the window has to do with files: opening, telling of them, and what ended unsaved.
#include "ui/figure/figure_dialog.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/sheet/sheet_dialog.h"
#include "ui/shell/help_key.h"
#include "ui/shell/main_window.h"
#include "ui/shell/preferences.h"
#include "ui/shell/problem_list.h"
#include "ui/shell/recent_files.h"
#include "ui/shell/unsaved_dialog.h"
#include "ui/shell/worked_example.h"

#include <QFileInfo>

namespace planewright {

bool MainWindow::open(const QString& path) {
  settleDrafts();
  return m_filing->open(path);
}

void MainWindow::beginStudy() {
  settleDrafts();
  m_filing->begin();
}

void MainWindow::openWorkedExample() {
  settleDrafts();
  m_filing->openUnnamed(workedExample());
}

void MainWindow::showFile(const QString& path) {
  m_trouble->hide();
  if (!path.isEmpty())
    rememberFile(path);
  listRecent();
  showTitle();
  if (m_figure)
    m_figure->setStudyFile(path);
  if (m_sheet)
    m_sheet->setStudyFile(path);
  if (m_filing->isReadOnly()) {
    m_trouble->say(tr("Open in another window: %1 is not saved over here.").arg(QFileInfo(path).fileName()),
                   Strip::Tone::wrong);
    m_trouble->offer(tr("Take over"), [this] { m_filing->takeOver(); });
  }
  if (const QString figure = m_filing->restoredFrom(); !figure.isEmpty()) {
    m_welcome->say(
        tr("Restored from %1. The study is in no file of its own yet.").arg(QFileInfo(figure).fileName()));
    m_welcome->offer(tr("Save as…"), [this] {
      settleDrafts();
      m_filing->saveAs();
    });
  } else if (m_desk.study() == preferredStudy()) {
    m_welcome->say(tr("A new study: type the stresses of your point."));
    m_welcome->offer(tr("Open the worked example"), [this] { openWorkedExample(); });
    m_welcome->offer(tr("Conventions in pictures"), [this] { m_help->show(QStringLiteral("conventions")); });
  } else if (isWorkedExample(m_desk.study())) {
    m_welcome->say(tr("Worked example, invented. Start your own: Ctrl+N."));
    m_welcome->offer(tr("New study"), [this] { beginStudy(); });
    m_welcome->offer(tr("Conventions in pictures"), [this] { m_help->show(QStringLiteral("conventions")); });
  } else {
    m_welcome->hide();
  }
}

void MainWindow::showTitle() {
  const QString name = m_filing->isReadOnly() ? tr("%1 (read-only)").arg(m_filing->name()) : m_filing->name();
  setWindowTitle(tr("%1[*] – Planewright").arg(name));
  setWindowModified(m_filing->hasChanges());
}

void MainWindow::showRefusal(const QString& path, const Problems& problems) {
  const QString file = QFileInfo(path).fileName();
  m_trouble->say(tr("%1: %2").arg(file, problems.empty() ? QString() : shown(problems.front())),
                 Strip::Tone::wrong);
  if (problems.size() > 1)
    m_trouble->offer(tr("All %1 problems").arg(problems.size()), [this, file, problems] {
      (new ProblemList(tr("Problems in %1").arg(file), problems, this))->show();
    });
}

void MainWindow::showUnsaved() {
  settleDrafts();
  if (m_unsaved)
    m_unsaved->list();
  else
    m_unsaved = new UnsavedDialog(*m_recovery, this);
  raised(*m_unsaved);
}

void MainWindow::offerUnsaved() {
  if (!m_recovery->left().empty())
    showUnsaved();
}

} // namespace planewright
