// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/manual/manual_search.h"

#include <QDialog>

#include <memory>

class QLabel;
class QLineEdit;
class QListWidget;
class QToolButton;

namespace planewright {

class HelpText;

/// The handbook beside the window: a search and the contents at the left, the page at the right.
class HelpWindow : public QDialog {
  Q_OBJECT

public:
  explicit HelpWindow(QWidget* parent);
  ~HelpWindow() override;

  /// Shows a place of the manual, "page" or "page#anchor", and comes to the front.
  void showPlace(const QString& place);
  /// The place shown, as it was asked for.
  QString place() const;

  QLineEdit& search() const { return *m_search; }
  QListWidget& contents() const { return *m_contents; }
  HelpText& text() const { return *m_text; }

public slots:
  void back();
  void forward();
  /// To the next place in which the searched words stand, on the pages that follow too.
  void findNext();
  void findPrevious();

protected:
  void changeEvent(QEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;

private:
  QToolButton* button(const QString& words, const QString& tip, void (HelpWindow::*act)());
  void addKeys();
  void listPages();
  void chosen();
  void follow();
  void filter();
  void mark();
  void step(int by);
  void dress();

  QString m_language;
  std::unique_ptr<ManualSearch> m_texts; ///< made with the first search
  QStringList m_words;
  QToolButton* m_back;
  QToolButton* m_forward;
  QLineEdit* m_search;
  QLabel* m_found;
  QListWidget* m_contents;
  HelpText* m_text;
};

} // namespace planewright
