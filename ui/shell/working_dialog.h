// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QDialog>

class QPlainTextEdit;

namespace planewright {

/// How the shown stresses come about, step by step, as text to read and to copy. Follows the study.
class WorkingDialog : public QDialog {
  Q_OBJECT

public:
  WorkingDialog(Desk& desk, QWidget* parent);

  QString words() const;

private:
  void refresh();

  Desk& m_desk;
  QPlainTextEdit* m_text;
};

} // namespace planewright
