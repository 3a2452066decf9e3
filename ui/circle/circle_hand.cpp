// SPDX-License-Identifier: GPL-3.0-or-later
// Pointer and keys on the circle.
#include "ui/circle/circle_plot.h"

#include "core/study/cut_text.h"
#include "ui/circle/others.h"
#include "ui/circle/ranges.h"

#include <QCoreApplication>
#include <QFocusEvent>
#include <QGraphicsPathItem>
#include <QHelpEvent>
#include <QKeyEvent>
#include <QMouseEvent>
#include <QStatusTipEvent>
#include <QToolTip>
#include <QWheelEvent>

#include <cmath>

namespace planewright {

namespace {

/// Half of a target's width.
constexpr double targetReach = 13;
constexpr double hoverReach = 4;

double distance(QPointF a, QPointF b) {
  return std::hypot(a.x() - b.x(), a.y() - b.y());
}

/// The whole-tick share that a key moves the ear by.
double earStep(double tick, Qt::KeyboardModifiers held) {
  const double step = decadeBelow(tick * 1.0001) / 10;
  if (held & Qt::ShiftModifier)
    return step / 10;
  return held & Qt::ControlModifier ? 10 * step : step;
}

QPointF directionOf(int key, bool yDown) {
  switch (key) {
  case Qt::Key_Left:
    return {-1, 0};
  case Qt::Key_Right:
    return {1, 0};
  case Qt::Key_Up:
    return {0, yDown ? -1.0 : 1.0};
  case Qt::Key_Down:
    return {0, yDown ? 1.0 : -1.0};
  default:
    return {};
  }
}

} // namespace

std::optional<Handle> CirclePlot::handleUnder(QPointF pixel) const {
  std::optional<Handle> nearest;
  double least = targetReach;
  for (const Handle handle : {Handle::reading, Handle::ear})
    if (const std::optional<QPointF> at = placeOf(handle); at && distance(*at, pixel) <= least) {
      least = distance(*at, pixel);
      nearest = handle;
    }
  return nearest;
}

QString CirclePlot::tipAt(QPointF pixel) const {
  return tipOf(inDrawing(pixel));
}

QString CirclePlot::tipOf(QPointF pixel) const {
  const Stage now = stage();
  const std::optional<Handle> handle = handleUnder(pixel);
  if (handle == Handle::reading)
    return now.readout.state().circle.radius > 0
               ? tr("Turn the reading plane")
               : tr("Every direction is principal: the arrow keys turn the plane");
  if (handle == Handle::ear)
    return tr("Draw the x face: changes σx and τxy of case %1")
        .arg(fromUtf8(draggableCase(now.study, now.readout).value_or(std::string())));
  if (distance(xMarkAt(now), pixel) <= targetReach && !handleAt(Handle::ear))
    return tr("The x face cannot be drawn here: %1 is not one case with factor 1,\n"
              "so a drag would not say which case to change.")
        .arg(fromUtf8(now.readout.state().combination));
  return m_hovered.isEmpty() ? shown(rangeWords(now, pixel)) : m_hovered;
}

bool CirclePlot::viewportEvent(QEvent* event) {
  if (event->type() == QEvent::ToolTip) {
    const auto* help = static_cast<QHelpEvent*>(event);
    const QString tip = m_drag ? QString() : tipAt(help->pos());
    QToolTip::showText(help->globalPos(), tip, this);
    return true;
  }
  if (event->type() == QEvent::Leave)
    hoverNothing();
  return EqualScaleFrame::viewportEvent(event);
}

void CirclePlot::mousePressEvent(QMouseEvent* event) {
  if (event->button() != Qt::LeftButton || m_drag)
    return;
  const QPointF pixel = inDrawing(event->position());
  if (const std::optional<Handle> handle = handleUnder(pixel))
    startDrag(*handle, pixel);
  else if (const StateReading* other = nearestOther(stage(), pixel, hoverReach))
    m_desk.show(m_desk.readout().point, other->combination);
}

void CirclePlot::startDrag(Handle handle, QPointF pixel) {
  take(handle);
  const Stage now = stage();
  const std::optional<std::string> caseId = draggableCase(now.study, now.readout);
  if (handle == Handle::ear && caseId) {
    QPainterPath old;
    old.addEllipse(now.round().centre, now.round().radius, now.round().radius);
    m_old->setPath(old);
    m_drag = CircleDrag{EarDrag(now, *caseId, pixel), m_desk.newGesture()};
  } else if (now.round().radius > 0) {
    m_drag = CircleDrag{ReadingDrag(now, pixel), m_desk.newGesture()};
  }
  if (m_drag)
    viewport()->setCursor(Qt::ClosedHandCursor);
}

void CirclePlot::mouseMoveEvent(QMouseEvent* event) {
  const QPointF pixel = inDrawing(event->position());
  // A release that went elsewhere ends the drag as well.
  if (m_drag && !(event->buttons() & Qt::LeftButton))
    endDrag();
  if (!m_drag) {
    hover(pixel);
    return;
  }
  if (auto* turning = std::get_if<ReadingDrag>(&m_drag->hand))
    ask(turning->moved(stage(), pixel, event->modifiers()), m_drag->gesture, tr("Turn the reading plane"));
  else
    ask(std::get<EarDrag>(m_drag->hand).moved(stage(), pixel), m_drag->gesture, tr("Draw the x face"));
}

void CirclePlot::mouseReleaseEvent(QMouseEvent* event) {
  if (event->button() == Qt::LeftButton && m_drag)
    endDrag();
}

void CirclePlot::mouseDoubleClickEvent(QMouseEvent* event) {
  mousePressEvent(event);
}

void CirclePlot::endDrag() {
  m_drag.reset();
  m_ride.reset();
  m_settle.stop();
  m_old->setPath({});
  m_keys.end();
  viewport()->unsetCursor();
  refit();
}

void CirclePlot::cancelDrag() {
  const Edits before = std::visit([](const auto& hand) { return hand.restored(); }, m_drag->hand);
  ask(before, m_drag->gesture, QString());
  endDrag();
}

void CirclePlot::hover(QPointF pixel) {
  const std::optional<Handle> handle = handleUnder(pixel);
  const StateReading* other = handle ? nullptr : nearestOther(stage(), pixel, hoverReach);
  viewport()->setCursor(handle ? Qt::OpenHandCursor : other ? Qt::PointingHandCursor : Qt::ArrowCursor);
  highlight(other);
}

void CirclePlot::hoverNothing() {
  if (!m_hovered.isEmpty())
    highlight(nullptr);
}

/// Draws the circle of the state under the pointer, and names it in the status line.
void CirclePlot::highlight(const StateReading* other) {
  const QString name = other ? fromUtf8(other->combination) : QString();
  if (name == m_hovered)
    return;
  m_hovered = name;
  QPainterPath near;
  if (other) {
    const Round round = stage().roundOf(*other);
    near.addEllipse(round.centre, round.radius, round.radius);
  }
  m_near->setPath(near);
  QStatusTipEvent tip(name);
  QCoreApplication::sendEvent(this, &tip);
}

void CirclePlot::wheelEvent(QWheelEvent* event) {
  event->ignore();
}

void CirclePlot::keyPressEvent(QKeyEvent* event) {
  const bool foreign = event->modifiers() & (Qt::AltModifier | Qt::MetaModifier);
  if (m_drag) {
    if (event->key() == Qt::Key_Escape)
      cancelDrag();
    return;
  }
  if (!foreign && (m_handle == Handle::ear ? moveEarByKey(*event) : turnByKey(*event)))
    return;
  event->ignore();
}

bool CirclePlot::turnByKey(const QKeyEvent& event) {
  if (event.key() == Qt::Key_Return || event.key() == Qt::Key_Enter) {
    Q_EMIT angleEntryWanted();
    return true;
  }
  const Readout& readout = m_desk.readout();
  const std::optional<Angle> turned =
      keyedTurn(readout.reading.value, event.key(), event.modifiers(), directionsForNormal(readout));
  if (turned)
    askByKey(readingPlace(readout), {Type{readingPlace(readout), angleText(*turned)}},
             tr("Turn the reading plane"));
  return turned.has_value();
}

bool CirclePlot::moveEarByKey(const QKeyEvent& event) {
  const Stage now = stage();
  const std::optional<std::string> caseId = draggableCase(now.study, now.readout);
  const QPointF direction = directionOf(event.key(), scale().yDown());
  if (!caseId || direction.isNull())
    return false;
  const double step = earStep(tick(), event.modifiers());
  const QPointF values =
      plotted(now.study, planeAt(now.readout.state(), {Angle()}).traction) + step * direction;
  askByKey({Spot::caseStress, now.readout.point, *caseId},
           xFaceEdits(now.study, now.readout, *caseId, values, step), tr("Draw the x face"));
  return true;
}

void CirclePlot::turnTo(Angle normal) {
  ask({Type{readingPlace(m_desk.readout()), angleText(folded(normal))}}, m_desk.newGesture(),
      tr("Turn the reading plane"));
}

void CirclePlot::take(Handle handle) {
  m_handle = handle;
  m_keys.end();
  arrangeHandles();
}

void CirclePlot::focusInEvent(QFocusEvent* event) {
  EqualScaleFrame::focusInEvent(event);
  const bool fromBehind = event->reason() == Qt::BacktabFocusReason && handleAt(Handle::ear);
  const bool fromBefore = event->reason() == Qt::TabFocusReason || !handleAt(m_handle);
  take(fromBehind ? Handle::ear : fromBefore ? Handle::reading : m_handle);
}

void CirclePlot::focusOutEvent(QFocusEvent* event) {
  EqualScaleFrame::focusOutEvent(event);
  arrangeHandles();
}

bool CirclePlot::focusNextPrevChild(bool next) {
  const Handle other = next ? Handle::ear : Handle::reading;
  if (hasFocus() && m_handle != other && handleAt(other)) {
    take(other);
    return true;
  }
  return QWidget::focusNextPrevChild(next);
}

void CirclePlot::ask(const Edits& edits, Gesture gesture, const QString& what) {
  if (const std::optional<Problem> problem = m_desk.request(edits, gesture, what))
    m_desk.say(shown(*problem));
}

void CirclePlot::askByKey(const Place& place, const Edits& edits, const QString& what) {
  ask(edits, m_keys.gestureOn(place, m_desk), what);
  m_keys.pressed(m_desk);
}

} // namespace planewright
