// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where these come first.
#include "ui/desk/beside.h"
#include "ui/screen/screened_field.h"

#include <QDialog>
#include <QTimer>

class QStackedWidget;

namespace planewright {

class FieldPage;
class FieldSetup;

/// Screen points: a table of very many points is chosen, judged beside the window by the checks of a point,
/// and its results are shown.
class ScreenDialog : public QDialog {
  Q_OBJECT

public:
  explicit ScreenDialog(Desk& desk, QWidget* parent = nullptr);

  FieldSetup& setup() const { return *m_setup; }
  FieldPage& page() const { return *m_page; }
  bool isRunning() const { return m_progress != nullptr; }
  bool showsResults() const;
  /// Ends what is running; closes when nothing is.
  void reject() override;

signals:
  /// A point of the field was made one of the study, and is shown.
  void opened();

private:
  void chooseTable();
  void chooseResults();
  void start();
  void end(const Results<std::shared_ptr<const ScreenedField>>& outcome);
  void cancel();

  Desk& m_desk;
  QStackedWidget* m_pages;
  FieldSetup* m_setup;
  FieldPage* m_page;
  std::shared_ptr<FieldProgress> m_progress; ///< of what is running
  QTimer m_look;
  Beside m_work;
};

} // namespace planewright
