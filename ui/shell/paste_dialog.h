// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_columns.h"
#include "ui/desk/desk.h"

#include <QDialog>

class QCheckBox;
class QComboBox;
class QLabel;
class QPushButton;
class QTableView;

namespace planewright {

class Complaint;
class MeaningHeader;
class PasteModel;
struct PastedPoints;

/// Shows what a table from the clipboard or a file would make of the study, row by row, and takes all of it
/// in one step of undo or nothing. Holds the text of the table and what was said about its columns.
class PasteDialog : public QDialog {
  Q_OBJECT

public:
  PasteDialog(Desk& desk, std::string table, const QString& title, QWidget* parent);

  QTableView& table() const { return *m_table; }
  QCheckBox& header() const { return *m_header; }
  QComboBox& meaning(int column) const;
  /// What the rows would add and replace, and the cautions.
  QString additions() const;
  QString cautions() const;
  /// What is wrong with the table or the current row; empty where nothing is.
  QString complaint() const;
  QPushButton& takeButton() const { return *m_take; }

public slots:
  void nextWrongRow();

private:
  void build();
  void connectParts();
  void preview();
  void fitColumns();
  void tell(const PastedPoints& pasted);
  void tellCurrentRow();
  void goToWrongRow(int row);
  void take();
  void complain(const Problem* problem);

  Desk& m_desk;
  std::string m_text;
  ColumnChoices m_choices;
  PasteModel* m_model;
  MeaningHeader* m_meanings;
  QTableView* m_table;
  QCheckBox* m_header;
  QLabel* m_count;
  Complaint* m_complaint;
  QLabel* m_additions;
  QLabel* m_cautions;
  QPushButton* m_next;
  QPushButton* m_take;
};

} // namespace planewright
