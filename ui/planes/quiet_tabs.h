// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QTabBar>

namespace planewright {

/// Tabs that are only their words; the current one is bold with a line under it.
class QuietTabs : public QTabBar {
  Q_OBJECT

public:
  explicit QuietTabs(QWidget* parent = nullptr);

protected:
  QSize tabSizeHint(int index) const override;
  QSize minimumTabSizeHint(int index) const override { return tabSizeHint(index); }
  void paintEvent(QPaintEvent* event) override;
};

} // namespace planewright
