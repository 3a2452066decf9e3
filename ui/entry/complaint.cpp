// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/complaint.h"

#include "ui/look/look.h"

#include <QPainter>
#include <QPolygonF>
#include <QTextLayout>

namespace planewright {

namespace {

constexpr int mostLines = 3;
constexpr int mostLetters = 1000; // three lines never hold more
constexpr int textStart = 14;
constexpr qreal triangle = 8;

/// The lines of a text broken between words, or inside one that is wider than a line.
QStringList broken(const QString& text, const QFont& font, int width) {
  QTextLayout layout(text, font);
  QTextOption option;
  option.setWrapMode(QTextOption::WrapAtWordBoundaryOrAnywhere);
  layout.setTextOption(option);
  layout.beginLayout();
  QStringList lines;
  for (QTextLine line = layout.createLine(); line.isValid(); line = layout.createLine()) {
    line.setLineWidth(width);
    lines += text.mid(line.textStart(), line.textLength()).trimmed();
  }
  layout.endLayout();
  return lines;
}

} // namespace

QStringList complaintLines(const QString& what, const QString& mend, const QFont& font, int width) {
  const QFontMetrics metrics(font);
  if (metrics.horizontalAdvance(what) <= width && metrics.horizontalAdvance(mend) <= width)
    return mend.isEmpty() ? QStringList{what} : QStringList{what, mend};
  QStringList lines = broken(what + QLatin1Char(' ') + mend, font, width);
  if (lines.size() <= mostLines)
    return lines;
  // The longest beginning of the first sentence that leaves room for the second.
  const auto shortened = [&](qsizetype length) {
    return broken(what.left(length).trimmed() + QStringLiteral("… ") + mend, font, width);
  };
  qsizetype fits = 0;
  for (qsizetype tooLong = qMin(what.size(), qsizetype(mostLetters)); tooLong - fits > 1;) {
    const qsizetype middle = (fits + tooLong) / 2;
    (shortened(middle).size() <= mostLines ? fits : tooLong) = middle;
  }
  lines = shortened(fits);
  if (lines.size() > mostLines) {
    const QString rest = lines.mid(mostLines - 1).join(QLatin1Char(' '));
    lines = lines.mid(0, mostLines - 1) << metrics.elidedText(rest, Qt::ElideRight, width);
  }
  return lines;
}

Complaint::Complaint(QWidget* parent) : QWidget(parent) {
  QSizePolicy policy(QSizePolicy::Ignored, QSizePolicy::Minimum);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
}

void Complaint::say(const QString& what, const QString& mend) {
  m_what = what;
  m_mend = mend;
  setToolTip(words());
  updateGeometry();
  update();
}

QString Complaint::words() const {
  return m_mend.isEmpty() ? m_what : m_what + QLatin1Char(' ') + m_mend;
}

QStringList Complaint::linesIn(int width) const {
  return complaintLines(m_what, m_mend, font(), qMax(40, width - textStart));
}

int Complaint::heightForWidth(int width) const {
  return static_cast<int>(linesIn(width).size()) * fontMetrics().lineSpacing() + 2;
}

QSize Complaint::sizeHint() const {
  return {160, heightForWidth(qMax(160, width()))};
}

QSize Complaint::minimumSizeHint() const {
  return {0, fontMetrics().lineSpacing() + 2};
}

void Complaint::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const QColor wrong = lookOf(*this).colour(Role::wrong);
  const QFontMetrics metrics = fontMetrics();
  const qreal foot = metrics.ascent();
  painter.setPen(Qt::NoPen);
  painter.setBrush(wrong);
  painter.drawPolygon(QPolygonF{{0, foot}, {triangle, foot}, {triangle / 2, foot - triangle}});
  painter.setPen(wrong);
  int base = metrics.ascent();
  for (const QString& line : linesIn(width())) {
    painter.drawText(textStart, base, line);
    base += metrics.lineSpacing();
  }
}

} // namespace planewright
