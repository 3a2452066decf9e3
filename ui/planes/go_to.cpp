// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/go_to.h"

#include "core/study/cut_text.h"
#include "ui/planes/table_model.h"

#include <QCoreApplication>

namespace planewright {

void bringReadingTo(Desk& desk, const Table& table, int row) {
  const Cell& normal =
      table.rows[static_cast<std::size_t>(row)].cells[static_cast<std::size_t>(PlaneColumn::normal)];
  if (!normal.exact) {
    desk.say(QCoreApplication::translate("Planes", "In this state every direction is such a plane."));
    return;
  }
  const Place place{Spot::reading, shownPoint(desk.study()).name, {}};
  desk.request({Type{place, angleText(Angle::fromDegrees(*normal.exact))}}, desk.newCommand(),
               QCoreApplication::translate("Planes", "turn of the reading plane"));
}

void showCombination(Desk& desk, const QString& combination) {
  desk.show(shownPoint(desk.study()).name, combination.toStdString());
}

} // namespace planewright
