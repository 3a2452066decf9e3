// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QHeaderView>

namespace planewright {

/// The headings of a table of planes with their indices lowered and the unit behind.
class PlaneHeader : public QHeaderView {
  Q_OBJECT

public:
  explicit PlaneHeader(QWidget* parent);
  /// Room that a column needs for its heading.
  int headingWidth(int section) const;
  QSize sizeHint() const override;

protected:
  void paintEvent(QPaintEvent* event) override;
  void paintSection(QPainter* painter, const QRect& rect, int section) const override;
};

} // namespace planewright
