// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/look.h"

#include <QWidget>

#include <optional>

namespace planewright {

/// The column of a page with the figure on it and a rule in mm above. Always white, whatever the window.
class FigurePage : public QWidget {
  Q_OBJECT

public:
  enum class Zoom { fit, trueSize };

  explicit FigurePage(QWidget* parent = nullptr);

  /// Shows this picture; none leaves the page empty.
  void setPicture(std::optional<Picture> picture, Palette palette);
  void setZoom(Zoom zoom);

  /// Pixels of one mm as it is shown now.
  double pixelsPerMm() const;
  /// Where the figure lies in the widget.
  QRectF figureRect() const;

  QSize sizeHint() const override;
  QSize minimumSizeHint() const override;

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  double columnWidth() const;
  QSizeF sheet() const;
  QRectF columnRect() const;
  void paintRule(QPainter& painter) const;

  std::optional<Picture> m_picture;
  Palette m_palette = Palette::paper;
  Zoom m_zoom = Zoom::fit;
};

} // namespace planewright
