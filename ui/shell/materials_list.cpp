// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/materials_list.h"

#include "ui/look/look.h"

#include <QCoreApplication>
#include <QKeyEvent>
#include <QLineEdit>
#include <QTreeWidget>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int originRole = Qt::UserRole;

/// What a line of the tree stands for; a heading for none.
MaterialChoice choiceOf(const QTreeWidgetItem* item) {
  if (!item || !item->parent() || !item->data(0, originRole).isValid())
    return {};
  return {static_cast<MaterialOrigin>(item->data(0, originRole).toInt()), item->text(0).toStdString()};
}

void addItems(QTreeWidgetItem& heading, const MaterialGroup& group) {
  for (const std::string& name : group.names) {
    auto* item = new QTreeWidgetItem(&heading, {fromUtf8(name)});
    item->setData(0, originRole, static_cast<int>(group.origin));
    item->setToolTip(0, fromUtf8(name));
  }
  if (group.names.empty()) {
    auto* item = new QTreeWidgetItem(&heading, {group.whenEmpty});
    item->setFlags(Qt::NoItemFlags);
  }
}

} // namespace

MaterialsList::MaterialsList(QWidget* parent)
    : QWidget(parent), m_filter(new QLineEdit(this)), m_tree(new QTreeWidget(this)) {
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->addWidget(m_filter);
  rows->addWidget(m_tree, 1);
  m_filter->setPlaceholderText(tr("Type to filter"));
  m_filter->setAccessibleName(tr("Filter"));
  m_filter->setClearButtonEnabled(true);
  m_filter->installEventFilter(this);
  m_tree->setAccessibleName(tr("Materials"));
  m_tree->setHeaderHidden(true);
  m_tree->setUniformRowHeights(true);
  m_tree->setIndentation(14);
  m_tree->setStyleSheet(QStringLiteral("QTreeView::item { padding: 2px 4px; }"));
  m_tree->setExpandsOnDoubleClick(false);
  m_tree->installEventFilter(this);
  // The clear button of the line is no typing.
  connect(m_filter, &QLineEdit::textChanged, this, &MaterialsList::narrow);
  connect(m_filter, &QLineEdit::textEdited, this, [this] {
    narrow();
    if (const QTreeWidgetItem* now = m_tree->currentItem(); !now || now->isHidden())
      m_tree->setCurrentItem(firstSeen());
  });
  connect(m_tree, &QTreeWidget::currentItemChanged, this, [this](const QTreeWidgetItem* item) {
    if (const MaterialChoice choice = choiceOf(item); !choice.name.empty())
      Q_EMIT chosen(choice);
  });
  connect(m_tree, &QTreeWidget::itemActivated, this, [this](const QTreeWidgetItem* item) {
    if (const MaterialChoice choice = choiceOf(item); !choice.name.empty())
      Q_EMIT opened(choice);
  });
}

void MaterialsList::fill(const std::vector<MaterialGroup>& groups, const MaterialChoice& current) {
  if (groups != m_groups) {
    m_groups = groups;
    m_tree->clear();
    for (const MaterialGroup& group : groups) {
      auto* heading = new QTreeWidgetItem(m_tree, {group.title});
      heading->setFlags(Qt::ItemIsEnabled);
      QFont bold = m_tree->font();
      bold.setBold(true);
      heading->setFont(0, bold);
      addItems(*heading, group);
    }
    m_tree->expandAll();
    narrow();
  }
  select(current);
}

QTreeWidgetItem* MaterialsList::itemOf(const MaterialChoice& choice) const {
  for (int i = 0; i < m_tree->topLevelItemCount(); ++i)
    for (int k = 0; k < m_tree->topLevelItem(i)->childCount(); ++k)
      if (QTreeWidgetItem* item = m_tree->topLevelItem(i)->child(k); choiceOf(item) == choice)
        return item;
  return nullptr;
}

void MaterialsList::select(const MaterialChoice& choice) {
  QTreeWidgetItem* item = choice.name.empty() ? nullptr : itemOf(choice);
  if (item && item->isHidden())
    m_filter->clear();
  if (item == m_tree->currentItem())
    return;
  m_tree->setCurrentItem(item);
  reveal();
}

// The list has no size to scroll in before it is shown. The first under a heading is seen with it.
void MaterialsList::reveal() {
  const QTreeWidgetItem* item = m_tree->currentItem();
  if (!item || !item->parent() || !isVisible())
    return;
  if (item->parent()->child(0) == item)
    m_tree->scrollToItem(item->parent());
  m_tree->scrollToItem(item);
}

void MaterialsList::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  reveal();
}

// What does not fit is hidden, with the headings that nothing is left of.
void MaterialsList::narrow() {
  const QString typed = m_filter->text().trimmed();
  for (int i = 0; i < m_tree->topLevelItemCount(); ++i) {
    QTreeWidgetItem* heading = m_tree->topLevelItem(i);
    bool some = typed.isEmpty();
    for (int k = 0; k < heading->childCount(); ++k) {
      QTreeWidgetItem* item = heading->child(k);
      const bool fits = typed.isEmpty() ||
                        (!choiceOf(item).name.empty() && item->text(0).contains(typed, Qt::CaseInsensitive));
      item->setHidden(!fits);
      some = some || fits;
    }
    heading->setHidden(!some);
  }
}

QTreeWidgetItem* MaterialsList::firstSeen() const {
  for (int i = 0; i < m_tree->topLevelItemCount(); ++i)
    for (int k = 0; k < m_tree->topLevelItem(i)->childCount(); ++k)
      if (QTreeWidgetItem* item = m_tree->topLevelItem(i)->child(k);
          !item->isHidden() && !choiceOf(item).name.empty())
        return item;
  return nullptr;
}

bool MaterialsList::eventFilter(QObject* watched, QEvent* event) {
  if (event->type() != QEvent::KeyPress)
    return QWidget::eventFilter(watched, event);
  const int key = static_cast<QKeyEvent*>(event)->key();
  const MaterialChoice choice = choiceOf(m_tree->currentItem());
  if (watched == m_filter && (key == Qt::Key_Up || key == Qt::Key_Down))
    return QCoreApplication::sendEvent(m_tree, event);
  const bool isEnter = key == Qt::Key_Return || key == Qt::Key_Enter;
  if (watched == m_filter && isEnter) {
    if (!choice.name.empty())
      Q_EMIT opened(choice);
    return true;
  }
  if (watched == m_tree && key == Qt::Key_F2 && !choice.name.empty()) {
    Q_EMIT renameWanted(choice);
    return true;
  }
  return QWidget::eventFilter(watched, event);
}

} // namespace planewright
