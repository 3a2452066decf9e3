// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/figure/batch_run.h"

#include <QDialog>

#include <functional>

class QFormLayout;
class QLabel;
class QLineEdit;
class QListWidget;
class QPlainTextEdit;
class QProgressBar;
class QPushButton;
class QRadioButton;
class QVBoxLayout;

namespace planewright {

/// What is to be done with files that would be written over.
enum class Existing { replace, keep, stop };
/// Asked once for a whole batch: so many of so many files exist in the folder.
using AskExisting = std::function<Existing(QWidget& over, const QString& folder, int existing, int all)>;
Existing askExisting(QWidget& over, const QString& folder, int existing, int all);

/// All points: a figure of its own for each chosen point, arranged as the figure is, written to a folder. It
/// shows how far it is, can be stopped, and tells at the end what was written and what failed.
class PointsDialog : public QDialog {
  Q_OBJECT

public:
  /// `arranged` is the batch without its points: study, arrangement, names.
  PointsDialog(Desk& desk, FigureBatch arranged, AskExisting ask = askExisting, QWidget* parent = nullptr);

  QListWidget& points() const { return *m_points; }
  void setFolder(const QString& folder);
  bool isRunning() const { return m_run != nullptr; }
  /// Stops what is being written; closes when nothing is.
  void reject() override;

private:
  QVBoxLayout* pointColumn();
  QFormLayout* choices();
  QVBoxLayout* outcome();
  void check(Qt::CheckState state);
  void refresh();
  void chooseFolder();
  void write();
  void begin(std::vector<PointFigure> figures, const QString& folder);
  void end();
  QString outcomeInWords() const;

  Desk& m_desk;
  FigureBatch m_arranged;
  AskExisting m_ask;
  std::unique_ptr<BatchRun> m_run;
  qsizetype m_kept = 0; ///< files that were there and are left alone
  QListWidget* m_points = nullptr;
  QRadioButton* m_governing = nullptr;
  QLineEdit* m_folder = nullptr;
  QLabel* m_sentence = nullptr;
  QProgressBar* m_progress = nullptr;
  QPlainTextEdit* m_problems = nullptr;
  QPushButton* m_write = nullptr;
  QPushButton* m_close = nullptr;
  QList<QWidget*> m_settled; ///< not to be changed while figures are written
};

} // namespace planewright
