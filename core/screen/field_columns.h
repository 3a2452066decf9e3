// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

#include <optional>

namespace planewright {

/// What a column of a table of very many points holds.
enum class FieldRole { unread, point, layer, loadCase, axes, line, region, x, y, sx, sy, txy };
template <>
const std::vector<Named<FieldRole>>& namesOf<FieldRole>();

struct FieldColumn {
  std::string heading; ///< as it stands in the table
  FieldRole role = FieldRole::unread;
  std::size_t loadCase = 0; ///< in the study, of sx, sy and txy in the wide form
  Unit unit;                ///< of its numbers
};

/// A heading that the caller maps: `name` is one of the names below ("sx", "point", "sx G"), with a unit
/// behind it if the heading has none or another one counts; "unread" of a column that is passed over.
struct MappedHeading {
  std::string name;
  std::string heading;
};

/// The name by which a heading is mapped to this role: "sx G" of a case of the study, "sx" without one.
std::string nameOfColumn(const Study& study, FieldRole role, std::optional<std::size_t> loadCase = {});

/// The columns of a table, from its header.
struct FieldColumns {
  char separator = ',';
  bool isWide = false;       ///< a column triple for each case; else a row for each case at a point
  std::vector<bool> isGiven; ///< of each case of the study, whether it has its triple; all in the long form
  std::vector<FieldColumn> columns;
  bool has(FieldRole role) const;
};

/// Reads a header: `point,case,sx,sy,txy` with a row for each case at a point, or `point` and a column triple
/// for each case of the study by its id or name (`sx G`, `G sx`, `sx_G`). Besides: `layer` (top, mid or
/// bottom), `axes` (turn of the row's x axis from the x axis in which lines are given), `line` (the row's own
/// angle of the line, from that same x axis), `region`, and `x` and `y` of the point. Units stand in brackets
/// (`sx [MPa]`); without them stresses and lengths are in the study's units, angles in degrees. Cells are cut
/// at tabs, where there is none at semicolons, else at commas. Other columns are not read, but told.
///
/// Problems, with the column of the table, for what is missing, doubled or in a unit of another kind, and for
/// a mapped heading that the table does not have.
Results<FieldColumns> fieldColumnsOf(const Study& study, std::string_view header,
                                     const std::vector<MappedHeading>& mapped = {});

/// What each column of a header would be, sound or not; nothing of one that cannot be cut into cells.
struct NamedColumn {
  FieldColumn column;
  bool isOfCase = false; ///< the heading names its case
};
std::vector<NamedColumn> namedColumnsOf(const Study& study, std::string_view header,
                                        const std::vector<MappedHeading>& mapped = {});

} // namespace planewright
