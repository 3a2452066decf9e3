// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/format.h"
#include "core/screen/field_reader.h"

namespace planewright {

/// Cases G and S, of which G acts in every combination and S in one; N/mm2.
inline Study readingStudy() {
  Study study = newStudy();
  study.cases = {{"G", "Permanent", Nature::permanent, Duration::permanent, {}},
                 {"S", "Snow", Nature::variable, Duration::shortTerm, {}}};
  return study;
}

/// A table read in pieces of `piece` bytes.
inline Results<FieldReading> readingOf(const Study& study, std::string_view table,
                                       const std::vector<MappedHeading>& mapped = {},
                                       std::size_t piece = std::string_view::npos) {
  FieldReader reader(study, std::vector<bool>(study.cases.size(), true), mapped);
  while (!table.empty()) {
    const std::string_view next = table.substr(0, piece);
    if (Results<void> taken = reader.take(next); !taken)
      return tl::unexpected(std::move(taken).error());
    table.remove_prefix(next.size());
  }
  return reader.finish();
}

/// All that came of a table, as text.
inline std::string written(const Results<FieldReading>& reading) {
  std::string text;
  const auto number = [](double value) { return value == value ? exactNumber(value) : std::string("none"); };
  const auto count = [](std::size_t value) { return exactNumber(static_cast<double>(value)); };
  if (!reading) {
    for (const Problem& problem : reading.error())
      text += plain(problem) + "\n";
    return text;
  }
  for (const FieldColumn& column : reading->columns.columns)
    text += column.heading + ": " + std::string(wordOf(column.role)) + "\n";
  text += count(reading->rows) + " rows, " + count(reading->faultyRows) + " faulty, " +
          count(reading->notFinite) + " not finite, " + count(reading->incompletePoints) +
          " incomplete points\n";
  for (const Problem& problem : reading->faults)
    text += plain(problem) + "\n";
  const Field& field = reading->field;
  for (std::size_t i = 0; i < field.size(); ++i) {
    text += std::string(field.nameOf(i)) + " " + std::string(wordOf(field.layerOf(i))) +
            (field.standingOf(i) == PointStanding::whole ? "" : " incomplete");
    if (field.columns().axes)
      text += " axes " + number(field.axesOf(i));
    if (field.columns().line)
      text += " line " + number(field.lineOf(i));
    if (field.columns().region)
      text += " region " + std::string(field.regionOf(i));
    if (field.columns().x)
      text += " at " + number(field.xOf(i)) + " " + number(field.yOf(i));
    for (std::size_t k = 0; k < field.cases().size(); ++k) {
      const PlaneStress stress = field.stressOf(k, i);
      text += "; " + field.cases()[k] + " " + number(stress.sx) + " " + number(stress.sy) + " " +
              number(stress.txy);
    }
    text += "\n";
  }
  return text;
}

} // namespace planewright
