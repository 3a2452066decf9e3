// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where these come first.
#include "ui/desk/beside.h"
#include "ui/screen/map_picture.h"

#include <QWidget>

class QItemSelectionModel;

namespace planewright {

class FieldModel;

/// A map of the points of a table, coloured by utilisation, at one scale with y upwards. A click makes the
/// point that is seen there the current row; the current row has a ring. The wheel or + and - zoom, a drag or
/// the arrows move, Home shows all; Ctrl and an arrow choose the nearest point that way. It is drawn beside
/// the window.
class FieldMapView : public QWidget {
  Q_OBJECT

public:
  /// Shows what the model has; `current` is the choice of rows that it shares with the table.
  FieldMapView(const FieldModel& model, QItemSelectionModel& current, QWidget* parent = nullptr);

  /// The point that is seen at a place of the widget, or near it.
  std::optional<std::uint32_t> pointAt(QPointF at) const;
  /// Where a point lies in the widget.
  QPointF placeOf(std::uint32_t point) const;
  /// Whether what is shown is drawn as it now stands.
  bool isDrawn() const;
  void showAll();

  QSize sizeHint() const override { return {320, 260}; }
  QSize minimumSizeHint() const override { return {160, 120}; }

protected:
  bool event(QEvent* event) override;
  void paintEvent(QPaintEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void wheelEvent(QWheelEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;

private:
  bool hasMap() const;
  QSize mapSize() const;
  MapView view() const;
  MapOrder order() const;
  void ask(const MapOrder& order);
  void zoom(double factor, QPointF around);
  void move(QPointF pixels);
  void pick(QPointF at);
  void pick(MapWay way);
  void choose(std::uint32_t point);
  std::optional<std::uint32_t> current() const;
  void drawMap(QPainter& painter) const;
  void drawRing(QPainter& painter) const;
  void drawScale(QPainter& painter) const;

  const FieldModel& m_model;
  QItemSelectionModel& m_current;
  double m_zoom = 1;
  std::optional<QPointF> m_centre; ///< mm; that of the extent unless moved
  QPointF m_pressed;
  QPointF m_last;
  bool m_isMoving = false;
  MapOrder m_asked;
  std::shared_ptr<const MapPicture> m_picture;
  Beside m_drawing;
};

} // namespace planewright
