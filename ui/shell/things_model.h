// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

// First, because moc does not read <compare> of the standard library on its own.
#include <QAbstractTableModel>

#include "ui/desk/desk.h"
#include "ui/shell/things.h"

namespace planewright {

/// A list of the study as an item model; what is typed in a cell goes to the desk.
class ThingsModel : public QAbstractTableModel {
  Q_OBJECT

public:
  ThingsModel(Desk& desk, Things things, QObject* parent);

  const Things& things() const { return m_things; }
  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;
  Qt::ItemFlags flags(const QModelIndex& index) const override;
  bool setData(const QModelIndex& index, const QVariant& value, int role) override;

  /// Edits of the list as one step of undo; what is wrong is told by refused().
  bool ask(const Edits& edits, const QString& what);

signals:
  void refused(const planewright::Problem& problem);
  void taken();

private:
  QString stepIn(const QModelIndex& index) const;
  void refresh();

  Desk& m_desk;
  Things m_things;
  int m_rows = 0; ///< that the views know of
};

} // namespace planewright
