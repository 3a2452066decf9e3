// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/things_model.h"

#include "ui/look/look.h"

namespace planewright {

ThingsModel::ThingsModel(Desk& desk, Things things, QObject* parent)
    : QAbstractTableModel(parent), m_desk(desk), m_things(std::move(things)),
      m_rows(static_cast<int>(m_things.count(desk.study()))) {
  connect(&m_desk, &Desk::changed, this, &ThingsModel::refresh);
}

int ThingsModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : m_rows;
}

int ThingsModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_things.columns.size());
}

QVariant ThingsModel::data(const QModelIndex& index, int role) const {
  if (!index.isValid() || (role != Qt::DisplayRole && role != Qt::EditRole && role != Qt::ToolTipRole))
    return {};
  const ThingColumn& column = m_things.columns[static_cast<std::size_t>(index.column())];
  return column.text(m_desk.study(), static_cast<std::size_t>(index.row()));
}

QVariant ThingsModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation != Qt::Horizontal || role != Qt::DisplayRole)
    return {};
  return m_things.columns[static_cast<std::size_t>(section)].heading;
}

Qt::ItemFlags ThingsModel::flags(const QModelIndex& index) const {
  const bool isTyped = index.isValid() && m_things.columns[static_cast<std::size_t>(index.column())].edits;
  return QAbstractTableModel::flags(index).setFlag(Qt::ItemIsEditable, isTyped);
}

bool ThingsModel::setData(const QModelIndex& index, const QVariant& value, int role) {
  if (role != Qt::EditRole || !flags(index).testFlag(Qt::ItemIsEditable) ||
      value == data(index, Qt::EditRole))
    return false;
  const ThingColumn& column = m_things.columns[static_cast<std::size_t>(index.column())];
  const Result<Edits> edits =
      column.edits(m_desk.study(), static_cast<std::size_t>(index.row()), value.toString().toStdString());
  if (edits)
    return ask(*edits, stepIn(index));
  Q_EMIT refused(edits.error());
  return false;
}

// "load case Q: nature"
QString ThingsModel::stepIn(const QModelIndex& index) const {
  const Place place = m_things.place(m_desk.study(), static_cast<std::size_t>(index.row()));
  const QString heading = m_things.columns[static_cast<std::size_t>(index.column())].heading;
  const bool isKey = index.column() == 0;
  return tr("%1 %2: %3").arg(m_things.one, fromUtf8(place.owner), isKey ? tr("name") : heading.toLower());
}

bool ThingsModel::ask(const Edits& edits, const QString& what) {
  if (const std::optional<Problem> problem = m_desk.request(edits, m_desk.newCommand(), what)) {
    Q_EMIT refused(*problem);
    return false;
  }
  Q_EMIT taken();
  return true;
}

// Rows come and go at the end for the views; which of them moved does not matter to a table this short.
void ThingsModel::refresh() {
  const int now = static_cast<int>(m_things.count(m_desk.study()));
  if (now > m_rows) {
    beginInsertRows({}, m_rows, now - 1);
    m_rows = now;
    endInsertRows();
  } else if (now < m_rows) {
    beginRemoveRows({}, now, m_rows - 1);
    m_rows = now;
    endRemoveRows();
  }
  if (m_rows > 0)
    Q_EMIT dataChanged(index(0, 0), index(m_rows - 1, columnCount() - 1));
}

} // namespace planewright
