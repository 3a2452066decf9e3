// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QSortFilterProxyModel>

namespace planewright {

/// The rows of the summary that hold what was typed, in any column, and those that exceed or could not be
/// judged where only these are wanted.
class SummaryFilter : public QSortFilterProxyModel {
  Q_OBJECT

public:
  explicit SummaryFilter(QObject* parent);

  void narrow(const QString& typed);
  void showExceedingOnly(bool only);

protected:
  bool filterAcceptsRow(int row, const QModelIndex& parent) const override;

private:
  QString m_typed;
  bool m_exceedingOnly = false;
};

} // namespace planewright
