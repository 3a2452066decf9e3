// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/paste_header.h"

#include "ui/look/look.h"

#include <QComboBox>
#include <QEvent>

#include <algorithm>

namespace planewright {

PasteHeader::PasteHeader(QWidget* parent) : QHeaderView(Qt::Horizontal, parent) {
  setDefaultAlignment(Qt::AlignLeft | Qt::AlignVCenter);
  setStretchLastSection(true);
  connect(this, &QHeaderView::sectionResized, this, &PasteHeader::place);
}

void PasteHeader::show(const std::vector<PastedColumn>& columns) {
  while (m_meanings.size() > columns.size()) {
    delete m_meanings.back();
    m_meanings.pop_back();
  }
  while (m_meanings.size() < columns.size())
    addMeaning();
  for (std::size_t i = 0; i < columns.size(); ++i)
    m_meanings[i]->setCurrentIndex(columns[i].kind ? 1 + static_cast<int>(*columns[i].kind) : 0);
  updateGeometry();
  place();
}

void PasteHeader::addMeaning() {
  auto* list = new QComboBox(viewport());
  list->addItem(tr("choose…"));
  for (const Named<ColumnKind>& row : namesOf<ColumnKind>())
    list->addItem(shown(row.label));
  list->setAccessibleName(tr("meaning of column %1").arg(m_meanings.size() + 1));
  list->installEventFilter(this);
  connect(list, &QComboBox::activated, this, &PasteHeader::meaningChosen);
  m_meanings.push_back(list);
  list->show();
}

std::vector<std::optional<ColumnKind>> PasteHeader::chosen() const {
  std::vector<std::optional<ColumnKind>> kinds;
  kinds.reserve(m_meanings.size());
  for (const QComboBox* list : m_meanings)
    kinds.push_back(list->currentIndex() > 0
                        ? std::optional(static_cast<ColumnKind>(list->currentIndex() - 1))
                        : std::nullopt);
  return kinds;
}

int PasteHeader::meaningHeight() const {
  return m_meanings.empty() ? 0 : m_meanings.front()->sizeHint().height();
}

QSize PasteHeader::sizeHint() const {
  return QHeaderView::sizeHint() + QSize(0, meaningHeight());
}

QSize PasteHeader::sectionSizeFromContents(int section) const {
  constexpr int widest = 260;
  const QSize size = QHeaderView::sectionSizeFromContents(section);
  if (section >= meanings())
    return size;
  return {std::clamp(size.width(), meaning(section).sizeHint().width(), widest), size.height()};
}

void PasteHeader::paintSection(QPainter* painter, const QRect& rect, int section) const {
  QHeaderView::paintSection(painter, rect.adjusted(0, meaningHeight(), 0, 0), section);
}

void PasteHeader::place() {
  for (int i = 0; i < meanings() && i < count(); ++i)
    meaning(i).setGeometry(sectionViewportPosition(i), 0, sectionSize(i), meaningHeight());
}

void PasteHeader::resizeEvent(QResizeEvent* event) {
  QHeaderView::resizeEvent(event);
  place();
}

bool PasteHeader::eventFilter(QObject* watched, QEvent* event) {
  const auto at = std::ranges::find(m_meanings, watched);
  if (event->type() == QEvent::FocusIn && at != m_meanings.end())
    Q_EMIT meaningEntered(static_cast<int>(at - m_meanings.begin()));
  return QHeaderView::eventFilter(watched, event);
}

} // namespace planewright
