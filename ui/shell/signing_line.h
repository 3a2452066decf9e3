// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QLabel>

namespace planewright {

/// Says under the name of who prepared or checked whether it was given for the study as it is now, and lets
/// it be given again.
class SigningLine : public QLabel {
  Q_OBJECT

public:
  /// `spot` is that of the name.
  SigningLine(Desk& desk, Spot spot, QWidget* parent = nullptr);

private:
  void refresh();
  void giveAgain();

  Desk& m_desk;
  Spot m_spot;
};

} // namespace planewright
