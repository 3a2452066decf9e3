// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/column_texts.h"

#include "core/study/text_fields.h"

namespace planewright {

namespace {

using Typed = std::optional<std::string>;

template <class Thing>
Typed typedText(const Thing& thing, Spot spot) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>())
    if (field.spot == spot)
      return thing.*field.text;
  return std::nullopt;
}

template <class Enum>
Typed written(Enum value) {
  return std::string(wordOf(value));
}

Typed nameIn(const RowThings& row, ColumnKind kind) {
  if (kind == ColumnKind::point && row.point)
    return row.point->name;
  if (kind == ColumnKind::line && row.line)
    return row.line->name;
  if (kind == ColumnKind::loadCase && row.stress)
    return row.stress->caseId;
  return std::nullopt;
}

} // namespace

bool has(const RowThings& row, Spot thing) {
  switch (thing) {
  case Spot::point:
    return row.point;
  case Spot::fibre:
    return row.point && row.point->fibre;
  case Spot::line:
    return row.line;
  case Spot::forces:
    return row.stress && row.stress->forces;
  case Spot::pressure:
    return row.stress && row.stress->pressure;
  case Spot::rosette:
    return row.stress && row.stress->rosette;
  default:
    return row.stress;
  }
}

Typed textIn(const RowThings& row, ColumnKind kind) {
  const std::optional<Spot> thing = thingOf(kind);
  if (!thing)
    return nameIn(row, kind);
  if (!has(row, *thing))
    return std::nullopt;
  const Spot spot = *spotOf(kind);
  switch (spot) {
  case Spot::pointNote:
    return row.point->note;
  case Spot::fibreView:
    return written(row.point->fibre->view);
  case Spot::lineKind:
    return written(row.line->kind);
  case Spot::pressureEnds:
    return written(row.stress->pressure->ends);
  case Spot::rosetteMaterial:
    return written(row.stress->rosette->material);
  default:
    break;
  }
  switch (*thing) {
  case Spot::fibre:
    return typedText(*row.point->fibre, spot);
  case Spot::line:
    return typedText(*row.line, spot);
  case Spot::forces:
    return typedText(*row.stress->forces, spot);
  case Spot::pressure:
    return typedText(*row.stress->pressure, spot);
  case Spot::rosette:
    return typedText(*row.stress->rosette, spot);
  default:
    return typedText(*row.stress, spot);
  }
}

} // namespace planewright
