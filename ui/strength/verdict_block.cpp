// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/verdict_block.h"

#include "core/table/check_words.h"
#include "ui/look/look.h"
#include "ui/look/standing_mark.h"
#include "ui/look/steady_label.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QPainter>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int largeFigures = 20; // px
constexpr int markSize = 14;
constexpr int edge = 2;

Text joined(const Text& first, const Text& second) {
  if (first.empty() || second.empty())
    return first.empty() ? second : first;
  return PW_TEXT("Check", "%1 %2").with(first).with(second);
}

} // namespace

VerdictBlock::VerdictBlock(Desk& desk, QWidget* parent)
    : QFrame(parent), m_desk(desk), m_word(new QLabel(this)), m_number(new QLabel(this)),
      m_sentences(new SteadyLabel(this)) {
  QFont bold = m_word->font();
  bold.setBold(true);
  m_word->setFont(bold);
  QFont large = bold;
  large.setPixelSize(largeFigures);
  m_number->setFont(large);
  auto* head = new QHBoxLayout;
  head->setContentsMargins(markSize + 8, 0, 0, 0);
  head->addWidget(m_word);
  head->addStretch();
  head->addWidget(m_number);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(10, 8, 10, 8);
  rows->setSpacing(4);
  rows->addLayout(head);
  rows->addWidget(m_sentences);
  setAccessibleName(tr("Verdict"));
  connect(&m_desk, &Desk::changed, this, &VerdictBlock::refresh);
  refresh();
}

QString VerdictBlock::word() const {
  return m_word->text();
}
QString VerdictBlock::number() const {
  return m_number->text();
}
QString VerdictBlock::sentences() const {
  return m_sentences->text();
}

void VerdictBlock::refresh() {
  const Readout& readout = m_desk.readout();
  const Verdict verdict = verdictOf(readout);
  m_word->setText(shown(wordOfStanding(verdict.standing)));
  const bool hasNumber = verdict.stressed && verdict.governing && verdict.standing != Standing::unjudged;
  m_number->setVisible(hasNumber);
  Text sentences = verdictSentence(verdict);
  if (hasNumber) {
    const CheckReading& reading = readingOf(readout, *verdict.governing);
    m_number->setText(shown(shownWorst(reading)));
    m_number->setFixedSize(m_number->sizeHint()); // a text of the same size moves nothing
    const CheckSetup& check = readout.checks[verdict.governing->check];
    if (readout.checks.size() > 1)
      sentences = joined(sentences, PW_TEXT("Check", "By %1.").with(checkName(check)));
    sentences = joined(sentences, multiplierSentence(reading));
    sentences = joined(sentences, worstSentence(check, reading));
  }
  if (verdict.unjudged)
    sentences = joined(sentences, notJudgedSentence(readout, *verdict.unjudged));
  for (const Text& mismatch : mismatchesOf(readout))
    sentences = joined(sentences, mismatch);
  m_sentences->setText(shownRich(sentences));
  setAccessibleDescription(m_word->text() + QLatin1Char(' ') + m_number->text() + QLatin1Char(' ') +
                           shown(sentences));
  update();
}

void VerdictBlock::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  const Standing standing = verdictOf(m_desk.readout()).standing;
  const Role role = standing == Standing::exceeds ? Role::limit : Role::ink;
  painter.setPen(QPen(look.colour(role), edge));
  painter.drawRect(QRectF(rect()).adjusted(edge / 2.0, edge / 2.0, -edge / 2.0, -edge / 2.0));
  const double middle = m_word->geometry().center().y();
  paintStandingMark(painter, {12, middle - markSize / 2.0, markSize, markSize}, standing, look);
}

} // namespace planewright
