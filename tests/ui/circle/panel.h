// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/circle_plot.h"
#include "ui/circle/circle_view.h"
#include "ui/desk/desk.h"

#include <QMouseEvent>
#include <QTest>

namespace planewright {

/// A study of one case with these components, which have the usual golden state as default.
inline Study studyOf(const std::string& sx = "80 MPa", const std::string& sy = "20 MPa",
                     const std::string& txy = "-30 MPa", const std::string& reading = "25 deg") {
  Study study = newStudy();
  Point& point = study.points.front();
  CaseStress& stress = point.stress.front();
  stress.sx = sx;
  stress.sy = sy;
  stress.txy = txy;
  point.reading = reading;
  point.lines.front().angle = "1 in 10";
  point.lines.front().tolerance = "3 deg";
  return study;
}

/// The same with `count` combinations of two cases; the one in the middle is shown.
inline Study studyWithCombinations(int count) {
  Study study = studyOf("5 MPa", "-1 MPa", "2 MPa", "30 deg");
  study.cases.push_back({"Q", "Variable", Nature::variable, Duration::medium, {}});
  study.points.front().stress.push_back({"Q", "1.5 MPa", "0.4 MPa", "-1.2 MPa", "0 MPa"});
  for (int i = 0; i < count; ++i) {
    const std::string factor = std::to_string(-1.5 + 3.0 * i / count);
    study.combinations.push_back(
        {"k" + std::to_string(i), {{study.cases.front().id, "1.35"}, {"Q", factor}}, Basis::design});
  }
  study.shown.combination = "k" + std::to_string(count / 2);
  return study;
}

/// A panel on a desk of its own, shown at a size, with hands to work it.
struct Panel {
  explicit Panel(const Study& study, QSize size = {430, 560}) : desk(study), view(desk, nullptr) {
    view.resize(size);
    view.show();
    view.activateWindow();
    plot.setFocus();
    QTest::qWait(1);
  }

  void press(QPointF at) { send(QEvent::MouseButtonPress, at, Qt::LeftButton, Qt::LeftButton); }
  void move(QPointF at, Qt::KeyboardModifiers held = {}) {
    send(QEvent::MouseMove, at, Qt::NoButton, Qt::LeftButton, held);
  }
  /// Moved without a button, as after a release that went elsewhere.
  void hover(QPointF at) { send(QEvent::MouseMove, at, Qt::NoButton, Qt::NoButton); }
  void release(QPointF at) { send(QEvent::MouseButtonRelease, at, Qt::LeftButton, Qt::NoButton); }
  void key(int key, Qt::KeyboardModifiers held = {}) { QTest::keyClick(&plot, Qt::Key(key), held); }

  /// Drags a handle to a place in one move.
  void drag(Handle handle, QPointF to) {
    press(*plot.handleAt(handle));
    move(to);
    release(to);
  }
  /// Where the mark of a plane stands.
  QPointF markOf(Angle normal) const {
    const Stage stage{desk.study(), desk.readout(), plot.scale()};
    return stage.pixelOf(planeAt(desk.readout().state(), {normal}).traction);
  }
  double reading() const { return desk.readout().reading.value.degrees(); }
  const CaseStress& typed() const { return desk.study().points.front().stress.front(); }
  int steps() { return desk.undoStack()->index(); }

  Desk desk;
  CircleView view;
  CirclePlot& plot = view.plot();

private:
  void send(QEvent::Type type, QPointF at, Qt::MouseButton button, Qt::MouseButtons held,
            Qt::KeyboardModifiers modifiers = {}) {
    QMouseEvent event(type, at, plot.viewport()->mapToGlobal(at), button, held, modifiers);
    QCoreApplication::sendEvent(plot.viewport(), &event);
  }
};

} // namespace planewright
