// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QProxyStyle>

namespace planewright {

/// The style of the standard widgets, but a button or a link that has the keys wears the ring that fields
/// wear, fields and lists without the keys, boxes and rounds to tick have an edge that is seen in the dark
/// too, the arrow of a sorted column points to where the values go (downwards when they fall), the sign for
/// what has no room in a bar is drawn, and texts in fields, lists and headings keep off the edges and off one
/// another.
class RingStyle : public QProxyStyle {
  Q_OBJECT

public:
  RingStyle();

  void drawPrimitive(PrimitiveElement element, const QStyleOption* option, QPainter* painter,
                     const QWidget* widget) const override;
  int pixelMetric(PixelMetric metric, const QStyleOption* option, const QWidget* widget) const override;
  QIcon standardIcon(StandardPixmap icon, const QStyleOption* option, const QWidget* widget) const override;
  int styleHint(StyleHint hint, const QStyleOption* option, const QWidget* widget,
                QStyleHintReturn* data) const override;
  QRect subElementRect(SubElement element, const QStyleOption* option, const QWidget* widget) const override;

private:
  void drawEdge(const QStyleOption& option, QPainter& painter, const QWidget& widget, double radius) const;
};

} // namespace planewright
