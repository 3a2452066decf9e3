// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/shipped/shipped_materials.h"

#include "core/record/csv.h"
#include "core/study/text_fields.h"
#include "shipped_rows.h"

#include <algorithm>
#include <cassert>
#include <map>
#include <span>

namespace planewright {

template <>
const std::vector<Named<MaterialFamily>>& namesOf() {
  static const std::vector<Named<MaterialFamily>> names = {
      {MaterialFamily::solidTimber, "solid-timber", PW_TEXT("Material", "Solid timber")},
      {MaterialFamily::glulam, "glulam", PW_TEXT("Material", "Glulam")},
      {MaterialFamily::lvl, "lvl", PW_TEXT("Material", "Laminated veneer lumber")},
      {MaterialFamily::lamina, "lamina", PW_TEXT("Material", "Laminae")},
      {MaterialFamily::filletWeld, "fillet-weld", PW_TEXT("Material", "Fillet welds")}};
  return names;
}

namespace {

using Rows = std::span<const std::string_view>;
/// One row by the names of its columns.
using Record = std::map<std::string, std::string>;

std::vector<Record> recordsIn(Rows rows) {
  const std::vector<std::string> heading = csvFields(rows.front());
  std::vector<Record> records;
  for (const std::string_view row : rows.subspan(1)) {
    const std::vector<std::string> fields = csvFields(row);
    assert(fields.size() == heading.size());
    Record& record = records.emplace_back();
    for (std::size_t i = 0; i < heading.size(); ++i)
      record[heading[i]] = fields[i];
  }
  return records;
}

/// Puts the texts of a row where its columns are keys of the thing; a stress gets the row's unit.
template <class Thing>
void takeTexts(Thing& thing, const Record& record) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>()) {
    const SpotRow& row = rowOf(field.spot);
    const auto found = record.find(std::string(row.key()));
    if (found == record.end() || found->second.empty())
      continue;
    const bool isStress = row.holds == Holds::expression && row.dimension == dimension::stress;
    thing.*field.text = found->second + (isStress ? " " + record.at("unit") : "");
  }
}

template <class Enum>
Enum wordIn(const Record& record, const char* column) {
  const std::optional<Enum> value = fromWord<Enum>(record.at(column));
  assert(value);
  return *value;
}

const std::vector<Record>& durationRecords() {
  static const std::vector<Record> records = recordsIn(rows::duration_factors);
  return records;
}

/// What the factors of timber add to the source and the trust of its strengths.
void addOrigin(Material& material, const Record& factors) {
  material.source += "; " + factors.at("source");
  material.trust += "; " + factors.at("trust");
}

/// Gives timber the factors that its family has.
void addFactors(ShippedMaterial& shipped) {
  for (const Record& partial : recordsIn(rows::partial_factors)) {
    if (wordIn<MaterialFamily>(partial, "family") != shipped.family)
      continue;
    const Record& durations = durationRecords().front();
    shipped.material.partialFactor = partial.at("partial_factor");
    shipped.material.serviceClass = durations.at("service_class");
    takeTexts(shipped.material.durations, durations);
    addOrigin(shipped.material, durations);
    addOrigin(shipped.material, partial);
  }
}

ShippedMaterial materialOf(const Record& record) {
  ShippedMaterial shipped{wordIn<MaterialFamily>(record, "family"), {}};
  shipped.material.name = record.at("name");
  shipped.material.kind = wordIn<MaterialKind>(record, "kind");
  shipped.material.basis = wordIn<StrengthBasis>(record, "basis");
  takeTexts(shipped.material, record);
  addFactors(shipped);
  return shipped;
}

std::vector<ShippedMaterial> readMaterials() {
  std::vector<ShippedMaterial> materials;
  for (const Rows rows : {Rows(rows::timber), Rows(rows::lamina), Rows(rows::weld)})
    for (const Record& record : recordsIn(rows))
      materials.push_back(materialOf(record));
  std::ranges::stable_sort(materials, {}, &ShippedMaterial::family);
  return materials;
}

} // namespace

const std::vector<ShippedMaterial>& shippedMaterials() {
  static const std::vector<ShippedMaterial> materials = readMaterials();
  return materials;
}

const std::vector<std::string>& serviceClasses() {
  static const std::vector<std::string> classes = [] {
    std::vector<std::string> names;
    for (const Record& record : durationRecords())
      names.push_back(record.at("service_class"));
    return names;
  }();
  return classes;
}

Material inServiceClass(Material shipped, std::string_view serviceClass) {
  for (const Record& record : durationRecords()) {
    if (shipped.serviceClass.empty() || record.at("service_class") != serviceClass)
      continue;
    shipped.serviceClass = serviceClass;
    takeTexts(shipped.durations, record);
  }
  return shipped;
}

} // namespace planewright
