// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/summary_model.h"

#include "core/quantity/format.h"
#include "core/table/check_words.h"
#include "ui/look/look.h"

namespace planewright {

namespace {

constexpr int angleDecimals = 2;

/// Unjudged rows weigh more than any that are within, less than any that exceed.
double weightOf(const SummaryRow& row) {
  if (row.verdict.standing == Standing::unjudged)
    return exceedingFrom;
  return row.verdict.governing ? row.verdict.governing->utilisation : 0;
}

} // namespace

void SummaryModel::show(const Study& study) {
  beginResetModel();
  m_summary = summarise(study);
  endResetModel();
}

int SummaryModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_summary.rows.size() + m_summary.unchecked.size());
}

int SummaryModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : columns;
}

bool SummaryModel::exceeds(int row) const {
  return isChecked(row) && (rowAt(row).verdict.standing == Standing::exceeds ||
                            rowAt(row).verdict.standing == Standing::unjudged);
}

const std::string& SummaryModel::pointOf(int row) const {
  return isChecked(row) ? rowAt(row).point
                        : m_summary.unchecked[static_cast<std::size_t>(row) - m_summary.rows.size()];
}

std::string SummaryModel::combinationOf(int row) const {
  return isChecked(row) ? rowAt(row).combination : std::string();
}

QString SummaryModel::textOf(int row, int column) const {
  if (column == point)
    return fromUtf8(pointOf(row));
  if (!isChecked(row))
    return column == utilisation ? shown(wordOfStanding(Standing::notChecked)) : QString();
  const SummaryRow& one = rowAt(row);
  switch (column) {
  case check:
    return shown(checkName(one.check));
  case utilisation:
    if (one.verdict.standing == Standing::unjudged)
      return shown(wordOfStanding(Standing::unjudged));
    return one.verdict.stressed ? shown(shownWorst(one.reading)) : tr("no stress");
  case combination:
    return fromUtf8(one.combination);
  case mode:
    return one.reading.worst.mode && !one.reading.problem ? shown(labelOf(*one.reading.worst.mode))
                                                          : QString();
  case angle:
    if (!one.reading.worstAngle || one.reading.problem)
      return {};
    return (one.check.plane.empty() ? tr("line %1") : tr("normal %1"))
        .arg(fromUtf8(shownDegrees(*one.reading.worstAngle, angleDecimals)));
  default:
    return {};
  }
}

QVariant SummaryModel::sortKey(int row, int column) const {
  if (column == utilisation)
    return isChecked(row) ? weightOf(rowAt(row)) : -1.0;
  if (column == angle && isChecked(row) && rowAt(row).reading.worstAngle)
    return rowAt(row).reading.worstAngle->degrees();
  return textOf(row, column);
}

QVariant SummaryModel::data(const QModelIndex& index, int role) const {
  if (!index.isValid())
    return {};
  switch (role) {
  case Qt::DisplayRole:
    return (index.column() == utilisation && exceeds(index.row()) ? QStringLiteral("▲ ") : QString()) +
           textOf(index.row(), index.column());
  case Qt::UserRole:
    return sortKey(index.row(), index.column());
  case Qt::TextAlignmentRole:
    return index.column() == utilisation || index.column() == angle
               ? QVariant(Qt::AlignRight | Qt::AlignVCenter)
               : QVariant();
  case Qt::ToolTipRole:
    return isChecked(index.row()) && rowAt(index.row()).reading.problem
               ? QVariant(shown(*rowAt(index.row()).reading.problem))
               : QVariant();
  default:
    return {};
  }
}

QVariant SummaryModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation != Qt::Horizontal)
    return {};
  if (role == Qt::TextAlignmentRole && (section == utilisation || section == angle))
    return QVariant(Qt::AlignRight | Qt::AlignVCenter);
  if (role != Qt::DisplayRole)
    return {};
  switch (section) {
  case point:
    return tr("point");
  case check:
    return tr("check");
  case utilisation:
    return tr("worst utilisation");
  case combination:
    return tr("combination");
  case mode:
    return tr("mode");
  default:
    return tr("worst at");
  }
}

} // namespace planewright
