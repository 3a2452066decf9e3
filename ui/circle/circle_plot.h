// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/chart/frame.h"
#include "ui/circle/circle_drag.h"
#include "ui/circle/circle_fit.h"
#include "ui/circle/circle_labels.h"
#include "ui/desk/key_stay.h"

#include <QTimer>

class QGraphicsPathItem;
class QGraphicsRectItem;
class QLineSeries;

namespace planewright {

class PictureItem;

/// Mohr's circle of the shown state with its marks, and the two handles that turn the reading plane and
/// change the x face. It holds nothing of the study: everything is drawn from the desk's readout.
class CirclePlot : public EqualScaleFrame {
  Q_OBJECT

public:
  CirclePlot(Desk& desk, QWidget* parent);

  Fit fit() const { return m_fit; }
  void setFit(Fit fit);

  /// Where a handle stands in the widget; none for an ear that does not exist.
  std::optional<QPointF> handleAt(Handle handle) const;
  /// What the arrow keys move.
  Handle currentHandle() const { return m_handle; }
  const CircleLabels& labels() const { return m_labels; }
  Round round() const { return stage().round(); }
  /// The normal of the reading plane, folded.
  Angle reading() const { return m_desk.readout().reading.value; }
  bool isDragging() const { return m_drag.has_value(); }
  /// What is said about this place of the widget.
  QString tipAt(QPointF pixel) const;
  /// What the circle reads out, without a picture.
  QString stressesInWords() const;
  /// Turns the reading plane as one step of its own.
  void turnTo(Angle normal);

signals:
  /// Enter was pressed on the reading mark: an angle is to be typed.
  void angleEntryWanted();

protected:
  EqualScale fittedTo(const QRectF& plot) const override;
  void arrange() override;

  bool viewportEvent(QEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void mouseDoubleClickEvent(QMouseEvent* event) override;
  void wheelEvent(QWheelEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;
  bool focusNextPrevChild(bool next) override;

private:
  Stage stage() const { return {m_desk.study(), m_desk.readout(), scale()}; }
  void follow();
  void rest();
  void arrangeCircle();
  void arrangeOthers();
  void arrangeLabels();
  void arrangeHandles();

  std::optional<QPointF> placeOf(Handle handle) const;
  std::optional<Handle> handleUnder(QPointF pixel) const;
  QString tipOf(QPointF pixel) const;
  void startDrag(Handle handle, QPointF pixel);
  void endDrag();
  void cancelDrag();
  void hover(QPointF pixel);
  void hoverNothing();
  void highlight(const StateReading* other);
  void take(Handle handle);
  bool turnByKey(const QKeyEvent& event);
  bool moveEarByKey(const QKeyEvent& event);
  void ask(const Edits& edits, Gesture gesture, const QString& what);
  void askByKey(const Place& place, const Edits& edits, const QString& what);

  Desk& m_desk;
  Fit m_fit = Fit::thisCircle;
  Handle m_handle = Handle::reading;
  std::optional<CircleDrag> m_drag;
  KeyStay m_keys;
  QTimer m_settle;                    ///< runs while changes follow each other closely
  std::optional<CircleLabels> m_ride; ///< labels as they stood when something began to move
  CircleLabels m_labels;
  QString m_hovered; ///< the combination whose circle is under the pointer

  QLineSeries* m_circle;
  QGraphicsRectItem* m_plotClip;
  QGraphicsPathItem* m_shape;
  QGraphicsPathItem* m_hairlines;
  QGraphicsPathItem* m_extremes;
  QGraphicsPathItem* m_old; ///< the circle as it was before its ear was drawn
  QGraphicsPathItem* m_near;
  PictureItem* m_failure;
  PictureItem* m_ranges;
  PictureItem* m_words;
  PictureItem* m_leaders;
  PictureItem* m_still;
  PictureItem* m_reading;
  PictureItem* m_ear;
  PictureItem* m_names;
  PictureItem* m_focus;
};

} // namespace planewright
