// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/meaning_header.h"

#include <QComboBox>
#include <QEvent>

#include <algorithm>

namespace planewright {

MeaningHeader::MeaningHeader(const QStringList& meanings, QWidget* parent)
    : QHeaderView(Qt::Horizontal, parent), m_words(meanings) {
  setDefaultAlignment(Qt::AlignLeft | Qt::AlignVCenter);
  setStretchLastSection(true);
  connect(this, &QHeaderView::sectionResized, this, &MeaningHeader::place);
}

void MeaningHeader::setMeanings(const QStringList& meanings) {
  if (meanings == m_words)
    return;
  m_words = meanings;
  show({});
}

void MeaningHeader::show(const std::vector<int>& chosen) {
  while (m_meanings.size() > chosen.size()) {
    delete m_meanings.back();
    m_meanings.pop_back();
  }
  while (m_meanings.size() < chosen.size())
    addMeaning();
  for (std::size_t i = 0; i < chosen.size(); ++i)
    m_meanings[i]->setCurrentIndex(chosen[i]);
  updateGeometry();
  place();
}

void MeaningHeader::addMeaning() {
  auto* list = new QComboBox(viewport());
  list->addItems(m_words);
  list->setAccessibleName(tr("meaning of column %1").arg(m_meanings.size() + 1));
  list->installEventFilter(this);
  connect(list, &QComboBox::activated, this, [this, column = meanings()] { Q_EMIT meaningChosen(column); });
  m_meanings.push_back(list);
  list->show();
}

std::vector<int> MeaningHeader::chosen() const {
  std::vector<int> chosen;
  chosen.reserve(m_meanings.size());
  for (const QComboBox* list : m_meanings)
    chosen.push_back(list->currentIndex());
  return chosen;
}

int MeaningHeader::meaningHeight() const {
  return m_meanings.empty() ? 0 : m_meanings.front()->sizeHint().height();
}

QSize MeaningHeader::sizeHint() const {
  return QHeaderView::sizeHint() + QSize(0, meaningHeight());
}

QSize MeaningHeader::sectionSizeFromContents(int section) const {
  constexpr int widest = 260;
  const QSize size = QHeaderView::sectionSizeFromContents(section);
  if (section >= meanings())
    return size;
  return {std::clamp(size.width(), meaning(section).sizeHint().width(), widest), size.height()};
}

void MeaningHeader::paintSection(QPainter* painter, const QRect& rect, int section) const {
  QHeaderView::paintSection(painter, rect.adjusted(0, meaningHeight(), 0, 0), section);
}

void MeaningHeader::place() {
  for (int i = 0; i < meanings() && i < count(); ++i)
    meaning(i).setGeometry(sectionViewportPosition(i), 0, sectionSize(i), meaningHeight());
}

void MeaningHeader::resizeEvent(QResizeEvent* event) {
  QHeaderView::resizeEvent(event);
  place();
}

bool MeaningHeader::eventFilter(QObject* watched, QEvent* event) {
  const auto at = std::ranges::find(m_meanings, watched);
  if (event->type() == QEvent::FocusIn && at != m_meanings.end())
    Q_EMIT meaningEntered(static_cast<int>(at - m_meanings.begin()));
  return QHeaderView::eventFilter(watched, event);
}

} // namespace planewright
