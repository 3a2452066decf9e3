// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QWidget>

class QCheckBox;
class QLabel;
class QLineEdit;
class QTableView;

namespace planewright {

class SummaryFilter;
class SummaryModel;

/// All points of the study with all their checks, one row each: to sort, to filter, to go to. Worked out only
/// while it is shown.
class SummaryPage : public QWidget {
  Q_OBJECT

public:
  explicit SummaryPage(Desk& desk, QWidget* parent = nullptr);

  QTableView& table() const { return *m_table; }
  QLineEdit& filter() const { return *m_filter; }
  QCheckBox& exceedsOnly() const { return *m_exceeds; }
  QString heading() const;

signals:
  /// A row was chosen: its point and combination are shown already.
  void opened();

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;
  void showEvent(QShowEvent* event) override;

private:
  void refresh();
  void open(const QModelIndex& index);

  Desk& m_desk;
  SummaryModel* m_model;
  SummaryFilter* m_rows;
  QLabel* m_heading;
  QLineEdit* m_filter;
  QCheckBox* m_exceeds;
  QTableView* m_table;
};

} // namespace planewright
