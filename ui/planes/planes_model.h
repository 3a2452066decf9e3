// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/planes/table_model.h"

namespace planewright {

enum class Component;
struct ReadingByValue;

/// The planes of the shown state, and a last row in which a plane to watch is typed.
class PlanesModel : public TableModel {
  Q_OBJECT

public:
  explicit PlanesModel(Desk& desk, QObject* parent = nullptr);

  int rowCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  Qt::ItemFlags flags(const QModelIndex& index) const override;

  int tintedRow() const override { return 0; }
  bool tintIsBold() const override { return true; }
  RowNote noteOf(int row) const override;
  bool isWatchRow(int row) const { return row == TableModel::rowCount(); }
  /// The name of the watched plane in a row; empty for every other row.
  std::string watchedIn(int row) const;

  /// Takes what was typed in a cell: a name, an angle, or for the reading plane a stress. The Problem, which
  /// the row then tells, when it is not taken.
  void forget() override;
  std::optional<Problem> enter(const QModelIndex& index, const QString& typed) override;
  /// Brings the reading plane to the other plane of the stress that was typed last; false without one.
  bool swapSolution();
  /// Watches the reading plane under a name of its own and gives its row.
  int watchReading();
  void removeWatched(int row);

private:
  /// The stress that was typed for the reading plane; it counts until the reading plane leaves it.
  struct Asked {
    Component component;
    std::string typed;
  };
  /// What the last entry was refused for.
  struct Refused {
    int row;
    Problem problem;
  };

  void refresh();
  std::optional<ReadingByValue> solution() const;
  std::optional<Problem> enterValue(Component component, const std::string& typed);
  std::optional<Problem> enterWatched(const std::string& name, PlaneColumn column, const std::string& typed);
  std::optional<Problem> enterNew(PlaneColumn column, const std::string& typed);
  std::optional<Problem> enterReading(PlaneColumn column, const std::string& typed);
  std::optional<Problem> turn(const std::string& normal);
  std::string toleranceIn(int row) const;
  std::string owner() const;
  std::string freshName() const;
  QString editText(const QModelIndex& index) const;

  Desk& m_desk;
  std::optional<Asked> m_asked;
  std::optional<Refused> m_refused;
};

} // namespace planewright
