// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <QLabel>

namespace planewright {

/// A label on one line whose indices are lowered as in the figure.
class RunsLabel : public QLabel {
  Q_OBJECT

public:
  explicit RunsLabel(const Text& text, QWidget* parent = nullptr);

  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  Runs m_runs;
};

} // namespace planewright
