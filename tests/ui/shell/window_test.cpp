// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/embedded_study.h"
#include "core/record/study_file.h"
#include "shell_test.h"
#include "tests/support/judged_study.h"
#include "ui/circle/circle_plot.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/given/given_panel.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_panel.h"
#include "ui/planes/sweep_page.h"
#include "ui/screen/screen_dialog.h"
#include "ui/shell/body.h"
#include "ui/shell/main_window.h"
#include "ui/shell/picker.h"
#include "ui/shell/recent_files.h"
#include "ui/shell/state_bar.h"
#include "ui/shell/status_line.h"
#include "ui/shell/verdict_chip.h"
#include "ui/shell/worked_example.h"
#include "ui/strength/strength_panel.h"
#include "ui/strength/summary_page.h"
#include "ui/strength/utilisation_plot.h"

#include <QAbstractItemView>
#include <QApplication>
#include <QDropEvent>
#include <QFile>
#include <QLineEdit>
#include <QMenu>
#include <QMimeData>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QSplitter>
#include <QTabBar>
#include <QTableView>
#include <QTest>

#include <algorithm>

namespace planewright {
namespace {

class WindowTest : public ShellTest {
protected:
  MainWindow& shown(QSize size = {1400, 900}) {
    m_window = std::make_unique<MainWindow>(answers());
    m_window->resize(size);
    m_window->show();
    m_window->activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(m_window.get()));
    return *m_window;
  }
  QString saved(const QString& name, const Study& study) {
    QFile opened(file(name));
    EXPECT_TRUE(opened.open(QIODevice::WriteOnly));
    opened.write(QByteArray::fromStdString(writeStudy(study)));
    return opened.fileName();
  }
  static void drop(QWidget& on, const QString& path) {
    QMimeData data;
    data.setUrls({QUrl::fromLocalFile(path)});
    QDragEnterEvent enter(QPoint(5, 5), Qt::CopyAction, &data, Qt::LeftButton, Qt::NoModifier);
    QApplication::sendEvent(&on, &enter);
    EXPECT_TRUE(enter.isAccepted());
    QDropEvent event(QPointF(5, 5), Qt::CopyAction, &data, Qt::LeftButton, Qt::NoModifier);
    QApplication::sendEvent(&on, &event);
  }
  std::unique_ptr<MainWindow> m_window;
};

TEST_F(WindowTest, copyWhereNothingIsToCopyIsNoCommandWithoutAnEnd) {
  MainWindow& window = shown();
  window.element().setFocus();
  QTest::keyClick(&window.element(), Qt::Key_C, Qt::ControlModifier);
  EXPECT_TRUE(window.isVisible());
}

TEST_F(WindowTest, makesWhatIsNotShownWhenItFirstIs) {
  MainWindow& window = shown();
  EXPECT_TRUE(window.findChildren<SummaryPage*>().isEmpty());
  EXPECT_TRUE(window.findChildren<SweepPage*>().isEmpty());
  EXPECT_TRUE(window.findChildren<UtilisationPlot*>().isEmpty());
  window.openWorkedExample();
  EXPECT_EQ(window.findChildren<UtilisationPlot*>().size(), 1);
  QTest::keyClick(&window, Qt::Key_2, Qt::ControlModifier);
  ASSERT_EQ(window.findChildren<SummaryPage*>().size(), 1);
  EXPECT_TRUE(window.summary().table().isVisible());
  EXPECT_TRUE(window.summary().table().hasFocus());
  EXPECT_GT(window.summary().table().model()->rowCount(), 0);
  QTest::keyClick(&window, Qt::Key_1, Qt::ControlModifier);
  auto* tabs = window.findChild<PlanesPanel*>()->findChild<QTabBar*>();
  tabs->setCurrentIndex(1);
  ASSERT_EQ(window.findChildren<SweepPage*>().size(), 1);
  EXPECT_GT(window.findChild<SweepPage*>()->table().model()->rowCount(), 4);
}

TEST_F(WindowTest, enterOnTheCircleTypesTheAngleOfTheReadingPlane) {
  MainWindow& window = shown();
  window.circle().setFocus();
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_Return);
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("33"));
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_Return);
  EXPECT_DOUBLE_EQ(window.desk().readout().reading.value.degrees(), 33);
}

TEST_F(WindowTest, enterInTheSummaryOfANarrowWindowLandsOnTheStrengths) {
  MainWindow& window = shown({1024, 700});
  window.desk().replace(judgedStudy());
  window.showSummary();
  QTest::keyClick(&window.summary().table(), Qt::Key_Return);
  EXPECT_TRUE(window.strength().isVisible());
  EXPECT_TRUE(window.strength().isAncestorOf(QApplication::focusWidget()));
}

TEST_F(WindowTest, besideTheSummaryTheVerdictSaysThatItIsOfThisPoint) {
  MainWindow& window = shown();
  window.desk().replace(judgedStudy());
  const QString alone = window.stateBar().verdict().text();
  window.showSummary();
  EXPECT_EQ(window.stateBar().verdict().text(), QStringLiteral("this point: ") + alone);
}

TEST_F(WindowTest, startsWithANewStudyAndTheCursorInItsFirstComponent) {
  MainWindow& window = shown();
  EXPECT_EQ(window.desk().study(), newStudy());
  auto* field = qobject_cast<QLineEdit*>(QApplication::focusWidget());
  ASSERT_NE(field, nullptr);
  EXPECT_EQ(field->selectedText(), "0 MPa");
  EXPECT_TRUE(window.welcome().isVisible());
  EXPECT_TRUE(window.welcome().offers().contains(QStringLiteral("Open the worked example")));
  EXPECT_FALSE(window.trouble().isVisible());
}

TEST_F(WindowTest, theWorkedExampleSaysThatItIsInvented) {
  MainWindow& window = shown();
  window.welcome().follow(QStringLiteral("Open the worked example"));
  EXPECT_EQ(window.desk().study(), workedExample());
  EXPECT_TRUE(window.welcome().sentence().contains(QStringLiteral("invented")));
  EXPECT_TRUE(window.filing().path().isEmpty()) << "saving it asks for a name";
  window.welcome().follow(QStringLiteral("New study"));
  EXPECT_EQ(window.desk().study(), newStudy());
}

TEST_F(WindowTest, opensAStudyAndRemembersIt) {
  MainWindow& window = shown();
  Study study = workedExample();
  study.title.subject = "another";
  const QString path = saved(QStringLiteral("beam.planewright"), study);
  ASSERT_TRUE(window.open(path));
  EXPECT_EQ(window.desk().study(), study);
  EXPECT_EQ(window.windowTitle(), "beam[*] – Planewright");
  EXPECT_FALSE(window.isWindowModified());
  EXPECT_FALSE(window.welcome().isVisible());
  EXPECT_EQ(recentFiles(), QStringList{path});
  const QList<QMenu*> menus = window.findChildren<QMenu*>();
  EXPECT_TRUE(std::ranges::any_of(menus, [](const QMenu* menu) {
    return menu->isEnabled() && menu->actions().size() == 1 &&
           menu->actions().front()->text() == "beam.planewright";
  }));
  type(window.desk(), Spot::sx, "8 MPa");
  EXPECT_TRUE(window.isWindowModified());
  window.desk().undoStack()->undo();
  EXPECT_FALSE(window.isWindowModified());
}

TEST_F(WindowTest, aBadFileIsToldInTheWindowAndAGoodOneEndsTheMessage) {
  MainWindow& window = shown();
  QFile bad(file(QStringLiteral("bad.planewright")));
  ASSERT_TRUE(bad.open(QIODevice::WriteOnly));
  bad.write("{\"format\":\"planewright-study\",\"version\":1,\"pionts\":[],\"titel\":{}}");
  bad.close();
  EXPECT_FALSE(window.open(bad.fileName()));
  EXPECT_TRUE(window.trouble().isVisible());
  EXPECT_TRUE(window.trouble().sentence().startsWith(QStringLiteral("bad.planewright: ")));
  EXPECT_EQ(window.trouble().offers().size(), 1) << "the list of all problems";
  EXPECT_TRUE(recentFiles().isEmpty());
  EXPECT_TRUE(window.open(saved(QStringLiteral("good.planewright"), workedExample())));
  EXPECT_FALSE(window.trouble().isVisible());
}

TEST_F(WindowTest, aDroppedStudyIsOpenedWhereverItIsDropped) {
  MainWindow& window = shown();
  Study study = workedExample();
  study.title.subject = "another";
  const QString path = saved(QStringLiteral("beam.planewright"), study);
  QWidget* field = QApplication::focusWidget();
  ASSERT_NE(field, nullptr);
  drop(*field, path);
  EXPECT_EQ(window.desk().study(), study);
  window.filing().begin();
  drop(window.element(), path);
  EXPECT_EQ(window.desk().study(), study);
}

TEST_F(WindowTest, aDroppedFigureBringsItsStudyBackAndTheStripSaysSo) {
  MainWindow& window = shown();
  Study study = workedExample();
  study.title.subject = "another";
  const QString figure = file(QStringLiteral("beam.svg"));
  QFile opened(figure);
  ASSERT_TRUE(opened.open(QIODevice::WriteOnly));
  opened.write(QByteArray::fromStdString(*svgWithStudy("<svg></svg>", writeStudy(study))));
  opened.close();
  drop(window.circle(), figure);
  EXPECT_EQ(window.desk().study(), study);
  EXPECT_TRUE(window.welcome().isVisible());
  EXPECT_TRUE(window.welcome().sentence().startsWith(QStringLiteral("Restored from beam.svg.")));
  EXPECT_TRUE(window.windowTitle().startsWith(QStringLiteral("Study from beam.svg")));
  EXPECT_TRUE(window.isWindowModified());
  EXPECT_TRUE(recentFiles().isEmpty()) << "it is no study of its own";
  m_savePath = file(QStringLiteral("beam.planewright"));
  window.welcome().follow(QStringLiteral("Save as…"));
  EXPECT_FALSE(window.isWindowModified());
  EXPECT_FALSE(window.welcome().isVisible());
  EXPECT_EQ(recentFiles(), QStringList{m_savePath});
}

TEST_F(WindowTest, aDroppedFigureThatWasHarmedIsRefused) {
  MainWindow& window = shown();
  const QString figure = file(QStringLiteral("beam.svg"));
  QFile opened(figure);
  ASSERT_TRUE(opened.open(QIODevice::WriteOnly));
  QByteArray bytes = QByteArray::fromStdString(*svgWithStudy("<svg></svg>", writeStudy(workedExample())));
  opened.write(bytes.replace("ewog", "evog"));
  opened.close();
  drop(window.element(), figure);
  EXPECT_EQ(window.desk().study(), newStudy());
  EXPECT_TRUE(window.trouble().sentence().contains(QStringLiteral("was changed after it was saved")));
}

TEST_F(WindowTest, anUnsavedStudyIsAskedAboutAtClosing) {
  MainWindow& window = shown();
  type(window.desk(), Spot::sx, "8 MPa");
  EXPECT_FALSE(window.close()) << "the answer was to stay";
  EXPECT_EQ(m_askedUnsaved, 1);
  m_unsaved = Unsaved::drop;
  EXPECT_TRUE(window.close());
}

TEST_F(WindowTest, aTextStillBeingTypedIsSaved) {
  MainWindow& window = shown();
  m_savePath = file(QStringLiteral("beam.planewright"));
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("7.5"));
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_S, Qt::ControlModifier);
  QFile written(m_savePath);
  ASSERT_TRUE(written.open(QIODevice::ReadOnly));
  EXPECT_EQ(readStudy(written.readAll().toStdString()).value().points[0].stress[0].sx, "7.5 MPa");
  EXPECT_FALSE(window.isWindowModified());
}

TEST_F(WindowTest, aTextStillBeingTypedIsAskedAboutBeforeAnotherStudyComes) {
  MainWindow& window = shown();
  const QString path = saved(QStringLiteral("beam.planewright"), workedExample());
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("7"));
  EXPECT_FALSE(window.open(path)) << "the answer was to stay";
  EXPECT_EQ(m_askedUnsaved, 1);
  EXPECT_EQ(window.desk().study().points[0].stress[0].sx, "7 MPa");

  window.desk().undoStack()->undo();
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_A, Qt::ControlModifier);
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("8"));
  window.openWorkedExample();
  EXPECT_EQ(m_askedUnsaved, 2);

  m_unsaved = Unsaved::drop;
  window.openWorkedExample();
  m_unsaved = Unsaved::stay;
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("9"));
  window.welcome().follow(QStringLiteral("New study"));
  EXPECT_EQ(m_askedUnsaved, 4);
}

TEST_F(WindowTest, aTextStillBeingTypedBelongsToThePointThatIsLeft) {
  MainWindow& window = shown();
  Study study = newStudy();
  study.points.push_back(study.points[0]);
  study.points[1].name = "P2";
  ASSERT_TRUE(window.filing().openUnnamed(study));
  QTest::keyClicks(QApplication::focusWidget(), QStringLiteral("7"));
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_PageDown, Qt::ControlModifier);
  EXPECT_EQ(window.desk().readout().point, "P2");
  EXPECT_EQ(window.desk().study().points[0].stress[0].sx, "7 MPa");
  EXPECT_EQ(window.desk().study().points[1].stress[0].sx, "0 MPa");
}

TEST_F(WindowTest, theStatusLineTellsAStepAndTakesItBack) {
  MainWindow& window = shown();
  type(window.desk(), Spot::lineAngle, "1 in 10");
  type(window.desk(), Spot::lineAngle, "7.4 deg");
  EXPECT_EQ(window.statusLine().words(), "Grain now 7.4 deg, was 1 in 10. Undo");
  Q_EMIT window.statusLine().actionClicked();
  EXPECT_EQ(window.desk().study().points[0].lines.front().angle, "1 in 10");
  EXPECT_TRUE(window.statusLine().words().startsWith(QStringLiteral("Undone")));
}

/// Presses on the bar of the line, moves by each of the ways and lets go there.
void dragBar(MainWindow& window, const QList<QPoint>& ways) {
  ElementView& element = window.element();
  const QPoint start = element.placeOf(ElementHandle::line)->toPoint();
  QTest::mousePress(&element, Qt::LeftButton, {}, start);
  for (const QPoint way : ways) {
    QMouseEvent event(QEvent::MouseMove, start + way, element.mapToGlobal(start + way), Qt::NoButton,
                      Qt::LeftButton, Qt::ControlModifier);
    QApplication::sendEvent(&element, &event);
  }
  QTest::mouseRelease(&element, Qt::LeftButton, Qt::ControlModifier, start + ways.back());
}

TEST_F(WindowTest, aDraggedLineIsToldWithTheWayBack) {
  MainWindow& window = shown();
  type(window.desk(), Spot::lineAngle, "1 in 10");
  dragBar(window, {QPoint(0, -40)});
  const std::string now = window.desk().study().points[0].lines.front().angle;
  EXPECT_NE(now, "1 in 10");
  EXPECT_EQ(window.statusLine().words().toStdString(), "Grain now " + now + ", was 1 in 10. Undo");
  QTest::keyClick(&window.element(), Qt::Key_Right);
  EXPECT_TRUE(window.statusLine().words().endsWith(QStringLiteral(", was %1. Undo").arg(fromUtf8(now))));
}

TEST_F(WindowTest, aDragThatEndsWhereItBeganSaysNothing) {
  MainWindow& window = shown();
  type(window.desk(), Spot::lineAngle, "1 in 10");
  dragBar(window, {QPoint(0, -40), QPoint()});
  EXPECT_EQ(window.desk().study().points[0].lines.front().angle, "1 in 10");
  EXPECT_EQ(window.statusLine().words(), "");
}

TEST_F(WindowTest, f6GoesRoundTheAreasAndComesBackToWhereItWas) {
  MainWindow& window = shown();
  QWidget* start = QApplication::focusWidget();
  const QList<QWidget*> order{&window.element(),  &window.circle(),   &window.planes(),
                              &window.strength(), &window.stateBar(), &window.given()};
  for (QWidget* area : order) {
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_F6);
    QWidget* focused = QApplication::focusWidget();
    EXPECT_TRUE(focused && (focused == area || area->isAncestorOf(focused)))
        << area->metaObject()->className();
    if (area == &window.planes()) {
      EXPECT_NE(qobject_cast<QAbstractItemView*>(focused), nullptr) << "the rows, not the tabs over them";
    }
  }
  EXPECT_EQ(QApplication::focusWidget(), start);
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_F6, Qt::ShiftModifier);
  EXPECT_TRUE(window.stateBar().isAncestorOf(QApplication::focusWidget()));
}

TEST_F(WindowTest, tabGoesThroughEveryAreaAndComesBackToWhereItWas) {
  MainWindow& window = shown();
  const QList<QWidget*> areas{&window.given(),  &window.element(),  &window.circle(),
                              &window.planes(), &window.strength(), &window.stateBar()};
  for (const bool forward : {true, false}) {
    QWidget* start = QApplication::focusWidget();
    QList<QWidget*> visited;
    QList<QWidget*> stops;
    constexpr int most = 100;
    do {
      QTest::keyClick(QApplication::focusWidget(), forward ? Qt::Key_Tab : Qt::Key_Backtab);
      QWidget* focused = QApplication::focusWidget();
      ASSERT_NE(focused, nullptr);
      stops += focused;
      for (QWidget* area : areas)
        if ((focused == area || area->isAncestorOf(focused)) && (visited.isEmpty() || visited.last() != area))
          visited += area;
    } while (QApplication::focusWidget() != start && stops.size() < most);
    EXPECT_EQ(QApplication::focusWidget(), start) << "never comes back";
    for (QWidget* area : areas)
      EXPECT_TRUE(visited.contains(area)) << area->metaObject()->className();
    EXPECT_LE(visited.size(), areas.size() + 1) << "an area is entered twice";
  }
}

/// The keys of the window that a field with the focus would keep for itself.
QStringList keptFromWindow(const MainWindow& window) {
  QStringList kept;
  for (const QAction* action : window.findChildren<QAction*>()) {
    // Help's key is taken on its way to any widget of any window.
    if (action->shortcut().isEmpty() || action->shortcut() == QKeySequence::Copy ||
        action->shortcut() == QKeySequence(QKeySequence::HelpContents))
      continue;
    const QKeyCombination keys = action->shortcut()[0];
    QKeyEvent event(QEvent::ShortcutOverride, keys.key(), keys.keyboardModifiers());
    event.ignore();
    QApplication::sendEvent(QApplication::focusWidget(), &event);
    if (event.isAccepted())
      kept << action->shortcut().toString();
  }
  return kept;
}

TEST_F(WindowTest, theKeysOfTheWindowWorkFromEveryField) {
  MainWindow& window = shown();
  const auto expectAll = [&](const char* field) {
    EXPECT_TRUE(qobject_cast<QLineEdit*>(QApplication::focusWidget()) ||
                qobject_cast<QPlainTextEdit*>(QApplication::focusWidget()))
        << field;
    EXPECT_EQ(keptFromWindow(window).join(' ').toStdString(), "") << field;
    window.circle().plot().setFit(Fit::allCombinations);
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_0, Qt::ControlModifier);
    EXPECT_EQ(window.circle().plot().fit(), Fit::thisCircle) << field;
  };
  expectAll("stress");
  window.element().setFocus();
  QTest::keyClick(&window.element(), Qt::Key_Return);
  expectAll("angle on the element");
  window.planes().setFocus();
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_F2);
  expectAll("cell of the table");
  for (auto* fold : window.given().findChildren<QAbstractButton*>())
    if (fold->text() == QStringLiteral("Notes"))
      fold->click();
  window.given().findChild<QPlainTextEdit*>()->setFocus();
  expectAll("note");
}

TEST_F(WindowTest, noMenuHasTwoEntriesWithOneLetter) {
  for (const QMenu* menu : shown().findChildren<QMenu*>()) {
    QStringList letters;
    for (const QAction* action : menu->actions())
      if (const QKeySequence letter = QKeySequence::mnemonic(action->text()); !letter.isEmpty()) {
        EXPECT_FALSE(letters.contains(letter.toString())) << action->text().toStdString();
        letters.append(letter.toString());
      }
  }
}

TEST_F(WindowTest, pickersShowAnotherPointWithoutAStep) {
  MainWindow& window = shown();
  Study study = workedExample();
  study.points.resize(1);
  study.points.push_back(study.points[0]);
  study.points[1].name = "P2";
  ASSERT_TRUE(window.filing().openUnnamed(study));
  QTest::keyClick(&window, Qt::Key_PageDown, Qt::ControlModifier);
  EXPECT_EQ(window.desk().readout().point, "P2");
  EXPECT_EQ(window.desk().undoStack()->count(), 0);
  EXPECT_FALSE(window.isWindowModified());
  QTest::keyClick(&window, Qt::Key_PageUp, Qt::ControlModifier);
  EXPECT_EQ(window.desk().readout().point, study.points[0].name);
}

TEST_F(WindowTest, aFieldHasAWindowOfItsOwnThatGoesWithThisOne) {
  MainWindow& window = shown();
  window.openWorkedExample();
  const auto fields = [] {
    QList<ScreenDialog*> found;
    for (QWidget* widget : QApplication::topLevelWidgets())
      if (auto* dialog = qobject_cast<ScreenDialog*>(widget); dialog && dialog->isVisible())
        found << dialog;
    return found;
  };
  EXPECT_TRUE(fields().isEmpty());
  const QList<QAction*> actions = window.findChildren<QAction*>();
  const auto action = std::ranges::find(actions, QStringLiteral("S&creen points…"),
                                        [](const QAction* one) { return one->text(); });
  ASSERT_NE(action, actions.end());
  (*action)->trigger();
  ASSERT_EQ(fields().size(), 1);
  EXPECT_EQ(fields()[0]->parentWidget(), nullptr); // one that has a parent would lie over it always
  window.showSummary();
  Q_EMIT fields()[0]->opened();
  EXPECT_TRUE(window.body().isVisible());
  EXPECT_TRUE(window.close());
  EXPECT_TRUE(fields().isEmpty());
}

/// Rectangle of a widget in the window.
QRect placed(const QWidget& widget, const QWidget& window) {
  return {widget.mapTo(&window, QPoint(0, 0)), widget.size()};
}

class WindowSizes : public WindowTest, public testing::WithParamInterface<std::pair<int, int>> {};

TEST_P(WindowSizes, noPanelIsClippedAndNoneCoversAnother) {
  const QSize size(GetParam().first, GetParam().second);
  MainWindow& window = shown(size);
  window.openWorkedExample();
  QCoreApplication::processEvents();
  ASSERT_EQ(window.size(), size);
  const QList<QWidget*> panels{&window.stateBar(), &window.given(),  &window.element(),
                               &window.circle(),   &window.planes(), &window.statusLine()};
  for (qsizetype i = 0; i < panels.size(); ++i) {
    const QRect place = placed(*panels[i], window);
    EXPECT_TRUE(window.rect().contains(place)) << panels[i]->metaObject()->className();
    EXPECT_GE(place.width(), panels[i]->minimumSizeHint().width()) << panels[i]->metaObject()->className();
    EXPECT_GE(place.height(), panels[i]->minimumSizeHint().height()) << panels[i]->metaObject()->className();
    for (qsizetype k = 0; k < i; ++k)
      EXPECT_FALSE(place.intersects(placed(*panels[k], window)));
  }
}

INSTANTIATE_TEST_SUITE_P(Sizes, WindowSizes,
                         testing::Values(std::pair{1024, 700}, std::pair{1100, 760}, std::pair{1600, 1000},
                                         std::pair{2560, 1400}));

TEST_F(WindowTest, sizesThatTheUserChoseComeBack) {
  MainWindow& first = shown();
  const int usual = first.given().width();
  auto* columns = first.body().findChild<QSplitter*>(QStringLiteral("columns"));
  ASSERT_NE(columns, nullptr);
  QTest::mousePress(columns->handle(1), Qt::LeftButton, {}, QPoint(0, 40));
  QTest::mouseMove(columns->handle(1), QPoint(60, 40));
  QTest::mouseRelease(columns->handle(1), Qt::LeftButton, {}, QPoint(60, 40));
  const int chosen = first.given().width();
  EXPECT_GT(chosen, usual);
  EXPECT_TRUE(first.close());
  EXPECT_EQ(shown().given().width(), chosen);
}

} // namespace
} // namespace planewright
