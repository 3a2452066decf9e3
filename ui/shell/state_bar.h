// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QWidget>

class QLabel;
class QPushButton;

namespace planewright {

class Picker;
class VerdictChip;

/// Says what one looks at: point and combination, and whether that governs; leads to the figure.
class StateBar : public QWidget {
  Q_OBJECT

public:
  static constexpr int barHeight = 40;

  StateBar(Desk& desk, QWidget* parent);

  Picker& points() const { return *m_points; }
  Picker& combinations() const { return *m_combinations; }
  /// "governs here", while the shown combination does and the window is wide enough.
  QLabel& governsHere() const { return *m_governs; }
  VerdictChip& verdict() const { return *m_verdict; }
  QPushButton& figureButton() const { return *m_figure; }

protected:
  void resizeEvent(QResizeEvent* event) override;

private:
  void refresh();
  void refreshGoverns();

  Desk& m_desk;
  Picker* m_points;
  Picker* m_combinations;
  QLabel* m_governs;
  VerdictChip* m_verdict;
  QPushButton* m_figure;
};

} // namespace planewright
