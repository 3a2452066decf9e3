// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/version.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/figure/figure_sharing.h"
#include "ui/given/given_panel.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_panel.h"
#include "ui/screen/screen_dialog.h"
#include "ui/sheet/evidence_dialog.h"
#include "ui/sheet/sheet_dialog.h"
#include "ui/shell/appearance.h"
#include "ui/shell/areas.h"
#include "ui/shell/body.h"
#include "ui/shell/build_dialog.h"
#include "ui/shell/governing_words.h"
#include "ui/shell/help_key.h"
#include "ui/shell/main_window.h"
#include "ui/shell/materials_dialog.h"
#include "ui/shell/picker.h"
#include "ui/shell/preferences_dialog.h"
#include "ui/shell/recent_files.h"
#include "ui/shell/slip_dialog.h"
#include "ui/shell/state_bar.h"
#include "ui/shell/things_dialog.h"
#include "ui/shell/title_dialog.h"
#include "ui/shell/working_dialog.h"

#include <QActionGroup>
#include <QApplication>
#include <QFileInfo>
#include <QKeyEvent>
#include <QMenuBar>
#include <QMessageBox>

namespace planewright {

template <class Act>
QAction* MainWindow::add(QMenu& menu, const QString& words, const QKeySequence& keys, Act act) {
  QAction* action = menu.addAction(words, this, act);
  action->setShortcut(keys);
  return action;
}

void MainWindow::raised(QDialog& dialog) {
  dialog.show();
  dialog.raise();
  dialog.activateWindow();
}

template <class Dialog, class... More>
void MainWindow::bringUp(QPointer<Dialog>& dialog, const More&... more) {
  if (!dialog)
    dialog = new Dialog(m_desk, more..., this);
  raised(*dialog);
}

void MainWindow::addFileMenu() {
  QMenu& menu = *menuBar()->addMenu(tr("&File"));
  add(menu, tr("&New"), QKeySequence::New, [this] { beginStudy(); });
  add(menu, tr("&Open…"), QKeySequence::Open, [this] {
    settleDrafts();
    m_filing->open();
  });
  m_recent = menu.addMenu(tr("Open &recent"));
  connect(m_recent, &QMenu::aboutToShow, this, &MainWindow::listRecent);
  listRecent();
  add(menu, tr("&Unsaved studies…"), {}, [this] { showUnsaved(); });
  menu.addSeparator();
  add(menu, tr("&Save"), QKeySequence::Save, [this] {
    settleDrafts();
    m_filing->save();
  });
  add(menu, tr("Save &as…"), Qt::CTRL | Qt::SHIFT | Qt::Key_S, [this] {
    settleDrafts();
    m_filing->saveAs();
  });
  menu.addSeparator();
  add(menu, tr("&Import points…"), {}, [this] { importPoints(); });
  add(menu, tr("Export poin&ts…"), {}, [this] {
    settleDrafts();
    m_filing->writeTable();
  });
  add(menu, tr("S&creen points…"), {}, [this] { screenPoints(); });
  menu.addSeparator();
  add(menu, tr("&Export figure…"), Qt::CTRL | Qt::Key_E, [this] { arrangeFigure(); });
  add(menu, tr("Copy fi&gure"), {}, [this] { copyFigureNow(); });
  add(menu, tr("&Print figure…"), QKeySequence::Print, [this] { printFigureNow(); });
  menu.addSeparator();
  add(menu, tr("Calculation s&heet…"), Qt::CTRL | Qt::SHIFT | Qt::Key_E, [this] { showSheet(); });
  menu.addSeparator();
  add(menu, tr("&Quit"), QKeySequence(Qt::CTRL | Qt::Key_Q), [this] { close(); });
}

void MainWindow::listRecent() {
  m_recent->clear();
  for (const QString& file : recentFiles())
    m_recent->addAction(nameForMenu(QFileInfo(file).fileName()), this, [this, file] { open(file); })
        ->setToolTip(file);
  m_recent->setToolTipsVisible(true);
  m_recent->setEnabled(!m_recent->isEmpty());
}

void MainWindow::addEditMenu() {
  QMenu& menu = *menuBar()->addMenu(tr("&Edit"));
  QAction* undo = m_desk.undoStack()->createUndoAction(this, tr("&Undo"));
  undo->setShortcut(QKeySequence::Undo);
  QAction* redo = m_desk.undoStack()->createRedoAction(this, tr("&Redo"));
  redo->setShortcut(QKeySequence::Redo);
  menu.addAction(undo);
  menu.addAction(redo);
  menu.addSeparator();
  add(menu, tr("&Copy"), QKeySequence::Copy, [this] { copyFromFocus(); });
  menu.addSeparator();
  add(menu, tr("Copy stresses of &this point"), {}, [this] {
    settleDrafts();
    const Point& point = shownPoint(m_desk.study());
    copyStresses({point}, tr("The stresses of %1 are on the clipboard.").arg(fromUtf8(point.name)));
  });
  add(menu, tr("Copy stresses of &all points"), {}, [this] {
    settleDrafts();
    copyStresses(m_desk.study().points, tr("The stresses of all points are on the clipboard."));
  });
  add(menu, tr("Copy table of planes as &Markdown"), {}, [this] {
    settleDrafts();
    m_planes->shownTable().copyMarkdown();
    m_desk.say(tr("The table is on the clipboard, as Markdown."));
  });
  add(menu, tr("Copy table of planes as &LaTeX rows"), {}, [this] {
    settleDrafts();
    m_planes->shownTable().copyLatex();
    m_desk.say(tr("The table is on the clipboard, as rows for LaTeX."));
  });
  menu.addSeparator();
  add(menu, tr("Paste ta&ble…"), Qt::CTRL | Qt::SHIFT | Qt::Key_V, [this] { pasteTable(); });
  menu.addSeparator();
  add(menu, tr("Pre&ferences…"), QKeySequence::Preferences, [this] { showPreferences(); });
}

void MainWindow::addStudyMenu() {
  QMenu& menu = *menuBar()->addMenu(tr("&Study"));
  add(menu, tr("&Title block…"), {}, [this] { bringUp(m_title); });
  add(menu, tr("&Stresses"), {}, [this] { m_given->focusFirst(); });
  add(menu, tr("&Units and conventions"), {}, [this] { m_given->focusConventions(); });
  menu.addSeparator();
  add(menu, tr("&Next entry not taken"), Qt::Key_F8, [this] { m_given->focusNextProblem(); });
  add(menu, tr("&Previous entry not taken"), Qt::SHIFT | Qt::Key_F8,
      [this] { m_given->focusPreviousProblem(); });
  menu.addSeparator();
  addListsOfStudy(menu);
  add(menu, tr("Co&mpare somebody else's number…"), {}, [this] { bringUp(m_slips); });
  add(menu, tr("&Working of the shown stresses…"), {}, [this] { bringUp(m_working); });
  menu.addSeparator();
  Picker* points = &m_stateBar->points();
  Picker* combinations = &m_stateBar->combinations();
  add(menu, tr("Previous point"), Qt::CTRL | Qt::Key_PageUp, [this, points] {
    settleDrafts();
    points->previous();
  });
  add(menu, tr("Next point"), Qt::CTRL | Qt::Key_PageDown, [this, points] {
    settleDrafts();
    points->next();
  });
  add(menu, tr("Previous combination"), Qt::ALT | Qt::Key_PageUp,
      [combinations] { combinations->previous(); });
  add(menu, tr("Next combination"), Qt::ALT | Qt::Key_PageDown, [combinations] { combinations->next(); });
  add(menu, tr("&Governing combination here"), Qt::CTRL | Qt::Key_G,
      [this] { showGoverningCombination(m_desk); });
  add(menu, tr("Governing point and combination"), Qt::CTRL | Qt::SHIFT | Qt::Key_G, [this] {
    settleDrafts();
    showGoverningPoint(m_desk);
  });
}

void MainWindow::addListsOfStudy(QMenu& menu) {
  const auto open = [this](QPointer<ThingsDialog>& dialog, Things (*things)()) {
    settleDrafts();
    if (!dialog)
      dialog = new ThingsDialog(m_desk, things(), this);
    raised(*dialog);
  };
  add(menu, tr("P&oints…"), {}, [this, open] { open(m_points, points); });
  add(menu, tr("S&ections…"), {}, [this, open] { open(m_sections, sections); });
  add(menu, tr("&Load cases…"), {}, [this, open] { open(m_cases, loadCases); });
  add(menu, tr("&Combinations…"), {}, [this, open] { open(m_combinations, combinations); });
  add(menu, tr("&Build combinations…"), {}, [this] {
    settleDrafts();
    auto* dialog = findChild<BuildDialog*>();
    if (!dialog)
      dialog = new BuildDialog(m_desk, this);
    dialog->show();
    dialog->activateWindow();
  });
  add(menu, tr("Mate&rials…"), {}, [this] { showMaterials(); });
}

void MainWindow::showMaterials() {
  settleDrafts();
  bringUp(m_materials, ownMaterialsPath());
}

void MainWindow::addViewMenu() {
  QMenu& menu = *menuBar()->addMenu(tr("&View"));
  add(menu, tr("Show &given arrows"), {}, [this](bool shown) {
    m_element->setShowGivenArrows(shown);
  })->setCheckable(true);
  QAction* snapping =
      add(menu, tr("&Snap to named directions"), {}, [this](bool on) { m_element->setSnapping(on); });
  snapping->setCheckable(true);
  snapping->setChecked(m_element->snaps());
  add(menu, tr("&Point"), Qt::CTRL | Qt::Key_1, [this] { showPointPage(); });
  add(menu, tr("Su&mmary of all points"), Qt::CTRL | Qt::Key_2, [this] { showSummary(); });
  menu.addSeparator();
  add(menu, tr("&Fit the circle"), Qt::CTRL | Qt::Key_0, [this] { m_circle->fit(); });
  menu.addSeparator();
  add(menu, tr("Next area"), Qt::Key_F6, [this] { m_areas->next(); });
  add(menu, tr("Previous area"), Qt::SHIFT | Qt::Key_F6, [this] { m_areas->previous(); });
  add(menu, tr("&Usual sizes of the panels"), {}, [this] { m_body->resetSizes(); });
  menu.addSeparator();
  addAppearanceMenu(*menu.addMenu(tr("&Appearance")));
  QAction* full = add(menu, tr("Fu&ll screen"), Qt::Key_F11,
                      [this](bool on) { setWindowState(windowState().setFlag(Qt::WindowFullScreen, on)); });
  full->setCheckable(true);
}

void MainWindow::addAppearanceMenu(QMenu& menu) {
  auto* group = new QActionGroup(this);
  for (const auto& [appearance, words] : {std::pair{Appearance::system, tr("As the &system")},
                                          {Appearance::light, tr("&Light")},
                                          {Appearance::dark, tr("&Dark")},
                                          {Appearance::contrast, tr("High &contrast")}}) {
    QAction* action =
        menu.addAction(words, this, [appearance = appearance] { chooseAppearance(appearance); });
    action->setCheckable(true);
    action->setChecked(appearance == chosenAppearance());
    group->addAction(action);
  }
}

void MainWindow::addHelpMenu() {
  QMenu& menu = *menuBar()->addMenu(tr("&Help"));
  add(menu, tr("&Help on this place"), QKeySequence::HelpContents, [this] { m_help->showForFocus(); });
  menu.addSeparator();
  add(menu, tr("Hand&book"), {}, [this] { m_help->show(QStringLiteral("first-figure")); });
  add(menu, tr("&Keys"), {}, [this] { m_help->show(QStringLiteral("keys")); });
  add(menu, tr("&Cautions"), {}, [this] { m_help->show(QStringLiteral("cautions")); });
  menu.addSeparator();
  add(menu, tr("Published &values, recomputed…"), {}, [this] { showEvidence(); });
  menu.addAction(tr("&Worked example"), this, &MainWindow::openWorkedExample);
  menu.addAction(tr("&About Planewright"), this, &MainWindow::showAbout);
}

// Told to the widgets themselves: to the application the key would be this command again, without an end.
void MainWindow::copyFromFocus() {
  QKeyEvent copy(QEvent::KeyPress, Qt::Key_C, Qt::ControlModifier);
  for (QWidget* widget = QApplication::focusWidget(); widget && widget != this;
       widget = widget->parentWidget()) {
    copy.accept();
    static_cast<QObject*>(widget)->event(&copy);
    if (copy.isAccepted())
      return;
  }
}

void MainWindow::showPreferences() {
  settleDrafts();
  if (m_preferences)
    m_preferences->close();
  m_preferences = new PreferencesDialog(this);
  m_preferences->setAttribute(Qt::WA_DeleteOnClose);
  connect(m_preferences, &PreferencesDialog::kept, this, [this](bool needsStart) {
    m_desk.say(needsStart ? tr("The preferences are kept. The language changes with the next start.")
                          : tr("The preferences are kept."));
  });
  raised(*m_preferences);
}

void MainWindow::showSheet() {
  settleDrafts();
  if (!m_sheet) {
    m_sheet = new SheetDialog(m_desk, this);
    connect(m_sheet, &SheetDialog::titleAsked, this, [this] { bringUp(m_title); });
    m_sheet->setStudyFile(m_filing->path());
  }
  bringUp(m_sheet);
}

void MainWindow::showEvidence() {
  if (!m_evidence)
    m_evidence = new EvidenceDialog(this);
  raised(*m_evidence);
}

void MainWindow::screenPoints() {
  settleDrafts();
  if (!m_screen) {
    m_screen = new ScreenDialog(m_desk);
    connect(m_screen, &ScreenDialog::opened, this, [this] {
      showPointPage();
      activateWindow();
      raise();
    });
  }
  raised(*m_screen);
}

void MainWindow::copyFigureNow() {
  settleDrafts();
  const Result<void> copied = copyFigure(m_desk, m_filing->path());
  m_desk.say(copied ? tr("The figure is on the clipboard.") : shown(copied.error()));
}

void MainWindow::printFigureNow() {
  settleDrafts();
  const Result<QString> printed = printFigure(m_desk, m_filing->path(), this);
  if (!printed)
    m_trouble->say(shown(printed.error()), Strip::Tone::wrong);
  else if (!printed->isEmpty())
    m_desk.say(*printed);
}

void MainWindow::showAbout() {
  QMessageBox::about(
      this, tr("About Planewright"),
      tr("<h3>Planewright %1</h3>"
         "<p>Plane stress at a point, resolved to the line that matters.</p>"
         "<p>An aid to a licensed engineer; the code that governs locally decides.</p>"
         "<p>Free software under the GNU General Public License, version 3 or later; there is no "
         "warranty. Built with Qt. Set in Liberation Sans, under the SIL Open Font License 1.1.</p>")
          .arg(fromUtf8(std::string(programVersion()))));
}

} // namespace planewright
