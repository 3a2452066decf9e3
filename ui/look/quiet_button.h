// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

#include <QToolButton>

namespace planewright {

/// A button that is only its words, in the colour of a role; with a menu it carries a small triangle.
class QuietButton : public QToolButton {
  Q_OBJECT

public:
  QuietButton(const QString& words, Role role, QWidget* parent);
  /// Also told by a reader of the screen, beside a name of the button's own ("criterion": "sum of squares").
  void setText(const QString& words);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  QFont ownFont() const;

  Role m_role;
};

} // namespace planewright
