// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/element_view.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"
#include "ui/element/angle_field.h"
#include "ui/element/exact_words.h"
#include "ui/look/dial_access.h"
#include "ui/look/look.h"
#include "ui/look/zoom.h"
#include "ui/paint/painter.h"

#include <QHelpEvent>
#include <QKeyEvent>
#include <QMouseEvent>
#include <QPainter>
#include <QToolTip>

namespace planewright {

ElementView::ElementView(Desk& desk, QWidget* parent) : QWidget(parent), m_desk(desk) {
  setFocusPolicy(Qt::StrongFocus);
  setMouseTracking(true);
  setAttribute(Qt::WA_OpaquePaintEvent);
  // Before anything asks for the view's interface, which Qt keeps from then on.
  makeDial(*this, {[this] { return angleOf(m_current).value_or(Angle()).degrees(); },
                   [this](double degrees) { turn(m_current, Angle::fromDegrees(degrees)); },
                   [this] { return wordsOf(m_current); }, [this] { return wordsOfAll(); }});
  setAccessibleName(tr("Element"));
  setProperty("helpPlace", "drawings#element");
  setProperty("areaKeys", tr("Left/Right turn by 1°, Shift 0.1°, Ctrl 15°"));
  connect(&m_desk, &Desk::changed, this, &ElementView::follow);
}

double ElementView::zoom() const {
  return zoomOf(*this, least);
}

QString ElementView::wordsOfAll() const {
  const QString reading = wordsOf(ElementHandle::reading);
  const QString line = wordsOf(ElementHandle::line);
  return line.isEmpty() ? reading : reading + QStringLiteral("; ") + line;
}

void ElementView::follow() {
  if (m_current == ElementHandle::line && m_desk.readout().lines.empty())
    setCurrent(ElementHandle::reading);
  announceDial(*this);
  update();
}

void ElementView::setShowGivenArrows(bool shown) {
  m_glance.givenArrows = shown;
  update();
}

void ElementView::setSnapping(bool snapping) {
  m_glance.snapping = snapping;
  update();
}

ElementGlance ElementView::glance() const {
  ElementGlance glance = m_glance;
  glance.size = QSizeF(size()) / zoom();
  glance.focused = hasFocus() ? m_current : ElementHandle::none;
  if (m_drag) {
    glance.held = m_drag->handle();
    glance.onSnap = m_drag->onSnap();
    glance.sides = m_sides;
  }
  return glance;
}

ElementGeometry ElementView::geometry() const {
  return fittedElement(QSizeF(size()) / zoom(), m_desk.readout().axes);
}

Picture ElementView::picture() const {
  return elementScene(m_desk.study(), m_desk.readout(), glance(), translation()).picture;
}

std::optional<Angle> ElementView::angleOf(ElementHandle handle) const {
  const std::optional<ElementHold> hold = holdOf(m_desk.readout(), handle);
  return hold ? std::optional(hold->folded) : std::nullopt;
}

std::optional<QPointF> ElementView::placeOf(ElementHandle handle) const {
  const std::optional<Angle> angle = angleOf(handle);
  if (!angle)
    return std::nullopt;
  const bool reading = handle == ElementHandle::reading;
  const Angle shown = reading ? m_glance.knob.shown(*angle) : *angle;
  const Vec at = geometry().pixel(shown, reading ? part::knob : part::lineEnd);
  return QPointF(at.x, at.y) * zoom();
}

ElementHandle ElementView::handleAt(QPointF drawn) const {
  const Angle knob = m_glance.knob.shown(m_desk.readout().reading.value);
  return geometry().handleAt(drawn, knob, angleOf(ElementHandle::line));
}

Facing& ElementView::facingOf(ElementHandle handle) {
  return handle == ElementHandle::line ? m_glance.end : m_glance.knob;
}

void ElementView::paintEvent(QPaintEvent*) {
  ElementScene scene = elementScene(m_desk.study(), m_desk.readout(), glance(), translation());
  m_sides = std::move(scene.sides);
  const Look look = lookOf(*this);
  QPainter painter(this);
  painter.fillRect(rect(), look.colour(Role::canvas));
  painter.scale(zoom(), zoom());
  paintPicture(painter, scene.picture, look.palette);
}

void ElementView::changeEvent(QEvent* event) {
  QWidget::changeEvent(event);
  update();
}

// --- the hand

void ElementView::mousePressEvent(QMouseEvent* event) {
  const ElementHandle handle = handleAt(inDrawing(event->position()));
  const std::optional<ElementHold> hold = holdOf(m_desk.readout(), handle);
  if (event->button() != Qt::LeftButton || !hold || m_drag)
    return;
  QToolTip::hideText();
  setCurrent(handle);
  m_keys.end();
  m_drag.emplace(m_desk.study(), *hold, facingOf(handle), inDrawing(event->position()), m_desk.newGesture());
  setCursor(Qt::ClosedHandCursor);
  update();
}

void ElementView::mouseMoveEvent(QMouseEvent* event) {
  // A release that went elsewhere ends the drag as well.
  if (m_drag && !(event->buttons() & Qt::LeftButton))
    endDrag();
  if (m_drag)
    dragTo(inDrawing(event->position()), event->modifiers());
  else
    setCursorFor(handleAt(inDrawing(event->position())));
}

void ElementView::mouseReleaseEvent(QMouseEvent* event) {
  if (event->button() != Qt::LeftButton || !m_drag)
    return;
  dragTo(inDrawing(event->position()), event->modifiers());
  endDrag();
  setCursorFor(handleAt(inDrawing(event->position())));
}

void ElementView::leaveEvent(QEvent*) {
  setCursorFor(ElementHandle::none);
}

void ElementView::dragTo(QPointF drawn, Qt::KeyboardModifiers held) {
  const std::optional<ElementHold> hold = holdOf(m_desk.readout(), m_drag->handle());
  if (!hold || hold->place != m_drag->place())
    return;
  const std::optional<std::string> text = m_drag->moved(geometry(), *hold, drawn, held, m_glance.snapping);
  if (text)
    type(*hold, *text, m_drag->gesture(), m_drag->wanted());
}

/// Escape: the state at the start under the same gesture leaves no step of undo.
void ElementView::putBack() {
  m_desk.request({Type{m_drag->place(), m_drag->startText()}}, m_drag->gesture(),
                 whatTurns(m_drag->handle()));
  facingOf(m_drag->handle()) = m_drag->startFacing();
  m_drag.reset();
  setCursorFor(ElementHandle::none);
  update();
}

void ElementView::endDrag() {
  m_drag.reset();
  update();
}

/// Asks the desk; the handle keeps the side on which the hand wants it.
std::optional<Problem> ElementView::type(const ElementHold& hold, const std::string& text, Gesture gesture,
                                         Angle wanted) {
  std::optional<Problem> problem = m_desk.request({Type{hold.place, text}}, gesture, whatTurns(hold.handle));
  if (problem)
    m_desk.say(shown(*problem));
  else
    facingOf(hold.handle).keepNear(wanted, *angleOf(hold.handle));
  update();
  return problem;
}

void ElementView::turn(ElementHandle handle, Angle to) {
  if (const std::optional<ElementHold> hold = holdOf(m_desk.readout(), handle))
    type(*hold, angleText(folded(to)), m_desk.newCommand(), to);
}

// --- the keys

void ElementView::setCurrent(ElementHandle handle) {
  m_keys.end();
  if (handle == m_current)
    return;
  m_current = handle;
  announceDial(*this);
  update();
  Q_EMIT currentHandleChanged();
}

bool ElementView::focusNextPrevChild(bool next) {
  const ElementHandle wanted = next ? ElementHandle::line : ElementHandle::reading;
  if (!hasFocus() || m_current == wanted || !angleOf(wanted))
    return QWidget::focusNextPrevChild(next);
  setCurrent(wanted);
  return true;
}

void ElementView::focusInEvent(QFocusEvent* event) {
  QWidget::focusInEvent(event);
  if (event->reason() == Qt::TabFocusReason)
    setCurrent(ElementHandle::reading);
  else if (event->reason() == Qt::BacktabFocusReason && angleOf(ElementHandle::line))
    setCurrent(ElementHandle::line);
}

void ElementView::focusOutEvent(QFocusEvent* event) {
  QWidget::focusOutEvent(event);
  m_keys.end();
}

void ElementView::keyPressEvent(QKeyEvent* event) {
  const std::optional<ElementHold> hold = holdOf(m_desk.readout(), m_current);
  if (m_drag && event->key() == Qt::Key_Escape)
    return putBack();
  if (m_drag || !hold)
    return QWidget::keyPressEvent(event);
  if (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter)
    return openField(*hold);
  // Paging with Ctrl or Alt belongs to points and combinations.
  const bool pages = event->key() == Qt::Key_PageUp || event->key() == Qt::Key_PageDown;
  const Qt::KeyboardModifiers others = pages ? Qt::ControlModifier | Qt::AltModifier : Qt::AltModifier;
  const std::optional<Angle> to =
      event->modifiers() & (others | Qt::MetaModifier)
          ? std::nullopt
          : keyedTurn(hold->folded, event->key(), event->modifiers(), hold->directions);
  if (!to)
    return QWidget::keyPressEvent(event);
  turnByKey(*hold, *to);
}

void ElementView::turnByKey(const ElementHold& hold, Angle to) {
  const Angle from = facingOf(hold.handle).shown(hold.folded);
  type(hold, angleText(to), m_keys.gestureOn(hold.place, m_desk), from);
  m_keys.pressed(m_desk);
}

void ElementView::openField(const ElementHold& hold) {
  m_field = new AngleField(fromUtf8(textAt(m_desk.study(), hold.place).value_or(std::string())), this);
  m_field->setAccessibleName(wordsOf(hold.handle));
  const QPointF at = placeOf(hold.handle).value_or(QPointF());
  m_field->adjustSize();
  constexpr int beside = 14;
  m_field->move(qBound(0, qRound(at.x()) + beside, qMax(0, width() - m_field->width())),
                qBound(0, qRound(at.y()) - m_field->height() / 2, qMax(0, height() - m_field->height())));
  connect(m_field, &AngleField::offered, this,
          [this, handle = hold.handle](const QString& text) { takeTyped(handle, text); });
  m_field->show();
  m_field->setFocus(Qt::OtherFocusReason);
}

void ElementView::takeTyped(ElementHandle handle, const QString& text) {
  if (const std::optional<ElementHold> hold = holdOf(m_desk.readout(), handle)) {
    if (const auto problem = type(*hold, text.toStdString(), m_desk.newCommand(), hold->folded))
      return m_field->refuse(shown(*problem));
  }
  setFocus(Qt::OtherFocusReason);
}

// --- the words

QString ElementView::whatTurns(ElementHandle handle) const {
  if (handle == ElementHandle::line && !m_desk.readout().lines.empty())
    return tr("Turn the %1").arg(fromUtf8(m_desk.readout().lines.front().name));
  return tr("Turn the reading plane");
}

QString ElementView::wordsOf(ElementHandle handle) const {
  const std::optional<Angle> angle = angleOf(handle);
  if (!angle)
    return {};
  const QString degrees = fromUtf8(shownNumber(angle->degrees(), 1));
  if (handle == ElementHandle::line)
    return tr("%1, at %2 degrees, changes what is given")
        .arg(fromUtf8(m_desk.readout().lines.front().name), degrees);
  return tr("reading plane, normal at %1 degrees").arg(degrees);
}

QString ElementView::tipAt(QPointF drawn) const {
  switch (handleAt(drawn)) {
  case ElementHandle::reading:
    return tr("turn the reading plane");
  case ElementHandle::line:
    return tr("turn the %1: changes what is given").arg(fromUtf8(m_desk.readout().lines.front().name));
  case ElementHandle::none:
    break;
  }
  return exactWords(m_desk.study(), m_desk.readout(), picture(), drawn);
}

void ElementView::setCursorFor(ElementHandle handle) {
  if (handle == ElementHandle::none)
    unsetCursor();
  else
    setCursor(Qt::OpenHandCursor);
}

bool ElementView::event(QEvent* event) {
  if (event->type() == QEvent::ToolTip) {
    const auto* help = static_cast<QHelpEvent*>(event);
    const QString tip = m_drag ? QString() : tipAt(inDrawing(help->pos()));
    if (tip.isEmpty())
      QToolTip::hideText();
    else
      QToolTip::showText(help->globalPos(), tip, this);
    return true;
  }
  // During a drag Escape is ours, whatever else it would close.
  if (event->type() == QEvent::ShortcutOverride && m_drag &&
      static_cast<QKeyEvent*>(event)->key() == Qt::Key_Escape)
    event->accept();
  return QWidget::event(event);
}

} // namespace planewright
