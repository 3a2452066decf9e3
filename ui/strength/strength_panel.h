// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/look/later.h"

#include <QWidget>

namespace planewright {

class ColumnArea;

class CheckFields;
class CheckList;
class QuietButton;
class SteadyLabel;
class UtilisationPlot;
class VerdictBlock;

/// Is the point within its strengths, by how much, by which combination and direction, and for which
/// directions would it be: verdict, checks, what governs, utilisation over the angle, sentences, cautions.
class StrengthPanel : public QWidget {
  Q_OBJECT

public:
  explicit StrengthPanel(Desk& desk, QWidget* parent = nullptr);

  VerdictBlock& verdict() const { return *m_verdict; }
  CheckList& checks() const { return *m_checks; }
  CheckFields& fields() const { return *m_fields; }
  UtilisationPlot& plot() const;
  QuietButton& addButton() const { return *m_add; }
  QString sentences() const;
  QString cautions() const;
  QString governs() const;

signals:
  /// There is nothing to check against yet.
  void materialsWanted();

protected:
  void showEvent(QShowEvent* event) override;
  void paintEvent(QPaintEvent* event) override;

private:
  UtilisationPlot* newPlot(QWidget* place);
  void build();
  void listMaterials();
  void addCheck(const std::string& material);
  void removeCheck();
  void refresh();
  void refreshAdd();
  void refreshGoverns();
  void showGoverning();
  void showLimits();
  void showSideBySide();

  Desk& m_desk;
  ColumnArea* m_scroll;
  VerdictBlock* m_verdict;
  CheckList* m_checks;
  QuietButton* m_add;
  QuietButton* m_remove;
  QuietButton* m_side;
  CheckFields* m_fields;
  SteadyLabel* m_mode;
  QuietButton* m_governs;
  Later<UtilisationPlot>* m_plot;
  QuietButton* m_scale;
  SteadyLabel* m_sentences;
  SteadyLabel* m_cautions;
  QuietButton* m_more;
};

} // namespace planewright
