// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QWidget>

namespace planewright {

/// The key to the signs: a square with the positive stresses of the study's convention, and it in words.
class SenseKey : public QWidget {
  Q_OBJECT

public:
  explicit SenseKey(Desk& desk, QWidget* parent = nullptr);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  std::vector<Text> lines() const;
  void tell();

  Desk& m_desk;
};

} // namespace planewright
