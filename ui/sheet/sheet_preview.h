// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

#include <QWidget>

namespace planewright {

/// The pages of a sheet under each other, as wide as the view or at true size. Always white, whatever the
/// window.
class SheetPreview : public QWidget {
  Q_OBJECT

public:
  enum class Zoom { width, trueSize };

  explicit SheetPreview(QWidget* parent = nullptr);

  void setPages(std::vector<Picture> pages);
  const std::vector<Picture>& pages() const { return m_pages; }
  void setZoom(Zoom zoom);
  /// Where a page lies in the widget.
  QRectF pageRect(std::size_t page) const;

  QSize sizeHint() const override;
  bool hasHeightForWidth() const override { return m_zoom == Zoom::width; }
  int heightForWidth(int width) const override;

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  double scaleFor(int width) const;

  std::vector<Picture> m_pages;
  Zoom m_zoom = Zoom::width;
};

} // namespace planewright
