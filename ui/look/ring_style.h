// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QProxyStyle>

namespace planewright {

/// The style of the standard widgets, but a button that has the keys wears the ring that fields wear.
class RingStyle : public QProxyStyle {
  Q_OBJECT

public:
  RingStyle();

  void drawPrimitive(PrimitiveElement element, const QStyleOption* option, QPainter* painter,
                     const QWidget* widget) const override;
};

} // namespace planewright
