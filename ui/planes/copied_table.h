// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/table/table.h"

#include <QModelIndexList>
#include <QString>

namespace planewright {

/// The rows and columns that the cells touch, with their headings and the table's cautions.
Table partOf(const Table& table, const QModelIndexList& cells);

/// One cell: a number at full precision as a spreadsheet reads it, else its words.
QString oneCell(const Table& table, const QModelIndex& cell);

} // namespace planewright
