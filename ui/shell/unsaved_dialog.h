// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/recovery.h"

#include <QDialog>

class QLabel;
class QPlainTextEdit;
class QPushButton;
class QTreeWidget;
class QTreeWidgetItem;

namespace planewright {

/// Unsaved studies: those of windows that ended without an answer, and those that were discarded, each with
/// its time, its file and what changed since that was saved.
class UnsavedDialog : public QDialog {
  Q_OBJECT

public:
  explicit UnsavedDialog(Recovery& recovery, QWidget* parent = nullptr);

  /// Looks again what is there.
  void list();
  /// How many ended without an answer.
  int left() const { return static_cast<int>(m_left.size()); }

  QTreeWidget& studies() const { return *m_studies; }
  QPlainTextEdit& changes() const { return *m_changes; }
  QPushButton& openButton() const { return *m_open; }
  QPushButton& discardButton() const { return *m_discard; }

private:
  QTreeWidgetItem* addGroup(const QString& words, const std::vector<LeftStudy>& studies);
  const LeftStudy* current() const;
  bool isLeft(const LeftStudy& study) const;
  void showCurrent();
  void openCurrent();
  void discardCurrent();

  Recovery& m_recovery;
  std::vector<LeftStudy> m_left;
  std::vector<LeftStudy> m_discarded;
  QLabel* m_sentence;
  QTreeWidget* m_studies;
  QPlainTextEdit* m_changes;
  QPushButton* m_open;
  QPushButton* m_discard;
};

} // namespace planewright
