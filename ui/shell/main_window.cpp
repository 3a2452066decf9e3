// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/main_window.h"

#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/figure/figure_dialog.h"
#include "ui/given/given_panel.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/planes/planes_panel.h"
#include "ui/screen/screen_dialog.h"
#include "ui/sheet/sheet_dialog.h"
#include "ui/shell/appearance.h"
#include "ui/shell/areas.h"
#include "ui/shell/body.h"
#include "ui/shell/change_words.h"
#include "ui/shell/file_questions.h"
#include "ui/shell/help_key.h"
#include "ui/shell/preferences.h"
#include "ui/shell/recovery.h"
#include "ui/shell/state_bar.h"
#include "ui/shell/status_line.h"
#include "ui/shell/title_dialog.h"
#include "ui/shell/unsaved_dialog.h"
#include "ui/shell/verdict_chip.h"
#include "ui/shell/window_icon.h"
#include "ui/strength/strength_panel.h"
#include "ui/strength/summary_page.h"

#include <QApplication>
#include <QCloseEvent>
#include <QDropEvent>
#include <QFileInfo>
#include <QMenuBar>
#include <QMimeData>
#include <QPushButton>
#include <QSettings>
#include <QStackedWidget>
#include <QVBoxLayout>

namespace planewright {

namespace {

/// The one local file that is dragged over the window; empty for everything else.
QString draggedFile(const QMimeData& data) {
  const QList<QUrl> urls = data.urls();
  return urls.size() == 1 && urls.front().isLocalFile() ? urls.front().toLocalFile() : QString();
}

} // namespace

MainWindow::MainWindow() : MainWindow(askedOver(*this)) {}

MainWindow::MainWindow(FileQuestions questions)
    : m_desk(preferredStudy()), m_filing(new Filing(m_desk, std::move(questions), this)),
      m_recovery(new Recovery(m_desk, *m_filing, recoveryPath(), this)),
      m_stateBar(new StateBar(m_desk, this)), m_welcome(new Strip(this)), m_trouble(new Strip(this)),
      m_given(new GivenPanel(m_desk)), m_element(new ElementView(m_desk)),
      m_circle(new CircleView(m_desk, nullptr)), m_planes(new PlanesPanel(m_desk)),
      m_strength(new StrengthPanel(m_desk)),
      m_summary(new Later<SummaryPage>([this](QWidget* parent) { return newSummary(parent); }, nullptr)),
      m_body(new Body({m_given, m_element, m_circle, m_planes, m_strength}, this)),
      m_pages(new QStackedWidget(this)), m_status(new StatusLine(this)),
      m_areas(new Areas({m_stateBar, m_given, m_element, m_circle, m_planes, m_strength, m_summary}, this)),
      m_help(new HelpKey(*this)) {
  build();
  addFileMenu();
  addEditMenu();
  addStudyMenu();
  addViewMenu();
  addHelpMenu();
  connectViews();
  restoreGeometryAndSizes();
  showFile({});
  m_given->focusFirst();
  qApp->installEventFilter(this);
}

// Views end before the desk that they look at; the follower of the focus before the areas. What is unsaved is
// kept while the study still is there.
MainWindow::~MainWindow() {
  delete m_recovery;
  m_desk.undoStack()->disconnect(this);
  delete m_areas;
  delete m_screen;
  qDeleteAll(findChildren<QWidget*>(Qt::FindDirectChildrenOnly));
}

void MainWindow::build() {
  auto* page = new QWidget(this);
  auto* rows = new QVBoxLayout(page);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->setSpacing(0);
  rows->addWidget(m_stateBar);
  rows->addWidget(m_trouble);
  rows->addWidget(m_welcome);
  m_planes->adopt(m_strength, tr("Strength"));
  m_pages->addWidget(m_body);
  m_pages->addWidget(m_summary);
  rows->addWidget(m_pages, 1);
  rows->addWidget(m_status);
  setCentralWidget(page);
  setWindowIcon(windowIcon());
  setMinimumSize(800, 560);
  setProperty("helpPlace", "window#areas");
  setAcceptDrops(true);
  QWidget::setTabOrder(&m_stateBar->figureButton(), m_given);
}

SummaryPage& MainWindow::summary() const {
  return m_summary->page();
}

SummaryPage* MainWindow::newSummary(QWidget* parent) {
  auto* summary = new SummaryPage(m_desk, parent);
  connect(summary, &SummaryPage::opened, this, [this] {
    if (m_body->hasRoomForStrength())
      showPointPage();
    else
      enterStrength();
  });
  return summary;
}

void MainWindow::connectViews() {
  connect(&m_desk, &Desk::said, this, [this](const QString& message) { m_status->say(message); });
  connect(m_desk.undoStack(), &QUndoStack::indexChanged, this, &MainWindow::tellStep);
  connect(m_desk.undoStack(), &QUndoStack::cleanChanged, this, [this] { showTitle(); });
  connect(m_given, &GivenPanel::entriesNotTaken, m_status, &StatusLine::setNotTaken);
  connect(m_circle, &CircleView::angleEntryWanted, m_given, &GivenPanel::focusReading);
  connect(m_given, &GivenPanel::entriesNotTaken, this,
          [this](int count, const QString&) { m_stateBar->verdict().setNotTaken(count); });
  connect(&m_stateBar->verdict(), &QAbstractButton::clicked, this, &MainWindow::enterStrength);
  connect(m_strength, &StrengthPanel::materialsWanted, this, &MainWindow::showMaterials);
  connect(m_pages, &QStackedWidget::currentChanged, this,
          [this] { m_stateBar->verdict().setNamesPoint(m_pages->currentWidget() == m_summary); });
  connect(m_body, &Body::roomForStrengthChanged, this, [this](bool room) {
    if (room)
      m_planes->release();
    else
      m_planes->adopt(m_strength, tr("Strength"));
  });
  connect(m_status, &StatusLine::notTakenClicked, m_given, &GivenPanel::focusNextProblem);
  connect(m_status, &StatusLine::actionClicked, m_desk.undoStack(), &QUndoStack::undo);
  connect(m_areas, &Areas::focusMoved, this, [this] { m_status->setKeys(m_areas->keys()); });
  connect(&m_stateBar->figureButton(), &QPushButton::clicked, this, &MainWindow::arrangeFigure);
  connect(m_filing, &Filing::fileChanged, this, &MainWindow::showFile);
  connect(m_filing, &Filing::begun, m_given, &GivenPanel::focusFirst);
  connect(m_filing, &Filing::refused, this, &MainWindow::showRefusal);
  connect(m_recovery, &Recovery::troubled, this, [this](const Problem& problem) {
    m_trouble->say(
        tr("Unsaved changes cannot be kept for the next start. %1 Save often.").arg(shown(problem)),
        Strip::Tone::wrong);
  });
}

void MainWindow::restoreGeometryAndSizes() {
  const QSettings settings;
  if (!restoreGeometry(settings.value(QStringLiteral("geometry")).toByteArray()))
    resize(1400, 900);
  m_body->restore(settings);
}

void MainWindow::tellStep(int index) {
  QUndoStack& undo = *m_desk.undoStack();
  if (index < m_toldStep) {
    m_status->say(undo.canRedo() ? tr("Undone: %1.").arg(undo.redoText()) : QString());
  } else if (const Study* before = m_desk.beforeNewestStep()) {
    const QString change = changeInWords(*before, m_desk.study());
    m_status->say(change.isEmpty() ? tr("%1.").arg(undo.undoText()) : change + QLatin1Char('.'), tr("Undo"));
  }
  m_toldStep = index;
}

void MainWindow::settleDrafts() {
  if (QWidget* focused = QApplication::focusWidget(); focused && isAncestorOf(focused)) {
    focused->clearFocus();
    focused->setFocus();
  }
}

void MainWindow::showPointPage() {
  m_pages->setCurrentWidget(m_body);
  Areas::enter(*m_given);
}

void MainWindow::showSummary() {
  settleDrafts();
  m_pages->setCurrentWidget(m_summary);
  m_summary->setFocus();
}

void MainWindow::enterStrength() {
  if (m_pages->currentWidget() != m_body)
    m_pages->setCurrentWidget(m_body);
  if (!m_body->hasRoomForStrength())
    m_planes->showAdopted();
  Areas::enter(*m_strength);
}

void MainWindow::arrangeFigure() {
  settleDrafts();
  if (!m_figure) {
    m_figure = new FigureDialog(m_desk, this);
    m_figure->setStudyFile(m_filing->path());
  }
  raised(*m_figure);
}

bool MainWindow::event(QEvent* event) {
  if (event->type() == QEvent::ThemeChange)
    dressApplication();
  return QMainWindow::event(event);
}

bool MainWindow::eventFilter(QObject* watched, QEvent* event) {
  const QEvent::Type type = event->type();
  if (type != QEvent::DragEnter && type != QEvent::DragMove && type != QEvent::Drop)
    return QMainWindow::eventFilter(watched, event);
  const auto* widget = qobject_cast<const QWidget*>(watched);
  auto* drop = static_cast<QDropEvent*>(event);
  if (!widget || widget->window() != this || draggedFile(*drop->mimeData()).isEmpty())
    return QMainWindow::eventFilter(watched, event);
  drop->acceptProposedAction();
  if (type == QEvent::Drop)
    open(draggedFile(*drop->mimeData()));
  return true;
}

void MainWindow::closeEvent(QCloseEvent* event) {
  settleDrafts();
  if (!m_filing->mayLeave()) {
    event->ignore();
    return;
  }
  QSettings settings;
  settings.setValue(QStringLiteral("geometry"), saveGeometry());
  m_body->store(settings);
  if (m_screen)
    m_screen->hide();
  event->accept();
}

} // namespace planewright
