// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/check_list.h"

#include "core/table/check_words.h"
#include "ui/look/look.h"

#include <QHeaderView>
#include <QKeyEvent>

#include <algorithm>

namespace planewright {

namespace {

constexpr int mostRows = 5;

/// Marks beside the number, since colour alone does not tell.
QString markOf(Standing standing) {
  switch (standing) {
  case Standing::exceeds:
    return QStringLiteral("▲ ");
  case Standing::unjudged:
    return QStringLiteral("! ");
  default:
    return {};
  }
}

} // namespace

CheckList::CheckList(Desk& desk, QWidget* parent) : QTreeWidget(parent), m_desk(desk) {
  setColumnCount(2);
  setHeaderLabels({tr("check"), tr("utilisation")});
  headerItem()->setTextAlignment(1, Qt::AlignRight);
  header()->setStretchLastSection(false);
  header()->setSectionResizeMode(0, QHeaderView::Stretch);
  header()->setSectionResizeMode(1, QHeaderView::ResizeToContents);
  header()->setSectionsClickable(false);
  setRootIsDecorated(false);
  setUniformRowHeights(true);
  setFrameShape(QFrame::NoFrame);
  setTabKeyNavigation(false);
  setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  setAccessibleName(tr("Checks of the point"));
  setProperty("helpPlace", "strength#checks");
  connect(this, &QTreeWidget::itemPressed, this, [this](QTreeWidgetItem* item) {
    m_selected = item->data(0, Qt::UserRole).toString().toStdString();
    emit selectionMoved();
  });
  connect(&m_desk, &Desk::changed, this, &CheckList::refresh);
  refresh();
}

std::optional<std::size_t> CheckList::selected() const {
  const std::vector<CheckSetup>& checks = m_desk.readout().checks;
  if (checks.empty())
    return std::nullopt;
  const auto at = std::ranges::find(checks, m_selected, &CheckSetup::id);
  if (at != checks.end())
    return static_cast<std::size_t>(at - checks.begin());
  const Verdict verdict = verdictOf(m_desk.readout());
  if (verdict.standing == Standing::unjudged)
    return verdict.unjudged->check;
  return verdict.governing ? verdict.governing->check : 0;
}

void CheckList::select(const std::string& id) {
  m_selected = id;
  refresh();
  emit selectionMoved();
}

void CheckList::refresh() {
  const Readout& readout = m_desk.readout();
  const int rowHeight = fontMetrics().height() + 6;
  while (topLevelItemCount() > static_cast<int>(readout.checks.size()))
    delete takeTopLevelItem(topLevelItemCount() - 1);
  for (std::size_t i = 0; i < readout.checks.size(); ++i) {
    const Verdict verdict = verdictOfCheck(readout, i);
    const std::optional<JudgedCheck>& told = toldOf(verdict);
    const QString name = shown(checkName(readout.checks[i]));
    const QString worst = told && verdict.standing == Standing::within && !verdict.stressed ? tr("no stress")
                          : told ? markOf(verdict.standing) + shown(shownWorst(readingOf(readout, *told)))
                                 : shown(wordOfStanding(verdict.standing));
    QTreeWidgetItem* item = topLevelItem(static_cast<int>(i));
    if (!item)
      item = new QTreeWidgetItem(this);
    item->setSizeHint(0, {0, rowHeight});
    item->setText(0, name);
    item->setText(1, worst);
    item->setTextAlignment(1, Qt::AlignRight | Qt::AlignVCenter);
    item->setToolTip(0, name);
    item->setData(0, Qt::UserRole, fromUtf8(readout.checks[i].id));
  }
  if (const auto now = selected())
    setCurrentItem(topLevelItem(static_cast<int>(*now)));
  const int rows = std::clamp(topLevelItemCount(), 1, mostRows);
  setFixedHeight(header()->sizeHint().height() + rows * rowHeight + 2);
  setVisible(topLevelItemCount() > 0);
}

void CheckList::keyPressEvent(QKeyEvent* event) {
  if (event->key() == Qt::Key_Delete) {
    emit removalWanted();
    return;
  }
  QTreeWidget::keyPressEvent(event);
  if (const QTreeWidgetItem* item = currentItem()) {
    const std::string id = item->data(0, Qt::UserRole).toString().toStdString();
    if (id != m_selected && (event->key() == Qt::Key_Up || event->key() == Qt::Key_Down ||
                             event->key() == Qt::Key_Home || event->key() == Qt::Key_End)) {
      m_selected = id;
      emit selectionMoved();
    }
  }
}

} // namespace planewright
