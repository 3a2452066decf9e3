// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_arrangement.h"

#include "ui/look/look.h"

#include <QComboBox>
#include <QHBoxLayout>
#include <QListWidget>
#include <QPushButton>
#include <QVBoxLayout>

namespace planewright {

namespace {

QString capital(QString words) {
  words[0] = words[0].toUpper();
  return words;
}

} // namespace

FigureArrangement::FigureArrangement(Arrangement arrangement, const FigureBlocks& blocks, QWidget* parent)
    : QWidget(parent), m_arrangement(arrangement), m_list(new QListWidget(this)),
      m_earlier(new QPushButton(tr("Earlier"), this)), m_later(new QPushButton(tr("Later"), this)) {
  auto* box = new QComboBox(this);
  box->setAccessibleName(tr("Elements and circle"));
  box->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
  for (const Named<Arrangement>& row : namesOf<Arrangement>())
    box->addItem(capital(shown(row.label)));
  box->setCurrentIndex(static_cast<int>(arrangement));
  m_list->setAccessibleName(tr("Order of the parts"));
  m_list->setToolTip(
      tr("From the top down; of elements and circle in one row the first stands to the left."));
  for (const FigureBlock block : blocks)
    (new QListWidgetItem(capital(shown(labelOf(block))), m_list))
        ->setData(Qt::UserRole, static_cast<int>(block));
  m_list->setCurrentRow(0);
  m_list->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  m_list->setFixedHeight(m_list->count() * m_list->sizeHintForRow(0) + 2 * m_list->frameWidth() + 4);
  auto* moves = new QHBoxLayout;
  for (QPushButton* button : {m_earlier, m_later}) {
    button->setAutoDefault(false);
    moves->addWidget(button);
  }
  moves->addStretch();
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->setSpacing(3);
  rows->addWidget(box);
  rows->addWidget(m_list);
  rows->addLayout(moves);
  allowMoves();
  connect(box, &QComboBox::activated, this, [this](int row) {
    m_arrangement = namesOf<Arrangement>()[static_cast<std::size_t>(row)].value;
    emit changed();
  });
  connect(m_list, &QListWidget::currentRowChanged, this, &FigureArrangement::allowMoves);
  connect(m_earlier, &QPushButton::clicked, this, [this] { move(-1); });
  connect(m_later, &QPushButton::clicked, this, [this] { move(1); });
}

FigureBlocks FigureArrangement::blocks() const {
  FigureBlocks blocks = usualBlocks;
  for (std::size_t i = 0; i < blocks.size(); ++i)
    blocks[i] = static_cast<FigureBlock>(m_list->item(static_cast<int>(i))->data(Qt::UserRole).toInt());
  return blocks;
}

void FigureArrangement::move(int by) {
  const int row = m_list->currentRow();
  m_list->insertItem(row + by, m_list->takeItem(row));
  m_list->setCurrentRow(row + by);
  emit changed();
}

void FigureArrangement::allowMoves() {
  const int row = m_list->currentRow();
  m_earlier->setEnabled(row > 0);
  m_later->setEnabled(row >= 0 && row + 1 < m_list->count());
}

} // namespace planewright
