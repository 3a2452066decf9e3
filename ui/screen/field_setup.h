// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where these come first.
#include "ui/screen/column_meanings.h"
#include "ui/screen/screened_field.h"

#include <QWidget>

class QCheckBox;
class QComboBox;
class QFormLayout;
class QLabel;
class QLineEdit;
class QPlainTextEdit;
class QProgressBar;
class QPushButton;
class QStandardItemModel;
class QTableView;

namespace planewright {

class MeaningHeader;

/// What is to be screened and by what: the table with the meaning of its columns, the point whose checks
/// judge, what is left out. While it runs it shows how far that is; what was wrong is listed below.
class FieldSetup : public QWidget {
  Q_OBJECT

public:
  explicit FieldSetup(Desk& desk, QWidget* parent = nullptr);

  /// Takes a file and shows the start of it.
  void setTable(const QString& path);
  FieldOrder order() const;
  /// The folder of the last table, for the next question.
  QString path() const;

  void showProgress(const FieldProgress& progress);
  /// Gives the entries back; the Problems of a run that came to nothing are listed.
  void settle(const Problems& problems);

  QTableView& preview() const { return *m_preview; }
  QComboBox& meaning(int column) const;
  QComboBox& judging() const { return *m_judging; }
  QCheckBox& leavesOut() const { return *m_leavesOut; }
  QLineEdit& except() const { return *m_except; }
  QPushButton& start() const { return *m_start; }
  QPushButton& cancel() const { return *m_cancel; }
  /// What stands against it, a line each; empty where nothing does.
  QString complaints() const;

signals:
  void started();
  void cancelled();
  void tableWanted();

protected:
  void showEvent(QShowEvent* event) override;

private:
  QFormLayout* entries();
  void build();
  void readStart();
  void showColumns();
  void listPoints();
  void list(const Problems& problems);

  Desk& m_desk;
  bool m_isRunning = false;
  QString m_read; ///< the file whose start is shown
  std::string m_header;
  ColumnMeanings m_choices;
  QLineEdit* m_path;
  QPushButton* m_choose;
  QStandardItemModel* m_rows;
  MeaningHeader* m_meanings;
  QTableView* m_preview;
  QComboBox* m_judging;
  QLineEdit* m_except;
  QCheckBox* m_leavesOut;
  QLabel* m_sentence;
  QPlainTextEdit* m_complaints;
  QProgressBar* m_progress;
  QPushButton* m_start;
  QPushButton* m_cancel;
  QList<QWidget*> m_settled; ///< not to be changed while it runs
};

} // namespace planewright
