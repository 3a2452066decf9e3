// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QTreeWidget>

namespace planewright {

/// The checks of the shown point, one row each, with the worst utilisation over all combinations. The
/// selected one is looked at more closely by its neighbours; it is the window's own.
class CheckList : public QTreeWidget {
  Q_OBJECT

public:
  CheckList(Desk& desk, QWidget* parent);

  /// The index of the selected check in the Readout; none where the point has no checks.
  std::optional<std::size_t> selected() const;
  /// Selects a check by its id, as soon as the point has it.
  void select(const std::string& id);

signals:
  void selectionMoved();
  void removalWanted();

protected:
  void keyPressEvent(QKeyEvent* event) override;

private:
  void refresh();

  Desk& m_desk;
  std::string m_selected; ///< id; empty: the governing one
};

} // namespace planewright
