// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/point.h"

#include <QDialog>

class QLabel;
class QLineEdit;
class QPushButton;

namespace planewright {

/// Asks for the slopes of a grain on two faces and tells the true one, with the angle and the tolerance that
/// the line has and would have. It changes nothing itself.
class FacesDialog : public QDialog {
  Q_OBJECT

public:
  FacesDialog(Line line, QWidget* parent);

  QLineEdit& first() const { return *m_first; }
  QLineEdit& second() const { return *m_second; }
  QString told() const;
  /// The true slope as a text of a tolerance, "5.7106 deg".
  std::string slope() const { return m_slope; }

private:
  void refresh();

  Line m_line;
  QLineEdit* m_first;
  QLineEdit* m_second;
  QLabel* m_told;
  QPushButton* m_take;
  std::string m_slope;
};

} // namespace planewright
