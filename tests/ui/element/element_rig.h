// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/cut_text.h"
#include "tests/support/picture_parts.h"
#include "ui/element/element_view.h"

#include <QApplication>
#include <QSignalSpy>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {

struct Typed {
  const char* sx = "8.4 MPa";
  const char* sy = "-0.6 MPa";
  const char* txy = "2.1 MPa";
  std::string reading = "30 deg";
  std::string line = "1 in 10";
  std::string tolerance = "3 deg";
  std::string axes = "0 deg";
};

inline Study studyOf(const Typed& typed) {
  Study study = newStudy();
  Point& point = study.points.front();
  point.stress = {{study.cases.front().id, typed.sx, typed.sy, typed.txy, "0 MPa"}};
  point.reading = typed.reading;
  point.axes = typed.axes;
  point.lines = {Line{"grain", LineKind::grain, typed.line, typed.tolerance}};
  return study;
}

/// An element in a window of its own, with the hand and the keys of a test.
struct ElementRig {
  explicit ElementRig(const Typed& typed = {}, QSize size = {520, 480}) : desk(studyOf(typed)), view(desk) {
    view.resize(size);
    view.show();
    view.activateWindow();
    view.setFocus();
    QApplication::processEvents();
  }

  const std::string& reading() const { return desk.study().points.front().reading; }
  const std::string& line() const { return desk.study().points.front().lines.front().angle; }
  double readingDegrees() const { return desk.readout().reading.value.degrees(); }
  double lineDegrees() const { return desk.readout().lines.front().angle.value.degrees(); }
  int steps() { return desk.undoStack()->index(); }

  ElementGeometry geometry() const { return fittedElement(view.size(), desk.readout().axes); }
  QPoint at(double degrees, double radius) const {
    const Vec place = geometry().pixel(Angle::fromDegrees(degrees), radius);
    return QPointF(place.x, place.y).toPoint();
  }
  QPoint knob() const { return view.placeOf(ElementHandle::reading)->toPoint(); }
  QPoint bar() const { return view.placeOf(ElementHandle::line)->toPoint(); }

  void press(QPoint place, Qt::KeyboardModifiers held = {}) {
    QTest::mousePress(&view, Qt::LeftButton, held, place);
  }
  /// Sent at once, without any other event between two of them.
  void move(QPoint place, Qt::KeyboardModifiers held = {}) {
    QMouseEvent event(QEvent::MouseMove, place, view.mapToGlobal(place), Qt::NoButton, Qt::LeftButton, held);
    QApplication::sendEvent(&view, &event);
  }
  void release(QPoint place, Qt::KeyboardModifiers held = {}) {
    QTest::mouseRelease(&view, Qt::LeftButton, held, place);
  }
  void drag(QPoint from, QPoint to, Qt::KeyboardModifiers held = {}) {
    press(from, held);
    move(to, held);
    release(to, held);
  }
  void key(Qt::Key key, Qt::KeyboardModifiers held = {}) { QTest::keyClick(&view, key, held); }

  Desk desk;
  ElementView view;
};

} // namespace planewright
