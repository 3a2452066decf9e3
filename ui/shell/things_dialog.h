// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/shell/things.h"

#include <QDialog>

class QDialogButtonBox;
class QLabel;
class QPushButton;
class QTableView;

namespace planewright {

class Complaint;
class ThingsModel;

/// A list of the study as a table in a window of its own: cells are typed over, rows added, copied, moved and
/// removed, each as one step of undo.
class ThingsDialog : public QDialog {
  Q_OBJECT

public:
  ThingsDialog(Desk& desk, Things things, QWidget* parent);

  QTableView& table() const { return *m_table; }
  QString complaint() const;
  QString cautions() const;
  /// A further button at the left of the row.
  QPushButton* addButton(const QString& words);

public slots:
  void add();
  void copy();
  /// Adds what is on the clipboard.
  void paste();
  void remove();
  void moveUp() { move(-1); }
  void moveDown() { move(1); }

protected:
  void showEvent(QShowEvent* event) override;

private:
  void build();
  void move(int by);
  int row() const;
  bool hasRow() const;
  void select(int row);
  void complain(const Problem& problem);
  void moveOn();
  void offer();

  Desk& m_desk;
  ThingsModel* m_model;
  QTableView* m_table;
  Complaint* m_complaint;
  bool m_isNewComplaint = false;
  QLabel* m_caution;
  QDialogButtonBox* m_buttons;
  QPushButton* m_copy = nullptr;
  QPushButton* m_remove = nullptr;
  QPushButton* m_up = nullptr;
  QPushButton* m_down = nullptr;
};

} // namespace planewright
