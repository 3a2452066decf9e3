// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QAbstractButton>

namespace planewright {

/// How the shown point stands over all combinations: mark, word and number. While an entry has not been taken
/// it says so, since the verdict is that of the study without it. A click leads to the strengths.
class VerdictChip : public QAbstractButton {
  Q_OBJECT

public:
  VerdictChip(Desk& desk, QWidget* parent);

  /// Beside a page of all points it says of which one it speaks.
  void setNamesPoint(bool names);

  /// How many entries stand in fields that the study has not taken.
  void setNotTaken(int entries);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  void refresh();

  Desk& m_desk;
  int m_notTaken = 0;
  bool m_namesPoint = false;
};

} // namespace planewright
