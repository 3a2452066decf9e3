// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QDialog>

class QLabel;
class QTreeWidget;

namespace planewright {

/// Every criterion that applies to the material of a check, nominal and at the worst of the band, so that it
/// is seen how much of the answer is the criterion. Follows the study while it is open.
class SideBySideDialog : public QDialog {
  Q_OBJECT

public:
  SideBySideDialog(Desk& desk, std::string check, QWidget* parent);

  QTreeWidget& table() const { return *m_table; }

private:
  void refresh();

  Desk& m_desk;
  std::string m_check; ///< its id
  QLabel* m_heading;
  QTreeWidget* m_table;
};

} // namespace planewright
