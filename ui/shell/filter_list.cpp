// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/filter_list.h"

#include <QCoreApplication>
#include <QKeyEvent>
#include <QLineEdit>
#include <QListWidget>
#include <QVBoxLayout>

namespace planewright {

FilterList::FilterList(const QStringList& names, const QString& current, QWidget* parent)
    : QFrame(parent, Qt::Popup), m_filter(new QLineEdit(this)), m_list(new QListWidget(this)) {
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
  m_list->addItems(names);
  const QList<QListWidgetItem*> found = m_list->findItems(current, Qt::MatchExactly);
  m_list->setCurrentItem(found.value(0, m_list->item(0)));
  connect(m_filter, &QLineEdit::textEdited, this, &FilterList::narrow);
  connect(m_filter, &QLineEdit::returnPressed, this, &FilterList::choose);
  connect(m_list, &QListWidget::itemClicked, this, &FilterList::choose);
  m_filter->setFocus();
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
  QListWidgetItem* first = nullptr;
  for (int row = 0; row < m_list->count(); ++row) {
    QListWidgetItem* item = m_list->item(row);
    item->setHidden(!item->text().contains(typed, Qt::CaseInsensitive));
    if (!first && !item->isHidden())
      first = item;
  }
  m_list->setCurrentItem(first);
}

void FilterList::choose() {
  if (const QListWidgetItem* item = m_list->currentItem()) {
    Q_EMIT chosen(item->text());
    close();
  }
}

} // namespace planewright
