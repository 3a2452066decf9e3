// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/planes/table_model.h"

namespace planewright {

/// The planes from -90 (excluded) to 90 deg by a step; the row nearest to the reading plane is tinted.
class SweepModel : public TableModel {
  Q_OBJECT

public:
  static constexpr double leastStep = 0.1;
  static constexpr double greatestStep = 90;

  explicit SweepModel(Desk& desk, QObject* parent = nullptr);

  Angle step() const { return m_step; }
  /// From leastStep to greatestStep degrees.
  void setStep(Angle step);

  int tintedRow() const override;
  bool tintIsBold() const override { return false; }
  RowNote noteOf(int) const override { return {}; }
  /// Nothing is typed here.
  std::optional<Problem> enter(const QModelIndex&, const QString&) override { return std::nullopt; }

  /// Follows the desk; called by the page while it is shown.
  void refresh();

private:
  Table swept() const;

  Desk& m_desk;
  Angle m_step = Angle::fromDegrees(5);
};

} // namespace planewright
