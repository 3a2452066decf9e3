// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/filter_list.h"

#include <QCoreApplication>
#include <QHeaderView>
#include <QKeyEvent>
#include <QLineEdit>
#include <QTreeWidget>
#include <QVBoxLayout>

#include <algorithm>
#include <functional>
#include <numeric>

namespace planewright {

FilterList::FilterList(const QStringList& names, const ListDetails& details, const QString& current,
                       QWidget* parent)
    : QFrame(parent, Qt::Popup), m_filter(new QLineEdit(this)), m_list(new QTreeWidget(this)) {
  setAttribute(Qt::WA_DeleteOnClose);
  setFrameShape(QFrame::StyledPanel);
  resize(420, 360);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(8, 8, 8, 8);
  column->addWidget(m_filter);
  column->addWidget(m_list);
  m_filter->setPlaceholderText(tr("Type to filter"));
  m_filter->setAccessibleName(tr("Filter"));
  m_filter->installEventFilter(this);
  m_list->setFocusPolicy(Qt::NoFocus);
  fill(names, details);
  const QList<QTreeWidgetItem*> found = m_list->findItems(current, Qt::MatchExactly);
  m_list->setCurrentItem(found.value(0, m_list->topLevelItem(0)));
  connect(m_filter, &QLineEdit::textEdited, this, &FilterList::narrow);
  connect(m_filter, &QLineEdit::returnPressed, this, &FilterList::choose);
  connect(m_list, &QTreeWidget::itemClicked, this, &FilterList::choose);
  m_filter->setFocus();
}

// The names take the room that values and remarks leave; a longer one is told by its tooltip.
void FilterList::fill(const QStringList& names, const ListDetails& details) {
  m_list->setRootIsDecorated(false);
  m_list->setUniformRowHeights(true);
  m_list->setStyleSheet(QStringLiteral(
      "QTreeView::item { padding: 3px 6px; } QHeaderView::section { background: palette(base); border: none; "
      "border-bottom: 1px solid palette(mid); padding: 3px 6px; }"));
  QList<qsizetype> order(names.size());
  std::iota(order.begin(), order.end(), 0);
  if (details.weights.size() == names.size())
    std::ranges::stable_sort(order, std::greater(), [&](qsizetype i) { return details.weights[i]; });
  for (const qsizetype i : order) {
    auto* item = new QTreeWidgetItem(m_list, {names[i], details.values.value(i), details.remarks.value(i)});
    item->setToolTip(0, names[i]);
    item->setTextAlignment(1, Qt::AlignRight | Qt::AlignVCenter);
  }
  const bool plain = details.valueHeading.isEmpty();
  m_list->setHeaderHidden(plain);
  if (plain)
    return;
  m_list->setHeaderLabels({details.nameHeading, details.valueHeading, QString()});
  m_list->headerItem()->setToolTip(1, details.valueMeaning);
  m_list->headerItem()->setTextAlignment(1, Qt::AlignRight | Qt::AlignVCenter);
  m_list->header()->setStretchLastSection(false);
  m_list->header()->setSectionsClickable(false);
  m_list->header()->setSectionResizeMode(QHeaderView::ResizeToContents);
  m_list->header()->setSectionResizeMode(0, QHeaderView::Stretch);
}

bool FilterList::eventFilter(QObject* watched, QEvent* event) {
  if (event->type() == QEvent::KeyPress) {
    const int key = static_cast<QKeyEvent*>(event)->key();
    if (key == Qt::Key_Up || key == Qt::Key_Down || key == Qt::Key_PageUp || key == Qt::Key_PageDown)
      return QCoreApplication::sendEvent(m_list, event);
  }
  return QFrame::eventFilter(watched, event);
}

void FilterList::narrow(const QString& typed) {
  QTreeWidgetItem* first = nullptr;
  for (int row = 0; row < m_list->topLevelItemCount(); ++row) {
    QTreeWidgetItem* item = m_list->topLevelItem(row);
    item->setHidden(!item->text(0).contains(typed, Qt::CaseInsensitive));
    if (!first && !item->isHidden())
      first = item;
  }
  m_list->setCurrentItem(first);
}

void FilterList::choose() {
  if (const QTreeWidgetItem* item = m_list->currentItem()) {
    Q_EMIT chosen(item->text(0));
    close();
  }
}

} // namespace planewright
