// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_page.h"

#include "ui/planes/go_to.h"
#include "ui/planes/plane_delegate.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_model.h"

#include <QAction>
#include <QApplication>
#include <QVBoxLayout>

namespace planewright {

PlanesPage::PlanesPage(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_model(new PlanesModel(desk, this)),
      m_table(new PlaneTable(*m_model, this)) {
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->addWidget(m_table);
  setFocusProxy(m_table);
  m_table->setAccessibleName(tr("Planes"));
  connect(m_table, &PlaneTable::goTo, this, &PlanesPage::goTo);
  connect(m_table, &PlaneTable::combinationWanted, this,
          [this](const QString& combination) { showCombination(m_desk, combination); });
  connect(m_table, &PlaneTable::insertPressed, this, &PlanesPage::watch);
  connect(m_table, &PlaneTable::deletePressed, this, &PlanesPage::remove);
  connect(m_table, &PlaneTable::otherPressed, m_model, &PlanesModel::swapSolution);
  connect(&m_table->delegate(), &PlaneDelegate::noteClicked, m_model, &PlanesModel::swapSolution);
  connect(m_model, &QAbstractItemModel::rowsInserted, this, &PlanesPage::showWatchRow);
  buildMenu();
  m_table->setCurrentIndex(m_model->index(0, static_cast<int>(PlaneColumn::normal)));
}

// The keys of these actions are the table's own; here they are only shown.
void PlanesPage::buildMenu() {
  const auto add = [this](const QString& words, const QString& key, auto slot) {
    auto* action = new QAction(key.isEmpty() ? words : words + QLatin1Char('\t') + key, m_table);
    connect(action, &QAction::triggered, this, slot);
    m_table->addAction(action);
    return action;
  };
  m_table->setContextMenuPolicy(Qt::ActionsContextMenu);
  add(tr("Bring the reading plane here"), tr("Enter"), [this] { goTo(m_table->currentIndex().row()); });
  QAction* combination = add(tr("Show the combination of this value"), tr("Enter"), [this] {
    showCombination(m_desk, m_model->combinationIn(m_table->currentIndex()));
  });
  combination->setVisible(false);
  connect(m_table->selectionModel(), &QItemSelectionModel::currentChanged, combination,
          [this, combination](const QModelIndex& current) {
            combination->setVisible(!m_model->combinationIn(current).isEmpty());
          });
  add(tr("Watch the reading plane"), tr("Ins"), [this] { watch(); });
  add(tr("Rename"), tr("F2"), [this] { edit(m_table->currentIndex().row(), 0); });
  add(tr("Remove"), tr("Del"), [this] { remove(m_table->currentIndex().row()); });
  add(tr("Copy"), tr("Ctrl+C"), [this] { m_table->copySelected(); });
  add(tr("Copy the table"), {}, [this] { m_table->copyAll(); });
}

void PlanesPage::edit(int row, int column) {
  const QModelIndex cell = m_model->index(row, column);
  if (!(cell.flags() & Qt::ItemIsEditable))
    return;
  m_table->setCurrentIndex(cell);
  m_table->edit(cell);
}

// There is nowhere to go to from the reading plane itself and from the empty row: there Enter edits.
void PlanesPage::goTo(int row) {
  if (row == 0 || m_model->isWatchRow(row))
    edit(row, m_table->currentIndex().column());
  else
    bringReadingTo(m_desk, m_model->table(), row);
}

void PlanesPage::watch() {
  m_table->setCurrentIndex(m_model->index(m_model->watchReading(), 0));
}

// Whoever watches one plane may want to watch another.
void PlanesPage::showWatchRow() {
  const QWidget* focused = QApplication::focusWidget();
  if (focused == m_table || m_table->isAncestorOf(focused))
    m_table->scrollToBottom();
}

void PlanesPage::remove(int row) {
  m_model->removeWatched(row);
}

} // namespace planewright
