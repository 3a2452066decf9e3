// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/summary_filter.h"

#include "ui/strength/summary_model.h"

namespace planewright {

SummaryFilter::SummaryFilter(QObject* parent) : QSortFilterProxyModel(parent) {
  setSortRole(Qt::UserRole);
  setSortLocaleAware(true);
}

void SummaryFilter::narrow(const QString& typed) {
  m_typed = typed.trimmed();
  invalidateFilter();
}

void SummaryFilter::showExceedingOnly(bool only) {
  m_exceedingOnly = only;
  invalidateFilter();
}

bool SummaryFilter::filterAcceptsRow(int row, const QModelIndex& parent) const {
  const auto* model = static_cast<const SummaryModel*>(sourceModel());
  if (m_exceedingOnly && !model->exceeds(row))
    return false;
  if (m_typed.isEmpty())
    return true;
  for (int column = 0; column < model->columnCount(); ++column)
    if (model->index(row, column, parent).data().toString().contains(m_typed, Qt::CaseInsensitive))
      return true;
  return false;
}

} // namespace planewright
