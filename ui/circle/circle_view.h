// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

class QAction;
class QLabel;

namespace planewright {

class CirclePlot;
class Desk;
class QuietButton;

/// The panel of the circle: heading, the menu of what the axes are fitted to, and the plot.
class CircleView : public QWidget {
  Q_OBJECT

public:
  CircleView(Desk& desk, QWidget* parent);

  CirclePlot& plot() { return *m_plot; }

public slots:
  /// Fits the axes to the shown circle.
  void fit();

signals:
  /// Enter was pressed on the reading mark: an angle is to be typed.
  void angleEntryWanted();

protected:
  void resizeEvent(QResizeEvent* event) override;
  void paintEvent(QPaintEvent* event) override;

private:
  void showFit();

  QLabel* m_heading;
  CirclePlot* m_plot;
  QuietButton* m_menu;
  QAction* m_this;
  QAction* m_all;
  QAction* m_limit;
};

} // namespace planewright
