// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QWidget>

namespace planewright {

class PlanesModel;
class PlaneTable;

/// The table of the planes of the shown state.
class PlanesPage : public QWidget {
  Q_OBJECT

public:
  explicit PlanesPage(Desk& desk, QWidget* parent = nullptr);
  PlaneTable& table() const { return *m_table; }
  PlanesModel& model() const { return *m_model; }

private:
  void goTo(int row);
  void watch();
  void showWatchRow();
  void remove(int row);
  void buildMenu();
  void edit(int row, int column);

  Desk& m_desk;
  PlanesModel* m_model;
  PlaneTable* m_table;
};

} // namespace planewright
