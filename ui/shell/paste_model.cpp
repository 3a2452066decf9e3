// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/paste_model.h"

#include "ui/look/look.h"

#include <QWidget>

#include <algorithm>

namespace planewright {

namespace {

/// So that what is wrong is not told by colour alone.
QString wrongMark() {
  return QStringLiteral("▲ ");
}

} // namespace

PasteModel::PasteModel(QWidget& dressed) : QAbstractTableModel(&dressed), m_dressed(dressed) {}

void PasteModel::put(PastedPoints pasted) {
  beginResetModel();
  m_pasted = std::move(pasted);
  endResetModel();
}

int PasteModel::nextWrongRow(int row) const {
  const int count = rowCount();
  for (int i = 0; i < count; ++i)
    if (const int at = (row + i) % count; !this->row(at).problems.empty())
      return at;
  return -1;
}

int PasteModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_pasted.rows.size());
}

int PasteModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() || m_pasted.columns.empty() ? 0 : static_cast<int>(m_pasted.columns.size()) + 1;
}

QString PasteModel::wordsAt(const QModelIndex& index) const {
  const PastedRow& row = this->row(index.row());
  const auto column = static_cast<std::size_t>(index.column());
  if (column < row.cells.size())
    return fromUtf8(row.cells[column]);
  QStringList sentences;
  for (const Problem& problem : row.problems)
    sentences << wrongMark() + shown(problem.what) + QLatin1Char(' ') + shown(problem.mend);
  return sentences.join(QLatin1Char('\n'));
}

/// The cell that a Problem names, and the words about it.
bool PasteModel::isWrong(const QModelIndex& index) const {
  const PastedRow& row = this->row(index.row());
  if (index.column() == static_cast<int>(row.cells.size()))
    return !row.problems.empty();
  return std::ranges::count(row.problems, index.column() + 1, &Problem::column) > 0;
}

QVariant PasteModel::data(const QModelIndex& index, int role) const {
  if (!index.isValid())
    return {};
  switch (role) {
  case Qt::DisplayRole:
    return wordsAt(index).simplified();
  case Qt::ToolTipRole:
    return wordsAt(index);
  case Qt::BackgroundRole:
    return isWrong(index) ? QVariant(lookOf(m_dressed).colour(Role::wrongGround)) : QVariant();
  case Qt::ForegroundRole:
    return isWrong(index) ? QVariant(lookOf(m_dressed).colour(Role::wrong)) : QVariant();
  default:
    return {};
  }
}

QString PasteModel::headingOf(int column) const {
  if (column >= static_cast<int>(m_pasted.columns.size()))
    return tr("what is wrong");
  const std::string& heading = m_pasted.columns[static_cast<std::size_t>(column)].heading;
  return heading.empty() ? tr("column %1").arg(column + 1) : fromUtf8(heading).simplified();
}

QVariant PasteModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (role != Qt::DisplayRole && role != Qt::ForegroundRole)
    return {};
  const bool isRow = orientation == Qt::Vertical;
  const bool isWrong = isRow ? !row(section).problems.empty()
                             : std::ranges::count(m_pasted.problems, section + 1, &Problem::column) > 0;
  if (role == Qt::ForegroundRole)
    return isWrong ? QVariant(lookOf(m_dressed).colour(Role::wrong)) : QVariant();
  const QString words = isRow ? QString::number(row(section).line) : headingOf(section);
  return isWrong ? wrongMark() + words : words;
}

} // namespace planewright
