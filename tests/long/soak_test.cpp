// SPDX-License-Identifier: GPL-3.0-or-later
// Random gestures through the whole window: clicks, drags, wheel, keys and typed text, wherever they fall, in
// every dialog that they open. Four times on the way, or more, all is undone and done again to the ends, and
// what the program then holds in memory must not have grown. PLANEWRIGHT_SOAK says how many gestures (a few,
// if not given), and PLANEWRIGHT_SOAK_SEED with what dice; both are printed.
#include "core/record/study_file.h"
#include "tests/support/from_environment.h"
#include "tests/ui/shell/shell_test.h"
#include "ui/circle/circle_plot.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/entry/draft_edit.h"
#include "ui/shell/main_window.h"
#include "ui/strength/strength_panel.h"
#include "ui/strength/utilisation_plot.h"

#include <QApplication>
#include <QDesktopServices>
#include <QMenuBar>
#include <QMouseEvent>
#include <QPointer>
#include <QTableView>
#include <QTest>
#include <QTimer>
#include <QUndoStack>
#include <QWheelEvent>

#include <algorithm>
#include <cstdlib>
#include <iostream>
#include <malloc.h>
#include <memory>
#include <random>

#if defined(__SANITIZE_ADDRESS__)
// Of the sanitizer's runtime; not every compiler brings the header of it.
extern "C" std::size_t __sanitizer_get_current_allocated_bytes();
#endif

namespace planewright {
namespace {

std::size_t bytesInUse() {
#if defined(__SANITIZE_ADDRESS__)
  return __sanitizer_get_current_allocated_bytes();
#else
  return mallinfo2().uordblks;
#endif
}

/// Takes the addresses that a click would have the system open.
class NoBrowser : public QObject {
  Q_OBJECT

public:
  NoBrowser() {
    for (const char* scheme : {"http", "https", "file", "mailto"})
      QDesktopServices::setUrlHandler(QLatin1String(scheme), this, "take");
  }
  ~NoBrowser() override {
    for (const char* scheme : {"http", "https", "file", "mailto"})
      QDesktopServices::unsetUrlHandler(QLatin1String(scheme));
  }

public slots:
  void take(const QUrl&) {}
};

class Soak : public ShellTest {
protected:
  Soak() {
    m_window->resize(1500, 950);
    m_window->openWorkedExample();
    m_window->show();
    EXPECT_TRUE(QTest::qWaitForWindowActive(m_window.get()));
    begin();
    // Menus, lists that open and questions wait for an answer in a loop of their own.
    QObject::connect(&m_answers, &QTimer::timeout, [this] { answer(); });
    m_answers.start(1);
  }

  void begin() { m_first = study(); }

  /// What undo is about.
  Study study() const {
    Study study = m_window->desk().study();
    study.shown = {};
    return study;
  }

  void gesture() {
    m_window->show();
    ++m_gestures;
    if (stack().count() == 0)
      begin(); // a new study, perhaps, or nothing was done yet
    QWidget& at = target();
    switch (upTo(5)) {
    case 0:
      return click(at);
    case 1:
    case 2:
      return drag(at);
    case 3:
      return wheel(at);
    case 4:
      return key();
    default:
      return type();
    }
  }

  /// All undone and done again. Returns what is in use where all is undone.
  std::size_t toTheEndsAndBack() {
    closeOthers();
    if (QWidget* focused = QApplication::focusWidget())
      focused->clearFocus(); // takes what is half typed
    QApplication::processEvents();
    if (stack().count() == 0)
      begin();
    while (stack().canRedo()) // the last gesture may have been an undo
      stack().redo();
    const Study last = study();
    m_steps += stack().count();
    while (stack().canUndo())
      stack().undo();
    EXPECT_EQ(writeStudy(study()), writeStudy(m_first));
    while (stack().canRedo())
      stack().redo();
    EXPECT_EQ(writeStudy(study()), writeStudy(last));
    while (stack().canUndo())
      stack().undo();
    stack().clear();
    QApplication::sendPostedEvents(nullptr, QEvent::DeferredDelete);
    QApplication::processEvents();
    begin();
    return bytesInUse();
  }

  int m_gestures = 0;
  int m_steps = 0;
  unsigned m_seed = static_cast<unsigned>(
      fromEnvironment("PLANEWRIGHT_SOAK_SEED", static_cast<int>(std::random_device()() >> 1)));

private:
  QUndoStack& stack() const { return *m_window->desk().undoStack(); }
  int upTo(int most) { return std::uniform_int_distribution<int>(0, most)(m_dice); }
  QPoint placeIn(const QWidget& widget) {
    return {upTo(std::max(0, widget.width() - 1)), upTo(std::max(0, widget.height() - 1))};
  }

  /// Half of the time what carries the work: drawings, tables, fields.
  QWidget* favourite() {
    QList<QWidget*> those = {&m_window->element(), m_window->circle().plot().viewport()};
    if (UtilisationPlot& plot = m_window->strength().plot(); plot.isVisible())
      those += plot.viewport();
    for (auto* table : m_window->findChildren<QTableView*>())
      those += table->viewport();
    const auto fields = m_window->findChildren<DraftEdit*>();
    if (!fields.isEmpty())
      those += fields.at(upTo(static_cast<int>(fields.size()) - 1));
    QWidget* one = those.at(upTo(static_cast<int>(those.size()) - 1));
    return one->isVisible() ? one : nullptr;
  }

  /// Where a drag begins: on a handle, where the widget has one and chance wills.
  QPoint gripOf(QWidget& widget) {
    std::optional<QPointF> grip;
    if (&widget == &m_window->element())
      grip = m_window->element().placeOf(upTo(1) ? ElementHandle::reading : ElementHandle::line);
    if (CirclePlot& plot = m_window->circle().plot(); &widget == plot.viewport())
      grip = plot.handleAt(upTo(1) ? Handle::reading : Handle::ear);
    return grip && upTo(3) > 0 ? grip->toPoint() : placeIn(widget);
  }

  /// What lies under a random place of a random window, but no menu bar: it leads out of the program.
  QWidget& target() {
    QList<QWidget*> tops;
    for (QWidget* top : QApplication::topLevelWidgets())
      if (top->isVisible() && top->windowType() != Qt::Popup && top->windowType() != Qt::ToolTip)
        tops += top;
    if (tops.size() > 3 || upTo(9) == 0)
      closeOthers();
    if (QWidget* one = upTo(1) ? favourite() : nullptr)
      return *one;
    QWidget* top = upTo(2) == 0 ? tops.at(upTo(static_cast<int>(tops.size()) - 1)) : m_window.get();
    if (!top->isVisible())
      top = m_window.get();
    QWidget* child = top->childAt(placeIn(*top));
    return child && !qobject_cast<QMenuBar*>(child) ? *child : *top;
  }

  void closeOthers() {
    for (QWidget* top : QApplication::topLevelWidgets())
      if (top != m_window.get() && top->isVisible())
        top->close();
  }

  void answer() {
    QWidget* asks = QApplication::activePopupWidget();
    asks = asks ? asks : QApplication::activeModalWidget();
    if (!asks || m_isAnswering)
      return;
    m_isAnswering = true;
    const QPointer<QWidget> still = asks;
    for (int downs = upTo(6); downs > 0 && still; --downs)
      QTest::keyClick(asks, Qt::Key_Down);
    const bool takes = QApplication::activePopupWidget() && upTo(2) > 0;
    if (still)
      QTest::keyClick(asks, takes ? Qt::Key_Return : Qt::Key_Escape);
    if (still && still->isVisible())
      still->close();
    m_isAnswering = false;
  }

  Qt::KeyboardModifiers held() {
    switch (upTo(5)) {
    case 0:
      return Qt::ShiftModifier;
    case 1:
      return Qt::ControlModifier;
    default:
      return {};
    }
  }

  void click(QWidget& at) {
    const QPointer<QWidget> widget = &at;
    const QPoint place = placeIn(at);
    QTest::mouseClick(widget, Qt::LeftButton, held(), place);
    if (widget && upTo(3) == 0)
      QTest::mouseDClick(widget, Qt::LeftButton, {}, place);
  }

  void drag(QWidget& at) {
    const QPointer<QWidget> widget = &at;
    const Qt::KeyboardModifiers keys = held();
    QTest::mousePress(widget, Qt::LeftButton, keys, gripOf(at));
    for (int steps = 1 + upTo(4); steps > 0 && widget; --steps) {
      const QPointF to = placeIn(*widget);
      QMouseEvent move(QEvent::MouseMove, to, widget->mapToGlobal(to), Qt::NoButton, Qt::LeftButton, keys);
      QApplication::sendEvent(widget, &move);
    }
    if (widget && upTo(9) == 0)
      QTest::keyClick(widget, Qt::Key_Escape);
    if (widget)
      QTest::mouseRelease(widget, Qt::LeftButton, keys, placeIn(*widget));
  }

  void wheel(QWidget& at) {
    const QPointF place = placeIn(at);
    QWheelEvent event(place, at.mapToGlobal(place), {}, {0, 120 * (upTo(2) - 1)}, Qt::NoButton, held(),
                      Qt::NoScrollPhase, false);
    QApplication::sendEvent(&at, &event);
  }

  QWidget& focused() {
    QWidget* focused = QApplication::focusWidget();
    return focused ? *focused : *m_window;
  }

  void key() {
    static constexpr std::array keys = {Qt::Key_Left,     Qt::Key_Right,  Qt::Key_Up,        Qt::Key_Down,
                                        Qt::Key_Home,     Qt::Key_End,    Qt::Key_Tab,       Qt::Key_Tab,
                                        Qt::Key_Return,   Qt::Key_Escape, Qt::Key_Backspace, Qt::Key_Delete,
                                        Qt::Key_F2,       Qt::Key_F8,     Qt::Key_Insert,    Qt::Key_PageUp,
                                        Qt::Key_PageDown, Qt::Key_Space,  Qt::Key_F6,        Qt::Key_F1};
    static constexpr std::array withControl = {Qt::Key_Z, Qt::Key_Y, Qt::Key_1,      Qt::Key_2,
                                               Qt::Key_C, Qt::Key_V, Qt::Key_PageUp, Qt::Key_PageDown};
    if (upTo(3) == 0)
      QTest::keyClick(&focused(), withControl.at(upTo(withControl.size() - 1)), Qt::ControlModifier);
    else
      QTest::keyClick(&focused(), keys.at(upTo(keys.size() - 1)), held());
  }

  void type() {
    static constexpr std::array texts = {"12.5 MPa",         "-3",  "1 in 10", "7.4 deg", "0",
                                         "1e3 kN/(20 mm)^2", "abc", "(",       "2*",      "0.8",
                                         "1.35 G + 1.5 S"};
    QWidget* wanted = upTo(1) ? favourite() : nullptr;
    if (qobject_cast<DraftEdit*>(wanted))
      wanted->setFocus();
    const QPointer<QWidget> field = &focused();
    QTest::keyClick(field, Qt::Key_A, Qt::ControlModifier);
    for (const char* c = texts.at(upTo(texts.size() - 1)); *c && field; ++c)
      QTest::keyClick(field, *c);
    if (field)
      QTest::keyClick(field, upTo(3) > 0 ? Qt::Key_Return : Qt::Key_Escape);
  }

  std::mt19937 m_dice{m_seed};
  NoBrowser m_noBrowser;
  std::unique_ptr<MainWindow> m_window = std::make_unique<MainWindow>(answers());
  QTimer m_answers;
  bool m_isAnswering = false;
  Study m_first;
};

TEST_F(Soak, undoesAndRedoesToTheEndsAndStaysAsLarge) {
  const int gestures = fromEnvironment("PLANEWRIGHT_SOAK", 120);
  // Often enough that no step falls off the stack, which keeps a thousand.
  const int rests = std::max(4, gestures / 2500);
  std::vector<std::size_t> inUse;
  for (int rest = 0; rest < rests && !HasFailure(); ++rest) {
    while (m_gestures < (rest + 1) * gestures / rests)
      gesture();
    inUse.push_back(toTheEndsAndBack());
  }
  std::cout << m_gestures << " gestures, " << m_steps
            << " steps undone and done again; in use at the rests (kB):";
  for (const std::size_t bytes : inUse)
    std::cout << ' ' << bytes / 1024;
  std::cout << "; PLANEWRIGHT_SOAK_SEED=" << m_seed << '\n';
  ASSERT_EQ(inUse.size(), static_cast<std::size_t>(rests));
  // Dialogs that were opened once stay: what is in use half way is the measure.
  constexpr std::size_t allowed = 6 << 20;
  EXPECT_LT(inUse.back(), inUse.at(inUse.size() / 2) + allowed) << "PLANEWRIGHT_SOAK_SEED=" << m_seed;
}

} // namespace
} // namespace planewright

#include "soak_test.moc"
