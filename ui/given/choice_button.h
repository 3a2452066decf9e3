// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/look/look.h"

#include <QRadioButton>
#include <QRectF>

#include <functional>

class QPainter;

namespace planewright {

/// One of two choices: a small picture over its words.
class ChoiceButton : public QRadioButton {
  Q_OBJECT

public:
  using Picture = std::function<void(QPainter&, const QRectF&, const Look&)>;
  ChoiceButton(Picture picture, const Text& words, QWidget* parent);

  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  bool hitButton(const QPoint& at) const override { return rect().contains(at); }
  void paintEvent(QPaintEvent* event) override;

private:
  Picture m_picture;
  Runs m_words;
};

} // namespace planewright
