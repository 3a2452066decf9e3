// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where this one comes first.
#include "core/screen/summary.h"

#include <QWidget>

namespace planewright {

/// How many points of a field have which utilisation, a bar for each bin of the summary. A click or the space
/// bar chooses the points of a bin, or all again; the arrows go from bin to bin.
class HistogramView : public QWidget {
  Q_OBJECT

public:
  explicit HistogramView(QWidget* parent = nullptr);

  void show(const Histogram& histogram);
  const std::optional<std::size_t>& chosen() const { return m_chosen; }
  /// Where the bar of a bin has its row.
  QRect rowOf(std::size_t bin) const;

  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

signals:
  void choiceMoved();

protected:
  void paintEvent(QPaintEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;

private:
  void toggle(std::size_t bin);
  int rowHeight() const;

  Histogram m_histogram{};
  std::optional<std::size_t> m_chosen;
  std::size_t m_current = 0; ///< where the arrows are
};

} // namespace planewright
