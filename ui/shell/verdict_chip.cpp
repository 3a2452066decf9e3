// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/verdict_chip.h"

#include "core/table/check_words.h"
#include "ui/look/standing_mark.h"

#include <QPainter>

namespace planewright {

namespace {

constexpr int markSize = 12;
constexpr int padding = 8;
constexpr int gap = 6;
constexpr int chipHeight = 26;

} // namespace

VerdictChip::VerdictChip(Desk& desk, QWidget* parent) : QAbstractButton(parent), m_desk(desk) {
  setProperty("helpPlace", "strength#verdict");
  setFocusPolicy(Qt::TabFocus);
  setCursor(Qt::PointingHandCursor);
  connect(&m_desk, &Desk::changed, this, &VerdictChip::refresh);
  refresh();
}

void VerdictChip::setNotTaken(int entries) {
  m_notTaken = entries;
  refresh();
}

void VerdictChip::setNamesPoint(bool names) {
  m_namesPoint = names;
  refresh();
}

void VerdictChip::refresh() {
  const Verdict verdict = verdictOf(m_desk.readout());
  QString words = shown(shortVerdict(verdict));
  if (m_notTaken > 0 && verdict.standing != Standing::notChecked)
    words = tr("%1, %n entry not taken", nullptr, m_notTaken)
                .replace(QStringLiteral("%1"), shown(wordOfStanding(verdict.standing)));
  if (m_namesPoint)
    words = tr("this point: %1").arg(words);
  setText(words);
  setAccessibleName(tr("Verdict: %1").arg(words));
  QString tip = shown(verdictSentence(verdict));
  if (verdict.governing)
    tip +=
        QLatin1Char(' ') + tr("Worst of all combinations: %1.")
                               .arg(fromUtf8(m_desk.readout().states[verdict.governing->state].combination));
  setToolTip(tip);
  updateGeometry();
  update();
}

QSize VerdictChip::sizeHint() const {
  return {padding + markSize + gap + fontMetrics().horizontalAdvance(text()) + padding, chipHeight};
}

void VerdictChip::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  const Standing standing = verdictOf(m_desk.readout()).standing;
  const QColor ink = look.colour(standing == Standing::exceeds ? Role::limit : Role::ink);
  const QColor edge = hasFocus() ? look.colour(Role::focus) : ink;
  painter.setPen(QPen(edge, hasFocus() ? 2 : 1));
  painter.setBrush(look.colour(Role::canvas));
  painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 3, 3);
  paintStandingMark(painter, {padding, (height() - markSize) / 2.0, markSize, markSize}, standing, look);
  painter.setPen(ink);
  const QRect words = rect().adjusted(padding + markSize + gap, 0, -padding, 0);
  painter.drawText(words, Qt::AlignVCenter | Qt::AlignLeft, text());
}

} // namespace planewright
