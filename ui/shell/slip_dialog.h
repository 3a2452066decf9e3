// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QDialog>

class QComboBox;
class QLabel;

namespace planewright {

class Complaint;
class DraftEdit;

/// Somebody else's number beside this study's: that it agrees, or the known slips that make it. Follows the
/// study; holds nothing but the text that is typed.
class SlipDialog : public QDialog {
  Q_OBJECT

public:
  SlipDialog(Desk& desk, QWidget* parent);

  QComboBox& question() const { return *m_question; }
  DraftEdit& number() const { return *m_number; }
  QString answer() const;

private:
  void build();
  void compare();
  void refuse(const Problem& problem);

  Desk& m_desk;
  QComboBox* m_question;
  DraftEdit* m_number;
  Complaint* m_complaint;
  QLabel* m_answer;
};

} // namespace planewright
