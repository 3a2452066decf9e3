// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QWidget>

namespace planewright {

class Complaint;
class DraftEdit;
class PlaneTable;
class SweepModel;

/// The planes all round, by a step that is typed.
class SweepPage : public QWidget {
  Q_OBJECT

public:
  explicit SweepPage(Desk& desk, QWidget* parent = nullptr);
  ~SweepPage() override;
  PlaneTable& table() const { return *m_table; }
  DraftEdit& step() const { return *m_step; }
  QString complaint() const;

protected:
  void showEvent(QShowEvent* event) override;

private:
  void takeStep();
  void showStep();

  Desk& m_desk;
  SweepModel* m_model;
  PlaneTable* m_table;
  DraftEdit* m_step;
  Complaint* m_complaint;
};

} // namespace planewright
