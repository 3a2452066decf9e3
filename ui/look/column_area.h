// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QScrollArea>

namespace planewright {

/// A column of the window, which scrolls downwards. It is never made narrower than what stands in it needs,
/// so that no word is cut, whatever the language and the size of text; only beyond `mostColumn` it scrolls
/// sideways too.
class ColumnArea : public QScrollArea {
  Q_OBJECT

public:
  static constexpr int leastColumn = 264; ///< pixels
  static constexpr int mostColumn = 460;  ///< where the text is at 100 %

  explicit ColumnArea(QWidget* parent = nullptr);

  QSize minimumSizeHint() const override;

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;
};

} // namespace planewright
