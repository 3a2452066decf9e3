// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/built_combinations.h"
#include "ui/desk/desk.h"

#include <QDialog>

#include <map>

class QComboBox;
class QFormLayout;
class QLabel;
class QPlainTextEdit;
class QPushButton;

namespace planewright {

class Complaint;
class DraftEdit;

/// Builds combinations from the cases of the study by a rule of EN 1990: factors are typed, what they make is
/// listed with its count, and nothing is taken before the button is pressed; then all in one step of undo.
class BuildDialog : public QDialog {
  Q_OBJECT

public:
  BuildDialog(Desk& desk, QWidget* parent);

  QComboBox& rule() const { return *m_rule; }
  /// The field of a factor: "upper", "lower", "variable", "reduction", or "of " and the id of a case for its
  /// psi_0.
  DraftEdit& factor(const std::string& key) const { return *m_factors.at(key); }
  QString listed() const;
  QString complaint() const;
  QString count() const;
  QString notes() const;
  QPushButton& takeButton() const { return *m_take; }

private:
  void build();
  void addFactor(const std::string& key, const QString& caption, const std::string& text);
  void followCases();
  QString captionOf(const std::string& place) const;
  CombinationFactors typed() const;
  void preview();
  void take();
  void complain(const Problem& problem);

  Desk& m_desk;
  QComboBox* m_rule;
  QFormLayout* m_form;
  std::map<std::string, DraftEdit*> m_factors;
  Complaint* m_complaint;
  QLabel* m_count;
  QPlainTextEdit* m_list;
  QLabel* m_notes;
  QPushButton* m_take;
};

} // namespace planewright
