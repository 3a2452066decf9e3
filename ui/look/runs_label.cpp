// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/runs_label.h"

#include "ui/look/look.h"
#include "ui/look/runs_text.h"

#include <QPainter>

namespace planewright {

RunsLabel::RunsLabel(const Text& text, QWidget* parent)
    : QLabel(shown(text), parent), m_runs(runs(text, translation())) {}

QSize RunsLabel::sizeHint() const {
  return {qCeil(runsWidth(m_runs, font())) + 1, fontMetrics().height()};
}

void RunsLabel::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setPen(palette().color(foregroundRole()));
  drawRuns(painter, rect(), m_runs, Qt::AlignLeft);
}

} // namespace planewright
