// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QHeaderView>

namespace planewright {

struct Column;

/// The headings of a table of planes with their indices lowered and the unit behind; broken, the words before
/// a symbol stand over it.
class PlaneHeader : public QHeaderView {
  Q_OBJECT

public:
  explicit PlaneHeader(QWidget* parent);
  /// Room that a column needs for its heading, whole or broken.
  int headingWidth(int section, bool broken) const;
  bool isBroken() const { return m_isBroken; }
  void setBroken(bool broken);
  QSize sizeHint() const override;

protected:
  void paintEvent(QPaintEvent* event) override;
  void paintSection(QPainter* painter, const QRect& rect, int section) const override;

private:
  const Column& columnAt(int section) const;

  bool m_isBroken = false;
};

} // namespace planewright
