// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/key_stay.h"
#include "ui/element/element_drag.h"
#include "ui/element/scene.h"

#include <QPointer>
#include <QWidget>

namespace planewright {

class AngleField;

/// The stress element with its two handles: the knob turns the reading plane, the bars turn the line. It
/// holds nothing of the study; it paints what the desk reads out and asks the desk for what the hand wants.
class ElementView : public QWidget {
  Q_OBJECT

public:
  explicit ElementView(Desk& desk, QWidget* parent = nullptr);

  void setShowGivenArrows(bool shown);
  void setSnapping(bool snapping);
  bool showsGivenArrows() const { return m_glance.givenArrows; }
  bool snaps() const { return m_glance.snapping; }

  /// The handle that keys turn.
  ElementHandle currentHandle() const { return m_current; }
  /// Where a handle stands in the widget: the knob, the bar nearer to +x; none for bars without a line.
  std::optional<QPointF> placeOf(ElementHandle handle) const;
  /// The picture that is painted, in pixels of its own: it grows with the size of text.
  Picture picture() const;
  /// The angle of a handle (deg, folded) and what it means in words; none for bars without a line.
  std::optional<Angle> angleOf(ElementHandle handle) const;
  QString wordsOf(ElementHandle handle) const;
  /// Turns a handle, as one step of its own.
  void turn(ElementHandle handle, Angle to);

  QSize sizeHint() const override { return {520, 480}; }
  QSize minimumSizeHint() const override { return least; }

signals:
  void currentHandleChanged();

protected:
  bool event(QEvent* event) override;
  bool focusNextPrevChild(bool next) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void leaveEvent(QEvent* event) override;
  void paintEvent(QPaintEvent* event) override;
  void changeEvent(QEvent* event) override;

private:
  static constexpr QSize least = {260, 260};

  double zoom() const;
  QPointF inDrawing(QPointF widget) const { return widget / zoom(); }
  QString wordsOfAll() const;
  void follow();
  ElementGlance glance() const;
  ElementGeometry geometry() const;
  ElementHandle handleAt(QPointF drawn) const;
  Facing& facingOf(ElementHandle handle);
  QString whatTurns(ElementHandle handle) const;
  QString tipAt(QPointF drawn) const;
  void setCurrent(ElementHandle handle);
  void setCursorFor(ElementHandle handle);
  void dragTo(QPointF drawn, Qt::KeyboardModifiers held);
  void putBack();
  void endDrag();
  std::optional<Problem> type(const ElementHold& hold, const std::string& text, Gesture gesture,
                              Angle wanted);
  void turnByKey(const ElementHold& hold, Angle to);
  void openField(const ElementHold& hold);
  void takeTyped(ElementHandle handle, const QString& text);

  Desk& m_desk;
  ElementGlance m_glance; ///< of the window's own; size, focus and drag are added when it is painted
  ElementHandle m_current = ElementHandle::reading;
  std::optional<ElementDrag> m_drag;
  std::optional<Sides> m_sides;
  QPointer<AngleField> m_field;
  KeyStay m_keys;
};

} // namespace planewright
