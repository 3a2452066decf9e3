// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/table_words.h"

#include "core/record/copied_points.h"
#include "ui/look/look.h"

#include <QCoreApplication>
#include <QStringList>

namespace planewright {

QString leftOutInWords(const std::vector<Point>& points) {
  QStringList names;
  for (const Text& name : leftOutOf(points))
    names << shown(name);
  if (names.isEmpty())
    return {};
  return QLatin1Char(' ') +
         QCoreApplication::translate("Table", "Not in the table: %1.").arg(names.join(QStringLiteral(", ")));
}

} // namespace planewright
