// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/utilisation_drawing.h"
#include "ui/desk/desk.h"
#include "ui/desk/key_stay.h"
#include "ui/look/look.h"

#include <QChartView>

#include <functional>

class QLineSeries;
class QValueAxis;

namespace planewright {

class PictureItem;

/// Utilisation over the angle of the line (or the normal of the plane) of the selected check: the shown
/// combination, the greatest of all, the limit, the band, the worst, the angles within the limit. Dragging
/// the cursor turns the line; everything else follows from the desk.
class UtilisationPlot : public QChartView {
  Q_OBJECT

public:
  UtilisationPlot(Desk& desk, std::function<std::optional<std::size_t>()> selected, QWidget* parent);

  bool isLogarithmic() const { return m_logarithmic; }
  void setLogarithmic(bool logarithmic);
  /// Whether the shown curves reach far beyond the limit, so that a logarithmic scale helps.
  bool reachesFar() const { return isFarBeyond(m_highest); }
  /// In the pixels of the drawing.
  const UtilisationFrame& frame() const { return m_frame; }
  QSize sizeHint() const override { return {300, 240}; }
  bool hasHeightForWidth() const override { return true; }
  int heightForWidth(int width) const override { return width * 4 / 5; }
  /// How much larger than its own pixels the drawing stands in the widget, which follows the size of text.
  double zoom() const;
  /// After another check was selected.
  void refresh();

signals:
  void reachChanged();

protected:
  bool viewportEvent(QEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;
  void changeEvent(QEvent* event) override;
  void showEvent(QShowEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;

private:
  /// A drag of the cursor.
  struct Hold {
    Gesture gesture;
    std::string textAtStart;
    double grip = 0; ///< deg from the cursor to the pointer
  };

  void chooseScale(const std::optional<WorstInBand>& worst);
  void layOut(const UtilisationCurves& curves);
  void drawCurves(const UtilisationCurves& curves);
  void put(QLineSeries& series, const UtilisationCurve& curve);
  std::optional<Place> turnedPlace() const;
  Angle nominal() const;
  void turnTo(double degrees, Gesture gesture);
  QPointF inDrawing(QPointF widget) const { return widget / zoom(); }
  QString tipAt(QPointF drawn) const;

  Desk& m_desk;
  std::function<std::optional<std::size_t>()> m_selectedIndex;
  UtilisationFrame m_frame;
  bool m_logarithmic = false;
  std::optional<bool> m_chosenScale; ///< that the user wants logarithmic or not
  double m_highest = 0;
  std::optional<Hold> m_hold;
  KeyStay m_keys;
  QValueAxis* m_x;
  QValueAxis* m_y;
  QLineSeries* m_shown;
  QLineSeries* m_greatest;
  PictureItem* m_ground;
  PictureItem* m_others;
  PictureItem* m_marks;
};

} // namespace planewright
