// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/look/later.h"

#include <QWidget>

class QLabel;
class QStackedWidget;

namespace planewright {

class PlanesPage;
class PlaneTable;
class QuietButton;
class QuietTabs;
class SweepPage;

/// The tables under the drawings: the planes of the shown state, and a sweep all round.
class PlanesPanel : public QWidget {
  Q_OBJECT

public:
  explicit PlanesPanel(Desk& desk, QWidget* parent = nullptr);
  ~PlanesPanel() override;

  PlanesPage& planes() const { return *m_planes; }
  SweepPage& sweep() const;
  QuietTabs& tabs() const { return *m_tabs; }
  QSize sizeHint() const override { return {830, 300}; }

  /// The table of planes, or the sweep where that is shown.
  PlaneTable& shownTable() const;

  /// Takes another page behind its own, under a tab of this title, and gives it back.
  void adopt(QWidget* page, const QString& title);
  void release();
  /// Shows the page that was adopted.
  void showAdopted();

private:
  void showPage(int index);
  void copyShown();

  Desk& m_desk;
  QuietTabs* m_tabs;
  QStackedWidget* m_pages;
  PlanesPage* m_planes;
  Later<SweepPage>* m_sweep;
  QuietButton* m_copy;
  QLabel* m_range; ///< what must stand with least and greatest values
};

} // namespace planewright
