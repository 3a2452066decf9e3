// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/summary_page.h"

#include "core/strength/cautions.h"
#include "core/table/check_words.h"
#include "ui/look/look.h"
#include "ui/strength/summary_filter.h"
#include "ui/strength/summary_model.h"

#include <QCheckBox>
#include <QHBoxLayout>
#include <QHeaderView>
#include <QKeyEvent>
#include <QLabel>
#include <QLineEdit>
#include <QTableView>
#include <QVBoxLayout>

namespace planewright {

SummaryPage::SummaryPage(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_model(new SummaryModel(this)), m_rows(new SummaryFilter(this)),
      m_heading(new QLabel(this)), m_filter(new QLineEdit(this)),
      m_exceeds(new QCheckBox(tr("exceeds or not judged only"), this)), m_table(new QTableView(this)) {
  QFont bold = m_heading->font();
  bold.setBold(true);
  m_heading->setFont(bold);
  m_filter->setPlaceholderText(tr("filter: P1, 1.5 S, shear"));
  m_filter->setAccessibleName(tr("Filter of the summary"));
  m_filter->setClearButtonEnabled(true);
  m_filter->setMaximumWidth(320);
  m_rows->setSourceModel(m_model);
  m_table->setModel(m_rows);
  m_table->setSortingEnabled(true);
  m_table->sortByColumn(SummaryModel::utilisation, Qt::DescendingOrder);
  m_table->setSelectionBehavior(QAbstractItemView::SelectRows);
  m_table->setSelectionMode(QAbstractItemView::SingleSelection);
  m_table->setEditTriggers(QAbstractItemView::NoEditTriggers);
  m_table->verticalHeader()->hide();
  m_table->horizontalHeader()->setStretchLastSection(false);
  m_table->horizontalHeader()->setSectionResizeMode(SummaryModel::check, QHeaderView::Stretch);
  m_table->horizontalHeader()->setDefaultAlignment(Qt::AlignLeft | Qt::AlignVCenter);
  m_table->setTabKeyNavigation(false);
  m_table->setShowGrid(false);
  m_table->setAccessibleName(tr("Summary of all points"));
  m_table->installEventFilter(this);

  auto* head = new QHBoxLayout;
  head->addWidget(m_heading);
  head->addStretch();
  head->addWidget(m_exceeds);
  head->addWidget(m_filter);
  auto* foot = new QLabel(shown(limitOfAllPoints()), this);
  foot->setForegroundRole(QPalette::PlaceholderText);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(12, 8, 12, 8);
  rows->addLayout(head);
  rows->addWidget(m_table, 1);
  rows->addWidget(foot);
  setAccessibleName(tr("Summary"));
  setProperty("helpPlace", "combinations#summary");
  setFocusProxy(m_table);
  setProperty("areaKeys", tr("Enter opens the point with its governing combination, Ctrl+1 goes back"));
  connect(m_filter, &QLineEdit::textEdited, m_rows, &SummaryFilter::narrow);
  connect(m_exceeds, &QCheckBox::clicked, m_rows, &SummaryFilter::showExceedingOnly);
  connect(m_table, &QTableView::doubleClicked, this, &SummaryPage::open);
  connect(&m_desk, &Desk::changed, this, &SummaryPage::refresh);
}

QString SummaryPage::heading() const {
  return m_heading->text();
}

void SummaryPage::refresh() {
  if (!isVisible())
    return;
  m_model->show(m_desk.study());
  m_heading->setText(tr("All points, all checks: %1").arg(shown(wordOfStanding(m_model->standing()))));
  m_table->resizeColumnsToContents();
  for (int column = 0; column < m_model->columnCount(); ++column)
    m_table->setColumnWidth(column, m_table->columnWidth(column) + 16);
}

void SummaryPage::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  refresh();
  if (!m_table->currentIndex().isValid() && m_rows->rowCount() > 0)
    m_table->setCurrentIndex(m_rows->index(0, 0));
}

bool SummaryPage::eventFilter(QObject* watched, QEvent* event) {
  if (watched == m_table && event->type() == QEvent::KeyPress) {
    const int key = static_cast<QKeyEvent*>(event)->key();
    if (key == Qt::Key_Return || key == Qt::Key_Enter) {
      open(m_table->currentIndex());
      return true;
    }
  }
  return QWidget::eventFilter(watched, event);
}

void SummaryPage::open(const QModelIndex& index) {
  if (!index.isValid())
    return;
  const int row = m_rows->mapToSource(index).row();
  const std::string combination = m_model->combinationOf(row);
  m_desk.show(m_model->pointOf(row), combination.empty() ? m_desk.study().shown.combination : combination);
  emit opened();
}

} // namespace planewright
